import { describe, expect, test } from 'vitest'
import {
  type CircuitPath,
  describeEdit,
  type Edit,
  emptySheet,
  type Form,
  partedFrom,
  type Sheet,
} from '../../../src/sheet'
import { applied, refused } from '../laws'
import { phasorOf } from '../sheets'

type Added = Extract<Edit, { readonly kind: 'add-element' }>

function add(
  kind: Added['element']['kind'],
  at: CircuitPath = [],
  form: Form = 'series',
  more: Partial<Added> & { readonly label?: string } = {},
): Added {
  const { label, ...rest } = more
  const element = { kind, ...(label === undefined ? {} : { label }) }
  return { kind: 'add-element', element, at, form, ...rest }
}

function built(form: Form, ...edits: readonly Edit[]): Sheet {
  return edits.reduce(applied, applied(emptySheet(), { kind: 'start-circuit', form }))
}

const labels = (sheet: Sheet) => sheet.phasors.map(({ label }) => label)
const sums = (sheet: Sheet) =>
  (sheet.sums ?? []).map(
    ({ terms, equals }) => `${equals} = ${terms.map((t) => t.phasor).join(' + ')}`,
  )
const sides = (sheet: Sheet) =>
  (sheet.elements ?? []).map(({ id, voltage, current }) => `${id}: ${voltage}, ${current}`)

const reading = (of: string): Edit => ({
  kind: 'add-reading',
  reading: { id: `r${of}`, of, kind: 'magnitude', shown: '1.23' },
})

describe('a circuit is started', () => {
  test('with a supply of its own on an empty sheet', () => {
    const sheet = built('series')
    expect(sheet.supply).toBe('VS')
    expect(sheet.circuit).toEqual({ series: [] })
    expect(labels(sheet)).toEqual(['VS'])
  })

  test('on the supply that the sheet names, current or voltage', () => {
    const before = built('series', reading('VS'))
    const bare = applied(before, { kind: 'remove-circuit' })
    const sheet = applied(bare, { kind: 'start-circuit', form: 'parallel' })
    expect(labels(sheet)).toEqual(['VS'])
    expect(sheet.readings).toHaveLength(1)
  })

  test('once', () => {
    expect(refused(built('series'), { kind: 'start-circuit', form: 'parallel' })).toContain(
      'already',
    )
    expect(refused(emptySheet(), add('resistor'))).toContain('start one')
  })
})

