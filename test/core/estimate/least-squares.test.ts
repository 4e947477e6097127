import type { Matrix } from 'ml-matrix'
import { describe, expect, test } from 'vitest'
import {
  chiSquarePoint,
  type Equations,
  type LeastSquaresProblem,
  Linearisation,
  NO_EQUATIONS,
  solveLeastSquares,
  uncertaintyOf,
} from '../../../src/core/estimate'
import { expectPublished, nameOf, outputOf, published } from '../../published/cases'
import { type DataSet, dataSet } from './published-models'

/** The gradient of one unknown by itself. */
function unit(unknowns: number, which: number): Float64Array {
  return new Float64Array(unknowns).fill(1, which, which + 1)
}

describe('nonlinear least squares', () => {
  test.each<[string, DataSet]>([
    ['F01', 'ENSO'],
    ['F02', 'Misra1a'],
    ['F03', 'Chwirut2'],
    ['F04', 'MGH09'],
    ['F05', 'Eckerle4'],
    ['F06', 'Roszman1'],
  ])('%s %s is certified from both of its starts', (id, name) => {
    const from = published(id)
    expect(nameOf(from)).toContain(name)
    const { problem, starts } = dataSet(name)
    for (const start of starts) {
      const solution = solveLeastSquares(problem, Float64Array.from(start))
      expect(solution.converged).toBe(true)
      const at = new Linearisation(problem, solution.x, solution.residuals)
      const deviation = Math.sqrt(solution.chiSquare / at.degreesOfFreedom)
      solution.x.forEach((value, k) => {
        expectPublished(outputOf(from, `b${k + 1}`), value)
        const { isFixed, shares } = at.spreadOf(unit(start.length, k))
        expect(isFixed).toBe(true)
        expectPublished(outputOf(from, `s(b${k + 1})`), deviation * uncertaintyOf(shares))
      })
      expectPublished(outputOf(from, 'RSS'), solution.chiSquare)
      expectPublished(outputOf(from, 'resid sd'), deviation)
    }
  })
})

/** Observed differences of height between points; a point of known height is fixed by a condition. */
function levelNet(
  points: readonly string[],
  fixed: Readonly<Record<string, number>>,
  observed: readonly (readonly [from: string, to: string, rise: number, uncertainty: number])[],
): LeastSquaresProblem {
  const column = (name: string) => points.indexOf(name)
  const rows: Equations = {
    count: observed.length,
    evaluate: (x, derivatives?: Matrix) =>
      Float64Array.from(observed, ([from, to, rise, uncertainty], row) => {
        derivatives?.set(row, column(to), 1 / uncertainty)
        derivatives?.set(row, column(from), -1 / uncertainty)
        return ((x[column(to)] ?? 0) - (x[column(from)] ?? 0) - rise) / uncertainty
      }),
  }
  const known = Object.entries(fixed)
  const conditions: Equations = {
    count: known.length,
    evaluate: (x, derivatives?: Matrix) =>
      Float64Array.from(known, ([name, height], row) => {
        derivatives?.set(row, column(name), 1)
        return (x[column(name)] ?? 0) - height
      }),
  }
  return { unknowns: points.length, residuals: rows, conditions, sizes: (x) => x.map(() => 1000) }
}

