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
/** Where every row adds this much of its length to the rows before it, they are plainly independent. */
const PLAINLY_INDEPENDENT = 1e-4

function rankOf(singularValues: readonly number[]): number {
  const largest = singularValues[0] ?? 0
  return singularValues.filter((value) => value > RANK_TOLERANCE * largest).length
}

/**
 * The triangular decomposition of columns with the orthogonal factor whole: a column of zeros is left
 * as it is by the library's Householder steps.
 */
function wholeDecomposition(
  columns: number,
  rows: number,
  at: (row: number, column: number) => number,
) {
  const padded = new Matrix(rows, rows)
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) padded.set(row, column, at(row, column))
  }
  return new QrDecomposition(padded)
}

/** Orthonormal columns that complete orthonormal columns to a whole basis. */
function complementOf(basis: Matrix): Matrix {
  const { orthogonalMatrix } = wholeDecomposition(basis.columns, basis.rows, (row, column) =>
    basis.get(row, column),
  )
  return someColumns(orthogonalMatrix, basis.columns, basis.rows - basis.columns)
}

/** The space of conditions that are plainly independent; nothing where they may not be. */
function spaceOfIndependent(derivatives: Matrix): ConditionSpace | undefined {
  const rank = derivatives.rows
  const unknowns = derivatives.columns
  if (rank > unknowns) return undefined
  const { orthogonalMatrix, upperTriangularMatrix } = wholeDecomposition(
    rank,
    unknowns,
    (row, column) => derivatives.get(column, row),
  )
  for (let k = 0; k < rank; k++) {
    if (Math.abs(upperTriangularMatrix.get(k, k)) < PLAINLY_INDEPENDENT) return undefined
  }
  const stepFor = (change: Float64Array): Float64Array => {
    const along = new Float64Array(unknowns)
    for (let row = 0; row < rank; row++) {
      let left = change[row] ?? 0
      for (let k = 0; k < row; k++) left -= upperTriangularMatrix.get(k, row) * (along[k] ?? 0)
      along[row] = left / upperTriangularMatrix.get(row, row)
    }
    return times(orthogonalMatrix, along)
  }
  return { rank, free: someColumns(orthogonalMatrix, rank, unknowns - rank), stepFor }
}

/**
 * The space of linearised conditions, from their derivatives (a row a condition, rows of length 1,
 * a column an unknown). Where they are not plainly independent, rank is decided from the singular
 * values.
 */
export function conditionSpace(derivatives: Matrix): ConditionSpace {
  const unknowns = derivatives.columns
  if (derivatives.rows === 0) {
    return { rank: 0, free: Matrix.eye(unknowns), stepFor: () => new Float64Array(unknowns) }
  }
  const plain = spaceOfIndependent(derivatives)
  if (plain !== undefined) return plain
  const svd = new SingularValueDecomposition(derivatives, { autoTranspose: true })
  const diagonal = svd.diagonal
  const rank = rankOf(diagonal)
  const inside = someColumns(svd.rightSingularVectors, 0, rank)
  const outside = someColumns(svd.leftSingularVectors, 0, rank)
  return {
    rank,
    free: complementOf(inside),
    stepFor: (change) =>
      times(
        inside,
        timesTransposed(outside, change).map((value, k) => value / (diagonal[k] ?? 1)),
      ),
  }
}
