import { incompleteBeta } from './beta'
import { upperGamma } from './gamma'

/** Where a decreasing function of x > 0 falls to a level: bracketed by doubling, then halved. */
function whereItFallsTo(level: number, falling: (x: number) => number, start: number): number {
  let high = start
  while (falling(high) > level) high *= 2
  let low = 0
  for (let step = 0; step < 200 && high - low > 2 * Number.EPSILON * high; step++) {
    const middle = (low + high) / 2
    if (falling(middle) > level) low = middle
    else high = middle
  }
  return (low + high) / 2
}

/** The probability that chi-square with so many degrees of freedom is this large or larger; 1 with none. */
export function chiSquareTail(chiSquare: number, degreesOfFreedom: number): number {
  return degreesOfFreedom > 0 ? upperGamma(degreesOfFreedom / 2, chiSquare / 2) : 1
}

/** The chi-square that is exceeded with this probability (0.05: the 95 % point); 0 with no freedom. */
export function chiSquarePoint(exceeded: number, degreesOfFreedom: number): number {
  if (degreesOfFreedom <= 0) return 0
  return whereItFallsTo(exceeded, (x) => chiSquareTail(x, degreesOfFreedom), degreesOfFreedom)
}

/** The probability that a standard normal deviate lies further from 0 than z, on either side. */
export function normalTwoTails(z: number): number {
  return upperGamma(0.5, (z * z) / 2)
}

/** The z that a standard normal deviate exceeds, on either side, with this probability. */
export function normalTwoSidedPoint(exceeded: number): number {
  return whereItFallsTo(exceeded, normalTwoTails, 1)
}

/** The probability that Student's t with so many degrees of freedom lies further from 0 than t, on either side. */
export function studentTwoTails(t: number, degreesOfFreedom: number): number {
  if (degreesOfFreedom === Number.POSITIVE_INFINITY) return normalTwoTails(t)
  return incompleteBeta(degreesOfFreedom / 2, 0.5, degreesOfFreedom / (degreesOfFreedom + t * t))
}

/** The t that Student's t exceeds, on either side, with this probability; the freedom need not be whole. */
export function studentTwoSidedPoint(exceeded: number, degreesOfFreedom: number): number {
  return whereItFallsTo(exceeded, (t) => studentTwoTails(t, degreesOfFreedom), 1)
}
