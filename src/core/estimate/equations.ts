import type { Matrix } from 'ml-matrix'
import { cosDegrees, sinDegrees, wrapDegrees } from '..'
import { combinedUncertainty } from './coverage'
import { type Layout, layoutOf, valueAt } from './layout'
import { Observables } from './observables'
import type { Observable, PhasorProblem, SharedPart } from './phasor-problem'
import type { Equations, LeastSquaresProblem } from './problem'

/** An observation as one row of equations. */
export interface Row {
  /** The observation's place in the problem. */
  readonly observation: number
  readonly of: Observable
  readonly value: number
  /** Combined standard uncertainty of the parts that are the observation's own; 0: a condition. */
  readonly uncertainty: number
  readonly shared: readonly SharedPart[]
}

/** A phasor problem in the form that the solver takes. */
export interface PhasorEquations extends LeastSquaresProblem {
  readonly layout: Layout
  readonly observables: Observables
  /** The rows that are residuals, in order; behind them comes one residual a shared error. */
  readonly rows: readonly Row[]
  /** The rows that are conditions, in order; before them come sums, elements and the reference. */
  readonly exactRows: readonly Row[]
  /** How many conditions come before the exact rows. */
  readonly structural: number
}

/** Exact values that cannot all be true are taken as known to one part in a million. */
export const SOFTENED = 1e-6

/**
 * A phasor that was read as nothing is nothing in both its parts: its magnitude has no slope there,
 * and its angle does not exist.
 */
function asParts(of: Observable, value: number): readonly Observable[] {
  if (of.kind !== 'magnitude' || value !== 0) return [of]
  return [
    { kind: 'real', phasor: of.phasor },
    { kind: 'imaginary', phasor: of.phasor },
  ]
}

function softened(of: Observable, value: number): number {
  if (of.kind === 'angle') return SOFTENED * 180
  return SOFTENED * (Math.abs(value) || 1)
}

function rowsOf(problem: PhasorProblem, softenExact: boolean): readonly Row[] {
  return problem.observations.flatMap((each, observation) => {
    const own = combinedUncertainty(each.parts)
    const shared = (each.shared ?? []).filter((part) => part.sensitivity !== 0)
    const isExact = own === 0 && shared.length === 0
    const uncertainty = isExact && softenExact ? softened(each.of, each.value) : own
    return asParts(each.of, each.value).map((of) => ({
      observation,
      of,
      value: each.value,
      uncertainty,
      shared,
    }))
  })
}

/** Model plus shared errors less what was observed, over a divisor. */
function evaluateRows(
  rows: readonly Row[],
  layout: Layout,
  observables: Observables,
  x: Float64Array,
  write: (row: number, column: number, slope: number) => void,
  values: Float64Array,
  firstRow: number,
): void {
  rows.forEach(({ of, value, uncertainty, shared }, each) => {
    const row = firstRow + each
    const divisor = uncertainty || 1
    const model = observables.valueOf(of, x, (column, slope) => {
      if (column !== undefined) write(row, column, slope / divisor)
    })
    let difference = of.kind === 'angle' ? wrapDegrees(model - value) : model - value
    for (const { error, sensitivity } of shared) {
      const column = layout.error(error)
      difference += sensitivity * valueAt(x, column)
      write(row, column, sensitivity / divisor)
    }
    values[row] = difference / divisor
  })
}

function writerTo(derivatives: Matrix | undefined) {
  return (row: number, column: number, slope: number) => {
    derivatives?.set(row, column, derivatives.get(row, column) + slope)
  }
}

function residualsOf(
  problem: PhasorProblem,
  layout: Layout,
  observables: Observables,
  rows: readonly Row[],
): Equations {
  const count = rows.length + problem.sharedErrors.length
  return {
    count,
    evaluate(x, derivatives) {
      const values = new Float64Array(count)
      evaluateRows(rows, layout, observables, x, writerTo(derivatives), values, 0)
      for (let error = 0; error < problem.sharedErrors.length; error++) {
        values[rows.length + error] = valueAt(x, layout.error(error))
        derivatives?.set(rows.length + error, layout.error(error), 1)
      }
      return values
    },
  }
}

type Write = (row: number, column: number, slope: number) => void

function writeSums(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
  write: Write,
  values: Float64Array,
): number {
  problem.sums.forEach((terms, each) => {
    for (const { phasor, sign } of terms) {
      for (const [row, column] of [
        [2 * each, layout.real(phasor)],
        [2 * each + 1, layout.imaginary(phasor)],
      ] as const) {
        values[row] = (values[row] ?? 0) + sign * valueAt(x, column)
        write(row, column, sign)
      }
    }
  })
  return 2 * problem.sums.length
}

