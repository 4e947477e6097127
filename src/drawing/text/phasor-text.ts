import { formatAngle, formatQuantity, unitOf } from '../../core'
import type { Quantity } from '../../sheet'
import type { Digits, PhasorDigits } from './resolution'

/** Digits of a magnitude of which nothing is known. */
const USUAL_DIGITS = 3

/** A magnitude with its unit: `61.2 V`. */
export function formatMagnitude(magnitude: number, quantity: Quantity, digits: Digits): string {
  return formatQuantity(magnitude, unitOf(quantity), { digits: USUAL_DIGITS, ...digits })
}

/** A phasor as it is labelled: `61.2 V ∠ 72.9°`; a magnitude of zero has no angle. */
export function formatPhasor(
  { magnitude, angle }: { readonly magnitude: number; readonly angle: number },
  quantity: Quantity,
  digits: PhasorDigits,
): string {
  const size = formatMagnitude(magnitude, quantity, digits.magnitude)
  return magnitude === 0 ? size : `${size} ∠ ${formatAngle(angle, digits.angle)}`
}

/** The digits of what was worked out from figures of these digits: a small result still shows `least`. */
export function digitsOfResult(magnitude: number, digits: Digits, least: number): Digits {
  const { resolution, like } = digits
  const unit = like === undefined ? {} : { like }
  if (resolution === undefined) return unit
  if (magnitude === 0 || magnitude >= resolution * 10 ** (least - 1)) return { resolution, ...unit }
  return { resolution: 10 ** (Math.floor(Math.log10(magnitude)) - least + 1), ...unit }
}

/** A length on the paper: `1.2 mm`. */
export function formatPaperLength(millimetres: number): string {
  return millimetres < 0.05 ? 'under 0.1 mm' : `${millimetres.toFixed(1)} mm`
}
