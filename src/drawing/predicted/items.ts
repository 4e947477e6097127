import { headOf } from '../items/head'
import { HEAD_SHAPES, HEADS } from '../items/style'
import type { Item, PlacedArrow } from '../scene'
import type { Palette } from '../theme'

/** A thin broken line: no measured arrow has one, whatever its colour. */
const SHAFT = { width: 0.22, dash: [2.2, 1] }
const HEAD_SHARE = 0.75
const DOT_RADIUS = 0.5

/** The arrows of a prediction: a thin broken shaft in grey, the head shaped as its quantity's. */
export function predictedItems(arrows: readonly PlacedArrow[], palette: Palette): readonly Item[] {
  return arrows.flatMap((arrow) => itemsOf(arrow, palette))
}

function itemsOf({ from, to, quantity }: PlacedArrow, { quiet }: Palette): readonly Item[] {
  const part = 'predicted'
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  if (length === 0) {
    return [
      { part, kind: 'arc', centre: to, radius: DOT_RADIUS, start: 0, sweep: 360, fill: quiet },
    ]
  }
  const direction = { x: (to.x - from.x) / length, y: (to.y - from.y) / length }
  const shape = HEAD_SHAPES[quantity]
  const [headLength, headReach] = HEADS[shape]
  const { points, shaftEnd } = headOf(to, direction, length, {
    shape,
    colour: quiet,
    width: SHAFT.width,
    headLength: HEAD_SHARE * headLength,
    headReach: HEAD_SHARE * headReach,
  })
  const end = { x: to.x - direction.x * shaftEnd, y: to.y - direction.y * shaftEnd }
  return [
    {
      part,
      kind: 'lines',
      segments: [from.x, from.y, end.x, end.y],
      stroke: quiet,
      ...SHAFT,
    },
    { part, kind: 'path', points, closed: true, fill: quiet },
  ]
}
