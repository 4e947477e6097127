const STEPS = [1, 2, 5] as const

/** The double nearest to step × 10ⁿ: as a decimal, so that every caller gets the same one. */
function scaleOf(step: number, exponent: number): number {
  return Number(`${step}e${exponent}`)
}

/** The scales about a positive value, in rising order, from below it to above it. */
function scalesAbout(value: number): readonly number[] {
  const exponent = Math.floor(Math.log10(value))
  return [exponent - 1, exponent, exponent + 1]
    .flatMap((each) => STEPS.map((step) => scaleOf(step, each)))
    .filter(isPositive)
}

function isPositive(value: number): boolean {
  return Number.isFinite(value) && value > 0
}

/**
 * The smallest scale of the 1-2-5 series, in units per centimetre, at which an extent fits into so
 * many centimetres. An extent of nothing, or one that is not finite, gets 1.
 */
export function niceScale(extent: number, centimetres: number): number {
  const needed = extent / centimetres
  if (!isPositive(needed)) return 1
  // 1.1 units over 11 cm is 0.1 a centimetre, whatever rounding makes of the quotient.
  return scalesAbout(needed).find((scale) => scale * (1 + 1e-12) >= needed) ?? needed
}

/** Whether a value is 1, 2 or 5 times a whole power of ten. */
export function isNiceScale(value: number): boolean {
  return isPositive(value) && scalesAbout(value).includes(value)
}

/** The next coarser scale: the smallest of the 1-2-5 series above a positive value. */
export function nextScale(scale: number): number {
  return scalesAbout(scale).find((each) => each > scale) ?? scale
}

/** The next finer scale: the largest of the 1-2-5 series below a positive value. */
export function previousScale(scale: number): number {
  return scalesAbout(scale).findLast((each) => each < scale) ?? scale
}
