import { radiansFromDegrees } from './angle'

/** How well a hand draws with rule and protractor: ± millimetres of length and ± degrees. */
export interface DrawingTolerance {
  readonly millimetres: number
  readonly degrees: number
}

/** What is expected of a drawing where nothing else is said (common practice, no source). */
export const USUAL_TOLERANCE: DrawingTolerance = { millimetres: 0.5, degrees: 0.5 }

/**
 * How far the tip of a line of so many millimetres may be from where it should be, its tail being
 * right: √(mm² + (length · degrees in radians)²), in millimetres. The error of the length lies along
 * the line and that of the angle across it.
 */
export function tipErrorAllowed(
  length: number,
  { millimetres, degrees }: DrawingTolerance,
): number {
  return Math.hypot(millimetres, length * radiansFromDegrees(degrees))
}
