import type { Matrix } from 'ml-matrix'

/** Values that depend on the unknowns. */
export interface Equations {
  readonly count: number
  /**
   * The values at x. Where a matrix of zeros is given (count rows, a column an unknown), their
   * derivatives are written into it.
   */
  evaluate(x: Float64Array, derivatives?: Matrix): Float64Array
}

/**
 * A least-squares problem: the unknowns that make the sum of squared residuals least, among those
 * that meet every condition.
 */
export interface LeastSquaresProblem {
  readonly unknowns: number
  /** (model − observed) / standard uncertainty, one an observation. */
  readonly residuals: Equations
  /** What must be 0 without fail. Conditions that follow from each other do no harm. */
  readonly conditions: Equations
  /** How large each unknown is, in its own unit, near x: positive. All linear algebra is done in these units. */
  sizes(x: Float64Array): Float64Array
}

/** No equations at all. */
export const NO_EQUATIONS: Equations = { count: 0, evaluate: () => new Float64Array(0) }

/** The sum of squares. */
export function sumOfSquares(values: Float64Array): number {
  let sum = 0
  for (const value of values) sum += value * value
  return sum
}

/** The largest of the absolute values; 0 of none. NaN where one of them is not a number. */
export function largestOf(values: Float64Array): number {
  let largest = 0
  for (const value of values) {
    if (!(Math.abs(value) <= largest)) largest = Math.abs(value)
  }
  return largest
}
