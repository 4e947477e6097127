import { Matrix, SingularValueDecomposition } from 'ml-matrix'
import { someColumns } from './vectors'

/** Relative to the row's own length before the conditions take their part: below it is rounding. */
const RANK_TOLERANCE = 1e-8

/** What observations fix. */
export interface FixedDirections {
  /** Orthonormal columns, in coordinates of the free directions. */
  readonly directions: Matrix
  /** How much worse the worst of them is fixed than the best: the ratio of the singular values. */
  readonly condition: number
}

/**
 * The directions, in coordinates of the free ones, that the observations fix. Each row counts by its
 * direction, not by its weight: a coarse observation fixes as much as a fine one. Slopes are those
 * along the free directions, a row an observation, and `lengths` those of the whole rows.
 */
export function fixedDirections(slopes: Matrix, lengths: Float64Array): FixedDirections {
  if (slopes.rows === 0 || slopes.columns === 0) {
    return { directions: new Matrix(slopes.columns, 0), condition: 1 }
  }
  const rows = slopes.clone()
  for (let row = 0; row < rows.rows; row++) {
    const length = lengths[row] ?? 0
    rows.mulRow(row, length > 0 ? 1 / length : 0)
  }
  const svd = new SingularValueDecomposition(rows, { autoTranspose: true })
  const { diagonal } = svd
  const rank = diagonal.filter((value) => value > RANK_TOLERANCE).length
  return {
    directions: someColumns(svd.rightSingularVectors, 0, rank),
    condition: rank === 0 ? 1 : (diagonal[0] ?? 1) / (diagonal[rank - 1] ?? 1),
  }
}
