import type { Phasor, Place } from '../../sheet'
import { measureText } from '../font/measure'
import { headOf } from '../items/head'
import { HEAD_SHAPES, HEADS } from '../items/style'
import type { Item } from '../scene'
import { labelRuns } from '../text/label-runs'
import type { Palette } from '../theme'
import { outlineItem, wireItem } from './items'

/** The heads of a schematic beside those of the board. */
const HEAD_SHARE = 0.72
const SHAFT = 0.25
/** The em of a phasor's symbol in millimetres. */
export const SYMBOL_SIZE = 4.2

/** An arrow along the positive direction of a phasor, its head shaped as on the board. */
export function directionItems(
  { quantity }: Pick<Phasor, 'quantity'>,
  from: Place,
  to: Place,
  palette: Palette,
): readonly Item[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const direction = { x: (to.x - from.x) / length, y: (to.y - from.y) / length }
  const shape = HEAD_SHAPES[quantity]
  const [headLength, headReach] = HEADS[shape]
  const colour = palette.quantities[quantity]
  const { points, shaftEnd, width } = headOf(to, direction, length, {
    shape,
    colour,
    width: SHAFT,
    headLength: HEAD_SHARE * headLength,
    headReach: HEAD_SHARE * headReach,
  })
  const end = { x: to.x - direction.x * shaftEnd, y: to.y - direction.y * shaftEnd }
  return [
    wireItem([from.x, from.y, end.x, end.y], colour, width),
    outlineItem(points, { closed: true, fill: colour }),
  ]
}

/** The label of a phasor in its quantity's colour, as runs, with the width that they take. */
export function phasorWords({ label, id }: Pick<Phasor, 'label' | 'id'>): {
  readonly runs: ReturnType<typeof labelRuns>
  readonly width: number
} {
  const runs = labelRuns(label || id, SYMBOL_SIZE)
  return { runs, width: measureText(runs) }
}
