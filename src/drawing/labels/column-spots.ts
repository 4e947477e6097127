import type { Place } from '../../sheet'
import type { Box } from '../geometry'
import type { Size, Spot } from './spot'
import type { Wish } from './wish'

/** What stays free between two labels of a column. */
const BETWEEN = 1
/** What a leader leaves free before the text. */
const GAP = 0.4

/**
 * Places in columns to the left and right of what a label names, each with a leader. Leaders that fan
 * out from one point to one column never cross its labels, so that many can name the same place.
 *
 * @param distances How far the columns stand off: the first are filled first.
 */
export function columnSpots(
  { to }: Wish,
  { width, height }: Size,
  region: Box,
  distances: readonly number[],
): Spot[] {
  const spots: Spot[] = []
  const pitch = height + BETWEEN
  const steps = Math.ceil((region.top - region.bottom) / pitch)
  distances.forEach((distance, rank) => {
    for (let step = -steps; step <= steps; step += 1) {
      const middle = to.y + step * pitch
      const [bottom, top] = [middle - height / 2, middle + height / 2]
      if (bottom < region.bottom || top > region.top) continue
      const cost = rank * steps + Math.abs(step)
      const right = { left: to.x + distance, right: to.x + distance + width, bottom, top }
      const left = { left: to.x - distance - width, right: to.x - distance, bottom, top }
      spots.push({ box: right, cost, leader: leaderTo(to, right.left, middle) })
      spots.push({ box: left, cost: cost + 0.5, leader: leaderTo(to, left.right, middle) })
    }
  })
  return spots
}

/** A leader to the middle of a label's end, a little short of it. */
function leaderTo(from: Place, x: number, y: number): { from: Place; to: Place } {
  return { from, to: { x: x + (from.x < x ? -GAP : GAP), y } }
}
