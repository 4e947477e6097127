/** Decimals of a place value: 2 for 0.01, 0 for 1, −1 for 10. */
export function decimalPlacesOf(resolution: number): number {
  return -Math.floor(Math.log10(resolution) + 1e-9)
}

/** Ten to a whole power, as its own nearest double. */
export function powerOfTen(exponent: number): number {
  return Number(`1e${exponent}`)
}

/** A value to a place value: the nearest multiple of it, or the value itself where there is none. */
export function roundTo(value: number, resolution: number): number {
  const decimals = decimalPlacesOf(resolution)
  if (decimals > 100) return value
  if (decimals >= 0) return Number(value.toFixed(decimals))
  return Math.round(value / powerOfTen(-decimals)) * powerOfTen(-decimals)
}

/**
 * A figure with so many decimals (−1 rounds to tens), a point, and a true minus sign; never −0. An en
 * dash where the value is not finite.
 */
export function formatNumber(value: number, decimals: number): string {
  if (!Number.isFinite(value)) return '–'
  const rounded = roundTo(value, powerOfTen(-decimals))
  const digits = Math.abs(rounded).toFixed(Math.min(Math.max(decimals, 0), 100))
  return rounded < 0 ? `−${digits}` : digits
}
