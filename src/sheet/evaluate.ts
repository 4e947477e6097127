import { type Complex, fromPolar, magnitudeOf, resultant, toPolar, ZERO } from '../core'
import { type AsRead, asReadOf, type KnownParts } from './as-read'
import type { Evaluation, PhasorEvaluation, PolarValue, SumEvaluation } from './evaluation'
import { evaluateHand } from './hand/evaluate-hand'
import type { Id, Phasor, PhasorId, Sheet, Sum } from './types'

/**
 * The half of the evaluation that keeps up with a drag: the phasors as typed and read, and of each sum
 * the exact resultant and how far it is from what was measured, and what a hand drew beside what it
 * stands for. Nothing is solved or adjusted.
 */
export function quick(sheet: Sheet): Evaluation {
  const asRead = asReadOf(sheet)
  const phasors = sheet.phasors.map((phasor) => evaluatePhasor(phasor, asRead))
  const values = new Map<PhasorId, PhasorEvaluation>()
  for (const phasor of phasors) values.set(phasor.id, phasor)
  const sums = (sheet.sums ?? []).map((sum) => evaluateSum(sum, values))
  const hand = evaluateHand(sheet, {
    phasor: (id) => complexOf(values.get(id)),
    resultant: (id) => resultantIn(sums, id),
  })
  return { phasors, sums, hand }
}

function resultantIn(sums: readonly SumEvaluation[], id: Id): Complex | undefined {
  const found = sums.find((sum) => sum.id === id)?.resultant
  return found && { re: found.real, im: found.imaginary }
}

/** What is known is written down part by part; spreading objects would take longer than the sums. */
type Writable<Part> = { -readonly [field in keyof Part]: Part[field] }

const evaluations = new WeakMap<Phasor, PhasorEvaluation>()

/** A phasor that neither changed itself nor by its readings keeps its evaluation, the object itself. */
function evaluatePhasor(phasor: Phasor, { values }: AsRead): PhasorEvaluation {
  const asRead = values.get(phasor.id) ?? {}
  const before = evaluations.get(phasor)
  if (before && isSame(before.asRead, asRead)) return before
  const evaluation = evaluateAnew(phasor, asRead)
  evaluations.set(phasor, evaluation)
  return evaluation
}

function isSame(one: KnownParts, other: KnownParts): boolean {
  return one === other || (one.magnitude === other.magnitude && one.angle === other.angle)
}

function evaluateAnew(phasor: Phasor, asRead: KnownParts): PhasorEvaluation {
  const { magnitude, angle } = asRead
  const value = complexOfPhasor(phasor, asRead)
  const isAngleOpen = angle === undefined || magnitude === 0
  const evaluation: Writable<PhasorEvaluation> = {
    id: phasor.id,
    asRead,
    magnitudeState: magnitude === undefined ? 'open' : 'given',
    angleState: isAngleOpen ? 'open' : 'given',
  }
  if (magnitude !== undefined) evaluation.magnitude = magnitude
  if (!isAngleOpen) evaluation.angle = angle
  if (value !== undefined) {
    evaluation.real = value.re
    evaluation.imaginary = value.im
  }
  return evaluation
}

/** The value where both parts are settled: that of a phasor typed rectangular is not computed anew. */
function complexOfPhasor(
  { real, imaginary }: Phasor,
  { magnitude, angle }: KnownParts,
): Complex | undefined {
  if (magnitude === 0) return ZERO
  if (magnitude === undefined || angle === undefined) return undefined
  if (real !== undefined && imaginary !== undefined) {
    const typed = { re: real.value, im: imaginary.value }
    const polar = toPolar(typed)
    if (polar.magnitude === magnitude && polar.angle === angle) return typed
  }
  return fromPolar(magnitude, angle)
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
  const isKnown =
    terms.length > 0 && known.length === terms.length && Number.isFinite(magnitudeOf(total))
  const measured = typeof sum.equals === 'string' ? phasors.get(sum.equals) : undefined
  const target = sum.equals === 0 ? ZERO : complexOf(measured)
  const gap =
    isKnown && target !== undefined
      ? gapBetween(target, known, [measured?.magnitude ?? 0, largestMagnitude(sum, phasors)])
      : undefined
  return {
    id: sum.id,
    ...(isKnown ? { resultant: toPolarValue(total) } : {}),
    ...(measured === undefined ? {} : { measured: measured.asRead }),
    ...(gap === undefined ? {} : { closingError: gap }),
  }
}

function complexOf(phasor: PhasorEvaluation | undefined): Complex | undefined {
  if (phasor?.real === undefined || phasor.imaginary === undefined) return undefined
  return { re: phasor.real, im: phasor.imaginary }
}

function toPolarValue(value: Complex): PolarValue {
  return { ...toPolar(value), real: value.re, imaginary: value.im }
}

/**
 * What is missing from the sum: measured − resultant, added up in one go so that little is rounded. Its
 * percentage is of the first size that is more than nothing; without one there is no gap either.
 * Undefined where the gap is too large to be a figure.
 */
function gapBetween(
  target: Complex,
  terms: readonly { readonly value: Complex; readonly sign: 1 | -1 }[],
  sizes: readonly number[],
): SumEvaluation['closingError'] {
  const { magnitude, angle } = toPolar(
    resultant([
      { value: target },
      ...terms.map(({ value, sign }) => ({
        value,
        sign: sign === 1 ? (-1 as const) : (1 as const),
      })),
    ]),
  )
  if (!Number.isFinite(magnitude)) return undefined
  const percents = sizes.map((size) => (magnitude / size) * 100)
  return { magnitude, angle, percent: percents.find(Number.isFinite) ?? 0 }
}

function largestMagnitude(
  { terms }: Sum,
  phasors: ReadonlyMap<PhasorId, PhasorEvaluation>,
): number {
  return Math.max(0, ...terms.map(({ phasor }) => phasors.get(phasor)?.magnitude ?? 0))
}
