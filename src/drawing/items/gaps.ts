import type { Place } from '../../sheet'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { WIDTHS } from './style'
import { lengthOf, type SumFigure } from './sum-figures'

/** Half the length of the bar's end strokes, in millimetres. */
const END_REACH = 1.3
/** Below this share of the largest arrow a gap is rounding alone. */
const ROUNDING = 1e-9

/** The stretch between where a sum ends and where it should. */
export interface Gap {
  readonly key: string
  readonly from: Place
  readonly to: Place
  readonly millimetres: number
}

/** The gap of a sum; undefined where nothing says where it should end, and where it does. */
export function gapOf({ isClosing, resultant, measured, terms }: SumFigure): Gap | undefined {
  if (!resultant || (!isClosing && !measured)) return undefined
  const from = isClosing ? resultant.from : resultant.to
  const to = isClosing ? resultant.to : (measured?.to as Place)
  const millimetres = Math.hypot(to.x - from.x, to.y - from.y)
  const arrows = measured ? [resultant, measured, ...terms] : terms
  const largest = arrows.reduce((most, arrow) => Math.max(most, lengthOf(arrow)), 0)
  return millimetres > ROUNDING * largest
    ? { key: resultant.key, from, to, millimetres }
    : undefined
}

/** A gap as a bar with end strokes. */
export function gapItem({ key, from, to, millimetres }: Gap, palette: Palette): Item {
  const x = ((to.y - from.y) / millimetres) * END_REACH
  const y = ((from.x - to.x) / millimetres) * END_REACH
  return {
    part: 'gap',
    arrow: key,
    kind: 'lines',
    segments: [
      ...[from.x, from.y, to.x, to.y],
      ...[from.x - x, from.y - y, from.x + x, from.y + y],
      ...[to.x - x, to.y - y, to.x + x, to.y + y],
    ],
    stroke: palette.gap,
    width: WIDTHS.gap,
  }
}
