import type { Place } from '../../sheet'
import { type Box, distanceToSegment } from '../geometry'
import type { Leader } from './spot'
import type { Wish } from './wish'

/** What speaks against a leader for every arrow that it crosses. */
const CROSSING_COST = 3
/** A label nearer to another arrow than to its own, by less than this, may be taken for the other's. */
const MARGIN = 2.5
const MISTAKABLE_COST = 9

/** What speaks against a place because the label would seem to belong to something else. */
export function mistakableCost(box: Box, wish: Wish, wishes: readonly Wish[]): number {
  const own = distanceFrom(box, wish)
  let nearest = Number.POSITIVE_INFINITY
  for (const other of wishes) {
    if (other.arrow !== wish.arrow) nearest = Math.min(nearest, distanceFrom(box, other))
  }
  return MISTAKABLE_COST * Math.min(1, Math.max(0, (own + MARGIN - nearest) / MARGIN))
}

/** What speaks against a leader because it crosses what other labels name. */
export function crossingCost({ from, to }: Leader, wish: Wish, wishes: readonly Wish[]): number {
  let crossings = 0
  for (const other of wishes) {
    if (other.arrow !== wish.arrow && isCrossing(from, to, other.from, other.to)) crossings += 1
  }
  return CROSSING_COST * crossings
}

/** Whether two segments cross: the ends of each lie on both sides of the other. */
function isCrossing(from: Place, to: Place, start: Place, end: Place): boolean {
  return (
    sideOf(from, to, start) * sideOf(from, to, end) < 0 &&
    sideOf(start, end, from) * sideOf(start, end, to) < 0
  )
}

function sideOf(from: Place, to: Place, point: Place): number {
  return (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x)
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
