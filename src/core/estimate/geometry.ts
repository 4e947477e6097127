import { add, type Complex, divide, magnitudeOf, multiply, scaleBy, subtract } from '..'

/**
 * The two places where a circle of radius `a` about 0 meets one of radius `b` about `gap`: the tips
 * of a first phasor of length a that a second of length b completes to `gap`. Where they do not meet,
 * the one place on the line through the centres that both come nearest to.
 */
export function circlesMeet(a: number, b: number, gap: Complex): readonly Complex[] {
  const distance = magnitudeOf(gap)
  if (distance === 0) return [{ re: a, im: 0 }]
  const along = (a * a - b * b + distance * distance) / (2 * distance)
  const direction = scaleBy(gap, 1 / distance)
  const square = a * a - along * along
  if (!(square > 0)) return [scaleBy(direction, Math.sign(along) * a)]
  const height = Math.sqrt(square)
  return [height, -height].map((aside) => multiply(direction, { re: along, im: aside }))
}

/**
 * The lengths along a direction (a phasor of length 1) at which a circle of radius `radius` about
 * `centre` is met, the longer first; the nearest length where it is not met. Negative lengths are
 * left out.
 */
export function lineMeetsCircle(
  direction: Complex,
  centre: Complex,
  radius: number,
): readonly number[] {
  const seen = divide(centre, direction)
  const square = radius * radius - seen.im * seen.im
  if (!(square > 0)) return seen.re > 0 ? [seen.re] : [0]
  const half = Math.sqrt(square)
  return [seen.re + half, seen.re - half].filter((length) => length >= 0)
}

/** The real factors p and q with p · first + q · second = gap; nothing where the two are parallel. */
export function linesMeet(
  first: Complex,
  second: Complex,
  gap: Complex,
): readonly [number, number] | undefined {
  const cross = first.re * second.im - first.im * second.re
  if (Math.abs(cross) <= 1e-9 * magnitudeOf(first) * magnitudeOf(second)) return undefined
  return [
    (gap.re * second.im - gap.im * second.re) / cross,
    (first.re * gap.im - first.im * gap.re) / cross,
  ]
}

/** Two phasors that keep their sum and their lengths: mirrored about that sum. */
export function mirrored(first: Complex, second: Complex): readonly [Complex, Complex] {
  const sum = add(first, second)
  if (magnitudeOf(sum) === 0) return [first, second]
  const axis = divide(sum, { re: sum.re, im: -sum.im })
  const flipped = multiply(axis, { re: first.re, im: -first.im })
  return [flipped, subtract(sum, flipped)]
}
