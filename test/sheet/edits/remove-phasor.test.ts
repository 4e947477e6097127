import { expect, test } from 'vitest'
import { describeRemoval, exampleSheet, type Sheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { phasor, phasorOf, polar, sheetOf } from '../sheets'

const sheet: Sheet = sheetOf({
  reference: 'V1',
  supply: 'V1',
  phasors: [
    polar('V1', '5', '0'),
    { ...polar('V2', '5', '10'), tail: { tipOf: 'V1' } },
    phasor('V3'),
    phasor('V4'),
    phasor('I', 'current'),
  ],
  readings: [
    { id: 'r1', of: 'V1', kind: 'magnitude', shown: 5 },
    { id: 'r2', of: 'V3', kind: 'angle', shown: 5, against: 'V1' },
    { id: 'r3', of: 'V4', kind: 'power', shown: 5, with: 'I' },
    { id: 'r4', of: 'V3', kind: 'magnitude', shown: 5 },
  ],
  sums: [
    { id: 's1', label: 'Loop', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V3' },
    { id: 's2', terms: [{ phasor: 'V1' }] },
    { id: 's3', terms: [{ phasor: 'V2' }, { phasor: 'V3' }], equals: 'V1' },
  ],
  elements: [
    { id: 'e1', kind: 'resistor', voltage: 'V1', current: 'I' },
    { id: 'e2', kind: 'resistor', voltage: 'V2', current: 'I' },
    { id: 'e3', kind: 'coil', voltage: 'V3', current: 'I' },
  ],
  circuit: {
    series: [{ element: 'e2' }, { parallel: [{ element: 'e1' }, { element: 'e3' }] }],
  },
  threePhase: [
    { id: 't1', phasors: ['V1', 'V2', 'V3'] },
    { id: 't2', phasors: ['V2', 'V3', 'V4'], neutral: 'V1', currents: ['V1', 'V2', 'V3'] },
  ],
  chosen: [{ phasor: 'V1', magnitude: 5, angle: 0 }],
  hand: [
    { id: 'h1', stands: 'V1', from: { x: 0, y: 0 }, to: { x: 1, y: 0 } },
    { id: 'h2', sum: 's2', stands: 'closing', from: { x: 0, y: 0 }, to: { x: 1, y: 0 } },
    { id: 'h3', stands: 'V2', from: { x: 0, y: 0 }, to: { x: 1, y: 0 } },
  ],
})

test('whatever names a phasor goes with it, or lets it go', () => {
  const after = applied(sheet, { kind: 'remove-phasor', id: 'V1' })
  expect(after).not.toHaveProperty('reference')
  expect(after).not.toHaveProperty('supply')
  expect(after).not.toHaveProperty('chosen')
  expect(after.phasors.map(({ id }) => id)).toEqual(['V2', 'V3', 'V4', 'I'])
  expect(phasorOf(after, 'V2')).not.toHaveProperty('tail')
  expect(after.readings?.map(({ id }) => id)).toEqual(['r3', 'r4'])
  expect(after.sums).toEqual([
    { id: 's1', label: 'Loop', terms: [{ phasor: 'V2' }], equals: 'V3' },
    { id: 's3', terms: [{ phasor: 'V2' }, { phasor: 'V3' }] },
  ])
  expect(after.elements?.map(({ id }) => id)).toEqual(['e2', 'e3'])
  expect(after.circuit).toEqual({ series: [{ element: 'e2' }, { element: 'e3' }] })
  expect(after.threePhase).toEqual([{ id: 't2', phasors: ['V2', 'V3', 'V4'] }])
  expect(after.hand?.map(({ id }) => id)).toEqual(['h3'])
})

test('what goes with a phasor is told beforehand', () => {
  expect(describeRemoval(sheet, 'V1')).toEqual([
    '1 term of the sum Loop',
    'the sum s2',
    'what the sum V1 is compared with',
    '2 readings',
    '1 element of the circuit',
    '1 three-phase system',
    '2 hand-drawn arrows',
    'V2 no longer hangs on its tip',
    'another phasor becomes the reference',
    'the sheet names no supply any more',
  ])
  expect(describeRemoval(exampleSheet, 'Vcable')).toEqual(['1 term of the sum VS'])
  expect(describeRemoval(sheetOf({ phasors: [phasor('A')] }), 'A')).toEqual([])
})

test('the current of a power reading takes the reading and its elements along', () => {
  const after = applied(sheet, { kind: 'remove-phasor', id: 'I' })
  expect(after.readings?.map(({ id }) => id)).toEqual(['r1', 'r2', 'r4'])
  expect(after).not.toHaveProperty('elements')
  expect(after).not.toHaveProperty('circuit')
})

test('a phasor that is not there cannot be removed', () => {
  expect(refused(sheet, { kind: 'remove-phasor', id: 'V9' })).toBe(
    'There is no phasor "V9" on this sheet.',
  )
})
