import { type DescentOptions, descend, placeAt, polish } from './descent'
import { feasible } from './feasible'
import type { LeastSquaresProblem } from './problem'

/** Where a solver stopped. */
export interface LeastSquaresSolution {
  readonly x: Float64Array
  /** (model − observed) / standard uncertainty, at x. */
  readonly residuals: Float64Array
  /** The sum of their squares. */
  readonly chiSquare: number
  readonly iterations: number
  /** Whether a smallest sum of squares was reached, by the criteria of `solveLeastSquares`. */
  readonly converged: boolean
  /** Whether every condition is met to rounding. Where they contradict each other, they are not. */
  readonly conditionsMet: boolean
}

/** How a solver starts, and how long it may try. */
export interface SolverOptions extends DescentOptions {
  /** The start meets the conditions. */
  readonly isOnConditions?: boolean
  /**
   * How freely each unknown moves, 0 … 1, when the start is first brought onto the conditions: little
   * for one that is known, so that those that were guessed give way. 1 where omitted.
   */
  readonly mobility?: Float64Array
}

/**
 * Equality-constrained weighted nonlinear least squares: Levenberg–Marquardt steps in the null space
 * of the linearised conditions, each step followed by Newton steps back onto the conditions, so that
 * every place it compares meets them. Every unknown is scaled by its own size and moves by no more
 * than that in one step. Damping follows the ratio of the actual to the predicted gain (Nielsen 1999,
 * from memory) and falls to nothing, so that the last steps are Gauss–Newton's.
 *
 * When the predicted gain is below 10⁻¹² of the sum of squares, its rounding hides which place is
 * better. From there Gauss–Newton steps go on while each is at least a twentieth shorter than the one before,
 * until those to come would add up to less than 10⁻¹⁴ of any unknown's size. It has converged where
 * the last of them was below 10⁻⁸.
 * From a start from which the conditions cannot be met, the start itself comes back,
 * `conditionsMet` false.
 */
export function solveLeastSquares(
  problem: LeastSquaresProblem,
  start: Float64Array,
  options: SolverOptions = {},
): LeastSquaresSolution {
  const found = options.isOnConditions ? start : feasible(problem, start, options.mobility)
  const first = placeAt(problem, found ?? start)
  if (found === undefined || !Number.isFinite(first.chiSquare)) {
    return { ...first, iterations: 0, converged: false, conditionsMet: false }
  }
  const { place, iterations, end } = descend(problem, first, options)
  if (end !== 'flat') {
    return { ...place, iterations, converged: end === 'at rest', conditionsMet: true }
  }
  const polished = polish(problem, place)
  return {
    ...polished.place,
    iterations,
    converged: polished.converged,
    conditionsMet: true,
  }
}
