import {
  type Evaluation,
  type HandArrow,
  type HandEvaluation,
  type Id,
  type Phasor,
  referenceOf,
  type Sheet,
  type Sum,
  type UnitsPerCentimetre,
} from '../../sheet'
import { createVectors, type Vectors } from '../placement/vectors'
import { type ReadingsByPhasor, readingsByPhasor } from '../text/resolution'

/** What the labels of a sheet are written from, by name. */
export interface Register {
  readonly phasors: ReadonlyMap<Id, Phasor>
  readonly sums: ReadonlyMap<Id, Sum>
  readonly vectors: Vectors
  readonly readings: ReadingsByPhasor
  readonly reference: Id | undefined
  /** The terminals of a phasor are part of its label. */
  readonly hasTerminals: boolean
  readonly hand: ReadonlyMap<Id, DrawnArrow>
  readonly unitsPerCentimetre: UnitsPerCentimetre
}

/** A hand arrow, and what it reads. */
export interface DrawnArrow {
  readonly arrow: HandArrow
  readonly found: HandEvaluation | undefined
}

/** The register of a sheet. */
export function createRegister(
  sheet: Sheet,
  evaluation: Evaluation,
  hasTerminals: boolean,
): Register {
  return {
    phasors: new Map(sheet.phasors.map((phasor) => [phasor.id, phasor])),
    sums: new Map((sheet.sums ?? []).map((sum) => [sum.id, sum])),
    vectors: createVectors(evaluation),
    readings: readingsByPhasor(sheet),
    reference: referenceOf(sheet),
    hasTerminals,
    hand: new Map(
      (sheet.hand ?? []).map((arrow, index) => [
        arrow.id,
        { arrow, found: evaluation.hand[index] },
      ]),
    ),
    unitsPerCentimetre: sheet.drawing?.unitsPerCentimetre ?? {},
  }
}
