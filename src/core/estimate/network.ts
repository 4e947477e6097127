import { Matrix, SingularValueDecomposition } from 'ml-matrix'
import { type Complex, magnitudeOf } from '..'
import type { PhasorIndex, PhasorProblem } from './phasor-problem'

/** Singular values below this share of the largest count as nothing. */
const TOLERANCE = 1e-9

/** A complex linear equation: coefficients by phasor; they add up to nothing. */
type Line = readonly { readonly phasor: PhasorIndex; readonly factor: Complex }[]

function linesOf(
  problem: PhasorProblem,
  impedances: readonly (Complex | undefined)[],
): readonly Line[] {
  const sums = problem.sums.map((sum) =>
    sum.map(({ phasor, sign }) => ({ phasor, factor: { re: sign, im: 0 } })),
  )
  const elements = problem.elements.flatMap(({ voltage, current }, each) => {
    const impedance = impedances[each]
    if (impedance === undefined) return []
    const size = Math.max(1, magnitudeOf(impedance))
    return [
      [
        { phasor: voltage, factor: { re: 1 / size, im: 0 } },
        { phasor: current, factor: { re: -impedance.re / size, im: -impedance.im / size } },
      ],
    ]
  })
  return [...sums, ...elements]
}

/**
 * The phasors that follow from those that are known, taken all together, by the sums and by the
 * elements whose impedance is known: loops and nodes that no single sum settles, a floating star
 * point among them. What does not follow is left out.
 */
export function solveNetwork(
  problem: PhasorProblem,
  known: readonly (Complex | undefined)[],
  impedances: readonly (Complex | undefined)[],
): ReadonlyMap<PhasorIndex, Complex> {
  const found = new Map<PhasorIndex, Complex>()
  const lines = linesOf(problem, impedances).filter((line) =>
    line.some(({ phasor }) => known[phasor] === undefined),
  )
  const open = [...new Set(lines.flatMap((line) => line.map(({ phasor }) => phasor)))].filter(
    (phasor) => known[phasor] === undefined,
  )
  if (open.length === 0) return found
  const matrix = Matrix.zeros(2 * lines.length, 2 * open.length)
  const right = new Float64Array(2 * lines.length)
  lines.forEach((line, row) => {
    for (const { phasor, factor } of line) {
      const value = known[phasor]
      if (value) {
        right[2 * row] = (right[2 * row] ?? 0) - factor.re * value.re + factor.im * value.im
        right[2 * row + 1] = (right[2 * row + 1] ?? 0) - factor.re * value.im - factor.im * value.re
        continue
      }
      const column = 2 * open.indexOf(phasor)
      const add = (down: number, across: number, by: number) =>
        matrix.set(
          2 * row + down,
          column + across,
          matrix.get(2 * row + down, column + across) + by,
        )
      add(0, 0, factor.re)
      add(0, 1, -factor.im)
      add(1, 0, factor.im)
      add(1, 1, factor.re)
    }
  })
  const svd = new SingularValueDecomposition(matrix, { autoTranspose: true })
  const largest = svd.diagonal[0] ?? 0
  const rank = svd.diagonal.filter((value) => value > TOLERANCE * largest).length
  const [left, across] = [svd.leftSingularVectors, svd.rightSingularVectors]
  const part = (column: number): { value: number; isFixed: boolean } => {
    let value = 0
    let inside = 0
    for (let k = 0; k < rank; k++) {
      let along = 0
      for (let row = 0; row < right.length; row++) along += left.get(row, k) * (right[row] ?? 0)
      value += (across.get(column, k) * along) / (svd.diagonal[k] ?? 1)
      inside += across.get(column, k) ** 2
    }
    return { value, isFixed: inside > 1 - TOLERANCE }
  }
  open.forEach((phasor, each) => {
    const [re, im] = [part(2 * each), part(2 * each + 1)]
    if (re.isFixed && im.isFixed) found.set(phasor, { re: re.value, im: im.value })
  })
  return found
}
