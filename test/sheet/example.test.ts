import { expect, test } from 'vitest'
import { emptySheet, exampleSheet, quick } from '../../src/sheet'
import { expectValid } from './laws'

test('the empty sheet and the example are valid', () => {
  expectValid(emptySheet())
  expectValid(exampleSheet)
})

test('the example is electrically sensible: the voltages of a choke and a motor lead the current', () => {
  const { phasors } = quick(exampleSheet)
  const angles = Object.fromEntries(phasors.map(({ id, angle }) => [id, angle]))
  expect(angles).toEqual({ I: 0, Vcable: 0, Vchoke: 81, Vmotor: 35, VS: 58.5 })
})
