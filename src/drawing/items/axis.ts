import type { Place } from '../../sheet'
import type { Box } from '../geometry'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { WIDTHS } from './style'

/** How far the axis reaches beyond what is drawn, and how far it reaches at least. */
const BEYOND = 10
const SHORTEST = 40
/** Millimetres on, off, on, off: a dash and a dot. */
const DASH = [6, 1.4, 0.7, 1.4]

/** The direction of the reference: a dash-dot line through a point, inside the frame. */
export function axisItem(
  through: Place,
  reach: Box,
  frame: Box,
  palette: Palette,
): Item | undefined {
  const left = Math.max(frame.left, Math.min(reach.left, through.x) - BEYOND)
  const wished = Math.max(reach.right, through.x + SHORTEST) + BEYOND
  const right = Math.min(frame.right, wished)
  if (through.y <= frame.bottom || through.y >= frame.top || right <= left) return undefined
  return {
    part: 'axis',
    kind: 'lines',
    segments: [left, through.y, right, through.y],
    stroke: palette.thin,
    width: WIDTHS.thin,
    dash: DASH,
  }
}
