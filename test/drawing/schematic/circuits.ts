import fc from 'fast-check'
import type { CircuitElement, CircuitNode, Phasor, Sheet, Sum, Typed } from '../../../src/sheet'
import { sheetOf } from '../sheets'

/** A figure as typed, in a unit of its own. */
export function figure(value: number, text: string): Typed {
  return { value, text }
}

const kinds: readonly CircuitElement['kind'][] = ['resistor', 'coil', 'capacitor', 'impedance']

const names = fc.constantFrom(
  'R1',
  'Run capacitor',
  'Main winding of the upper fan motor, left',
  '',
)

const marked = fc.constantFrom<NonNullable<CircuitElement['marked']>>(
  {},
  { resistance: figure(47, '47') },
  { inductance: figure(0.15, '150 mH'), resistance: figure(8.2, '8.2') },
  { capacitance: figure(16e-6, '16 µF') },
  { resistance: figure(12, '12'), reactance: figure(-35.25, '-35.25') },
)

type Tree = { readonly leaf: number } | readonly Tree[]

const tree = fc.letrec<{ node: Tree }>((tie) => ({
  node: fc.oneof(
    { depthSize: 'medium', withCrossShrink: true },
    fc.nat(3).map((leaf): Tree => ({ leaf })),
    fc.array(tie('node'), { minLength: 1, maxLength: 4 }),
  ),
})).node

/** A sheet with a random circuit, nested to some depth, in which every part has phasors of its own. */
export const anyCircuit: fc.Arbitrary<Sheet> = fc
  .tuple(tree, fc.boolean(), fc.infiniteStream(names), fc.infiniteStream(marked), fc.boolean())
  .map(([shape, isSeries, labels, marks, hasTotals]) => {
    const phasors: Phasor[] = []
    const elements: CircuitElement[] = []
    const sums: Sum[] = []
    const add = (letter: 'V' | 'I'): string => {
      const id = `${letter}${phasors.length}`
      phasors.push({ id, label: id, quantity: letter === 'V' ? 'voltage' : 'current' })
      return id
    }
    const build = (part: Tree, series: boolean): { node: CircuitNode; v: string; i: string } => {
      if ('leaf' in part) {
        const id = `e${elements.length}`
        const [v, i] = [add('V'), add('I')]
        const label = labels.next().value
        const kind = kinds[part.leaf] ?? 'resistor'
        elements.push({ id, kind, label, voltage: v, current: i, marked: marks.next().value })
        return { node: { element: id }, v, i }
      }
      const parts = part.map((each) => build(each, !series))
      const [v, i] = [add('V'), add('I')]
      const terms = parts.map((each) => ({ phasor: series ? each.v : each.i }))
      if (hasTotals) sums.push({ id: `s${sums.length}`, terms, equals: series ? v : i })
      const nodes = parts.map(({ node }) => node)
      return { node: series ? { series: nodes } : { parallel: nodes }, v, i }
    }
    const { node } = build(shape, isSeries)
    return sheetOf(phasors, { frequency: figure(50, '50'), elements, sums, circuit: node })
  })

/** An invented circuit: a motor's main winding in series with a ballast, its run capacitor across it. */
export const ballasted: Sheet = sheetOf(
  [
    { id: 'VS', label: 'VS', quantity: 'voltage' },
    { id: 'I', label: 'I', quantity: 'current' },
    { id: 'VR', label: 'VR', quantity: 'voltage' },
    { id: 'Vm', label: 'Vmotor', quantity: 'voltage' },
    { id: 'Im', label: 'Imain', quantity: 'current' },
    { id: 'IC', label: 'IC', quantity: 'current' },
  ],
  {
    title: 'Extract fan 2',
    frequency: figure(50, '50'),
    supply: 'VS',
    sums: [
      { id: 's1', terms: [{ phasor: 'VR' }, { phasor: 'Vm' }], equals: 'VS' },
      { id: 's2', terms: [{ phasor: 'Im' }, { phasor: 'IC' }], equals: 'I' },
    ],
    elements: [
      {
        id: 'R1',
        kind: 'resistor',
        label: 'Ballast',
        voltage: 'VR',
        current: 'I',
        marked: { resistance: figure(47, '47') },
      },
      {
        id: 'L1',
        kind: 'coil',
        label: 'Main winding',
        voltage: 'Vm',
        current: 'Im',
        marked: { inductance: figure(0.15, '150 mH'), resistance: figure(8.2, '8.2') },
      },
      {
        id: 'C1',
        kind: 'capacitor',
        label: 'Run capacitor',
        voltage: 'Vm',
        current: 'IC',
        marked: { capacitance: figure(16e-6, '16 µF') },
      },
    ],
    circuit: { series: [{ element: 'R1' }, { parallel: [{ element: 'L1' }, { element: 'C1' }] }] },
  },
)
