import type { Matrix } from 'ml-matrix'
import type { Equations, LeastSquaresProblem } from '../../../src/core/estimate'
import { NO_EQUATIONS } from '../../../src/core/estimate'
import data from '../../published/published.json'

/** A model of x with parameters b: its value, and its derivative by each parameter. */
type Model = (b: readonly number[], x: number) => readonly [value: number, ...slopes: number[]]

function at(b: readonly number[], each: number): number {
  return b[each] ?? Number.NaN
}

/** The models of the NIST Statistical Reference Datasets, as the data sets state them. */
const models = {
  Misra1a: (b, x) => {
    const decay = Math.exp(-at(b, 1) * x)
    return [at(b, 0) * (1 - decay), 1 - decay, at(b, 0) * x * decay]
  },
  Chwirut2: (b, x) => {
    const bottom = at(b, 1) + at(b, 2) * x
    const y = Math.exp(-at(b, 0) * x) / bottom
    return [y, -x * y, -y / bottom, (-x * y) / bottom]
  },
  MGH09: (b, x) => {
    const top = x * x + x * at(b, 1)
    const bottom = x * x + x * at(b, 2) + at(b, 3)
    const y = (at(b, 0) * top) / bottom
    return [y, top / bottom, (at(b, 0) * x) / bottom, (-y * x) / bottom, -y / bottom]
  },
  Eckerle4: (b, x) => {
    const away = (x - at(b, 2)) / at(b, 1)
    const bell = Math.exp(-0.5 * away * away)
    const y = (at(b, 0) / at(b, 1)) * bell
    return [y, bell / at(b, 1), (y * (away * away - 1)) / at(b, 1), (y * away) / at(b, 1)]
  },
  Roszman1: (b, x) => {
    const away = x - at(b, 3)
    const square = away * away + at(b, 2) * at(b, 2)
    const y = at(b, 0) - at(b, 1) * x - Math.atan(at(b, 2) / away) / Math.PI
    return [y, 1, -x, -away / square / Math.PI, -at(b, 2) / square / Math.PI]
  },
  ENSO: (b, x) => {
    const year = (2 * Math.PI * x) / 12
    const wave = (period: number, cosine: number, sine: number) => {
      const phase = (2 * Math.PI * x) / period
      const value = cosine * Math.cos(phase) + sine * Math.sin(phase)
      const byPhase = sine * Math.cos(phase) - cosine * Math.sin(phase)
      return [value, (-byPhase * phase) / period, Math.cos(phase), Math.sin(phase)] as const
    }
    const second = wave(at(b, 3), at(b, 4), at(b, 5))
    const third = wave(at(b, 6), at(b, 7), at(b, 8))
    const y =
      at(b, 0) + at(b, 1) * Math.cos(year) + at(b, 2) * Math.sin(year) + second[0] + third[0]
    const slopes = [1, Math.cos(year), Math.sin(year), ...second.slice(1), ...third.slice(1)]
    return [y, ...slopes]
  },
} satisfies { readonly [name: string]: Model }

/** The data sets that published.json carries. */
export type DataSet = keyof typeof models

/** A data set as a least-squares problem, and its two published starts. */
export function dataSet(name: DataSet): { problem: LeastSquaresProblem; starts: number[][] } {
  const { x: places, y: observed, start1, start2 } = data.nist_data[name]
  const model: Model = models[name]
  const residuals: Equations = {
    count: places.length,
    evaluate: (b, derivatives?: Matrix) =>
      Float64Array.from(places, (place, row) => {
        const [value, ...slopes] = model([...b], place)
        slopes.forEach((slope, column) => {
          derivatives?.set(row, column, slope)
        })
        return value - (observed[row] ?? Number.NaN)
      }),
  }
  // A parameter that passes through zero keeps a size: a tenth of what it started from.
  const problem = (start: readonly number[]): LeastSquaresProblem => ({
    unknowns: start.length,
    residuals,
    conditions: NO_EQUATIONS,
    sizes: (b) => b.map((value, k) => Math.max(Math.abs(value), Math.abs(at(start, k)) / 10)),
  })
  return { problem: problem(start1), starts: [start1, start2] }
}
