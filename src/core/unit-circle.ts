/*
 * Sine and cosine on half a quadrant, by Taylor's series: at 45° the first term left out is below
 * 2⁻⁵⁷ of the result. They are written out, figures and all, rather than left to Math.sin and
 * Math.cos, because a sum of a million phasors spends nearly all its time here.
 *
 * π/180 and the angle come in two pieces each, so short that the product of the first ones is exact.
 * `tail` is what is left when the angle in radians is rounded to a double: with it the sine of 30° is
 * one half exactly, so that a balanced three-phase set closes.
 */

const SHORTENED = Math.fround(Math.PI / 180)
const REST = 1.3519960527851425e-10

/** The sine of an angle of at most 45° either way, in degrees. */
export function sineNearAxis(degrees: number): number {
  const front = Math.fround(degrees)
  const long = front * SHORTENED
  const short = (degrees - front) * SHORTENED + degrees * REST
  const x = long + short
  const tail = short - (x - long)
  const z = x * x
  const upper =
    1 / 362880 +
    z * (-1 / 39916800 + z * (1 / 6227020800 + z * (-1 / 1307674368000 + z / 355687428096000)))
  const series = -1 / 6 + z * (1 / 120 + z * (-1 / 5040 + z * upper))
  return x + (x * z * series + tail * (1 - z / 2))
}

/** The cosine of an angle of at most 45° either way, in degrees. */
export function cosineNearAxis(degrees: number): number {
  const front = Math.fround(degrees)
  const long = front * SHORTENED
  const short = (degrees - front) * SHORTENED + degrees * REST
  const x = long + short
  const tail = short - (x - long)
  const z = x * x
  const upper = -1 / 3628800 + z * (1 / 479001600 + z * (-1 / 87178291200 + z / 20922789888000))
  const series = 1 / 24 + z * (-1 / 720 + z * (1 / 40320 + z * upper))
  const half = z / 2
  const most = 1 - half
  return most + (1 - most - half + (z * z * series - x * tail))
}

/**
 * The multiple of 90° in −2 … 2 that is nearest to an angle in (−180°, 180°]. Taking it off is exact,
 * and leaves at most 45° either way.
 */
export function quarterOf(wrapped: number): number {
  if (wrapped > 45) return wrapped > 135 ? 2 : 1
  if (wrapped < -45) return wrapped < -135 ? -2 : -1
  return 0
}