describe('an element is added', () => {
  test('in series, with the common current, a voltage of its own and a term of the sum', () => {
    const sheet = built('series', add('resistor'), add('coil'), add('capacitor'))
    expect(labels(sheet)).toEqual(['VS', 'I', 'VR', 'Vcoil', 'VC'])
    expect(sums(sheet)).toEqual(['VS = VR + Vcoil + VC'])
    expect(sides(sheet)).toEqual(['R: VR, I', 'coil: Vcoil, I', 'C: VC, I'])
    expect(partedFrom(sheet)).toEqual([])
  })

  test('in parallel, with the common voltage and a current of its own', () => {
    const sheet = built('parallel', add('resistor', [], 'parallel'), add('coil', [], 'parallel'))
    expect(labels(sheet)).toEqual(['VS', 'IR', 'IS', 'Icoil'])
    expect(sums(sheet)).toEqual(['IS = IR + Icoil'])
    expect(sides(sheet)).toEqual(['R: VS, IR', 'coil: VS, Icoil'])
  })

  test('beside one in a group of the other form: the two become a group in its place', () => {
    const sheet = built('series', add('resistor'), add('coil'), add('capacitor', [1], 'parallel'))
    expect(sheet.circuit).toEqual({
      series: [{ element: 'R' }, { parallel: [{ element: 'coil' }, { element: 'C' }] }],
    })
    expect(sums(sheet)).toEqual(['VS = VR + Vcoil', 'I = Icoil + IC'])
    expect(sides(sheet)).toEqual(['R: VR, I', 'coil: Vcoil, Icoil', 'C: Vcoil, IC'])
    expect(partedFrom(sheet)).toEqual([])
  })

  test('to any depth', () => {
    let sheet = built('series', add('resistor'), add('resistor'))
    let at: CircuitPath = [1]
    for (let level = 0; level < 8; level += 1) {
      sheet = applied(sheet, add('resistor', at, level % 2 === 0 ? 'parallel' : 'series'))
      at = [...at, 1]
    }
    expect(sheet.elements).toHaveLength(10)
    expect(partedFrom(sheet)).toEqual([])
  })

  test('to the whole in the other form: the supply stays what it was', () => {
    const series = built('series', add('resistor'), add('coil'), add('capacitor', [], 'parallel'))
    expect(sums(series)).toEqual(['VS = VR + Vcoil', 'IS = I + IC'])
    expect(series.supply).toBe('VS')
    const parallel = built(
      'parallel',
      add('resistor', [], 'parallel'),
      add('coil', [], 'parallel'),
      add('capacitor', [], 'series'),
    )
    expect(sides(parallel)).toEqual(['R: VR, IR', 'coil: VR, Icoil', 'C: VC, IS'])
    expect(sums(parallel)).toEqual(['IS = IR + Icoil', 'VS = VR + VC'])
    expect(partedFrom(series)).toEqual([])
    expect(partedFrom(parallel)).toEqual([])
  })

  test('behind the branch that it is put beside, with its term there too', () => {
    const sheet = built('series', add('resistor'), add('coil'), add('capacitor', [0]))
    expect(sheet.circuit).toEqual({
      series: [{ element: 'R' }, { element: 'C' }, { element: 'coil' }],
    })
    expect(sums(sheet)).toEqual(['VS = VR + VC + Vcoil'])
  })

  test('with its label, and names that count on', () => {
    const sheet = built(
      'series',
      add('capacitor', [], 'series', { label: 'run capacitor' }),
      add('capacitor', [], 'series', { label: 'C' }),
      add('coil', [], 'series', { label: 'choke' }),
    )
    expect(sheet.elements?.map(({ id, label }) => [id, label])).toEqual([
      ['C', 'run capacitor'],
      ['C2', 'C'],
      ['choke', 'choke'],
    ])
    expect(labels(sheet)).toEqual(['VS', 'I', 'VC', 'VC2', 'Vchoke'])
  })

  test('on a phasor that was there and read, by its name or as it is said', () => {
    const measured: Sheet = {
      ...emptySheet(),
      phasors: [
        { id: 'a', label: 'VR', quantity: 'voltage', magnitude: { value: 12, text: '12.0' } },
        { id: 'b', label: 'Vx', quantity: 'voltage' },
      ],
      readings: [{ id: 'r1', of: 'b', kind: 'magnitude', shown: '3' }],
    }
    const started = applied(measured, { kind: 'start-circuit', form: 'series' })
    const sheet = [add('resistor'), add('coil', [], 'series', { own: 'b' })].reduce(
      applied,
      started,
    )
    expect(sides(sheet)).toEqual(['R: a, I', 'coil: b, I'])
    expect(phasorOf(sheet, 'a')).toEqual(measured.phasors[0])
    expect(sheet.readings).toEqual(measured.readings)
  })

  test('to a sum that a user made of the same voltages', () => {
    const started = built('series')
    const withSum = [
      { kind: 'add-phasor', phasor: { id: 'VR', label: 'VR', quantity: 'voltage' } },
      { kind: 'add-phasor', phasor: { id: 'VC', label: 'VC', quantity: 'voltage' } },
      {
        kind: 'add-sum',
        sum: { id: 'mine', terms: [{ phasor: 'VR' }, { phasor: 'VC' }], equals: 'VS' },
      },
    ] satisfies readonly Edit[]
    const sheet = [...withSum, add('resistor'), add('capacitor')].reduce(applied, started)
    expect(sums(sheet)).toEqual(['VS = VR + VC'])
  })

  test('nowhere but in the circuit', () => {
    expect(refused(built('series', add('resistor')), add('coil', [3, 1]))).toContain('nothing')
  })
})

describe('branches are grouped', () => {
  test('in parallel: one voltage for all, a current for each, and what was read stays', () => {
    const series = built(
      'series',
      add('resistor'),
      add('coil'),
      add('capacitor'),
      reading('Vcoil'),
      reading('VC'),
    )
    const sheet = applied(series, { kind: 'group-branches', at: [], from: 1, count: 2 })
    expect(sheet.circuit).toEqual({
      series: [{ element: 'R' }, { parallel: [{ element: 'coil' }, { element: 'C' }] }],
    })
    expect(sides(sheet)).toEqual(['R: VR, I', 'coil: Vcoil, Icoil', 'C: Vcoil, IC'])
    expect(sums(sheet)).toEqual(['VS = VR + Vcoil', 'I = Icoil + IC'])
    expect(sheet.readings).toEqual(series.readings)
    expect(labels(sheet)).toContain('VC')
    expect(partedFrom(sheet)).toEqual([])
  })

  test('in series, and a phasor that stands for nothing any more goes', () => {
    const parallel = built(
      'parallel',
      add('resistor', [], 'parallel'),
      add('coil', [], 'parallel'),
      add('capacitor', [], 'parallel'),
    )
    const sheet = applied(parallel, { kind: 'group-branches', at: [], from: 0, count: 2 })
    expect(sides(sheet)).toEqual(['R: VR, IR', 'coil: Vcoil, IR', 'C: VS, IC'])
    expect(sums(sheet)).toEqual(['IS = IR + IC', 'VS = VR + Vcoil'])
    expect(labels(sheet)).not.toContain('Icoil')
  })

  test('two or more', () => {
    const sheet = built('series', add('resistor'), add('coil'))
    for (const [from, count] of [
      [0, 1],
      [1, 2],
      [-1, 2],
    ] as const) {
      expect(refused(sheet, { kind: 'group-branches', at: [], from, count })).toContain('two')
    }
  })
})

