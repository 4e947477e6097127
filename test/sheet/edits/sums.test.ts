import { expect, test } from 'vitest'
import { describeEdit, exampleSheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { polar, sheetOf } from '../sheets'

test('a sum is added, changed and removed', () => {
  const added = applied(exampleSheet, {
    kind: 'add-sum',
    sum: {
      id: 's2',
      label: 'Loop',
      terms: [{ phasor: 'VS', sign: -1 }, { phasor: 'Vmotor' }],
      equals: 0,
    },
  })
  expect(added.sums?.map(({ id }) => id)).toEqual(['s1', 's2'])
  const changed = applied(added, {
    kind: 'set-sum',
    id: 's2',
    change: { label: null, equals: 'Vchoke', arrangement: 'from-origin', start: { x: 1, y: 2 } },
  })
  expect(changed.sums?.[1]).toEqual({
    id: 's2',
    terms: [{ phasor: 'VS', sign: -1 }, { phasor: 'Vmotor' }],
    equals: 'Vchoke',
    arrangement: 'from-origin',
    start: { x: 1, y: 2 },
  })
  const removed = applied(changed, { kind: 'remove-sum', id: 's1' })
  expect(removed.sums?.map(({ id }) => id)).toEqual(['s2'])
  expect(applied(removed, { kind: 'remove-sum', id: 's2' })).not.toHaveProperty('sums')
})

test('the hand arrows of a sum go with it', () => {
  const sheet = sheetOf({
    ...exampleSheet,
    hand: [
      { id: 'h1', sum: 's1', stands: 'closing', from: { x: 0, y: 0 }, to: { x: 1, y: 1 } },
      { id: 'h2', stands: 'VS', from: { x: 0, y: 0 }, to: { x: 1, y: 1 } },
    ],
  })
  const removed = applied(sheet, { kind: 'remove-sum', id: 's1' })
  expect(removed.hand?.map(({ id }) => id)).toEqual(['h2'])
})

test('terms are reordered by giving them anew', () => {
  const terms = [{ phasor: 'Vmotor' }, { phasor: 'Vcable' }]
  const sheet = applied(exampleSheet, { kind: 'set-sum', id: 's1', change: { terms } })
  expect(sheet.sums?.[0]?.terms).toEqual(terms)
})

test('a sum of a missing phasor, of two quantities, or equal to its own term is refused', () => {
  const change = (terms: { phasor: string }[], equals: string | 0) =>
    refused(exampleSheet, { kind: 'set-sum', id: 's1', change: { terms, equals } })
  expect(change([{ phasor: 'V9' }], 0)).toBe('There is no phasor "V9" on this sheet.')
  expect(change([{ phasor: 'VS' }, { phasor: 'I' }], 0)).toContain('another quantity')
  expect(change([{ phasor: 'VS' }], 'I')).toContain('another quantity')
  expect(change([{ phasor: 'VS' }, { phasor: 'Vmotor' }], 'VS')).toContain('term of this sum')
  refused(exampleSheet, { kind: 'set-sum', id: 's9', change: {} })
})

test('sums move in the list', () => {
  const sheet = sheetOf({
    phasors: [polar('A', '1', '0')],
    sums: ['s1', 's2', 's3'].map((id) => ({ id, terms: [{ phasor: 'A' }] })),
  })
  const moved = applied(sheet, { kind: 'move-sum', id: 's3', to: 0 })
  expect(moved.sums?.map(({ id }) => id)).toEqual(['s3', 's1', 's2'])
})

test('a sum is called by its label, else by what it must equal', () => {
  expect(describeEdit(exampleSheet, { kind: 'remove-sum', id: 's1' })).toBe('Delete the sum VS')
  const sum = { id: 's2', label: 'Loop', terms: [] }
  expect(describeEdit(exampleSheet, { kind: 'add-sum', sum })).toBe('Add the sum Loop')
})
