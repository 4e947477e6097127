/** Decimals of a place value: 2 for 0.01, 0 for 1, −1 for 10. */
export function decimalPlacesOf(resolution: number): number {
  return -Math.floor(Math.log10(resolution) + 1e-9) + 0
}

/** Ten to a whole power, as its own nearest double. */
export function powerOfTen(exponent: number): number {
  return Number(`1e${exponent}`)
}

/** The most decimals that `toFixed` takes. */
const MOST_DECIMALS = 100

/** A value to a place value, a power of ten: the nearest multiple of it. */
export function roundTo(value: number, resolution: number): number {
  const decimals = decimalPlacesOf(resolution)
  if (decimals < 0) return Math.round(value / powerOfTen(-decimals)) * powerOfTen(-decimals)
  if (decimals <= MOST_DECIMALS) return Number(value.toFixed(decimals))
  const [, exponent = '0'] = value.toExponential().split('e')
  const digits = Number(exponent) + decimals
  return digits < 0 ? 0 : Number(value.toExponential(Math.min(digits, MOST_DECIMALS)))
}

/**
 * A figure with so many decimals (−1 rounds to tens), a point, and a true minus sign; never −0. An en
 * dash where the value is not finite.
 */
export function formatNumber(value: number, decimals: number): string {
  if (!Number.isFinite(value)) return '–'
  const rounded = roundTo(value, powerOfTen(-decimals))
  const digits = Math.abs(rounded).toFixed(Math.min(Math.max(decimals, 0), MOST_DECIMALS))
  return rounded < 0 ? `−${digits}` : digits
}
