import {
  formatAngle,
  formatEstimate,
  formatLimit,
  formatQuantity,
  signed,
  unitOf,
} from '../../core'
import type { ComparisonEvaluation, Evaluation, Id, Phasor, Sheet } from '../../sheet'
import { type Digits, digitsOf, readingsByPhasor } from '../text/resolution'

/** A part of a phasor, predicted beside measured, as it is printed; empty where there is nothing. */
export interface ComparedPart {
  readonly part: 'magnitude' | 'angle'
  /** With its limit. */
  readonly predicted: string
  readonly measured: string
  /** Measured − predicted, with its sign. */
  readonly difference: string
  /** The difference of the predicted magnitude; of an angle there is none. */
  readonly percent: string
  /** Both limits together. */
  readonly allowed: string
}

/** A row of the comparison: what the circuit predicts of a phasor, beside what was measured. */
export interface ComparedRow {
  readonly phasor: Id
  readonly label: string
  readonly parts: readonly ComparedPart[]
  /** Left out where nothing was measured, or what was measured drives the prediction. */
  readonly agrees?: boolean
  /** The verdict in words; where there is none, why. */
  readonly verdict: string
}

/** The comparison of a sheet as it is printed, in the order of its phasors; empty where nothing is predicted. */
export function comparisonRows(sheet: Sheet, evaluation: Evaluation): readonly ComparedRow[] {
  const readings = readingsByPhasor(sheet)
  const phasors = new Map(sheet.phasors.map((phasor) => [phasor.id, phasor]))
  return (evaluation.comparison ?? []).flatMap((compared) => {
    const phasor = phasors.get(compared.phasor)
    if (phasor === undefined) return []
    const { magnitude } = digitsOf(phasor, readings)
    return [rowOf(phasor, compared, magnitude)]
  })
}

function rowOf(phasor: Phasor, compared: ComparisonEvaluation, digits: Digits): ComparedRow {
  const { agrees } = compared
  return {
    phasor: phasor.id,
    label: phasor.label || phasor.id,
    parts: [magnitudePart(phasor, compared, digits), ...anglePart(compared)],
    ...(agrees !== undefined && { agrees }),
    verdict: verdictText(compared),
  }
}

function verdictText({ agrees, measured, difference }: ComparisonEvaluation): string {
  if (agrees !== undefined) return agrees ? 'agrees' : 'differs'
  if (measured === undefined) return 'not measured'
  return difference === undefined ? 'drives it' : 'no limit, no verdict'
}

function magnitudePart(
  { quantity }: Phasor,
  { predicted, measured, difference, allowed }: ComparisonEvaluation,
  digits: Digits,
): ComparedPart {
  const unit = unitOf(quantity)
  const like = predicted.magnitude ?? 0
  const size = (value: number | undefined, options: Digits) =>
    value === undefined ? '' : formatQuantity(value, unit, { like, ...options })
  return {
    part: 'magnitude',
    predicted:
      predicted.magnitude === undefined
        ? ''
        : formatEstimate(predicted.magnitude, predicted.magnitudeLimit, unit, like),
    measured: size(measured?.magnitude, { ...digits, like }),
    difference: signedOrNothing(difference?.magnitude, (value) =>
      size(value, allowed ? { limit: allowed } : digits),
    ),
    percent: signedOrNothing(difference?.percent, (value) =>
      formatQuantity(value, '%', { digits: 2 }),
    ),
    allowed: allowed === undefined ? '' : `± ${formatQuantity(allowed, unit, { digits: 2, like })}`,
  }
}

function anglePart({
  predicted,
  measured,
  difference,
  allowedAngle,
}: ComparisonEvaluation): readonly ComparedPart[] {
  if (predicted.angle === undefined) return []
  const angle = (value: number | undefined, options: Digits = {}) =>
    value === undefined ? '' : formatAngle(value, options)
  return [
    {
      part: 'angle',
      predicted: formatEstimate(predicted.angle, predicted.angleLimit, '°'),
      measured: angle(measured?.angle),
      difference: signedOrNothing(difference?.angle, (value) => angle(value)),
      percent: '',
      allowed: allowedAngle === undefined ? '' : formatLimit(allowedAngle, '°'),
    },
  ]
}

function signedOrNothing(value: number | undefined, print: (value: number) => string): string {
  return value === undefined ? '' : signed(print(value))
}
