import { wrapDegrees } from './angle'
import { CompensatedSum } from './compensated'
import type { Complex } from './complex'
import { cosineNearAxis, quarterOf, sineNearAxis } from './unit-circle'

/** A phasor in a sum; −1 takes it off. Left out, the sign is 1. */
export interface SignedTerm {
  readonly value: Complex
  readonly sign?: 1 | -1
}

/**
 * The sum of any number of signed phasors, doubly compensated: n terms x that cancel in any order
 * leave less than 2⁻⁹⁰ · Σ|x| up to n = 4096. No terms add up to zero. A part is not finite where a
 * term's is not, or where the terms outgrow a double.
 */
export function resultant(terms: Iterable<SignedTerm>): Complex {
  const real = new CompensatedSum()
  const imaginary = new CompensatedSum()
  for (const { value, sign = 1 } of terms) {
    real.add(sign * value.re)
    imaginary.add(sign * value.im)
  }
  return { re: real.total, im: imaginary.total }
}

/**
 * The same sum over columns: magnitudes, angles in degrees and, where given, signs 1 or −1. Terms at a
 * multiple of 90° lie exactly on an axis. Throws a RangeError where the columns differ in length.
 */
export function resultantOfPolar(
  magnitudes: Float64Array,
  degrees: Float64Array,
  signs?: Int8Array,
): Complex {
  const count = magnitudes.length
  if (degrees.length !== count || (signs !== undefined && signs.length !== count)) {
    throw new RangeError('magnitudes, degrees and signs must have the same length')
  }
  const real = new CompensatedSum()
  const imaginary = new CompensatedSum()
  for (let index = 0; index < count; index += 1) {
    const sign = signs === undefined ? 1 : (signs[index] as number)
    const magnitude = sign * (magnitudes[index] as number)
    const wrapped = wrapDegrees(degrees[index] as number)
    const quarter = quarterOf(wrapped)
    // As in cosDegrees and sinDegrees, but the angle is reduced once for both.
    const rest = wrapped - 90 * quarter
    const along = magnitude * cosineNearAxis(rest)
    const across = magnitude * sineNearAxis(rest)
    const upright = quarter === 1 || quarter === -1
    const re = upright ? across : along
    const im = upright ? along : across
    real.add(quarter === 0 || quarter === -1 ? re : -re)
    imaginary.add(quarter === 0 || quarter === 1 ? im : -im)
  }
  return { re: real.total, im: imaginary.total }
}
