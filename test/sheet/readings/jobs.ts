import type { Instrument, Phasor, Reading, Sheet } from '../../../src/sheet'
import { phasor, sheetOf } from '../sheets'

/** A meter of our own invention. */
export const meter: Instrument = {
  id: 'm1',
  name: 'Bench meter',
  serial: 'B-17',
  category: 'CAT III 600 V',
  accuracy: [
    { of: 'voltage', range: 60, text: '±(0.7 % + 3 digits)' },
    { of: 'voltage', range: 600, text: '±(1 % of reading + 0.2 % of range)' },
    { of: 'current', text: '±(1.5 % + 5 digits)' },
    { of: 'power', text: 'class 1' },
    { of: 'time', text: '±(0.01 % + 1 digit)' },
  ],
}

/** Voltages and currents by their first letters. */
export function phasors(...ids: readonly string[]): readonly Phasor[] {
  return ids.map((id) => phasor(id, id.startsWith('I') ? 'current' : 'voltage'))
}

/** A sheet of these readings; its first phasor is the reference. */
export function jobOf(
  ids: readonly string[],
  readings: readonly Reading[],
  parts: Partial<Sheet> = {},
): Sheet {
  return sheetOf({ phasors: phasors(...ids), readings, instruments: [meter], ...parts })
}

/** A sheet with one reading. */
export function oneReading(
  reading: Omit<Reading, 'id'> & object,
  parts: Partial<Sheet> = {},
): Sheet {
  return jobOf(['I', 'V'], [{ id: 'r1', ...reading } as Reading], parts)
}
