import type { Phasor, Sheet } from '../../src/sheet'
import { sheetOf, typed } from './sheets'

const ring: readonly Phasor[] = Array.from({ length: 10 }, (_, at) =>
  typed(`V${at + 1}`, String(20 + 3 * at), String(((at * 47) % 360) - 170), {
    ...(at % 3 === 0 ? { angle: { value: 5 * at, text: String(5 * at), limit: 1 } } : {}),
  }),
)

/** A sheet with something in every place: loose phasors, readings, open values and three sums. */
export const fullSheet: Sheet = sheetOf({
  title: 'Full sheet for every screen',
  revision: 'B',
  job: { number: 'T-204', site: 'Test bay 2', circuit: 'Panel 4', date: '2026-11-30' },
  frequency: { value: 50, text: '50' },
  phasors: [
    typed('I', '1.84', '0'),
    ...ring,
    { id: 'VS', label: 'VS', quantity: 'voltage' },
    { id: 'Vopen', label: 'Vopen', quantity: 'voltage' },
    {
      id: 'Z',
      label: 'Zcoil',
      quantity: 'impedance',
      real: { value: 12, text: '12' },
      imaginary: { value: 33, text: '33' },
    },
  ],
  readings: [
    { id: 'r1', of: 'VS', kind: 'magnitude', shown: '35.0', limit: 0.4 },
    { id: 'r2', of: 'VS', kind: 'angle', shown: '12.5', limit: 1 },
  ],
  sums: [
    { id: 's1', terms: ring.slice(0, 5).map(({ id }) => ({ phasor: id })), equals: 'VS' },
    { id: 's2', label: 'Loop', terms: ring.slice(5).map(({ id }) => ({ phasor: id })), equals: 0 },
    {
      id: 's3',
      terms: [{ phasor: 'V1' }, { phasor: 'V2', sign: -1 }],
      arrangement: 'from-origin',
    },
  ],
})

const long = 'wwwwwwwwwiiiiiiiii mmmmmmmmmmmmmmmmmmm '

/** The same with the longest texts that can be typed. */
export const longSheet: Sheet = {
  ...fullSheet,
  title: long.repeat(6).slice(0, 200),
  job: { number: long, site: long.repeat(4), circuit: long.repeat(4), testedBy: long, notes: long },
  phasors: fullSheet.phasors.map((phasor, at) => ({
    ...phasor,
    label: at % 2 === 0 ? `V${'m'.repeat(98)}${at % 10}` : `V${long.repeat(2)}${at}`,
    ...(phasor.magnitude && { magnitude: { value: 1234567.891234, text: '1234567.891234' } }),
  })),
  sums: (fullSheet.sums ?? []).map((sum) => ({ ...sum, label: 'S'.repeat(100) })),
}
