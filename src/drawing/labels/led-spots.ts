import type { Place } from '../../sheet'
import { type Box, distanceToBox } from '../geometry'
import { directionOf, pointAlong, turned } from './near-spots'
import { boxToward, leaderTo, type Size, type Spot } from './spot'
import type { Wish } from './wish'

/** Where a leader may start along a stretch. */
const ANCHORS = [0.5, 1, 0.75, 0.25, 0]
const TURNS = [90, -90, 60, -60, 120, -120, 30, -30, 150, -150, 0, 180]
/** How many places are looked at closely. */
const MOST_ALL_OVER = 150
const COST = { led: 8, distance: 0.3, anchor: 2 }

/** Places at these distances, each with a leader. */
export function ledSpots(wish: Wish, size: Size, distances: readonly number[]): Spot[] {
  const direction = directionOf(wish)
  const spots: Spot[] = []
  for (const anchor of anchorsOf(wish)) {
    for (const distance of distances) {
      for (const turn of TURNS) {
        const box = boxToward(anchor.point, turned(direction, turn), distance, size)
        spots.push(ledTo(anchor, box))
      }
    }
  }
  return spots
}

/** The nearest of all places in a region that are free by themselves, each with a leader. */
export function spotsAllOver(
  wish: Wish,
  size: Size,
  region: Box,
  isFree: (box: Box) => boolean,
): Spot[] {
  const middle = pointAlong(wish, 0.5)
  const found: { box: Box; away: number }[] = []
  const [across, up] = [Math.max(4, size.width / 2), Math.max(3, 0.7 * size.height)]
  for (let left = region.left; left + size.width <= region.right; left += across) {
    for (let bottom = region.bottom; bottom + size.height <= region.top; bottom += up) {
      const box = { left, bottom, right: left + size.width, top: bottom + size.height }
      if (isFree(box)) found.push({ box, away: distanceToBox(middle, box) })
    }
  }
  const nearest = found.sort((one, other) => one.away - other.away).slice(0, MOST_ALL_OVER)
  return anchorsOf(wish).flatMap((anchor) => nearest.map(({ box }) => ledTo(anchor, box)))
}

interface Anchor {
  readonly point: Place
  readonly cost: number
}

function anchorsOf(wish: Wish): Anchor[] {
  if (wish.from.x === wish.to.x && wish.from.y === wish.to.y) return [{ point: wish.to, cost: 0 }]
  return ANCHORS.map((along) => ({
    point: pointAlong(wish, along),
    cost: Math.abs(along - wish.along) * COST.anchor,
  }))
}

function ledTo({ point, cost }: Anchor, box: Box): Spot {
  return {
    box,
    cost: COST.led + cost + distanceToBox(point, box) * COST.distance,
    leader: leaderTo(point, box),
  }
}
