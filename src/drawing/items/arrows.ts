import type { Item, PlacedArrow } from '../scene'
import type { Palette } from '../theme'
import { headOf } from './head'
import { styleOf } from './style'

/** The radius of the dot that a phasor of no magnitude is drawn as. */
const DOT_RADIUS = 0.7

/** Adds the shaft and the head of an arrow; a dot, where it has no length. */
export function addArrow(items: Item[], arrow: PlacedArrow, palette: Palette): void {
  const { from, to, key } = arrow
  const style = styleOf(arrow, palette)
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  if (!Number.isFinite(length)) return
  if (length === 0) {
    items.push({
      part: 'arrow',
      arrow: key,
      kind: 'arc',
      centre: to,
      radius: DOT_RADIUS,
      start: 0,
      sweep: 360,
      fill: style.colour,
    })
    return
  }
  const direction = { x: (to.x - from.x) / length, y: (to.y - from.y) / length }
  const { points, shaftEnd, width } = headOf(to, direction, length, style)
  items.push(
    {
      part: 'arrow',
      arrow: key,
      kind: 'lines',
      segments: [from.x, from.y, to.x - direction.x * shaftEnd, to.y - direction.y * shaftEnd],
      stroke: style.colour,
      width,
    },
    { part: 'arrow', arrow: key, kind: 'path', points, closed: true, fill: style.colour },
  )
}
