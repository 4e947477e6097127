import { type Box, distanceToSegment } from '../geometry'
import type { Wish } from './wish'

/** A label nearer to another arrow than to its own, by less than this, may be taken for the other's. */
const MARGIN = 2.5
const COST = 5

/** What speaks against a place because the label would seem to belong to something else. */
export function mistakableCost(box: Box, wish: Wish, wishes: readonly Wish[]): number {
  const own = distanceFrom(box, wish)
  let nearest = Number.POSITIVE_INFINITY
  for (const other of wishes) {
    if (other.arrow !== wish.arrow) nearest = Math.min(nearest, distanceFrom(box, other))
  }
  return COST * Math.min(1, Math.max(0, (own + MARGIN - nearest) / MARGIN))
}

/** From the ends and the middle of a label to a stretch: near enough for a comparison. */
function distanceFrom({ left, bottom, right, top }: Box, { from, to }: Wish): number {
  const y = (bottom + top) / 2
  const inset = Math.min((top - bottom) / 2, (right - left) / 2)
  return Math.min(
    distanceToSegment(left + inset, y, from.x, from.y, to.x, to.y),
    distanceToSegment((left + right) / 2, y, from.x, from.y, to.x, to.y),
    distanceToSegment(right - inset, y, from.x, from.y, to.x, to.y),
  )
}
