import { parseShown } from '../digits'
import { nameOfChannel } from '../edits/channels'
import { nameOfInstrument } from '../edits/instruments'
import { shownFigures } from '../figures'
import { labelOf } from '../names'
import { observedOf } from '../readings/indication'
import { limitOf } from '../readings/limit'
import { wordsOf } from '../readings/words'
import { indexOf } from '../sheet-index'
import type { Reading, Sheet } from '../types'
import { type Cell, type Table, worked } from './table'

type CellOf = (reading: Reading, sheet: Sheet, at: number) => Cell

const COLUMNS: readonly (readonly [string, CellOf])[] = [
  ['number', (_, __, at) => at + 1],
  ['phasor', ({ of }, sheet) => labelOf(sheet, of)],
  ['kind', ({ kind }) => kind],
  ['shown', (reading, sheet) => shownOf(sheet, reading, 0)],
  ['unit', (reading, sheet) => figureOf(sheet, reading, 0)?.unit],
  ['shown beside it', (reading, sheet) => shownOf(sheet, reading, 1)],
  ['against or with', (reading, sheet) => otherOf(sheet, reading)],
  ['sense', (reading) => ('sense' in reading ? reading.sense : undefined)],
  ['comes to', (reading, sheet) => worked(observedOf(sheet, reading)?.value)],
  ['±', (reading, sheet) => worked(limitOf(sheet, reading)?.limit)],
  ['limit is', (reading, sheet) => limitOf(sheet, reading)?.from],
  ['in words', (reading, sheet) => wordsOf(sheet, reading)],
  ['instrument', ({ instrument }, sheet) => instrument && nameOfInstrument(sheet, instrument)],
  ['channel', ({ channel }, sheet) => channel && nameOfChannel(sheet, channel)],
  ['range', ({ range }) => range],
  ['pass', ({ pass }) => pass],
  ['used', ({ struck }) => (struck ? 'struck' : 'used')],
  ['corrected', ({ corrected }) => corrected?.mistake],
  ['original', ({ corrected }) => corrected && JSON.stringify(corrected.original)],
]

/** The readings as shown and what each comes to, a row each. */
export function readingsTable(sheet: Sheet): Table {
  return {
    name: 'readings',
    head: COLUMNS.map(([title]) => title),
    rows: (sheet.readings ?? []).map((reading, at) =>
      COLUMNS.map(([, cellOf]) => cellOf(reading, sheet, at)),
    ),
  }
}

function figureOf(sheet: Sheet, reading: Reading, at: number) {
  const quantity = indexOf(sheet).phasors.get(reading.of)?.quantity ?? 'other'
  return shownFigures(reading, quantity)[at]
}

/** A shown figure as a number; as it was typed where it is none. */
function shownOf(sheet: Sheet, reading: Reading, at: number): Cell {
  const figure = figureOf(sheet, reading, at)
  if (figure === undefined) return undefined
  const parsed = parseShown(figure.shown, figure.unit)
  return parsed.ok ? worked(parsed.value) : figure.shown
}

function otherOf(sheet: Sheet, reading: Reading): Cell {
  const other =
    'with' in reading ? reading.with : 'against' in reading ? reading.against : undefined
  return other === undefined ? undefined : labelOf(sheet, other)
}
