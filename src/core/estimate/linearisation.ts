import { Matrix, QrDecomposition } from 'ml-matrix'
import { ConditionsAt, linearise } from './conditions-at'
import { fixedDirections } from './fixed-directions'
import { type LeastSquaresProblem, sumOfSquares } from './problem'
import { dot, rowLengths, times, timesTransposed } from './vectors'

/** What the observations say about one quantity near a solution. */
export interface QuantitySpread {
  /** Whether the observations and conditions fix the quantity. */
  readonly isFixed: boolean
  /**
   * By how much the quantity's estimate moves where one observation moves by its own standard
   * uncertainty, one an observation. Their squares add up to the quantity's variance.
   */
  readonly shares: Float64Array
}

/** How much of a gradient may point where the observations do not reach. */
const FIXED_TOLERANCE = 1e-6
/** A redundancy below this is none. */
const UNCHECKED = 1e-8

/**
 * A least-squares problem, linearised at a solution: how many quantities the observations fix, which
 * ones, how well, and which observations check each other.
 */
export class Linearisation {
  /** How many independent quantities the observations fix, besides those that the conditions fix. */
  readonly rank: number
  /** How many directions neither conditions nor observations fix. */
  readonly openDirections: number
  /** How many independent conditions there are. */
  readonly conditionRank: number
  /** How much worse the worst fixed direction is fixed than the best, every observation counting alike. */
  readonly conditionNumber: number
  /** Observations less what they fix: how often one checks the others. */
  readonly degreesOfFreedom: number
  /** Each observation's share in that, 0 … 1: 0 where nothing checks it. They add up to `degreesOfFreedom`. */
  readonly redundancies: Float64Array
  /**
   * Each residual divided by its own standard uncertainty, of the standard normal distribution where
   * the limits are right; 0 where nothing checks the observation.
   */
  readonly normalised: Float64Array
  readonly #sizes: Float64Array
  /** Orthonormal: every direction that the conditions leave free. */
  readonly #free: Matrix
  /** Orthonormal, in coordinates of `#free`: every direction that the observations fix. */
  readonly #fixed: Matrix
  /** Orthonormal, a row an observation: what the observations may be after adjustment. */
  readonly #adjusted: Matrix
  /** `#fixed` times the inverse triangle: one standard uncertainty a column, in coordinates of `#free`. */
  readonly #spread: Matrix

  /** Linearises the problem at x, where the residuals are these. */
  constructor(problem: LeastSquaresProblem, x: Float64Array, residuals: Float64Array) {
    this.#sizes = problem.sizes(x)
    const conditions = new ConditionsAt(problem.conditions, x, this.#sizes)
    const { derivatives } = linearise(problem.residuals, x, this.#sizes)
    const lengths = rowLengths(derivatives)
    this.conditionRank = conditions.space.rank
    this.#free = conditions.space.free
    const slopes = derivatives.mmul(this.#free)
    const fixed = fixedDirections(slopes, lengths)
    this.#fixed = fixed.directions
    this.conditionNumber = fixed.condition
    this.rank = this.#fixed.columns
    this.openDirections = this.#free.columns - this.rank
    const { adjusted, spread } = adjustment(slopes, this.#fixed)
    this.#adjusted = adjusted
    this.#spread = spread
    this.degreesOfFreedom = residuals.length - this.rank
    this.redundancies = rowLengths(adjusted).map((length) => {
      const left = 1 - length * length
      return left > UNCHECKED ? left : 0
    })
    this.normalised = residuals.map((residual, row) => {
      const redundancy = this.redundancies[row] ?? 0
      return redundancy > 0 ? residual / Math.sqrt(redundancy) : 0
    })
  }

  /** What the observations say of the quantity with this gradient by the unknowns. */
  spreadOf(gradient: Float64Array): QuantitySpread {
    const scaled = gradient.map((slope, each) => slope * (this.#sizes[each] ?? 1))
    const reduced = timesTransposed(this.#free, scaled)
    const whole = Math.sqrt(sumOfSquares(scaled))
    const inside = sumOfSquares(timesTransposed(this.#fixed, reduced))
    const outside = Math.sqrt(Math.max(0, sumOfSquares(reduced) - inside))
    return {
      isFixed: outside <= FIXED_TOLERANCE * whole,
      shares: times(this.#adjusted, timesTransposed(this.#spread, reduced)),
    }
  }

  /**
   * Independent moves of the unknowns, each by one standard uncertainty: a row a move. The covariance
   * of the unknowns is the sum of the products of each move with itself.
   */
  moves(): Matrix {
    const moves = this.#free.mmul(this.#spread).transpose()
    for (let row = 0; row < moves.rows; row++) {
      for (let column = 0; column < moves.columns; column++) {
        moves.set(row, column, moves.get(row, column) * (this.#sizes[column] ?? 1))
      }
    }
    return moves
  }

  /** How large each unknown was taken to be. */
  get sizes(): Float64Array {
    return this.#sizes
  }
}

/** The orthogonal factor of the slopes in the fixed directions, and those directions by one uncertainty each. */
function adjustment(slopes: Matrix, fixed: Matrix): { adjusted: Matrix; spread: Matrix } {
  if (fixed.columns === 0) {
    return { adjusted: new Matrix(slopes.rows, 0), spread: new Matrix(fixed.rows, 0) }
  }
  const qr = new QrDecomposition(slopes.mmul(fixed))
  return {
    adjusted: qr.orthogonalMatrix,
    spread: fixed.mmul(inverseTriangle(qr.upperTriangularMatrix)),
  }
}

/** The inverse of an upper triangle. */
function inverseTriangle(triangle: Matrix): Matrix {
  const size = triangle.rows
  const inverse = Matrix.zeros(size, size)
  for (let column = 0; column < size; column++) {
    inverse.set(column, column, 1 / triangle.get(column, column))
    for (let row = column - 1; row >= 0; row--) {
      let sum = 0
      for (let k = row + 1; k <= column; k++) sum += triangle.get(row, k) * inverse.get(k, column)
      inverse.set(row, column, -sum / triangle.get(row, row))
    }
  }
  return inverse
}

/** The standard uncertainty of a quantity with these shares. */
export function uncertaintyOf(shares: Float64Array): number {
  return Math.sqrt(sumOfSquares(shares))
}

/** The covariance of two quantities with these shares. */
export function covarianceOf(a: Float64Array, b: Float64Array): number {
  return dot(a, b)
}
