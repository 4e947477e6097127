import type { Complex } from './complex'
import { cosineNearAxis, quarterOf, sineNearAxis } from './unit-circle'

const RADIANS_PER_DEGREE = Math.PI / 180

/** Degrees from radians. */
export function degreesFromRadians(radians: number): number {
  return radians / RADIANS_PER_DEGREE
}

/** Radians from degrees. */
export function radiansFromDegrees(degrees: number): number {
  return degrees * RADIANS_PER_DEGREE
}

/**
 * The same angle in (−180°, 180°]. Exact: both the remainder and the turn taken off it fit a double.
 * NaN where the angle is not finite.
 */
export function wrapDegrees(degrees: number): number {
  // The remainder is slow, and hardly ever needed.
  const rest = degrees > -360 && degrees < 360 ? degrees : degrees % 360
  if (rest > 180) return rest - 360
  if (rest <= -180) return rest + 360
  return rest + 0
}

/** How far a is ahead of b, the short way round: a − b in (−180°, 180°], positive where a leads. */
export function differenceDegrees(a: number, b: number): number {
  return wrapDegrees(wrapDegrees(a) - wrapDegrees(b))
}

/** The sine of an angle in degrees: exactly 0, 1 or −1 at every multiple of 90°, however many turns away. */
export function sinDegrees(degrees: number): number {
  const wrapped = wrapDegrees(degrees)
  const quarter = quarterOf(wrapped)
  const rest = wrapped - 90 * quarter
  const size = quarter % 2 === 0 ? sineNearAxis(rest) : cosineNearAxis(rest)
  return (quarter === 0 || quarter === 1 ? size : -size) + 0
}

/** The cosine of an angle in degrees: exactly 0, 1 or −1 at every multiple of 90°, however many turns away. */
export function cosDegrees(degrees: number): number {
  const wrapped = wrapDegrees(degrees)
  const quarter = quarterOf(wrapped)
  const rest = wrapped - 90 * quarter
  const size = quarter % 2 === 0 ? cosineNearAxis(rest) : sineNearAxis(rest)
  return (quarter === 0 || quarter === -1 ? size : -size) + 0
}

/**
 * The angle of a phasor in degrees, in (−180°, 180°], anticlockwise positive: exactly 0, 90, 180 or
 * −90 on the axes, 0 for zero, NaN where a part is not a number.
 */
export function angleOf(z: Complex): number {
  // A negative zero would send a phasor on the negative real axis to −180°.
  const re = z.re + 0
  const im = z.im + 0
  if (im === 0 && re === 0) return 0
  if (im === 0) return re < 0 ? 180 : re > 0 ? 0 : Number.NaN
  if (re === 0) return im < 0 ? -90 : im > 0 ? 90 : Number.NaN
  return wrapDegrees(degreesFromRadians(Math.atan2(im, re)))
}
