import { Matrix, SingularValueDecomposition } from 'ml-matrix'
import { someColumns } from './vectors'

/** Relative to the row's own length before the conditions take their part: below it is rounding. */
const RANK_TOLERANCE = 1e-8

/**
 * The directions, in coordinates of the free ones, that the observations fix. Each row counts by its
 * direction, not by its weight: a coarse observation fixes as much as a fine one. Slopes are those
 * along the free directions, a row an observation, and `lengths` those of the whole rows.
 */
export function fixedDirections(slopes: Matrix, lengths: Float64Array): Matrix {
  if (slopes.rows === 0 || slopes.columns === 0) return new Matrix(slopes.columns, 0)
  const rows = slopes.clone()
  for (let row = 0; row < rows.rows; row++) {
    const length = lengths[row] ?? 0
    rows.mulRow(row, length > 0 ? 1 / length : 0)
  }
  const svd = new SingularValueDecomposition(rows, { autoTranspose: true })
  const rank = svd.diagonal.filter((value) => value > RANK_TOLERANCE).length
  return someColumns(svd.rightSingularVectors, 0, rank)
}
