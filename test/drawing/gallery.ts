import type { LayoutOptions } from '../../src/drawing'
import type { Sheet } from '../../src/sheet'
import { ballasted } from './schematic/circuits'
import { fan, phasor, sheetOf, sum } from './sheets'

/** A sheet of the gallery, and how it is laid out. */
export interface Exhibit {
  readonly sheet: Sheet
  readonly options?: LayoutOptions
}

/** A circuit with a group inside it, measured in part. */
const circuit: Sheet = {
  ...ballasted,
  phasors: ballasted.phasors.map((each) => {
    if (each.id === 'VS') return { ...phasor('VS', '230', '29'), label: 'VS' }
    if (each.id === 'VR') return { ...phasor('VR', '61', '0'), label: 'VR' }
    return each.id === 'Vm' ? { ...phasor('Vm', '188', '38'), label: 'Vmotor' } : each
  }),
}

const feeder = sheetOf(
  [
    phasor('IA', '42.0', '-28', 'current'),
    phasor('IB', '38.5', '-151', 'current'),
    phasor('IC', '45.2', '96', 'current'),
    phasor('IN', '7.1', '131', 'current'),
  ],
  {
    title: 'Bakery oven, neutral current',
    frequency: { value: 50, text: '50' },
    job: { number: 'B-118', testedBy: 'J. Moreau', date: '2026-05-02' },
    sums: [sum('s1', ['IA', 'IB', 'IC'], { equals: 'IN' })],
  },
)

const node = sheetOf(
  [
    phasor('I1', '3.20', '-41', 'current'),
    phasor('I2', '2.45', '87', 'current'),
    phasor('I3', '2.55', '-173', 'current'),
  ],
  {
    title: 'Lighting busbar, node 4',
    frequency: { value: 60, text: '60' },
    sums: [sum('s1', ['I1', 'I2', 'I3'], { equals: 0 })],
  },
)

const star = sheetOf(
  [
    phasor('VA', '231.4', '0'),
    phasor('VB', '228.9', '-119.6'),
    phasor('VC', '233.0', '120.8'),
    { ...phasor('IA', '12.1', '-31', 'current'), label: 'IA' },
    { ...phasor('IB', '11.8', '-152', 'current'), label: 'IB' },
    { ...phasor('IC', '12.4', '90', 'current'), label: 'IC' },
  ],
  {
    title: 'Compressor 2, supply',
    revision: 'A',
    frequency: { value: 50, text: '50' },
    job: {
      number: 'C-0031',
      site: 'Cold store',
      testedBy: 'P. Nowak',
      approvedBy: 'E. Silva',
      date: '2026-06-19',
    },
    sums: [sum('s1', ['VA', 'VB', 'VC'], { arrangement: 'from-origin', label: 'V0' })],
  },
)

const quantities = sheetOf(
  [
    phasor('V1', '24', '15'),
    phasor('I1', '1.5', '75', 'current'),
    phasor('Z1', '16', '-50', 'impedance'),
    phasor('S1', '36', '140', 'power'),
    phasor('B1', '0.8', '-140', 'other'),
    phasor('V2', '0.9', '100'),
    phasor('V3', '0', '0'),
  ],
  { title: 'One of each quantity' },
)

const two = sheetOf(
  [
    phasor('V1', '62.0', '0'),
    phasor('V2', '58.5', '-118'),
    phasor('V3', '40.1', '64'),
    phasor('V4', '75.0', '31'),
    phasor('V5', '21.3', '-90'),
  ],
  {
    title: 'Line voltages from phase voltages',
    drawing: { orientation: 'portrait' },
    sums: [
      sum('s1', ['V1', '−V2'], { label: 'V12' }),
      sum('s2', ['V3', 'V4', '−V5'], { label: 'Secondary loop' }),
    ],
  },
)

const forty = sheetOf(
  Array.from({ length: 40 }, (_, index) =>
    phasor(
      `V${index + 1}`,
      (4 + ((index * 37) % 41)).toFixed(1),
      String(((index * 101) % 360) - 179),
    ),
  ),
  {
    title: 'Forty phasors',
    sums: [
      sum(
        's1',
        Array.from({ length: 40 }, (_, index) => `V${index + 1}`),
      ),
    ],
  },
)

const awkward = sheetOf(
  [
    { ...phasor('V1', '10.0', '10'), label: '<b>V</b>&"' },
    { ...phasor('V2', '9.0', '130'), label: 'מתח 2' },
    { ...phasor('V3', '8.0', '-110'), label: 'V_extraordinarily_long_subscript' },
    { ...phasor('V4', '8.5', '-30'), label: '電圧' },
  ],
  {
    title:
      'A title that is far too long for its cell and ends in three dots, whatever it says there',
    job: {
      site: 'الموقع',
      circuit: 'Distribution board of the east wing, way 112, second row from the left',
    },
  },
)

/** Every exhibit, by the name of its file. */
export const gallery: { readonly [name: string]: Exhibit } = {
  fan: { sheet: fan },
  'fan-dark': { sheet: fan, options: { theme: 'dark' } },
  feeder: { sheet: feeder },
  node: { sheet: node },
  star: { sheet: star },
  quantities: { sheet: quantities },
  two: { sheet: two },
  circuit: { sheet: circuit },
  forty: { sheet: forty },
  awkward: { sheet: { ...awkward, drawing: { paper: 'Letter' } } },
  empty: { sheet: sheetOf([], { title: '' }) },
}
