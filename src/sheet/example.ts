import type { Sheet } from './types'

/** A sheet with nothing on it. */
export function emptySheet(): Sheet {
  return { format: 'phasogon-sheet', version: 1, title: '', phasors: [] }
}

/**
 * What a first visit shows, an invented job: the motor of a valve actuator behind a choke and a length
 * of cable. The three voltages come within half a volt of the supply that was measured.
 */
export const exampleSheet: Sheet = {
  format: 'phasogon-sheet',
  version: 1,
  title: 'Valve actuator 7: cable, choke and motor',
  revision: '0',
  job: {
    number: 'V-118',
    site: 'Pump house, lower gallery',
    circuit: 'Actuator supply, 48 V',
    conditions: 'Motor running, valve half way',
    date: '2026-11-24',
  },
  frequency: { value: 50, text: '50' },
  reference: 'I',
  supply: 'VS',
  phasors: [
    { id: 'I', label: 'I', quantity: 'current' },
    {
      id: 'Vcable',
      label: 'Vcable',
      quantity: 'voltage',
      magnitude: { value: 2.1, text: '2.10', limit: 0.05 },
      angle: { value: 0, text: '0' },
    },
    { id: 'Vchoke', label: 'Vchoke', quantity: 'voltage' },
    {
      id: 'Vmotor',
      label: 'Vmotor',
      quantity: 'voltage',
      magnitude: { value: 22.4, text: '22.4', limit: 0.2 },
      angle: { value: 35, text: '35', limit: 1 },
    },
    { id: 'VS', label: 'VS', quantity: 'voltage' },
  ],
  readings: [
    { id: 'r1', of: 'I', kind: 'magnitude', shown: '0.750', limit: 0.012 },
    { id: 'r2', of: 'Vchoke', kind: 'magnitude', shown: '28.9', limit: 0.3 },
    { id: 'r3', of: 'Vchoke', kind: 'angle', shown: '81', limit: 1 },
    { id: 'r4', of: 'VS', kind: 'magnitude', shown: '48.0', limit: 0.4 },
    { id: 'r5', of: 'VS', kind: 'angle', shown: '58.5', limit: 1 },
  ],
  sums: [
    {
      id: 's1',
      terms: [{ phasor: 'Vcable' }, { phasor: 'Vchoke' }, { phasor: 'Vmotor' }],
      equals: 'VS',
    },
  ],
}
