import { expect, test } from 'vitest'
import {
  exampleSheet,
  readingsTable,
  type Sheet,
  scheduleTable,
  sumsTable,
  type Table,
} from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'

/** The cells of a row by the names of their columns. */
function rowOf({ head, rows }: Table, at: number): Readonly<Record<string, unknown>> {
  return Object.fromEntries(head.map((name, column) => [name, rows[at]?.[column]]))
}

const sheet: Sheet = {
  ...exampleSheet,
  instruments: [{ id: 'm1', name: 'Clamp meter' }],
  readings: (exampleSheet.readings ?? []).map((reading) =>
    reading.id === 'r4' ? { ...reading, instrument: 'm1', struck: true } : reading,
  ),
}
const evaluation = evaluate(exampleSheet)

test('the schedule has a row for each phasor, with figures as numbers', () => {
  const table = scheduleTable(exampleSheet, evaluation)
  expect(table.rows.length).toBe(exampleSheet.phasors.length)
  for (const row of table.rows) expect(row.length).toBe(table.head.length)
  const motor = rowOf(table, 3)
  expect(motor).toMatchObject({ phasor: 'Vmotor', unit: 'V', 'magnitude as read': 22.4 })
  const [found] = evaluation.phasors.filter(({ id }) => id === 'Vmotor')
  expect(motor.magnitude).toBeCloseTo(found?.magnitude ?? Number.NaN, 6)
  expect(motor['magnitude ±']).toBeCloseTo(found?.magnitudeLimit ?? Number.NaN, 6)
})

test('what is open is left out of the schedule', () => {
  const open: Sheet = { ...exampleSheet, readings: [] }
  const choke = rowOf(scheduleTable(open, evaluate(open)), 2)
  expect(choke).toMatchObject({ phasor: 'Vchoke', 'magnitude as read': undefined })
})

test('a reading stands as shown beside what it comes to, with its limit and who says so', () => {
  const row = rowOf(readingsTable(sheet), 1)
  expect(row).toMatchObject({
    number: 2,
    phasor: 'Vchoke',
    kind: 'magnitude',
    shown: 28.9,
    unit: 'V',
    'comes to': 28.9,
    '±': 0.3,
    'limit is': 'stated',
    used: 'used',
  })
  expect(rowOf(readingsTable(sheet), 3)).toMatchObject({
    instrument: 'Clamp meter',
    used: 'struck',
  })
})

test('what a display showed in words or with a prefix becomes a number where it is one', () => {
  const shown: Sheet = {
    ...exampleSheet,
    readings: [{ id: 'r1', of: 'I', kind: 'magnitude', shown: '750m' }],
  }
  expect(rowOf(readingsTable(shown), 0).shown).toBe(0.75)
})

test('a sum stands calculated beside measured, with its gap', () => {
  const row = rowOf(sumsTable(exampleSheet, evaluation), 0)
  const [found] = evaluation.sums
  expect(row).toMatchObject({ terms: 'Vcable + Vchoke + Vmotor', 'must equal': 'VS', unit: 'V' })
  expect(row.measured).toBe(48)
  expect(row.calculated).toBeCloseTo(found?.resultant?.magnitude ?? Number.NaN, 6)
  expect(row.closes).toBe('yes')
})
