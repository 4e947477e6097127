import { expect, test } from 'vitest'
import { describeEdit, exampleSheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { phasor, phasorOf, polar, readingOf, sheetOf } from '../sheets'

test('a phasor is added at the end, or where it is said', () => {
  const last = applied(exampleSheet, { kind: 'add-phasor', phasor: phasor('V9') })
  expect(last.phasors.at(-1)?.id).toBe('V9')
  const second = applied(exampleSheet, { kind: 'add-phasor', phasor: phasor('V9'), at: 1 })
  expect(second.phasors.map(({ id }) => id)).toEqual([
    'I',
    'V9',
    'Vcable',
    'Vchoke',
    'Vmotor',
    'VS',
  ])
})

test('a phasor may be added to a sum at once', () => {
  const sheet = applied(exampleSheet, {
    kind: 'add-phasor',
    phasor: polar('V9', '1.5', '90'),
    term: { sum: 's1', sign: -1 },
  })
  expect(sheet.sums?.[0]?.terms.at(-1)).toEqual({ phasor: 'V9', sign: -1 })
})

test('a phasor whose id is taken, or that a sum cannot hold, is refused', () => {
  expect(refused(exampleSheet, { kind: 'add-phasor', phasor: phasor('VS') })).toContain('"VS"')
  const current = phasor('I9', 'current')
  expect(
    refused(exampleSheet, { kind: 'add-phasor', phasor: current, term: { sum: 's1' } }),
  ).toContain('another quantity')
  refused(exampleSheet, { kind: 'add-phasor', phasor: phasor('V9'), term: { sum: 's9' } })
})

test('a label with markup is refused in a sentence that says what to type', () => {
  const marked = { ...phasor('V9'), label: 'V<sub>coil</sub>' }
  expect(refused(exampleSheet, { kind: 'add-phasor', phasor: marked })).toContain('type Vcoil')
})

test('a copy stands below its original, with copies of the readings of it', () => {
  const sheet = applied(exampleSheet, { kind: 'duplicate-phasor', id: 'Vchoke', as: 'Vchoke2' })
  expect(sheet.phasors.map(({ id }) => id)).toEqual([
    'I',
    'Vcable',
    'Vchoke',
    'Vchoke2',
    'Vmotor',
    'VS',
  ])
  expect(readingOf(sheet, 'r6')).toEqual({ ...readingOf(sheet, 'r2'), id: 'r6', of: 'Vchoke2' })
  expect(readingOf(sheet, 'r7')).toEqual({ ...readingOf(sheet, 'r3'), id: 'r7', of: 'Vchoke2' })
})

test('a copy of a placed phasor does not lie on it', () => {
  const sheet = sheetOf({ phasors: [{ ...polar('V1', '1', '0'), tail: { x: 20, y: 20 } }] })
  const copied = applied(sheet, { kind: 'duplicate-phasor', id: 'V1', as: 'V2' })
  expect(phasorOf(copied, 'V2').tail).toEqual({ x: 25, y: 15 })
})

test('a phasor moves in the list, to the ends at most', () => {
  const order = (to: number) =>
    applied(exampleSheet, { kind: 'move-phasor', id: 'Vchoke', to }).phasors.map(({ id }) => id)
  expect(order(0)).toEqual(['Vchoke', 'I', 'Vcable', 'Vmotor', 'VS'])
  expect(order(3)).toEqual(['I', 'Vcable', 'Vmotor', 'Vchoke', 'VS'])
  expect(order(99)).toEqual(['I', 'Vcable', 'Vmotor', 'VS', 'Vchoke'])
  refused(exampleSheet, { kind: 'move-phasor', id: 'V9', to: 0 })
})

test('rows of a spreadsheet come as one step', () => {
  const sheet = applied(exampleSheet, {
    kind: 'add-rows',
    phasors: [polar('V8', '3.1', '10'), phasor('V9')],
    readings: [{ id: 'r9', of: 'V9', kind: 'magnitude', shown: '7.70' }],
  })
  expect(sheet.phasors.slice(-2).map(({ id }) => id)).toEqual(['V8', 'V9'])
  expect(readingOf(sheet, 'r9').of).toBe('V9')
  expect(describeEdit(sheet, { kind: 'add-rows', phasors: [phasor('A')], readings: [] })).toBe(
    'Paste 1 row',
  )
})

test('a phasor is placed, hung on a tip, and let go', () => {
  const placed = applied(exampleSheet, { kind: 'place-phasor', id: 'I', tail: { x: 12, y: 34.5 } })
  expect(phasorOf(placed, 'I').tail).toEqual({ x: 12, y: 34.5 })
  const hung = applied(placed, { kind: 'place-phasor', id: 'I', tail: { tipOf: 'VS' } })
  expect(phasorOf(hung, 'I').tail).toEqual({ tipOf: 'VS' })
  const free = applied(hung, { kind: 'place-phasor', id: 'I', tail: null })
  expect(phasorOf(free, 'I')).not.toHaveProperty('tail')
})

test('a phasor is never hung on its own tip, not through others either', () => {
  const sheet = sheetOf({
    phasors: [
      polar('A', '1', '0'),
      { ...polar('B', '1', '0'), tail: { tipOf: 'A' } },
      { ...polar('C', '1', '0'), tail: { tipOf: 'B' } },
    ],
  })
  for (const tipOf of ['A', 'B', 'C']) {
    const edit = { kind: 'place-phasor', id: 'A', tail: { tipOf } } as const
    expect(refused(sheet, edit)).toBe('A would hang on its own tip: hang it on another phasor.')
  }
  refused(sheet, { kind: 'place-phasor', id: 'A', tail: { tipOf: 'Z' } })
})
