import { roundUp } from './format-limit'
import {
  type FormatOptions,
  formatShifted,
  placeValueOf,
  prefixExponentOf,
  unitSuffix,
} from './format-quantity'

/** Sizes that read well without a prefix. */
function isPlain(size: number): boolean {
  return size >= 0.1 && size < 1000
}

/**
 * A value and its limit in one unit, so that the two can be set side by side: 0.750 A ± 0.012 A,
 * 12.00 kV ± 0.18 kV. No prefix from a tenth to a thousand of the unit; the value to the second digit of
 * the limit, and the limit rounded up to as many places. An exact value (limit 0) stands alone.
 */
export function formatEstimate(value: number, limit: number, unit: string): string {
  if (!Number.isFinite(value)) return '–'
  const options: FormatOptions = { limit }
  const place = placeValueOf(value, options)
  const size = Math.abs(value)
  const exponent = isPlain(size) ? 0 : prefixExponentOf(Math.max(size, limit), place, unit)
  const inUnit = (figure: number) =>
    `${formatShifted(figure, place, exponent)}${unitSuffix(unit, exponent)}`
  return limit === 0 ? inUnit(value) : `${inUnit(value)} ± ${inUnit(roundUp(limit))}`
}