describe('the adjustment of a net', () => {
  test(nameOf(published('K04')), () => {
    const from = published('K04')
    const points = ['1a', '4', '3', '2']
    const problem = levelNet(points, { '1a': 1000 }, [
      ['1a', '4', -1.225, 0.005],
      ['4', '3', -0.848, 0.005],
      ['3', '2', 1.342, 0.005],
      ['2', '1a', 0.72, 0.005],
      ['1a', '2', -0.724, 0.005],
      ['2', '3', -1.335, 0.005],
      ['3', '4', 0.842, 0.005],
      ['4', '1a', 1.231, 0.005],
    ])
    const solution = solveLeastSquares(problem, Float64Array.of(1000, 998, 998, 998))
    expect(solution.converged && solution.conditionsMet).toBe(true)
    const at = new Linearisation(problem, solution.x, solution.residuals)
    const [, h4, h3, h2] = solution.x
    expectPublished(outputOf(from, 'H4'), h4 ?? 0)
    expectPublished(outputOf(from, 'H3'), h3 ?? 0)
    expectPublished(outputOf(from, 'H2'), h2 ?? 0)
    expect(at.degreesOfFreedom).toBe(5)
    expectPublished(outputOf(from, '[pvv]'), solution.chiSquare * 25)
    expectPublished(outputOf(from, "m0'"), Math.sqrt((solution.chiSquare * 25) / 5))
    const deviation = (name: string) =>
      1000 * uncertaintyOf(at.spreadOf(unit(4, points.indexOf(name))).shares)
    expectPublished(outputOf(from, 's H4'), deviation('4'))
    expectPublished(outputOf(from, 's H3'), deviation('3'))
    // The case's note: residuals, test value and its critical value, the whole list of w.
    expect(Math.abs(solution.chiSquare - 5.865)).toBeLessThanOrEqual(5e-5)
    expect(Math.abs(chiSquarePoint(0.05, 5) - 11.07)).toBeLessThanOrEqual(5e-4)
    const noted = [0.032, 1.55, -0.095, 1.297, -0.285, -1.676, -0.032, -1.55]
    const scores = [...at.normalised].map((w) => Math.abs(w))
    noted.forEach((w, row) => {
      expect(Math.abs((scores[row] ?? 0) - Math.abs(w))).toBeLessThanOrEqual(5e-4)
    })
    expectPublished(outputOf(from, 'max |w|'), Math.max(...scores))
    expect(scores.indexOf(Math.max(...scores)) + 1).toBe(
      Number(outputOf(from, 'index of max').printed),
    )
  })

  test(nameOf(published('K05')), () => {
    const from = published('K05')
    const problem = levelNet(['A', 'B', 'C', 'D'], { A: 437.596 }, [
      ['A', 'B', 10.509, 0.006],
      ['B', 'C', 5.36, 0.004],
      ['C', 'D', -8.523, 0.005],
      ['D', 'A', -7.348, 0.003],
      ['B', 'D', -3.167, 0.004],
      ['A', 'C', 15.881, 0.012],
    ])
    const solution = solveLeastSquares(problem, Float64Array.of(437, 437, 437, 437))
    const at = new Linearisation(problem, solution.x, solution.residuals)
    const [, b, c, d] = solution.x
    expectPublished(outputOf(from, 'B'), b ?? 0)
    expectPublished(outputOf(from, 'C'), c ?? 0)
    expectPublished(outputOf(from, 'D'), d ?? 0)
    expectPublished(outputOf(from, 'S0'), Math.sqrt(solution.chiSquare / at.degreesOfFreedom))
  })

  test('without a known height leaves heights open and their differences fixed', () => {
    const problem = levelNet(['A', 'B', 'C'], {}, [
      ['A', 'B', 1, 0.01],
      ['B', 'C', 2, 0.01],
      ['C', 'A', -3.01, 0.01],
    ])
    const solution = solveLeastSquares(problem, Float64Array.of(10, 10, 10))
    const at = new Linearisation(problem, solution.x, solution.residuals)
    expect(at.rank).toBe(2)
    expect(at.openDirections).toBe(1)
    expect(at.spreadOf(unit(3, 0)).isFixed).toBe(false)
    expect(at.spreadOf(Float64Array.of(-1, 1, 0)).isFixed).toBe(true)
    expect(at.degreesOfFreedom).toBe(1)
    for (const redundancy of at.redundancies) expect(redundancy).toBeCloseTo(1 / 3, 12)
  })

  test('with the same condition twice solves as with it once', () => {
    const observed = [
      ['A', 'B', 1, 0.01],
      ['B', 'A', -1.02, 0.02],
    ] as const
    const once = levelNet(['A', 'B'], { A: 5 }, observed)
    const twice: LeastSquaresProblem = {
      ...once,
      conditions: {
        count: 2,
        evaluate: (x, derivatives) => {
          derivatives?.set(0, 0, 1)
          derivatives?.set(1, 0, 2)
          return Float64Array.of((x[0] ?? 0) - 5, 2 * (x[0] ?? 0) - 10)
        },
      },
    }
    const [a, b] = [once, twice].map((problem) => solveLeastSquares(problem, new Float64Array(2)))
    expect(b?.conditionsMet).toBe(true)
    expect([...(b?.x ?? [])].map((height) => height.toFixed(9))).toEqual(
      [...(a?.x ?? [])].map((height) => height.toFixed(9)),
    )
  })

  test('with conditions that contradict each other says so', () => {
    const problem: LeastSquaresProblem = {
      unknowns: 1,
      residuals: NO_EQUATIONS,
      conditions: {
        count: 2,
        evaluate: (x, derivatives) => {
          derivatives?.set(0, 0, 1)
          derivatives?.set(1, 0, 1)
          return Float64Array.of((x[0] ?? 0) - 1, (x[0] ?? 0) - 2)
        },
      },
      sizes: () => Float64Array.of(1),
    }
    expect(solveLeastSquares(problem, Float64Array.of(0)).conditionsMet).toBe(false)
  })
})
