import type { Place } from '../../sheet'
import type { Box } from '../geometry'

/**
 * The part of a stretch that lies in a box; undefined where none does (each side of the box cuts off
 * what lies beyond it).
 */
export function clipToBox(
  from: Place,
  to: Place,
  box: Box,
): { from: Place; to: Place } | undefined {
  const [width, height] = [to.x - from.x, to.y - from.y]
  const first = Math.max(
    0,
    enter(from.x, width, box.left, box.right),
    enter(from.y, height, box.bottom, box.top),
  )
  const last = Math.min(
    1,
    leave(from.x, width, box.left, box.right),
    leave(from.y, height, box.bottom, box.top),
  )
  if (!(first <= last)) return undefined
  return {
    from: { x: from.x + first * width, y: from.y + first * height },
    to: { x: from.x + last * width, y: from.y + last * height },
  }
}

/** Whether any of a stretch lies in a box. */
export function isCrossingBox(from: Place, to: Place, box: Box): boolean {
  const { left, bottom, right, top } = box
  // Most stretches lie to one side.
  if ((from.x < left && to.x < left) || (from.x > right && to.x > right)) return false
  if ((from.y < bottom && to.y < bottom) || (from.y > top && to.y > top)) return false
  const [width, height] = [to.x - from.x, to.y - from.y]
  const first = Math.max(0, enter(from.x, width, left, right), enter(from.y, height, bottom, top))
  const last = Math.min(1, leave(from.x, width, left, right), leave(from.y, height, bottom, top))
  return first <= last
}

/** At which share of a step from a start the range from low to high is entered. */
function enter(start: number, step: number, low: number, high: number): number {
  if (step === 0) return start < low || start > high ? 2 : 0
  return ((step > 0 ? low : high) - start) / step
}

/** At which share of a step it is left. */
function leave(start: number, step: number, low: number, high: number): number {
  if (step === 0) return 1
  return ((step > 0 ? high : low) - start) / step
}
