import { expect, test } from 'vitest'
import { apply, describeEdit, type Edit, exampleSheet } from '../../src/sheet'
import { applied, refused } from './laws'
import { phasor, phasorOf, polar, sheetOf } from './sheets'

test('several edits are one step', () => {
  const edits: readonly Edit[] = [
    { kind: 'add-phasor', phasor: polar('V9', '1', '0') },
    { kind: 'add-sum', sum: { id: 's9', terms: [{ phasor: 'V9' }] } },
    { kind: 'set-details', title: 'Both' },
  ]
  const sheet = applied(exampleSheet, { kind: 'several', edits })
  expect(sheet.title).toBe('Both')
  expect(sheet.sums?.at(-1)?.id).toBe('s9')
  expect(describeEdit(exampleSheet, { kind: 'several', edits })).toBe('Add V9, and 2 more')
})

test('where one of several edits fails, none is made', () => {
  const edits: readonly Edit[] = [
    { kind: 'set-details', title: 'Half' },
    { kind: 'remove-phasor', id: 'V9' },
    { kind: 'set-details', title: 'Whole' },
  ]
  expect(refused(exampleSheet, { kind: 'several', edits })).toContain('V9')
})

test('no edits change nothing', () => {
  expect(apply(exampleSheet, { kind: 'several', edits: [] })).toEqual({
    ok: true,
    value: exampleSheet,
  })
})

test('an edit may be changed afterwards without changing the sheet', () => {
  const added = { ...phasor('V9') }
  const result = apply(exampleSheet, { kind: 'add-phasor', phasor: added })
  Object.assign(added, { label: 'changed' })
  expect(result.ok && phasorOf(result.value, 'V9').label).toBe('V9')
})

test('what an edit does not touch is shared with the sheet before', () => {
  const result = apply(exampleSheet, { kind: 'set-details', title: 'x' })
  expect(result.ok && result.value.phasors).toBe(exampleSheet.phasors)
})

test('a kind of edit that does not exist is a programmer’s error', () => {
  const edit = JSON.parse('{"kind":"toString"}')
  expect(() => apply(exampleSheet, edit)).toThrow(TypeError)
  expect(() => describeEdit(exampleSheet, edit)).toThrow(TypeError)
})

test('numbers that are none are refused wherever they stand', () => {
  const of = (value: number) => ({ ...phasor('V9'), magnitude: { value } })
  for (const value of [Number.NaN, Number.POSITIVE_INFINITY]) {
    expect(apply(exampleSheet, { kind: 'add-phasor', phasor: of(value) }).ok).toBe(false)
    expect(apply(exampleSheet, { kind: 'set-details', drift: value }).ok).toBe(false)
  }
})

test('a sheet has no more than 2,000 phasors', () => {
  const phasors = Array.from({ length: 2_000 }, (_, index) => phasor(`V${index}`))
  const full = sheetOf({ phasors })
  expect(refused(full, { kind: 'add-phasor', phasor: phasor('one_more') })).toContain('2000')
})
