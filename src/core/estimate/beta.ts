import { logGamma } from './gamma'

const MOST_TERMS = 10_000
const TINY = Number.MIN_VALUE / Number.EPSILON

function awayFromZero(value: number): number {
  return Math.abs(value) < TINY ? TINY : value
}

/** The continued fraction of the incomplete beta function (DLMF 8.17.22), by modified Lentz. */
function betaFraction(a: number, b: number, x: number): number {
  let c = 1
  let d = 1 / awayFromZero(1 - ((a + b) * x) / (a + 1))
  let fraction = d
  for (let m = 1; m < MOST_TERMS; m++) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m))
    d = 1 / awayFromZero(1 + even * d)
    c = awayFromZero(1 + even / c)
    fraction *= d * c
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1))
    d = 1 / awayFromZero(1 + odd * d)
    c = awayFromZero(1 + odd / c)
    fraction *= d * c
    if (Math.abs(d * c - 1) <= Number.EPSILON) break
  }
  return fraction
}

/** The regularised incomplete beta function I_x(a, b), for a, b > 0 and 0 ≤ x ≤ 1. */
export function incompleteBeta(a: number, b: number, x: number): number {
  if (x <= 0) return 0
  if (x >= 1) return 1
  const front = Math.exp(
    logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log1p(-x),
  )
  // The fraction converges quickly only on the near side of the mean.
  return x < (a + 1) / (a + b + 2)
    ? (front * betaFraction(a, b, x)) / a
    : 1 - (front * betaFraction(b, a, 1 - x)) / b
}
