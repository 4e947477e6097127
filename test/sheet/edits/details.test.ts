import { expect, test } from 'vitest'
import { describeEdit, exampleSheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { polar, sheetOf } from '../sheets'

test('details change one by one, and null takes one away', () => {
  const sheet = applied(exampleSheet, {
    kind: 'set-details',
    title: 'Retest',
    frequency: { value: 60, text: '60' },
    assumed: { percent: 2 },
    revision: null,
    supply: null,
  })
  expect(sheet.title).toBe('Retest')
  expect(sheet.frequency).toEqual({ value: 60, text: '60' })
  expect(sheet.assumed).toEqual({ percent: 2 })
  expect(sheet).not.toHaveProperty('revision')
  expect(sheet).not.toHaveProperty('supply')
  expect(sheet.phasors).toEqual(exampleSheet.phasors)
})

test('a reference that is not on the sheet is refused', () => {
  expect(refused(exampleSheet, { kind: 'set-details', reference: 'V9' })).toContain('"V9"')
})

test('a frequency of nothing, or below, is refused', () => {
  for (const value of [0, -50]) {
    refused(exampleSheet, { kind: 'set-details', frequency: { value } })
  }
})

test('the title block keeps the fields that are not changed, and goes when it is empty', () => {
  const sheet = applied(exampleSheet, {
    kind: 'set-job',
    job: { number: null, notes: 'Retested.' },
  })
  expect(sheet.job).toEqual({
    site: 'Pump house, lower gallery',
    circuit: 'Actuator supply, 48 V',
    conditions: 'Motor running, valve half way',
    date: '2026-11-24',
    notes: 'Retested.',
  })
  const bare = sheetOf({ job: { number: '7' } })
  expect(applied(bare, { kind: 'set-job', job: { number: null } })).not.toHaveProperty('job')
})

test('a date that is no day is refused', () => {
  for (const date of ['24.11.2026', '2026-02-30', 'tomorrow', '']) {
    expect(refused(exampleSheet, { kind: 'set-job', job: { date } })).toContain('2026-03-31')
  }
})

test('the paper, the origin and the scales of the drawing change', () => {
  const sheet = applied(exampleSheet, {
    kind: 'set-drawing',
    drawing: { paper: 'A3', origin: { x: 30, y: 40 }, unitsPerCentimetre: { voltage: 5 } },
  })
  expect(sheet.drawing).toEqual({
    paper: 'A3',
    origin: { x: 30, y: 40 },
    unitsPerCentimetre: { voltage: 5 },
  })
  const back = applied(sheet, {
    kind: 'set-drawing',
    drawing: { paper: null, origin: null, unitsPerCentimetre: null },
  })
  expect(back).not.toHaveProperty('drawing')
})

test('a scale of nothing is refused', () => {
  const drawing = { unitsPerCentimetre: { voltage: 0 } }
  refused(exampleSheet, { kind: 'set-drawing', drawing })
})

test('what is changed is said in words', () => {
  const sheet = sheetOf({ phasors: [polar('V1', '1', '0')] })
  const wordsOf = (edit: Parameters<typeof describeEdit>[1]) => describeEdit(sheet, edit)
  expect(wordsOf({ kind: 'set-details', title: 'x' })).toBe('Change the title')
  expect(wordsOf({ kind: 'set-job', job: { testedBy: 'A. B.' } })).toBe(
    'Change the title block: tested by',
  )
  expect(wordsOf({ kind: 'set-drawing', drawing: { paper: 'A3' } })).toBe(
    'Change the drawing: paper',
  )
})
