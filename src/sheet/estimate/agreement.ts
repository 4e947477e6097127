import { chiSquarePoint, chiSquareTail } from '../../core/estimate'
import type { Agreement, PhasorEvaluation } from '../evaluation'
import type { Id } from '../types'
import type { SheetProblem } from './sheet-problem'
import type { SolvedSheet } from './solved-sheet'

const OUTSIDE = 0.05

/** How a reading came out. */
export interface ReadingOutcome {
  readonly reading: Id
  readonly score: number
  readonly isChecked: boolean
}

/** How the readings came out, in the sheet's order. */
export function outcomesOf(
  { sources }: SheetProblem,
  solved: SolvedSheet,
): readonly ReadingOutcome[] {
  return sources.flatMap(({ source }, place) => {
    if (source.kind !== 'reading') return []
    const at = solved.observation(place)
    const outcome = at?.drawing.outcomeOf(at.place)
    return [
      {
        reading: source.reading,
        score: outcome?.score ?? 0,
        isChecked: (outcome?.redundancy ?? 0) > 0,
      },
    ]
  })
}

/** Whether a part of a phasor is open that could be fixed: the angle of what may be nothing could not. */
function isAnythingOpen(phasors: readonly PhasorEvaluation[]): boolean {
  return phasors.some(
    ({ magnitudeState, angleState, magnitude = 0, magnitudeLimit = 0 }) =>
      magnitudeState === 'open' || (angleState === 'open' && magnitude > magnitudeLimit),
  )
}

/**
 * Whether all readings of a sheet can be true together: chi-square of all parts, held against its
 * 95 % point. With no degrees of freedom nothing was checked: all is solved, or there are not enough
 * readings.
 */
export function agreementOf(
  phasors: readonly PhasorEvaluation[],
  outcomes: readonly ReadingOutcome[],
  solved: SolvedSheet,
): Agreement {
  let chiSquare = 0
  let degreesOfFreedom = 0
  for (const { estimate } of solved.parts) {
    chiSquare += estimate?.drawings[0]?.chiSquare ?? 0
    degreesOfFreedom += estimate?.drawings[0]?.degreesOfFreedom ?? 0
  }
  const isContradicted = solved.parts.some(({ estimate }) => estimate?.isSoftened === true)
  const agrees = !isContradicted && chiSquare <= chiSquarePoint(OUTSIDE, degreesOfFreedom)
  const verdict =
    degreesOfFreedom > 0
      ? agrees
        ? 'agree'
        : 'disagree'
      : isAnythingOpen(phasors)
        ? 'not-enough'
        : 'nothing-to-check'
  return {
    verdict,
    chiSquare: degreesOfFreedom > 0 ? chiSquare : 0,
    degreesOfFreedom,
    probability: chiSquareTail(chiSquare, degreesOfFreedom),
    unchecked: outcomes.filter(({ isChecked }) => !isChecked).map(({ reading }) => reading),
  }
}
