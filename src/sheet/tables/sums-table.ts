import { unitOf } from '../../core'
import type { Evaluation, SumEvaluation } from '../evaluation'
import { labelOf } from '../names'
import { indexOf } from '../sheet-index'
import type { Sheet, Sum } from '../types'
import { type Cell, type Table, worked } from './table'

type CellOf = (sum: Sum, found: SumEvaluation | undefined, sheet: Sheet) => Cell

const COLUMNS: readonly (readonly [string, CellOf])[] = [
  ['sum', ({ id, label }) => label ?? id],
  ['terms', (sum, _, sheet) => termsOf(sheet, sum)],
  ['must equal', ({ equals }, _, sheet) => (equals ? labelOf(sheet, equals) : equals)],
  ['unit', (sum, _, sheet) => unitOfSum(sheet, sum)],
  ['calculated', (_, found) => worked(found?.resultant?.magnitude)],
  ['calculated angle in °', (_, found) => worked(found?.resultant?.angle)],
  ['measured', (_, found) => worked(found?.measured?.magnitude)],
  ['measured angle in °', (_, found) => worked(found?.measured?.angle)],
  ['gap', (_, found) => worked(found?.closingError?.magnitude)],
  ['gap angle in °', (_, found) => worked(found?.closingError?.angle)],
  ['gap in %', (_, found) => worked(found?.closingError?.percent)],
  ['gap allowed', (_, found) => worked(found?.closingError?.allowed)],
  ['closes', (_, found) => closesIn(found)],
]

/** The sums, calculated beside measured, a row each. */
export function sumsTable(sheet: Sheet, evaluation: Evaluation): Table {
  const found = new Map(evaluation.sums.map((sum) => [sum.id, sum]))
  return {
    name: 'sums',
    head: COLUMNS.map(([title]) => title),
    rows: (sheet.sums ?? []).map((sum) =>
      COLUMNS.map(([, cellOf]) => cellOf(sum, found.get(sum.id), sheet)),
    ),
  }
}

function closesIn(found: SumEvaluation | undefined): Cell {
  if (found?.closes === undefined) return undefined
  return found.closes ? 'yes' : 'no'
}

function termsOf(sheet: Sheet, { terms }: Sum): string {
  return terms
    .map(({ phasor, sign = 1 }, at) => {
      const label = labelOf(sheet, phasor)
      if (sign < 0) return `− ${label}`
      return at === 0 ? label : `+ ${label}`
    })
    .join(' ')
}

function unitOfSum(sheet: Sheet, { terms }: Sum): string {
  const { phasors } = indexOf(sheet)
  return unitOf(phasors.get(terms[0]?.phasor ?? '')?.quantity ?? 'other')
}
