import { cosDegrees, sinDegrees } from '../core'
import type { Place } from '../sheet'

/** An upright rectangle in millimetres, y up. */
export interface Box {
  readonly left: number
  readonly bottom: number
  readonly right: number
  readonly top: number
}

/** A box that holds nothing: joined with another, it gives the other. */
export const NO_BOX: Box = {
  left: Number.POSITIVE_INFINITY,
  bottom: Number.POSITIVE_INFINITY,
  right: Number.NEGATIVE_INFINITY,
  top: Number.NEGATIVE_INFINITY,
}

/** The smallest box that holds both. */
export function joinBoxes(one: Box, other: Box): Box {
  return {
    left: Math.min(one.left, other.left),
    bottom: Math.min(one.bottom, other.bottom),
    right: Math.max(one.right, other.right),
    top: Math.max(one.top, other.top),
  }
}

/** The box moved by (x, y). */
export function moveBox(box: Box, { x, y }: Place): Box {
  return { left: box.left + x, bottom: box.bottom + y, right: box.right + x, top: box.top + y }
}

/** The box with `by` millimetres more on every side. */
export function growBox(box: Box, by: number): Box {
  return {
    left: box.left - by,
    bottom: box.bottom - by,
    right: box.right + by,
    top: box.top + by,
  }
}

/** Whether two boxes share any of their inside. */
export function isOverlapping(one: Box, other: Box): boolean {
  return (
    one.left < other.right &&
    other.left < one.right &&
    one.bottom < other.top &&
    other.bottom < one.top
  )
}

/** Whether the first box lies wholly inside the second. */
export function isInside(inner: Box, outer: Box): boolean {
  return (
    inner.left >= outer.left &&
    inner.right <= outer.right &&
    inner.bottom >= outer.bottom &&
    inner.top <= outer.top
  )
}

/** The smallest box that holds the points x, y, …; `NO_BOX` for none. */
export function boxOfPoints(points: readonly number[]): Box {
  let [left, bottom, right, top] = [NO_BOX.left, NO_BOX.bottom, NO_BOX.right, NO_BOX.top]
  for (let index = 0; index + 1 < points.length; index += 2) {
    const x = points[index] as number
    const y = points[index + 1] as number
    left = Math.min(left, x)
    right = Math.max(right, x)
    bottom = Math.min(bottom, y)
    top = Math.max(top, y)
  }
  return { left, bottom, right, top }
}

/** The distance from a point to a box: 0 inside. */
export function distanceToBox({ x, y }: Place, box: Box): number {
  const across = Math.max(box.left - x, 0, x - box.right)
  const along = Math.max(box.bottom - y, 0, y - box.top)
  return Math.hypot(across, along)
}

/** The distance from the point (x, y) to the segment between two others. */
export function distanceToSegment(
  x: number,
  y: number,
  x1: number,
  y1: number,
  x2: number,
  y2: number,
): number {
  const [alongX, alongY] = [x2 - x1, y2 - y1]
  const squared = alongX * alongX + alongY * alongY
  const t = squared === 0 ? 0 : ((x - x1) * alongX + (y - y1) * alongY) / squared
  const nearest = Math.min(1, Math.max(0, t))
  return Math.hypot(x - x1 - nearest * alongX, y - y1 - nearest * alongY)
}

/** The corners of a box as points x, y, …, anticlockwise from the lower left. */
export function cornersOf({ left, bottom, right, top }: Box): readonly number[] {
  return [left, bottom, right, bottom, right, top, left, top]
}

/** The points x, y, … turned about a place by degrees, anticlockwise. */
export function turnPoints(points: readonly number[], about: Place, degrees: number): number[] {
  if (degrees === 0) return [...points]
  const [cosine, sine] = [cosDegrees(degrees), sinDegrees(degrees)]
  const turned: number[] = []
  for (let at = 0; at + 1 < points.length; at += 2) {
    const x = (points[at] as number) - about.x
    const y = (points[at + 1] as number) - about.y
    turned.push(about.x + cosine * x - sine * y, about.y + sine * x + cosine * y)
  }
  return turned
}
