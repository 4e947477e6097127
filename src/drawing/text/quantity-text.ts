import { formatQuantity, unitOf } from '../../core'
import type { Quantity, Typed } from '../../sheet'

/** What a scale bar says: `10 mm = 5 V`. */
export function formatScale(unitsPerCentimetre: number, quantity: Quantity): string {
  const resolution = placeOfLastDigit(unitsPerCentimetre)
  return `10 mm = ${formatQuantity(unitsPerCentimetre, unitOf(quantity), { resolution })}`
}

/** A frequency in hertz, with the digits as typed. */
export function formatFrequency({ value, text }: Typed): string {
  const isPlain = text !== undefined && /^\d+([.,]\d+)?$/.test(text)
  return isPlain ? `${text} Hz` : formatQuantity(value, 'Hz', { digits: 4 })
}

/** The place value of the last digit of a round number; of a thousand, ones are not asked for. */
function placeOfLastDigit(value: number): number {
  const exponent = Math.floor(Math.log10(value) + 1e-12)
  const digits = [1, 2, 3, 4, 5].find((count) => Number(value.toPrecision(count)) === value) ?? 6
  const thousands = exponent < 0 ? exponent : 3 * Math.floor(exponent / 3)
  return 10 ** Math.min(exponent - digits + 1, thousands)
}
