import { decimalPlacesOf, formatNumber, powerOfTen } from './format-number'
import { formatShifted, prefixExponentOf, unitSuffix } from './format-quantity'
import type { Limit } from './limit'

/** A size to two significant digits, never below itself: a limit must not look tighter than it is. */
export function roundUp(size: number): number {
  const nearest = Number(size.toPrecision(2))
  // What lies within a rounding error above is no reason for a wider limit: 0.1 + 0.2 is 0.3.
  if (nearest >= size * (1 - 1e-9)) return nearest
  const [, exponent = '0'] = size.toExponential(1).split('e')
  return Number((nearest + powerOfTen(Number(exponent) - 1)).toPrecision(2))
}

/** The place value of the last digit that is not 0, of the first two. */
function placeOf(size: number): number {
  const [, digits = '', exponent = '0'] = /^([\d.]+)e(.+)$/.exec(size.toExponential()) ?? []
  return powerOfTen(Number(exponent) - (digits.length > 1 ? 1 : 0))
}

/**
 * A limit as it is typed: ± 0.5 V, ± 1 %, ± 1°; to two significant digits, rounded up. A bare number is
 * half a width in `unit`. No prefix from a thousandth to a thousand of the unit, so that a limit reads in
 * the unit of its value. `parseCell` reads it again.
 */
export function formatLimit(limit: Limit | number, unit: string): string {
  if (typeof limit !== 'number') {
    return 'percent' in limit ? formatLimit(limit.percent, '%') : formatLimit(limit.absolute, unit)
  }
  if (!Number.isFinite(limit)) return '± –'
  const size = roundUp(limit)
  if (size === 0) return `± 0${unitSuffix(unit, 0)}`
  const place = placeOf(size)
  if (size >= 0.001 && size < 1000)
    return `± ${formatNumber(size, decimalPlacesOf(place))}${unitSuffix(unit, 0)}`
  const exponent = prefixExponentOf(size, place, unit)
  return `± ${formatShifted(size, place, exponent)}${unitSuffix(unit, exponent)}`
}