describe('an element is removed', () => {
  test('with its phasor and term, and the group of one that is left is that one', () => {
    const before = built('series', add('resistor'), add('coil'))
    const nested = applied(before, add('capacitor', [1], 'parallel'))
    expect(applied(nested, { kind: 'remove-element', id: 'C' })).toEqual(before)
  })

  test('but what was read of it stays', () => {
    const before = built('series', add('resistor'), add('coil'), reading('Vcoil'))
    const sheet = applied(before, { kind: 'remove-element', id: 'coil' })
    expect(labels(sheet)).toEqual(['VS', 'I', 'VR', 'Vcoil'])
    expect(sheet.readings).toEqual(before.readings)
    expect(sums(sheet)).toEqual(['VS = VR'])
  })

  test('and a current that was read keeps its place in a group of one', () => {
    const before = built('series', add('resistor'), add('coil'), add('capacitor', [1], 'parallel'))
    const read = applied(before, reading('Icoil'))
    const sheet = applied(read, { kind: 'remove-element', id: 'C' })
    expect(sheet.circuit).toEqual({
      series: [{ element: 'R' }, { parallel: [{ element: 'coil' }] }],
    })
    expect(sums(sheet)).toEqual(['VS = VR + Vcoil', 'I = Icoil'])
    expect(partedFrom(sheet)).toEqual([])
  })

  test('and the last one leaves the circuit that was started', () => {
    const sheet = applied(built('series', add('resistor')), { kind: 'remove-element', id: 'R' })
    expect(sheet).toEqual(built('series'))
  })

  test('with the groups that come out empty', () => {
    const inner = built('series', add('resistor'), add('coil'), add('capacitor', [1], 'parallel'))
    const sheet = ['C', 'coil'].reduce(
      (each, id) => applied(each, { kind: 'remove-element', id }),
      inner,
    )
    expect(sheet).toEqual(built('series', add('resistor')))
  })

  test('with the whole circuit, and what was typed or read stays', () => {
    const before = built('series', add('resistor'), add('coil'), reading('VR'), reading('VS'))
    const sheet = applied(before, { kind: 'remove-circuit' })
    expect(labels(sheet)).toEqual(['VS', 'VR'])
    expect(sheet.readings).toEqual(before.readings)
    expect([sheet.circuit, sheet.elements, sheet.sums]).toEqual([undefined, undefined, undefined])
  })
})

describe('an element’s values', () => {
  const sheet = built('series', add('coil'))
  const set = (
    value: 'resistance' | 'inductance' | 'dcResistance' | 'capacitance',
    figure: number | null,
    as?: 'marked' | 'counted',
  ): Edit => ({
    kind: 'set-element-value',
    id: 'coil',
    value,
    typed: figure === null ? null : { value: figure, limit: figure / 20 },
    ...(as === undefined ? {} : { as }),
  })

  test('stand on the nameplate, until they are said to count', () => {
    const marked = applied(sheet, set('inductance', 0.15))
    expect(marked.elements?.[0]?.marked).toEqual({ inductance: { value: 0.15, limit: 0.0075 } })
    const counted = applied(marked, { kind: 'count-element', id: 'coil', counts: true })
    expect(counted.elements?.[0]).toMatchObject({ inductance: { value: 0.15, limit: 0.0075 } })
    expect(counted.elements?.[0]?.marked).toBeUndefined()
    const both = applied(counted, set('resistance', 12))
    expect(both.elements?.[0]).toMatchObject({ resistance: { value: 12 } })
    const back = applied(both, { kind: 'count-element', id: 'coil', counts: false })
    expect(back.elements?.[0]?.marked).toMatchObject({
      inductance: { value: 0.15 },
      resistance: { value: 12 },
    })
    expect(applied(applied(back, set('resistance', null)), set('inductance', null))).toEqual(sheet)
  })

  test('are not moved over one another', () => {
    const both = [set('resistance', 12, 'marked'), set('resistance', 13, 'counted')].reduce(
      applied,
      sheet,
    )
    for (const counts of [true, false]) {
      expect(refused(both, { kind: 'count-element', id: 'coil', counts })).toContain('both')
    }
  })

  test('are those of its kind', () => {
    expect(refused(sheet, set('capacitance', 1e-6))).toContain('no capacitance')
    expect(refused(sheet, set('dcResistance', 12, 'marked'))).toContain('nameplate')
    expect(applied(sheet, set('dcResistance', 12)).elements?.[0]).toMatchObject({
      dcResistance: { value: 12 },
    })
  })

  test('may be off by a prefix: 150 H for 150 mH is a value like any other', () => {
    const typed = applied(sheet, set('inductance', 150))
    expect(typed.elements?.[0]?.marked?.inductance?.value).toBe(150)
  })

  test('are called by their names', () => {
    expect(describeEdit(sheet, set('dcResistance', 12))).toBe('Change the dc resistance of coil')
    expect(describeEdit(sheet, add('impedance'))).toBe('Add an impedance in series')
    expect(
      describeEdit(sheet, {
        kind: 'set-element',
        id: 'coil',
        change: { label: 'choke', rating: { current: 2 } },
      }),
    ).toBe('Rename coil to choke')
  })
})
