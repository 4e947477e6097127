import { decimalPlacesOf, formatNumber, powerOfTen, roundTo } from './format-number'
import { prefixOf, takesPrefix } from './units'

/** How finely a value is printed. */
export interface FormatOptions {
  /** The place value of the last digit that is known, in the unit without a prefix: 0.01 for 23.40 V. */
  readonly resolution?: number | undefined
  /** The value lies within ± limit, in the same unit; 0 means exact. No digit below its second is printed. */
  readonly limit?: number | undefined
  /** Significant digits where neither is known; 4 unless stated. */
  readonly digits?: number | undefined
  /** A size whose prefix is used, so that a small difference reads in the unit of what it is between. */
  readonly like?: number | undefined
}

const DEFAULT_DIGITS = 4

/** The place value of the n-th significant digit that a size has once it is rounded to n digits. */
function placeOf(size: number, digits: number): number {
  const [, exponent = '0'] = size.toExponential(digits - 1).split('e')
  return powerOfTen(Number(exponent) - digits + 1)
}

/**
 * The place value of the last digit to print: what is known, but never below the second significant digit
 * of the limit (GUM, JCGM 100:2008, 7.2.6: two digits of an uncertainty are enough).
 */
export function placeValueOf(value: number, options: FormatOptions): number {
  const { resolution, limit = 0, digits = DEFAULT_DIGITS } = options
  const supported = limit > 0 ? placeOf(limit, 2) : undefined
  if (resolution !== undefined) return Math.max(resolution, supported ?? 0)
  if (supported !== undefined) return supported
  return value === 0 ? 1 : placeOf(Math.abs(value), digits)
}

/** Sizes that no prefix brings near 1. */
function isBeyondPrefixes(size: number): boolean {
  return size !== 0 && (size >= 1e15 || size < 1e-12)
}

/**
 * The prefix with which the size reads as 1 to 999, or a larger one where the last digit known would
 * otherwise stand left of the point: 0.12 kV for 120 V to the nearest ten. As a power of ten; 0 where the
 * unit takes no prefix, or where none would help.
 */
export function prefixExponentOf(size: number, place: number, unit: string): number {
  if (!takesPrefix(unit) || size === 0 || isBeyondPrefixes(size)) return 0
  const bySize = 3 * Math.floor(Math.log10(size) / 3 + 1e-12)
  const byPlace = 3 * Math.ceil(-decimalPlacesOf(place) / 3)
  return Math.min(12, Math.max(-12, bySize, byPlace))
}

/** A value over a power of ten, both exact, so that only one rounding happens. */
function shift(value: number, exponent: number): number {
  return exponent >= 0 ? value / powerOfTen(exponent) : value * powerOfTen(-exponent)
}

/** A figure in a prefixed unit, without the unit. */
export function formatShifted(value: number, place: number, exponent: number): string {
  const rounded = roundTo(value, place)
  if (exponent === 0 && isBeyondPrefixes(Math.abs(rounded))) {
    const digits = Math.floor(Math.log10(Math.abs(rounded)) + 1e-12) + decimalPlacesOf(place)
    const text = rounded.toExponential(Math.min(20, Math.max(0, digits)))
    return text.replaceAll('-', '−').replace('+', '')
  }
  return formatNumber(shift(rounded, exponent), decimalPlacesOf(place) + exponent)
}

/** A unit behind its figure: a space between, none before °. */
export function unitSuffix(unit: string, exponent: number): string {
  if (unit === '' || unit === '°') return unit
  return ` ${prefixOf(exponent) ?? ''}${unit}`
}

/**
 * A value with its unit as ISO 80000-1 sets it: 48.2 V, 230 mV, −1.50 kA; in an SI prefix that suits the
 * size, with a true minus sign, and with no more digits than the resolution shows or the limit supports.
 * The value is in `unit`; one that is not finite prints as an en dash. `parseNumber` reads it again.
 */
export function formatQuantity(value: number, unit: string, options: FormatOptions = {}): string {
  if (!Number.isFinite(value)) return '–'
  const place = placeValueOf(value, options)
  const size = Math.abs(roundTo(options.like ?? value, place))
  const exponent = prefixExponentOf(size, place, unit)
  return `${formatShifted(value, place, exponent)}${unitSuffix(unit, exponent)}`
}
