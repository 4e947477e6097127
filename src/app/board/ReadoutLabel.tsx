import { formatNumber, formatPolar, unitOf } from '../../core'
import { labelOf, type Place, type Sheet } from '../../sheet'
import type { Readout } from './gestures'
import type { Size } from './view'

const above = 56
const aside = 16
const roomNeeded = 250

/** What a drag comes to, beside the pointer and clear of the finger. */
export function ReadoutLabel(properties: {
  readonly readout: Readout
  readonly sheet: Sheet
  readonly board: Size
}) {
  const { readout, sheet, board } = properties
  const { at } = readout
  const { left, top } = placeOfReadout(at, board)
  return (
    <output className="readout" style={{ transform: `translate(${left}px, ${top}px)` }}>
      {'hint' in readout ? readout.hint : dragText(readout, sheet)}
    </output>
  )
}

/** Where a readout stands for a pointer at a point of the board: CSS pixels. */
export function placeOfReadout(
  at: Place,
  board: Size,
): { readonly left: number; readonly top: number } {
  return {
    left: Math.min(at.x + aside, Math.max(0, board.width - roomNeeded)),
    top: at.y > above ? at.y - above : at.y + above / 2,
  }
}

function dragText({ drag, grip }: Extract<Readout, { drag: unknown }>, sheet: Sheet): string {
  const { phasor, quantity } = grip.arrow
  const name = phasor === undefined ? '' : `${labelOf(sheet, phasor)} `
  return `${name}${formatNumber(drag.millimetres, 1)} mm · ${formatPolar(drag, unitOf(quantity))}`
}
