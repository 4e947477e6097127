import { formatPolar, unitOf } from '../../core'
import { type Scene, valueOfStroke } from '../../drawing'
import type { Sheet } from '../../sheet'
import { checkedSum, quantityOfSum, usePage } from '../store'
import type { DrawnStroke } from './gestures'
import { placeOfReadout } from './ReadoutLabel'
import type { Size } from './view'

/** What a new arrow comes to while it is drawn: millimetres, and its value through the scale. */
export function StrokeReadout(properties: {
  readonly drawn: DrawnStroke
  readonly scene: Scene
  readonly sheet: Sheet
  readonly board: Size
}) {
  const { drawn, scene, sheet, board } = properties
  const { stroke, at } = drawn
  const chosen = usePage((state) => state.chosenSum)
  const sum = checkedSum(sheet, chosen)
  const quantity = sum ? quantityOfSum(sheet, sum) : 'voltage'
  const { left, top } = placeOfReadout(at, board)
  const value = formatPolar(valueOfStroke(scene, stroke, quantity), unitOf(quantity))
  return (
    <output className="readout" style={{ transform: `translate(${left}px, ${top}px)` }}>
      {`${stroke.millimetres.toFixed(1)} mm · ${value}`}
    </output>
  )
}
