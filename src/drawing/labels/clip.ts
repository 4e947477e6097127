import type { Place } from '../../sheet'
import type { Box } from '../geometry'

/**
 * The part of a stretch that lies in a box; undefined where none does (each side of the box cuts off
 * what lies beyond it).
 */
export function clipToBox(
  from: Place,
  to: Place,
  { left, bottom, right, top }: Box,
): { from: Place; to: Place } | undefined {
  let [first, last] = [0, 1]
  const [width, height] = [to.x - from.x, to.y - from.y]
  for (const [start, step, low, high] of [
    [from.x, width, left, right],
    [from.y, height, bottom, top],
  ] as const) {
    if (step === 0) {
      if (start < low || start > high) return undefined
      continue
    }
    const [one, other] = [(low - start) / step, (high - start) / step]
    first = Math.max(first, Math.min(one, other))
    last = Math.min(last, Math.max(one, other))
  }
  if (!(first <= last)) return undefined
  return {
    from: { x: from.x + first * width, y: from.y + first * height },
    to: { x: from.x + last * width, y: from.y + last * height },
  }
}
