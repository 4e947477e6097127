import { expect, test } from 'vitest'
import { type Edit, emptySheet, exampleSheet, partedFrom, type Sheet } from '../../../src/sheet'
import { applied } from '../laws'

const series: Sheet = [
  { kind: 'start-circuit', form: 'series' },
  { kind: 'add-element', element: { kind: 'resistor' }, at: [], form: 'series' },
  { kind: 'add-element', element: { kind: 'coil' }, at: [], form: 'series' },
  { kind: 'add-element', element: { kind: 'capacitor' }, at: [1], form: 'parallel' },
].reduce((sheet, edit) => applied(sheet, edit as Edit), emptySheet())

test('a sheet without a circuit has parted from none', () => {
  expect(partedFrom(exampleSheet)).toEqual([])
  expect(partedFrom(emptySheet())).toEqual([])
})

test('a sheet as it was built has not parted from its circuit', () => {
  expect(partedFrom(series)).toEqual([])
})

test.each<[string, readonly Edit[], string]>([
  [
    'a sum that was taken out',
    [{ kind: 'remove-sum', id: 's1' }],
    'No sum adds up the voltages of R and the group of coil and C, which are in series.',
  ],
  [
    'a term that was taken out',
    [{ kind: 'set-sum', id: 's2', change: { terms: [{ phasor: 'Icoil' }] } }],
    'The sum I lacks IC, the current of C.',
  ],
  [
    'a term that was added',
    [
      { kind: 'add-phasor', phasor: { id: 'Vx', label: 'Vx', quantity: 'voltage' } },
      {
        kind: 'set-sum',
        id: 's1',
        change: { terms: [{ phasor: 'VR' }, { phasor: 'Vcoil' }, { phasor: 'Vx' }] },
      },
    ],
    'The sum VS also holds Vx, which the circuit does not have there.',
  ],
  [
    'a term with the other sign',
    [
      {
        kind: 'set-sum',
        id: 's1',
        change: { terms: [{ phasor: 'VR' }, { phasor: 'Vcoil', sign: -1 }] },
      },
    ],
    'The sum VS takes Vcoil away, where the circuit adds it.',
  ],
  [
    'an element on another voltage',
    [{ kind: 'set-element', id: 'C', change: { voltage: 'VR' } }],
    'coil and C are in parallel, but their voltages are Vcoil and VR.',
  ],
  [
    'a supply elsewhere',
    [
      { kind: 'add-phasor', phasor: { id: 'Vx', label: 'Vx', quantity: 'voltage' } },
      { kind: 'set-details', supply: 'Vx' },
    ],
    'The supply Vx is no voltage and no current of the circuit.',
  ],
])('says it of %s', (_, edits, sentence) => {
  expect(partedFrom(edits.reduce(applied, series))).toContain(sentence)
})

test('says it of an element that the circuit does not have, and of a quantity that does not fit', () => {
  const stray: Sheet = {
    ...series,
    elements: [
      ...(series.elements ?? []),
      { id: 'Z', kind: 'impedance', label: 'motor', voltage: 'VR', current: 'I' },
    ],
  }
  expect(partedFrom(stray)).toEqual(['motor is an element of the sheet, but not of the circuit.'])
  const odd: Sheet = {
    ...series,
    phasors: series.phasors.map((each) =>
      each.id === 'VR' ? { ...each, quantity: 'other' } : each,
    ),
  }
  expect(partedFrom(odd)).toContain('VR stands for the voltage of R, but its quantity is other.')
})
