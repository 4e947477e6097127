import { fromPolar } from '../../core'
import {
  type Drawing,
  type EstimateOptions,
  estimatePhasors,
  layoutOf,
  type Observable,
  type PhasorEstimate,
  type ProblemPart,
  splitProblem,
} from '../../core/estimate'
import type { Sheet } from '../types'
import type { SheetProblem } from './sheet-problem'

/** A part of a sheet that nothing ties to the rest, solved. */
export interface SolvedPart {
  readonly part: ProblemPart
  /** Nothing where the part is too large, where it has no observation, or where no drawing was found. */
  readonly estimate: PhasorEstimate | undefined
  readonly isTooLarge: boolean
}

/** The best values in one part. */
export interface Place {
  readonly part: SolvedPart
  /** The first drawing: the one that is meant. */
  readonly drawing: Drawing
  readonly place: number
}

/** More unknowns than this in one part would keep the user waiting for minutes. */
const MOST_UNKNOWNS = 400

/** A sheet, solved part by part, and where in them everything is. */
export class SolvedSheet {
  readonly parts: readonly SolvedPart[]
  readonly #phasors = new Map<number, { part: SolvedPart; place: number }>()
  readonly #elements = new Map<number, { part: SolvedPart; place: number }>()
  readonly #observations = new Map<number, { part: SolvedPart; place: number }>()

  constructor(sheet: Sheet, { problem, names }: SheetProblem, options: EstimateOptions) {
    this.parts = splitProblem(problem).map((part) => {
      const wanted = (sheet.chosen ?? []).flatMap(({ phasor, magnitude, angle }) => {
        const place = part.phasors.indexOf(names.phasor.get(phasor) ?? -1)
        return place < 0 ? [] : [{ phasor: place, value: fromPolar(magnitude, angle) }]
      })
      return solvePart(part, { ...options, wanted })
    })
    for (const part of this.parts) {
      part.part.phasors.forEach((whole, place) => {
        if (whole !== undefined) this.#phasors.set(whole, { part, place })
      })
      part.part.elements.forEach((whole, place) => {
        this.#elements.set(whole, { part, place })
      })
      part.part.observations.forEach((whole, place) => {
        this.#observations.set(whole, { part, place })
      })
    }
  }

  /** Where a phasor of the sheet was solved; nothing where it was not. */
  phasor(place: number | undefined): Place | undefined {
    return place === undefined ? undefined : solved(this.#phasors.get(place))
  }

  /** Where an element of the sheet was solved. */
  element(place: number | undefined): Place | undefined {
    return place === undefined ? undefined : solved(this.#elements.get(place))
  }

  /** Where an observation came out. */
  observation(place: number): Place | undefined {
    return solved(this.#observations.get(place))
  }
}

function solved(found: { part: SolvedPart; place: number } | undefined): Place | undefined {
  const drawing = found?.part.estimate?.drawings[0]
  return found && drawing ? { ...found, drawing } : undefined
}

function solvePart(part: ProblemPart, options: EstimateOptions): SolvedPart {
  if (part.observations.length === 0) return { part, estimate: undefined, isTooLarge: false }
  if (layoutOf(part.problem).unknowns > MOST_UNKNOWNS) {
    return { part, estimate: undefined, isTooLarge: true }
  }
  const estimate = estimatePhasors(part.problem, options)
  return {
    part,
    estimate: estimate.drawings.length > 0 ? estimate : undefined,
    isTooLarge: false,
  }
}

/** What is observable of a phasor at a place. */
export function observablesAt(phasor: number) {
  return {
    magnitude: { kind: 'magnitude', phasor },
    angle: { kind: 'angle', phasor },
  } as const satisfies { readonly [part: string]: Observable }
}
