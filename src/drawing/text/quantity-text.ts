import { formatQuantity, unitOf } from '../../core'
import type { Quantity, Typed } from '../../sheet'

/** What a scale bar says: `10 mm = 5 V`. */
export function formatScale(unitsPerCentimetre: number, quantity: Quantity): string {
  return `10 mm = ${formatQuantity(unitsPerCentimetre, unitOf(quantity), { digits: 3 })}`
}

/** A frequency in hertz, with the digits as typed. */
export function formatFrequency({ value, text }: Typed): string {
  const isPlain = text !== undefined && /^\d+([.,]\d+)?$/.test(text)
  return isPlain ? `${text} Hz` : formatQuantity(value, 'Hz', { digits: 4 })
}
