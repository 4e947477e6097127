import type { Matrix } from 'ml-matrix'
import { wrapDegrees } from '..'
import { combinedUncertainty } from './coverage'
import { type Layout, valueAt } from './layout'
import type { Observables } from './observables'
import type { Observable, PhasorProblem, SharedPart } from './phasor-problem'

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

/** Adds a slope by one unknown to a row of derivatives. */
export type Write = (row: number, column: number, slope: number) => void

/** Exact values that cannot all be true are taken as known to one part in a million. */
const SOFTENED = 1e-6

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

/** A row or two for each observation. Exact ones are softened to one part in a million on request. */
export function rowsOf(problem: PhasorProblem, softenExact: boolean): readonly Row[] {
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

/** Writes, from a first row on, model plus shared errors less what was observed, over the uncertainty (1 where exact). */
export function evaluateRows(
  rows: readonly Row[],
  layout: Layout,
  observables: Observables,
  x: Float64Array,
  write: Write,
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

/** Adds slopes to a matrix of derivatives, where there is one. */
export function writerTo(derivatives: Matrix | undefined): Write {
  return (row: number, column: number, slope: number) => {
    derivatives?.set(row, column, derivatives.get(row, column) + slope)
  }
}
