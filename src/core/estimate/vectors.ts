import { Matrix } from 'ml-matrix'

/** M · v. */
export function times(matrix: Matrix, vector: Float64Array): Float64Array {
  const product = new Float64Array(matrix.rows)
  for (let row = 0; row < matrix.rows; row++) {
    let sum = 0
    for (let column = 0; column < matrix.columns; column++) {
      sum += matrix.get(row, column) * (vector[column] ?? 0)
    }
    product[row] = sum
  }
  return product
}

/** Mᵀ · v. */
export function timesTransposed(matrix: Matrix, vector: Float64Array): Float64Array {
  const product = new Float64Array(matrix.columns)
  for (let row = 0; row < matrix.rows; row++) {
    const factor = vector[row] ?? 0
    if (factor === 0) continue
    for (let column = 0; column < matrix.columns; column++) {
      product[column] = (product[column] ?? 0) + matrix.get(row, column) * factor
    }
  }
  return product
}

/** The inner product. */
export function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0
  for (let each = 0; each < a.length; each++) sum += (a[each] ?? 0) * (b[each] ?? 0)
  return sum
}

/** Multiplies each column of a matrix in place by its factor, and gives it back. */
export function scaleColumns(matrix: Matrix, factors: Float64Array): Matrix {
  for (let row = 0; row < matrix.rows; row++) {
    for (let column = 0; column < matrix.columns; column++) {
      matrix.set(row, column, matrix.get(row, column) * (factors[column] ?? 1))
    }
  }
  return matrix
}

/** The length of each row. */
export function rowLengths(matrix: Matrix): Float64Array {
  const lengths = new Float64Array(matrix.rows)
  for (let row = 0; row < matrix.rows; row++) {
    let sum = 0
    for (let column = 0; column < matrix.columns; column++) sum += matrix.get(row, column) ** 2
    lengths[row] = Math.sqrt(sum)
  }
  return lengths
}

/** The columns from `first` on, `count` of them. */
export function someColumns(matrix: Matrix, first: number, count: number): Matrix {
  const part = new Matrix(matrix.rows, count)
  for (let row = 0; row < matrix.rows; row++) {
    for (let column = 0; column < count; column++) {
      part.set(row, column, matrix.get(row, first + column))
    }
  }
  return part
}
