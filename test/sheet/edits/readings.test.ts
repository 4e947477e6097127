import { expect, test } from 'vitest'
import { describeEdit, exampleSheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { readingOf } from '../sheets'

test('a reading is added, changed, struck and removed', () => {
  const added = applied(exampleSheet, {
    kind: 'add-reading',
    reading: { id: 'r6', of: 'I', kind: 'angle', shown: '58.6', against: 'VS', sense: 'lags' },
  })
  expect(readingOf(added, 'r6')).toMatchObject({ of: 'I', against: 'VS' })
  const changed = applied(added, {
    kind: 'set-reading',
    id: 'r6',
    change: { shown: '58.4', sense: null, limit: 0.5, struck: true },
  })
  expect(readingOf(changed, 'r6')).toEqual({
    id: 'r6',
    of: 'I',
    kind: 'angle',
    shown: '58.4',
    against: 'VS',
    limit: 0.5,
    struck: true,
  })
  const removed = applied(changed, { kind: 'remove-reading', id: 'r6' })
  expect(removed).toEqual(exampleSheet)
})

test('digits that no meter shows, and a reading against itself, are refused', () => {
  const change = (shown: string | number) =>
    refused(exampleSheet, { kind: 'set-reading', id: 'r2', change: { shown } })
  expect(change(-3)).toContain('must not be negative')
  change('3 bananas')
  change('28.9 A')
  const against = { kind: 'set-reading', id: 'r3', change: { against: 'Vchoke' } } as const
  expect(refused(exampleSheet, against)).toContain('not against itself')
  refused(exampleSheet, { kind: 'remove-reading', id: 'r9' })
})

test('striking a reading is said so', () => {
  const edit = { kind: 'set-reading', id: 'r2', change: { struck: true } } as const
  expect(describeEdit(exampleSheet, edit)).toBe('Strike the reading of Vchoke')
})
