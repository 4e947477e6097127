import { magnitudeOf, subtract } from '../../../src/core'
import { estimatePhasors } from '../../../src/core/estimate'
import type { Loop } from './loops'

/** How well the estimator recovered a truth from exact readings. */
export interface Recovery {
  /** How many drawings it found. */
  readonly drawings: number
  /** The nearest drawing's worst error in a phasor, a share of the largest phasor of its sums. */
  readonly error: number
  /** How much worse the worst direction is fixed than the best. */
  readonly conditionNumber: number
}

/** Solves a loop and compares every drawing with the truth. */
export function recover({ problem, truth }: Loop): Recovery {
  const { drawings } = estimatePhasors(problem, { draws: 0 })
  let error = Number.POSITIVE_INFINITY
  let conditionNumber = 1
  for (const drawing of drawings) {
    const worst = truth.map((value, phasor) => {
      const found = {
        re: drawing.valueOf({ kind: 'real', phasor }),
        im: drawing.valueOf({ kind: 'imaginary', phasor }),
      }
      return magnitudeOf(subtract(found, value)) / magnitudeOf(value)
    })
    if (Math.max(...worst) < error) {
      error = Math.max(...worst)
      conditionNumber = drawing.candidate.linearisation.conditionNumber
    }
  }
  return { drawings: drawings.length, error, conditionNumber }
}
