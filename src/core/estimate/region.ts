import { degreesFromRadians } from '..'
import { chiSquarePoint } from './distributions'
import type { TipCovariance } from './drawing'

/** An ellipse about a phasor's tip, in the phasor's unit. */
export interface TipRegion {
  /** Half its length. */
  readonly major: number
  /** Half its breadth. */
  readonly minor: number
  /** Degrees in (−90°, 90°], anticlockwise, by which its length is turned from the real axis. */
  readonly turn: number
}

const OUTSIDE = 0.05
/** 2.45: how many standard uncertainties a 95 % region of two parts reaches (JCGM 102:2011, 6.5.2, from memory). */
const COVERAGE = Math.sqrt(chiSquarePoint(OUTSIDE, 2))

/** The region that holds the true tip with a probability of 95 %: 2.45 standard uncertainties each way. */
export function regionOf({ real, imaginary, both }: TipCovariance): TipRegion {
  const mean = (real + imaginary) / 2
  const half = (real - imaginary) / 2
  const spread = Math.hypot(half, both)
  return {
    major: COVERAGE * Math.sqrt(mean + spread),
    minor: COVERAGE * Math.sqrt(Math.max(0, mean - spread)),
    turn: spread === 0 ? 0 : degreesFromRadians(Math.atan2(both, half)) / 2,
  }
}
