import { Matrix, QrDecomposition, SingularValueDecomposition } from 'ml-matrix'
import { someColumns, times, timesTransposed } from './vectors'

/** The linearised conditions: where the unknowns may still move, and how to meet the conditions. */
export interface ConditionSpace {
  /** How many conditions are independent. */
  readonly rank: number
  /** Orthonormal columns that span every direction in which no condition changes. */
  readonly free: Matrix
  /** The shortest step that changes the conditions by `change`, as far as any step does. */
  stepFor(change: Float64Array): Float64Array
}

/** Rows are scaled to length 1 beforehand, so that what is below this is rounding. */
const RANK_TOLERANCE = 1e-9

function rankOf(singularValues: readonly number[]): number {
  const largest = singularValues[0] ?? 0
  return singularValues.filter((value) => value > RANK_TOLERANCE * largest).length
}

/** Orthonormal columns that complete orthonormal columns to a whole basis. */
function complementOf(basis: Matrix): Matrix {
  const size = basis.rows
  const padded = new Matrix(size, size)
  padded.setSubMatrix(basis, 0, 0)
  // A column of zeros is left as it is by the library's Householder steps: the orthogonal factor
  // then comes out whole.
  return someColumns(
    new QrDecomposition(padded).orthogonalMatrix,
    basis.columns,
    size - basis.columns,
  )
}

/**
 * The space of linearised conditions, from their derivatives (a row a condition, rows of length 1,
 * a column an unknown). Rank is decided from the singular values.
 */
export function conditionSpace(derivatives: Matrix): ConditionSpace {
  const unknowns = derivatives.columns
  if (derivatives.rows === 0) {
    return { rank: 0, free: Matrix.eye(unknowns), stepFor: () => new Float64Array(unknowns) }
  }
  const svd = new SingularValueDecomposition(derivatives, { autoTranspose: true })
  const rank = rankOf(svd.diagonal)
  const inside = someColumns(svd.rightSingularVectors, 0, rank)
  const outside = someColumns(svd.leftSingularVectors, 0, rank)
  return {
    rank,
    free: complementOf(inside),
    stepFor: (change) =>
      times(
        inside,
        timesTransposed(outside, change).map((value, k) => value / (svd.diagonal[k] ?? 1)),
      ),
  }
}
