import { type Complex, fromPolar, isFiniteComplex, resultant, toPolar } from '../core'
import { type AsRead, asReadOf, type KnownParts } from './as-read'
import type { Evaluation, PhasorEvaluation, PolarValue, SumEvaluation } from './evaluation'
import type { Phasor, PhasorId, Sheet, Sum } from './types'

/** What the program says of a sheet. */
export function evaluate(sheet: Sheet): Evaluation {
  return quick(sheet)
}

/**
 * The half of the evaluation that keeps up with a drag: the phasors as typed and read, and of each sum
 * the exact resultant and how far it is from what was measured. Nothing is solved or adjusted.
 */
export function quick(sheet: Sheet): Evaluation {
  const asRead = asReadOf(sheet)
  const phasors = sheet.phasors.map((phasor) => evaluatePhasor(phasor, asRead))
  const values = new Map<PhasorId, PhasorEvaluation>()
  for (const phasor of phasors) values.set(phasor.id, phasor)
  return { phasors, sums: (sheet.sums ?? []).map((sum) => evaluateSum(sum, values)) }
}

function evaluatePhasor(phasor: Phasor, { values }: AsRead): PhasorEvaluation {
  const asRead = values.get(phasor.id) ?? {}
  const { magnitude, angle } = asRead
  const isAngleOpen = angle === undefined || magnitude === 0
  return {
    id: phasor.id,
    ...(magnitude === undefined ? {} : { magnitude }),
    ...(isAngleOpen ? {} : { angle }),
    ...partsOf(phasor, asRead),
    asRead,
    magnitudeState: magnitude === undefined ? 'open' : 'given',
    angleState: isAngleOpen ? 'open' : 'given',
  }
}

/** Real and imaginary part where both are settled: those of a phasor typed so are not computed anew. */
function partsOf(
  { real, imaginary }: Phasor,
  { magnitude, angle }: KnownParts,
): { readonly real?: number; readonly imaginary?: number } {
  if (magnitude === 0) return { real: 0, imaginary: 0 }
  if (magnitude === undefined || angle === undefined) return {}
  if (real !== undefined && imaginary !== undefined) {
    const typed = toPolar({ re: real.value, im: imaginary.value })
    if (typed.magnitude === magnitude && typed.angle === angle) {
      return { real: real.value, imaginary: imaginary.value }
    }
  }
  const { re, im } = fromPolar(magnitude, angle)
  return { real: re, imaginary: im }
}

/** A sum's resultant of its terms, and how far it is from what it must equal. */
export function evaluateSum(
  sum: Sum,
  phasors: ReadonlyMap<PhasorId, PhasorEvaluation>,
): SumEvaluation {
  const terms = sum.terms.map(({ phasor, sign = 1 }) => ({
    value: complexOf(phasors.get(phasor)),
    sign,
  }))
  const known = terms.flatMap(({ value, sign }) => (value === undefined ? [] : [{ value, sign }]))
  const total = resultant(known)
  const isKnown = terms.length > 0 && known.length === terms.length && isFiniteComplex(total)
  const measured = typeof sum.equals === 'string' ? phasors.get(sum.equals) : undefined
  const target = sum.equals === 0 ? { re: 0, im: 0 } : complexOf(measured)
  const percentOf = measured?.magnitude || largestMagnitude(sum, phasors)
  return {
    id: sum.id,
    ...(isKnown ? { resultant: toPolarValue(total) } : {}),
    ...(measured === undefined ? {} : { measured: measured.asRead }),
    ...(isKnown && target !== undefined
      ? { closingError: gapBetween(target, known, percentOf) }
      : {}),
  }
}

function complexOf(phasor: PhasorEvaluation | undefined): Complex | undefined {
  if (phasor?.real === undefined || phasor.imaginary === undefined) return undefined
  return { re: phasor.real, im: phasor.imaginary }
}

function toPolarValue(value: Complex): PolarValue {
  return { ...toPolar(value), real: value.re, imaginary: value.im }
}

/** What is missing from the sum: measured − resultant, added up in one go so that little is rounded. */
function gapBetween(
  target: Complex,
  terms: readonly { readonly value: Complex; readonly sign: 1 | -1 }[],
  percentOf: number,
): NonNullable<SumEvaluation['closingError']> {
  const { magnitude, angle } = toPolar(
    resultant([
      { value: target },
      ...terms.map(({ value, sign }) => ({
        value,
        sign: sign === 1 ? (-1 as const) : (1 as const),
      })),
    ]),
  )
  return { magnitude, angle, percent: percentOf === 0 ? 0 : (100 * magnitude) / percentOf }
}

function largestMagnitude(
  { terms }: Sum,
  phasors: ReadonlyMap<PhasorId, PhasorEvaluation>,
): number {
  return Math.max(0, ...terms.map(({ phasor }) => phasors.get(phasor)?.magnitude ?? 0))
}
