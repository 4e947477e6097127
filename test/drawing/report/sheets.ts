import type { Sheet } from '../../../src/sheet'

/** A job of six phasors with all that a report can say: invented, like every name in it. */
export const mixer: Sheet = {
  format: 'phasogon-sheet',
  version: 1,
  title: 'Dough mixer 3, run winding and capacitor branch',
  revision: 'B',
  job: {
    number: 'BK-2041',
    site: 'North bakery, plant room 2',
    circuit: 'DB-4 way 7',
    conditions: 'Motor warm, 40 min at full load; 24 °C',
    testedBy: 'M. Okafor',
    checkedBy: 'L. Brandt',
    checkedDate: '2026-09-15',
    date: '2026-09-14',
    voided: [{ kind: 'checked', by: 'A. Rossi', date: '2026-09-12', revision: 'A' }],
    notes: 'Second visit: the capacitor was changed on the first one.',
  },
  frequency: { value: 50, text: '50.0' },
  reference: 'I',
  phasors: [
    { id: 'I', label: 'I', quantity: 'current', from: 'L1', to: 'a' },
    { id: 'VR', label: 'VR', quantity: 'voltage', from: 'a', to: 'b' },
    { id: 'VL', label: 'Vcoil', quantity: 'voltage', from: 'b', to: 'c' },
    { id: 'VC', label: 'VC', quantity: 'voltage', from: 'c', to: 'N' },
    { id: 'V', label: 'VS', quantity: 'voltage', from: 'a', to: 'N' },
  ],
  instruments: [
    {
      id: 'm1',
      name: 'Bench meter A',
      serial: '40-1187',
      calibrationDue: '2027-01-31',
      category: 'CAT III 600 V',
      responding: 'true-rms',
      accuracy: [{ of: 'voltage', range: 600, text: '±(0.7 % + 3 digits)' }],
    },
    { id: 'c1', name: 'Clamp B', serial: 'C-0093', calibrationDue: '2026-08-01' },
  ],
  channels: [{ id: 'ct', label: 'CT of way 7', ratio: { value: 1, text: '1' } }],
  readings: [
    { id: 'r1', of: 'I', kind: 'magnitude', shown: '8.02', turns: 4, instrument: 'c1' },
    { id: 'r2', of: 'VR', kind: 'magnitude', shown: '59.9', instrument: 'm1', range: 600 },
    { id: 'r3', of: 'VL', kind: 'magnitude', shown: '86.6', instrument: 'm1', range: 600 },
    { id: 'r4', of: 'VC', kind: 'magnitude', shown: '40.1', limit: 0.5 },
    { id: 'r5', of: 'V', kind: 'magnitude', shown: '91.1' },
    { id: 'r6', of: 'V', kind: 'angle', shown: '28.6', sense: 'leads', against: 'I', limit: 1 },
    { id: 'r7', of: 'V', kind: 'power', shown: '160.9', with: 'I', limit: 2 },
    { id: 'r8', of: 'VC', kind: 'magnitude', shown: '46.0', struck: true },
    {
      id: 'r9',
      of: 'VL',
      kind: 'shift',
      shift: '2.1',
      period: '10.0',
      sense: 'leads',
      against: 'I',
      corrected: {
        mistake: 'half-period',
        original: { shift: '2.1', period: '5.0' },
        by: 'L. Brandt',
        date: '2026-09-15',
        reason: 'The time base was read again from the photograph.',
      },
    },
  ],
  sums: [{ id: 's1', terms: ['VR', 'VL', 'VC'].map((phasor) => ({ phasor })), equals: 'V' }],
  elements: [
    { id: 'R', kind: 'resistor', voltage: 'VR', current: 'I' },
    {
      id: 'L',
      kind: 'coil',
      voltage: 'VL',
      current: 'I',
      label: 'Run winding',
      marked: { inductance: { value: 0.13, text: '130 m' } },
    },
  ],
  drawing: { unitsPerCentimetre: { voltage: 10, current: 0.2 } },
  hand: [{ id: 'h1', sum: 's1', stands: 'VR', from: { x: 100, y: 80 }, to: { x: 159.6, y: 80.3 } }],
  report: {
    hazards: [
      {
        hazard: 'Live parts: shock and arc',
        control: 'Covers in place, gloves, meter and leads of the category of the place.',
        risk: 'high',
        supervision: 'A second person who can isolate the supply',
      },
      { hazard: 'Hot winding', control: 'Let it cool or keep clear.', risk: 'medium' },
    ],
    criterion: 'Every reading lies within its limits of values that fit the circuit.',
    conclusion: 'The readings agree. The mixer can go back into service.',
  },
}

const SCRIPTS = [
  'Supply of the east wing, second row from the left, behind the cold store',
  'מתח בין המוליכים של הלוח הראשי 12',
  '配電盤第三列電圧測定値',
  'جهد المصدر عند اللوحة الرئيسية',
  'Напряжение на вводе щита № 4',
  'Τάση τροφοδοσίας πίνακα',
  'Uninterrupted_label_without_any_space_in_it_that_goes_on_and_on',
  'Příkon čerpadla ve strojovně',
] as const

/** A sheet of so many phasors, all with long names in many scripts, and what is said of them too. */
export function crowded(count: number, drawing: Sheet['drawing'] = {}): Sheet {
  const name = (at: number) => `${SCRIPTS[at % SCRIPTS.length]} ${at + 1}`
  const phasors = Array.from({ length: count }, (_, at) => ({
    id: `P${at}`,
    label: name(at),
    quantity: 'voltage' as const,
    from: name(at + 1).slice(0, 20),
  }))
  return {
    format: 'phasogon-sheet',
    version: 1,
    title: SCRIPTS.join(' · '),
    revision: 'A revision index that someone made much too long for its cell',
    job: {
      number: 'Number-'.repeat(12),
      site: SCRIPTS[1],
      circuit: SCRIPTS[2],
      conditions: SCRIPTS.join('\n'),
      testedBy: SCRIPTS[3],
      checkedBy: SCRIPTS[6],
      approvedBy: SCRIPTS[4],
      notes: 'x'.repeat(3000),
    },
    phasors,
    readings: phasors.map(({ id }, at) => ({
      id: `r${at}`,
      of: id,
      kind: 'magnitude' as const,
      shown: (1 + ((at * 37) % 900) / 10).toFixed(1),
    })),
    sums: [{ id: 's1', terms: phasors.map(({ id }) => ({ phasor: id })), label: name(1) }],
    drawing,
    report: {
      hazards: SCRIPTS.map((hazard, at) => ({
        hazard,
        control: `${hazard} `.repeat(at % 3 === 0 ? 30 : 2),
        risk: 'low' as const,
      })),
      conclusion: SCRIPTS.join(' ').repeat(40),
    },
  }
}

/** A sheet of which next to nothing was filled in. */
export const bare: Sheet = { format: 'phasogon-sheet', version: 1, title: ' ', phasors: [] }

/** A sheet with typed values and nothing else. */
export const typed: Sheet = {
  format: 'phasogon-sheet',
  version: 1,
  title: 'Two voltages',
  phasors: [
    { id: 'V1', label: 'V1', quantity: 'voltage', magnitude: { value: 3 }, angle: { value: 0 } },
    { id: 'V2', label: 'V2', quantity: 'voltage', magnitude: { value: 4 }, angle: { value: 90 } },
    { id: 'V3', label: 'V3', quantity: 'voltage' },
  ],
  sums: [{ id: 's1', terms: [{ phasor: 'V1' }, { phasor: 'V2', sign: -1 }] }],
}
