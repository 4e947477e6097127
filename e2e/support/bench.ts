import type { Sheet } from '../../src/sheet'
import { sheetOf, typed } from './sheets'

/**
 * A sheet to drag on, at 1 mm to 0.5 V: three voltages tip to tail from 60 mm, 60 mm; a loose one hung
 * on the tip of the second; one placed by itself; and one that a meter showed.
 */
export const benchSheet: Sheet = sheetOf({
  reference: 'I',
  phasors: [
    typed('I', '2.0', '0'),
    typed('V1', '40', '10'),
    typed('V2', '30', '75', { magnitude: { value: 30, text: '30', limit: 0.5 } }),
    typed('V3', '25', '-60'),
    typed('Vhung', '15', '150', { tail: { tipOf: 'V2' } }),
    typed('Vfree', '20', '90', { tail: { x: 230, y: 100 } }),
    { id: 'Vread', label: 'Vread', quantity: 'voltage', tail: { x: 200, y: 100 } },
  ],
  readings: [
    { id: 'r1', of: 'Vread', kind: 'magnitude', shown: '22.5' },
    { id: 'r2', of: 'Vread', kind: 'angle', shown: '60' },
  ],
  sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V2' }, { phasor: 'V3' }] }],
  drawing: { origin: { x: 60, y: 60 }, unitsPerCentimetre: { voltage: 5, current: 1 } },
})
