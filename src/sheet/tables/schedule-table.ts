import { unitOf } from '../../core'
import type { Evaluation, PhasorEvaluation } from '../evaluation'
import type { Phasor, Sheet } from '../types'
import { type Cell, type Table, worked } from './table'

const COLUMNS: readonly (readonly [
  string,
  (phasor: Phasor, evaluation: PhasorEvaluation | undefined) => Cell,
])[] = [
  ['phasor', ({ label }) => label],
  ['quantity', ({ quantity }) => quantity],
  ['unit', ({ quantity }) => unitOf(quantity)],
  ['magnitude', (_, found) => worked(found?.magnitude)],
  ['magnitude ±', (_, found) => worked(found?.magnitudeLimit)],
  ['magnitude is', (_, found) => found?.magnitudeState],
  ['magnitude as read', (_, found) => worked(found?.asRead.magnitude)],
  ['angle in °', (_, found) => worked(found?.angle)],
  ['angle ± in °', (_, found) => worked(found?.angleLimit)],
  ['angle is', (_, found) => found?.angleState],
  ['angle as read in °', (_, found) => worked(found?.asRead.angle)],
  ['real', (_, found) => worked(found?.real)],
  ['imaginary', (_, found) => worked(found?.imaginary)],
  ['from', ({ from }) => from],
  ['to', ({ to }) => to],
]

/** The phasors with their values and limits, a row each. */
export function scheduleTable(sheet: Sheet, evaluation: Evaluation): Table {
  const found = new Map(evaluation.phasors.map((phasor) => [phasor.id, phasor]))
  return {
    name: 'schedule',
    head: COLUMNS.map(([title]) => title),
    rows: sheet.phasors.map((phasor) =>
      COLUMNS.map(([, cellOf]) => cellOf(phasor, found.get(phasor.id))),
    ),
  }
}
