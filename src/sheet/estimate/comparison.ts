import { differenceDegrees } from '../../core'
import type { ComparisonEvaluation, Limited } from '../evaluation'
import type { Sheet } from '../types'
import { measuredOf, toLimited } from './measured'
import type { Prediction } from './prediction'
import type { SheetProblem } from './sheet-problem'

/** What differs by no more than this share, or by so many degrees, differs by a rounding. */
const ROUNDING = 1e-12
const ROUNDING_DEGREES = 1e-10

/**
 * The voltages and currents of the circuit in the sheet's order, predicted beside measured. The magnitude
 * that drives the prediction, and the angle from which its angles count, are not compared: they could
 * not differ.
 */
export function compare(
  sheet: Sheet,
  prediction: Prediction,
  problem: SheetProblem,
): readonly ComparisonEvaluation[] {
  return sheet.phasors.flatMap((phasor) => {
    const predicted = prediction.phasors.get(phasor.id)
    if (predicted === undefined) return []
    const measured = toLimited(measuredOf(phasor, problem))
    const isDrive = phasor.id === prediction.drive
    const isOrigin = phasor.id === prediction.origin
    return [
      {
        phasor: phasor.id,
        predicted,
        ...(Object.keys(measured).length === 0 ? {} : { measured }),
        ...verdictOf(predicted, measured, !isDrive, !isOrigin),
      },
    ]
  })
}

function verdictOf(
  predicted: Limited,
  measured: Limited,
  comparesMagnitude: boolean,
  comparesAngle: boolean,
): Partial<ComparisonEvaluation> {
  const size = comparesMagnitude ? gap(measured.magnitude, predicted.magnitude) : undefined
  const turn =
    comparesAngle && measured.angle !== undefined && predicted.angle !== undefined
      ? differenceDegrees(measured.angle, predicted.angle)
      : undefined
  if (size === undefined && turn === undefined) return {}
  const percent = size === undefined ? Number.NaN : (size / (predicted.magnitude ?? 0)) * 100
  const allowed = together(size, measured.magnitudeLimit, predicted.magnitudeLimit)
  const allowedAngle = together(turn, measured.angleLimit, predicted.angleLimit)
  const rounding = ROUNDING * (predicted.magnitude ?? 0)
  const verdicts = [
    isWithin(size, allowed, rounding),
    isWithin(turn, allowedAngle, ROUNDING_DEGREES),
  ].filter((verdict) => verdict !== undefined)
  return {
    difference: {
      ...(size === undefined ? {} : { magnitude: size }),
      ...(Number.isFinite(percent) ? { percent } : {}),
      ...(turn === undefined ? {} : { angle: turn }),
    },
    ...(allowed === undefined ? {} : { allowed }),
    ...(allowedAngle === undefined ? {} : { allowedAngle }),
    ...(verdicts.length === 0 ? {} : { agrees: !verdicts.includes(false) }),
  }
}

function gap(measured: number | undefined, predicted: number | undefined): number | undefined {
  if (measured === undefined || predicted === undefined) return undefined
  const difference = measured - predicted
  return Number.isFinite(difference) ? difference : undefined
}

/** Both limits together: independent expanded uncertainties add up as squares. */
function together(
  difference: number | undefined,
  measured: number | undefined,
  predicted: number | undefined,
): number | undefined {
  if (difference === undefined || measured === undefined || predicted === undefined)
    return undefined
  const both = Math.hypot(measured, predicted)
  return Number.isFinite(both) ? both : undefined
}

function isWithin(
  difference: number | undefined,
  allowed: number | undefined,
  rounding: number,
): boolean | undefined {
  if (difference === undefined || allowed === undefined) return undefined
  return Math.abs(difference) <= allowed + rounding
}
