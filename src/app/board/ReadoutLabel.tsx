import { formatNumber, formatPolar, unitOf } from '../../core'
import type { Sheet } from '../../sheet'
import { labelOf } from '../store'
import type { Readout } from './gestures'
import type { Size } from './view'

const above = 56
const aside = 16
const roomNeeded = 250

/** What the dragged tip comes to, beside the pointer and clear of the finger. */
export function ReadoutLabel(properties: {
  readonly readout: Readout
  readonly sheet: Sheet
  readonly board: Size
}) {
  const { readout, sheet, board } = properties
  const { drag, grip, at } = readout
  const unit = unitOf(grip.arrow.quantity)
  const name = grip.arrow.phasor === undefined ? '' : labelOf(sheet, grip.arrow.phasor)
  const left = Math.min(at.x + aside, Math.max(0, board.width - roomNeeded))
  const top = at.y > above ? at.y - above : at.y + above / 2
  return (
    <output className="readout" style={{ transform: `translate(${left}px, ${top}px)` }}>
      {`${name} ${formatNumber(drag.millimetres, 1)} mm · ${formatPolar(drag, unit)}`}
    </output>
  )
}
