import { writeElements, writeReference, writeSums } from './hard-conditions'
import { type Layout, layoutOf, valueAt } from './layout'
import { Observables } from './observables'
import type { PhasorProblem } from './phasor-problem'
import type { Equations, LeastSquaresProblem } from './problem'
import { evaluateRows, type Row, rowsOf, writerTo } from './rows'
import { sizesOf } from './sizes'

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
