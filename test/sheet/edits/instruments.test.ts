import { expect, test } from 'vitest'
import { describeEdit, type Sheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { meter, phasors } from '../readings/jobs'
import { readingOf, sheetOf } from '../sheets'

const sheet: Sheet = sheetOf({
  phasors: phasors('V', 'I'),
  instruments: [meter],
  channels: [{ id: 'ct', label: 'CT on L1', ratio: { value: 40 } }],
  readings: [
    { id: 'r1', of: 'V', kind: 'magnitude', shown: '48.2', instrument: 'm1' },
    { id: 'r2', of: 'V', kind: 'power', with: 'I', shown: '12', currentChannel: 'ct' },
    { id: 'r3', of: 'I', kind: 'magnitude', shown: '1.2', channel: 'ct' },
  ],
})

test('an instrument is added, changed and removed, and its readings stay', () => {
  const added = applied(sheet, { kind: 'add-instrument', instrument: { id: 'm2', name: 'Clamp' } })
  expect(added.instruments?.map(({ id }) => id)).toEqual(['m1', 'm2'])
  const changed = applied(added, {
    kind: 'set-instrument',
    id: 'm2',
    change: { name: 'Clamp meter', serial: 'C-4', calibrationDue: '2026-06-30' },
  })
  expect(changed.instruments?.[1]).toEqual({
    id: 'm2',
    name: 'Clamp meter',
    serial: 'C-4',
    calibrationDue: '2026-06-30',
  })
  const removed = applied(changed, { kind: 'remove-instrument', id: 'm1' })
  expect(removed.instruments?.map(({ id }) => id)).toEqual(['m2'])
  expect(readingOf(removed, 'r1')).toEqual({ id: 'r1', of: 'V', kind: 'magnitude', shown: '48.2' })
})

test('a channel is added, changed and removed, and its readings stay', () => {
  const added = applied(sheet, { kind: 'add-channel', channel: { id: 'vt', label: 'VT' } })
  const change = { ratio: { value: 100, limit: 1 }, reversed: true, turns: 2 }
  const changed = applied(added, { kind: 'set-channel', id: 'vt', change })
  expect(changed.channels?.[1]).toEqual({ id: 'vt', label: 'VT', ...change })
  const removed = applied(changed, { kind: 'remove-channel', id: 'ct' })
  expect(readingOf(removed, 'r2')).not.toHaveProperty('currentChannel')
  expect(readingOf(removed, 'r3')).not.toHaveProperty('channel')
})

test('what is not there is refused, and so is what cannot be', () => {
  refused(sheet, { kind: 'remove-instrument', id: 'm9' })
  refused(sheet, { kind: 'set-channel', id: 'm1', change: { turns: 2 } })
  expect(refused(sheet, { kind: 'set-channel', id: 'ct', change: { turns: 0 } })).toBe(
    'There is at least one turn.',
  )
  refused(sheet, { kind: 'add-channel', channel: { id: 'm1' } })
  refused(sheet, { kind: 'set-instrument', id: 'm1', change: { calibrationDue: 'next year' } })
})

test('the words name the instrument and the channel', () => {
  expect(describeEdit(sheet, { kind: 'remove-instrument', id: 'm1' })).toBe(
    'Delete the instrument Bench meter',
  )
  expect(describeEdit(sheet, { kind: 'set-channel', id: 'ct', change: {} })).toBe(
    'Change the channel CT on L1',
  )
})
