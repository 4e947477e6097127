import { fromPolar, magnitudeOf, radiansFromDegrees } from '../../core'
import { expandedUncertainty, type UncertaintyPart } from '../../core/estimate'
import type { Limited } from '../evaluation'
import type { Phasor } from '../types'
import { onlyFinite } from './finite'
import type { PendingObservation } from './pending'
import type { SheetProblem } from './sheet-problem'

/** A part of a phasor as it was read, and what makes it uncertain. */
export interface MeasuredPart {
  readonly value: number
  readonly parts: readonly UncertaintyPart[]
}

/** What was typed or read of a phasor, before anything is adjusted; what was not is left out. */
export interface Measured {
  readonly magnitude?: MeasuredPart
  /** Degrees. */
  readonly angle?: MeasuredPart
}

/** What was typed or read of a phasor, with the errors of the mean where several readings count. */
export function measuredOf(phasor: Phasor, problem: SheetProblem): Measured {
  const { magnitude, angle } = problem.asRead.values.get(phasor.id) ?? {}
  const isReference = phasor.id === problem.asRead.reference
  const size = magnitude === undefined ? [] : partsOf('magnitude', phasor, problem)
  const turn = angle === undefined || isReference ? [] : partsOf('angle', phasor, problem)
  return {
    ...(magnitude === undefined || size === undefined
      ? {}
      : { magnitude: { value: magnitude, parts: size } }),
    ...(angle === undefined || turn === undefined ? {} : { angle: { value: angle, parts: turn } }),
  }
}

/** The same as a limited value. */
export function toLimited({ magnitude, angle }: Measured): Limited {
  const known = magnitude && angle ? fromPolar(magnitude.value, angle.value) : undefined
  return onlyFinite({
    ...(magnitude && {
      magnitude: magnitude.value,
      magnitudeLimit: limitOfParts(magnitude.parts),
    }),
    ...(angle && { angle: angle.value, angleLimit: limitOfParts(angle.parts) }),
    ...(known && { real: known.re, imaginary: known.im }),
  })
}

function limitOfParts(parts: readonly UncertaintyPart[]): number {
  return parts.length === 0 ? 0 : expandedUncertainty(parts)
}

/** The errors of one part; undefined where what gave it says nothing of its limit. */
function partsOf(
  part: 'magnitude' | 'angle',
  phasor: Phasor,
  { sources }: SheetProblem,
): readonly UncertaintyPart[] | undefined {
  const own = sources.filter(
    ({ source }) => source.kind !== 'element' && source.phasor === phasor.id,
  )
  const givers = own.filter(({ gives }) => gives === part)
  const readings = givers.filter(({ source }) => source.kind === 'reading')
  const counted = readings.length > 0 ? readings : givers
  if (counted.length > 0) return errorsOfMean(counted)
  return errorsOfRectangular(part, phasor, own)
}

function errorsOfMean(observations: readonly PendingObservation[]): readonly UncertaintyPart[] {
  const share = 1 / observations.length
  const common = new Map<string, UncertaintyPart>()
  for (const { error, sensitivity, shape, freedom } of observations.flatMap(
    (each) => each.shared,
  )) {
    const before = common.get(error)?.uncertainty ?? 0
    common.set(error, {
      uncertainty: before + share * sensitivity,
      shape,
      ...(freedom === undefined ? {} : { freedom }),
    })
  }
  return [
    ...observations.flatMap(({ own }) =>
      own.map((each) => ({ ...each, uncertainty: share * each.uncertainty })),
    ),
    ...[...common.values()].map((each) => ({ ...each, uncertainty: Math.abs(each.uncertainty) })),
  ]
}

/** Of a phasor typed by its real and imaginary part: both errors, as far as they lie along the part. */
function errorsOfRectangular(
  part: 'magnitude' | 'angle',
  { real, imaginary }: Phasor,
  own: readonly PendingObservation[],
): readonly UncertaintyPart[] | undefined {
  if (real === undefined || imaginary === undefined) return undefined
  const size = magnitudeOf({ re: real.value, im: imaginary.value })
  if (!(size > 0)) return undefined
  const [cosine, sine] = [real.value / size, imaginary.value / size]
  const perDegree = radiansFromDegrees(1) * size
  const slopes =
    part === 'magnitude'
      ? { real: cosine, imaginary: sine }
      : { real: sine / perDegree, imaginary: cosine / perDegree }
  return own.flatMap(({ of, own: errors }) => {
    if (of.kind !== 'real' && of.kind !== 'imaginary') return []
    const slope = Math.abs(slopes[of.kind])
    return errors.map((each) => ({ ...each, uncertainty: slope * each.uncertainty }))
  })
}
