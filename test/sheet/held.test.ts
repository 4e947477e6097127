import { expect, test } from 'vitest'
import { exampleSheet, heldBy } from '../../src/sheet'
import { phasor, polar, sheetOf } from './sheets'

test('a reading holds its part, and says so', () => {
  const sheet = sheetOf({
    phasors: [polar('V0', '1', '0'), polar('V1', '1', '10'), phasor('V2'), phasor('V3')],
    readings: [
      { id: 'r1', of: 'V2', kind: 'magnitude', shown: 1 },
      { id: 'r2', of: 'V3', kind: 'angle', shown: 1 },
      { id: 'r3', of: 'V1', kind: 'angle', shown: 1, struck: true },
    ],
  })
  expect(heldBy(sheet, 'V1')).toMatchObject({ magnitude: false, angle: false })
  expect(heldBy(sheet, 'V1')).not.toHaveProperty('why')
  expect(heldBy(sheet, 'V2')).toMatchObject({
    magnitude: true,
    angle: false,
    why: 'The magnitude of V2 was read on a meter: change the reading instead.',
  })
  expect(heldBy(sheet, 'V3')).toMatchObject({ magnitude: false, angle: true })
  expect(heldBy(exampleSheet, 'VS').why).toBe(
    'The magnitude and angle of VS were read on a meter: change the reading instead.',
  )
})

test('the reference at 0° keeps its angle', () => {
  const sheet = sheetOf({ phasors: [polar('V0', '1', '20'), polar('V1', '1', '0')] })
  expect(heldBy(sheet, 'V1')).toMatchObject({ magnitude: false, angle: true })
  expect(heldBy(sheet, 'V1').why).toBe('V1 is the reference: its angle stays 0°.')
  expect(heldBy(exampleSheet, 'I')).toMatchObject({ magnitude: true, angle: true })
})

test('a first phasor that was typed at another angle is free, though others count from it', () => {
  const sheet = sheetOf({ phasors: [polar('V0', '1', '20'), polar('V1', '1', '30')] })
  expect(heldBy(sheet, 'V0')).toMatchObject({ magnitude: false, angle: false })
})
