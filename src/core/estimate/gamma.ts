const LANCZOS_G = 7
/** The nine-term Lanczos series with g = 7 (from memory): fifteen digits on the positive axis. */
const LANCZOS = [
  0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313,
  -176.61502916214059, 12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6,
  1.5056327351493116e-7,
] as const

/** ln Γ(x) for x > 0, by the Lanczos series. */
export function logGamma(x: number): number {
  const shifted = x - 1
  let sum: number = LANCZOS[0]
  for (let term = 1; term < LANCZOS.length; term++) sum += (LANCZOS[term] ?? 0) / (shifted + term)
  const t = shifted + LANCZOS_G + 0.5
  return 0.5 * Math.log(2 * Math.PI) + (shifted + 0.5) * Math.log(t) - t + Math.log(sum)
}

const MOST_TERMS = 100_000

/** P(a, x) by its power series, which is the quicker one below x = a + 1. */
function lowerSeries(a: number, x: number): number {
  let term = 1 / a
  let sum = term
  for (let step = 1; step < MOST_TERMS && Math.abs(term) > Number.EPSILON * Math.abs(sum); step++) {
    term *= x / (a + step)
    sum += term
  }
  return sum * Math.exp(a * Math.log(x) - x - logGamma(a))
}

/** Q(a, x) by its continued fraction (modified Lentz), which is the quicker one above x = a + 1. */
function upperFraction(a: number, x: number): number {
  const tiny = Number.MIN_VALUE / Number.EPSILON
  let b = x + 1 - a
  let c = 1 / tiny
  let d = 1 / b
  let fraction = d
  for (let step = 1; step < MOST_TERMS; step++) {
    const numerator = -step * (step - a)
    b += 2
    d = numerator * d + b
    d = 1 / (Math.abs(d) < tiny ? tiny : d)
    c = b + numerator / c
    c = Math.abs(c) < tiny ? tiny : c
    fraction *= c * d
    if (Math.abs(c * d - 1) <= Number.EPSILON) break
  }
  return fraction * Math.exp(a * Math.log(x) - x - logGamma(a))
}

/**
 * The upper regularised incomplete gamma function Q(a, x) = Γ(a, x) / Γ(a), for a > 0 and x ≥ 0:
 * series below x = a + 1, continued fraction above (DLMF 8.7.1 and 8.9.2).
 */
export function upperGamma(a: number, x: number): number {
  if (x <= 0) return 1
  if (x === Number.POSITIVE_INFINITY) return 0
  return x < a + 1 ? 1 - lowerSeries(a, x) : upperFraction(a, x)
}
