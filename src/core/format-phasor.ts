import { wrapDegrees } from './angle'
import type { Complex } from './complex'
import { decimalPlacesOf, formatNumber, roundTo } from './format-number'
import {
  type FormatOptions,
  formatQuantity,
  formatShifted,
  placeValueOf,
  prefixExponentOf,
  unitSuffix,
} from './format-quantity'
import type { Polar } from './polar'

const DEFAULT_RESOLUTION = 0.1

/**
 * An angle in degrees, wrapped into (−180°, 180°]: 82.0°, −90°. Tenths where neither a resolution nor a
 * limit says otherwise. `parseAngle` reads it again.
 */
export function formatAngle(degrees: number, options: FormatOptions = {}): string {
  if (!Number.isFinite(degrees)) return '–'
  const known = options.limit === undefined || options.limit === 0
  const resolution = options.resolution ?? (known ? DEFAULT_RESOLUTION : undefined)
  const wrapped = wrapDegrees(degrees)
  const place = placeValueOf(
    wrapped,
    resolution === undefined ? options : { ...options, resolution },
  )
  // −179.96° to tenths is 180.0°, which has no minus sign.
  return `${formatNumber(wrapDegrees(roundTo(wrapped, place)), decimalPlacesOf(place))}°`
}

/** Magnitude and angle: 48.2 V ∠ 82.0°. Each part takes its own options. `parseCell` reads it again. */
export function formatPolar(
  { magnitude, angle }: Polar,
  unit: string,
  options: {
    readonly magnitude?: FormatOptions | undefined
    readonly angle?: FormatOptions | undefined
  } = {},
): string {
  return `${formatQuantity(magnitude, unit, options.magnitude)} ∠ ${formatAngle(angle, options.angle)}`
}

/**
 * Real and imaginary part: 6.7 + j47.7 V, the j before its figure. Both parts have one prefix and one
 * place value, by the larger of them; the unit is that of both. `parseCell` reads it again.
 */
export function formatRectangular(
  { re, im }: Complex,
  unit: string,
  options: FormatOptions = {},
): string {
  if (!Number.isFinite(re) || !Number.isFinite(im)) return '–'
  const larger = Math.max(Math.abs(re), Math.abs(im))
  const place = placeValueOf(larger, options)
  const exponent = prefixExponentOf(roundTo(larger, place), place, unit)
  const real = formatShifted(re, place, exponent)
  const sign = roundTo(im, place) < 0 ? '−' : '+'
  const imaginary = formatShifted(Math.abs(im), place, exponent)
  return `${real} ${sign} j${imaginary}${unitSuffix(unit, exponent)}`
}
