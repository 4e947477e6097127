import { type Complex, fromPolar } from '../../core'
import type { Evaluation, Id, PhasorEvaluation, SumEvaluation } from '../../sheet'

/** What is drawn of an evaluation: each phasor's vector, and each sum's resultant and measured one. */
export interface Vectors {
  readonly phasors: ReadonlyMap<Id, PhasorEvaluation>
  readonly sums: ReadonlyMap<Id, SumEvaluation>
}

/** The evaluation by name. */
export function createVectors(evaluation: Evaluation): Vectors {
  const phasors = new Map<Id, PhasorEvaluation>()
  for (const phasor of evaluation.phasors) phasors.set(phasor.id, phasor)
  const sums = new Map<Id, SumEvaluation>()
  for (const sum of evaluation.sums) sums.set(sum.id, sum)
  return { phasors, sums }
}

/** Magnitude and angle of a phasor: as read, else as solved, part by part. */
export function partsOf(
  vectors: Vectors,
  id: Id,
): { readonly magnitude?: number | undefined; readonly angle?: number | undefined } {
  const known = vectors.phasors.get(id)
  return {
    magnitude: known?.asRead.magnitude ?? known?.magnitude,
    angle: known?.asRead.angle ?? known?.angle,
  }
}

/**
 * A phasor's vector in its unit: as read, else as solved, part by part. Undefined where a part is
 * open; a phasor of no magnitude is a point, whatever its angle.
 */
export function vectorOf(vectors: Vectors, id: Id): Complex | undefined {
  const known = vectors.phasors.get(id)
  if (known === undefined) return undefined
  const { magnitude, angle } = partsOf(vectors, id)
  const { real, imaginary } = known
  // The parts of a phasor typed rectangular are exact: going by the angle would round them.
  if (real !== undefined && imaginary !== undefined) {
    if (magnitude === known.magnitude && angle === known.angle) return finite(real, imaginary)
  }
  return fromParts(magnitude, angle)
}

/** A sum's exact resultant in the unit of its terms; undefined where a term is open. */
export function resultantOf(vectors: Vectors, sum: Id): Complex | undefined {
  const resultant = vectors.sums.get(sum)?.resultant
  return resultant && finite(resultant.real, resultant.imaginary)
}

/** The vector that a sum must equal, as read; undefined where a part of it was not read. */
export function measuredOf(vectors: Vectors, sum: Id, equals: Id): Complex | undefined {
  const measured = vectors.sums.get(sum)?.measured
  if (measured === undefined) return undefined
  const known = vectors.phasors.get(equals)
  const isWhole = measured.magnitude === known?.magnitude && measured.angle === known?.angle
  if (isWhole && measured.magnitude !== undefined && measured.angle !== undefined) {
    return vectorOf(vectors, equals)
  }
  return fromParts(measured.magnitude, measured.angle)
}

function fromParts(magnitude: number | undefined, angle: number | undefined): Complex | undefined {
  if (magnitude === 0) return { re: 0, im: 0 }
  if (magnitude === undefined || angle === undefined) return undefined
  const { re, im } = fromPolar(magnitude, angle)
  return finite(re, im)
}

function finite(re: number, im: number): Complex | undefined {
  return Number.isFinite(re) && Number.isFinite(im) ? { re, im } : undefined
}
