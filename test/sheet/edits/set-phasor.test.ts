import { expect, test } from 'vitest'
import { describeEdit, exampleSheet, type Sheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { phasor, phasorOf, polar, readingOf, sheetOf } from '../sheets'

test('a phasor gets another label and terminals, and loses them', () => {
  const sheet = applied(exampleSheet, {
    kind: 'set-phasor',
    id: 'VS',
    change: { label: 'Vsupply', from: 'L', to: 'N' },
  })
  expect(phasorOf(sheet, 'VS')).toMatchObject({ label: 'Vsupply', from: 'L', to: 'N' })
  const bare = applied(sheet, { kind: 'set-phasor', id: 'VS', change: { from: null, to: null } })
  expect(phasorOf(bare, 'VS')).toEqual({ id: 'VS', label: 'Vsupply', quantity: 'voltage' })
})

test('a blank label and one with a mark of direction are refused', () => {
  for (const label of ['', '  ', 'V\u202e1', 'V\u200f', 'V\n1', '<b>V</b>']) {
    refused(exampleSheet, { kind: 'set-phasor', id: 'VS', change: { label } })
  }
})

const currents: Sheet = sheetOf({
  phasors: [
    {
      ...phasor('A'),
      magnitude: { value: 0.23, text: '230 mV', limit: 0.01 },
      angle: { value: 0, text: '0' },
    },
    phasor('B'),
    phasor('C'),
    polar('D', '4', '0'),
  ],
  readings: [
    { id: 'r1', of: 'B', kind: 'magnitude', shown: '1.50 V' },
    { id: 'r2', of: 'C', kind: 'magnitude', shown: '20 mV', shunt: 0.1 },
  ],
  sums: [
    { id: 's1', terms: [{ phasor: 'A' }, { phasor: 'B' }] },
    { id: 's2', terms: [{ phasor: 'B' }], equals: 'C' },
  ],
})

test('another quantity goes to all that a phasor adds up with, and figures keep their digits', () => {
  const sheet = applied(currents, {
    kind: 'set-phasor',
    id: 'A',
    change: { quantity: 'current' },
  })
  expect(sheet.phasors.map(({ quantity }) => quantity)).toEqual([
    'current',
    'current',
    'current',
    'voltage',
  ])
  expect(phasorOf(sheet, 'A').magnitude).toEqual({ value: 0.23, text: '230 mA', limit: 0.01 })
  expect(readingOf(sheet, 'r1')).toMatchObject({ shown: '1.50 A' })
  expect(readingOf(sheet, 'r2')).toMatchObject({ shown: '20 mV' })
})

test('digits with a unit that the quantity does not have go on without it', () => {
  const sheet = applied(currents, { kind: 'set-phasor', id: 'A', change: { quantity: 'other' } })
  expect(phasorOf(sheet, 'A').magnitude?.value).toBe(0.23)
  expect(readingOf(sheet, 'r1')).toMatchObject({ shown: '1.50' })
})

test('what another quantity goes to is said', () => {
  const edit = { kind: 'set-phasor', id: 'A', change: { quantity: 'current' } } as const
  expect(describeEdit(currents, edit)).toBe('Make A, B, C of the quantity current')
  expect(describeEdit(currents, { ...edit, id: 'D' })).toBe('Make D a current')
})
