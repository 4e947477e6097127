import { expect, test } from 'vitest'
import { describeEdit, exampleSheet } from '../../../src/sheet'
import { applied, refused } from '../laws'

const choice = [{ phasor: 'VS', magnitude: 52, angle: -37 }]

test('a drawing is chosen, another takes its place, and none leaves no trace', () => {
  const first = applied(exampleSheet, { kind: 'choose', chosen: choice })
  expect(first.chosen).toEqual(choice)
  const other = [{ phasor: 'Vchoke', magnitude: 61, angle: 12 }]
  const second = applied(first, { kind: 'choose', chosen: other })
  expect(second.chosen).toEqual(other)
  expect(applied(second, { kind: 'choose', chosen: [] })).toEqual(exampleSheet)
})

test('a choice that names no phasor of the sheet is refused', () => {
  const chosen = [...choice, { phasor: 'V9', magnitude: 1, angle: 0 }]
  expect(refused(exampleSheet, { kind: 'choose', chosen })).toContain('"V9"')
})

test('a choice goes with its phasor, and the others stay', () => {
  const chosen = [...choice, { phasor: 'Vchoke', magnitude: 61, angle: 12 }]
  const sheet = applied(exampleSheet, { kind: 'choose', chosen })
  const removed = applied(sheet, { kind: 'remove-phasor', id: 'VS' })
  expect(removed.chosen).toEqual(chosen.slice(1))
})

test('each is named for undo', () => {
  expect(describeEdit(exampleSheet, { kind: 'choose', chosen: choice })).toBe(
    'Take another drawing',
  )
  expect(describeEdit(exampleSheet, { kind: 'choose', chosen: [] })).toBe('Leave the drawing open')
})