/** V − (R + jX) · I, real and imaginary part. */
function writeElements(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
  write: Write,
  values: Float64Array,
  first: number,
): number {
  problem.elements.forEach(({ voltage, current }, each) => {
    const row = first + 2 * each
    const resistance = layout.resistance(each)
    const reactance = layout.reactance(each)
    const r = valueAt(x, resistance)
    const s = valueAt(x, reactance)
    const i = { re: valueAt(x, layout.real(current)), im: valueAt(x, layout.imaginary(current)) }
    values[row] = valueAt(x, layout.real(voltage)) - r * i.re + s * i.im
    values[row + 1] = valueAt(x, layout.imaginary(voltage)) - r * i.im - s * i.re
    write(row, layout.real(voltage), 1)
    write(row + 1, layout.imaginary(voltage), 1)
    write(row, layout.real(current), -r)
    write(row, layout.imaginary(current), s)
    write(row + 1, layout.real(current), -s)
    write(row + 1, layout.imaginary(current), -r)
    if (resistance !== undefined) {
      write(row, resistance, -i.re)
      write(row + 1, resistance, -i.im)
    }
    if (reactance !== undefined) {
      write(row, reactance, i.im)
      write(row + 1, reactance, -i.re)
    }
  })
  return first + 2 * problem.elements.length
}

function writeReference(
  problem: PhasorProblem,
  layout: Layout,
  x: Float64Array,
  write: Write,
  values: Float64Array,
  row: number,
): number {
  if (problem.reference === undefined) return row
  const { phasor, angle } = problem.reference
  const [cosine, sine] = [cosDegrees(angle), sinDegrees(angle)]
  const [real, imaginary] = [layout.real(phasor), layout.imaginary(phasor)]
  values[row] = cosine * valueAt(x, imaginary) - sine * valueAt(x, real)
  write(row, imaginary, cosine)
  write(row, real, -sine)
  return row + 1
}

function conditionsOf(
  problem: PhasorProblem,
  layout: Layout,
  observables: Observables,
  exactRows: readonly Row[],
  structural: number,
): Equations {
  const count = structural + exactRows.length
  return {
    count,
    evaluate(x, derivatives) {
      const values = new Float64Array(count)
      const write = writerTo(derivatives)
      const elements = writeSums(problem, layout, x, write, values)
      const reference = writeElements(problem, layout, x, write, values, elements)
      const exact = writeReference(problem, layout, x, write, values, reference)
      evaluateRows(exactRows, layout, observables, x, write, values, exact)
      return values
    },
  }
}

/** No unknown is taken to be smaller than this share of the largest of its kind. */
const SMALLEST_SHARE = 1e-3

/** For each phasor, a list of all those that sums tie it to, itself among them. */
function tiedPhasors(problem: PhasorProblem): readonly (readonly number[])[] {
  const group = Array.from({ length: problem.phasors }, (_, each) => [each])
  for (const terms of problem.sums) {
    const all = [...new Set(terms.flatMap(({ phasor }) => group[phasor] ?? []))]
    for (const phasor of all) group[phasor] = all
  }
  return group
}

function sizesOf(problem: PhasorProblem, layout: Layout) {
  const ties = tiedPhasors(problem)
  return (x: Float64Array): Float64Array => {
    const lengths = ties.map((_, each) =>
      Math.hypot(valueAt(x, layout.real(each)), valueAt(x, layout.imaginary(each))),
    )
    const sizes = new Float64Array(layout.unknowns).fill(1)
    ties.forEach((group, each) => {
      const largest = Math.max(...group.map((other) => lengths[other] ?? 0))
      const size = Math.max(lengths[each] ?? 0, SMALLEST_SHARE * largest) || 1
      sizes[layout.real(each)] = size
      sizes[layout.imaginary(each)] = size
    })
    problem.elements.forEach(({ voltage, current }, each) => {
      const impedance = (sizes[layout.real(voltage)] ?? 1) / (sizes[layout.real(current)] ?? 1)
      const [r, s] = [layout.resistance(each), layout.reactance(each)]
      const own = Math.hypot(valueAt(x, r), valueAt(x, s))
      const size = Math.max(own, SMALLEST_SHARE * impedance)
      if (r !== undefined) sizes[r] = size
      if (s !== undefined) sizes[s] = size
    })
    return sizes
  }
}

/**
 * The equations of a phasor problem. Conditions: every sum is nothing, V = Z · I for every element,
 * the reference's angle, and every observation that has no error of its own. `softenExact` takes
 * exact observations as known to one part in a million instead, to see which of them contradict.
 */
export function equationsOf(problem: PhasorProblem, softenExact = false): PhasorEquations {
  const layout = layoutOf(problem)
  const observables = new Observables(problem, layout)
  const all = rowsOf(problem, softenExact)
  const rows = all.filter((row) => row.uncertainty > 0)
  const exactRows = all.filter((row) => row.uncertainty === 0)
  const structural =
    2 * problem.sums.length +
    2 * problem.elements.length +
    (problem.reference === undefined ? 0 : 1)
  return {
    layout,
    observables,
    rows,
    exactRows,
    structural,
    unknowns: layout.unknowns,
    residuals: residualsOf(problem, layout, observables, rows),
    conditions: conditionsOf(problem, layout, observables, exactRows, structural),
    sizes: sizesOf(problem, layout),
  }
}
