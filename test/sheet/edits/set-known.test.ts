import { expect, test } from 'vitest'
import { exampleSheet, quick, type Sheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { phasor, phasorOf, polar, readingOf, rectangular, sheetOf } from '../sheets'

const sheet: Sheet = sheetOf({
  phasors: [
    polar('V0', '10.0', '0'),
    {
      ...phasor('V1'),
      magnitude: { value: 24, text: '24.0', limit: 0.2 },
      angle: { value: -30, text: '−30', limit: 1 },
    },
    rectangular('V2', '3', '4'),
    phasor('V3'),
  ],
})

test('a typed value becomes readings with its digits and limits, and typed again', () => {
  const read = applied(sheet, { kind: 'set-known', id: 'V1', as: 'read' })
  expect(phasorOf(read, 'V1')).toEqual(phasor('V1'))
  expect(read.readings).toEqual([
    { id: 'r1', of: 'V1', kind: 'magnitude', shown: '24.0', limit: 0.2 },
    { id: 'r2', of: 'V1', kind: 'angle', shown: '−30', limit: 1 },
  ])
  expect(applied(read, { kind: 'set-known', id: 'V1', as: 'typed' })).toEqual(sheet)
})

test('the angle of the reference stays typed', () => {
  const read = applied(sheet, { kind: 'set-known', id: 'V0', as: 'read' })
  expect(phasorOf(read, 'V0')).toEqual({ ...phasor('V0'), angle: { value: 0, text: '0' } })
  expect(readingOf(read, 'r1')).toMatchObject({ kind: 'magnitude', shown: '10.0' })
  expect(quick(read).phasors).toEqual(quick(sheet).phasors)
})

test('a rectangular value is read as magnitude and angle, unless its parts have limits', () => {
  const read = applied(sheet, { kind: 'set-known', id: 'V2', as: 'read' })
  expect(readingOf(read, 'r1')).toMatchObject({ kind: 'magnitude', shown: 5 })
  const limited = sheetOf({
    phasors: [{ ...rectangular('V2', '3', '4'), real: { value: 3, limit: 0.1 } }],
  })
  expect(refused(limited, { kind: 'set-known', id: 'V2', as: 'read' })).toContain('no meter shows')
})

test('angles count from a reference that does not lie at 0°', () => {
  const turned = sheetOf({ phasors: [polar('V0', '10', '20'), polar('V1', '5', '50')] })
  const read = applied(turned, { kind: 'set-known', id: 'V1', as: 'read' })
  expect(readingOf(read, 'r2')).toMatchObject({ kind: 'angle', shown: 30 })
  expect(quick(read).phasors[1]).toMatchObject({ magnitude: 5, angle: 50 })
})

test('a reading through a ratio is typed as the value that it stands for', () => {
  const scaled = sheetOf({
    phasors: [phasor('V1')],
    readings: [
      { id: 'r1', of: 'V1', kind: 'magnitude', shown: '2.30', ratio: 100, limit: 0.01 },
      { id: 'r2', of: 'V1', kind: 'magnitude', shown: '9', struck: true },
    ],
  })
  const typed = applied(scaled, { kind: 'set-known', id: 'V1', as: 'typed' })
  expect(phasorOf(typed, 'V1').magnitude?.value).toBeCloseTo(230, 10)
  expect(phasorOf(typed, 'V1').magnitude?.limit).toBeCloseTo(1, 12)
  expect(typed.readings?.map(({ id }) => id)).toEqual(['r2'])
})

test('a lag that was read is typed with its sign', () => {
  const lagging = sheetOf({
    phasors: [polar('V0', '1', '0'), phasor('V1')],
    readings: [{ id: 'r1', of: 'V1', kind: 'angle', shown: '36.9', sense: 'lags' }],
  })
  const typed = applied(lagging, { kind: 'set-known', id: 'V1', as: 'typed' })
  expect(phasorOf(typed, 'V1').angle).toEqual({ value: -36.9, text: '−36.9' })
})

test('what is not there cannot be turned, and says so', () => {
  expect(refused(sheet, { kind: 'set-known', id: 'V3', as: 'read' })).toContain('Type the value')
  expect(refused(sheet, { kind: 'set-known', id: 'V1', as: 'typed' })).toContain('typed already')
  const twice = sheetOf({
    ...exampleSheet,
    readings: [
      ...(exampleSheet.readings ?? []),
      { id: 'r9', of: 'VS', kind: 'magnitude', shown: 48.1 },
    ],
  })
  expect(refused(twice, { kind: 'set-known', id: 'VS', as: 'typed' })).toContain('2 readings')
})
