import { describe, test } from 'vitest'
import { coverageFactor } from '../../src/core/estimate'
import type { Reading } from '../../src/sheet'
import { expectPublished, nameOf, outputOf, published } from './cases'
import { currents, element, known, solved, sum, unknown, voltages } from './solve'

/** A reading of a voltage with a current, without any limit of error. */
function exactReading(
  kind: 'power' | 'reactive-power' | 'power-factor',
  of: string,
  current: string,
  shown: number,
): Reading {
  const common = { id: `${kind}${of}`.replace('-', ''), of, with: current, shown, limit: 0 }
  return kind === 'power-factor' ? { ...common, kind, sense: 'lags' } : { ...common, kind }
}

/** Re and Im of V · I*. */
function powerOf(
  voltage: { real: number; imaginary: number },
  current: { real: number; imaginary: number },
) {
  return {
    active: voltage.real * current.real + voltage.imaginary * current.imaginary,
    reactive: voltage.imaginary * current.real - voltage.real * current.imaginary,
  }
}

describe('published three-phase circuits, solved as sheets', () => {
  test(nameOf(published('T10')), () => {
    const from = published('T10')
    // The source states no voltage: any will do, since the two readings share the power alike.
    const phase = 400 / Math.sqrt(3)
    const { phasor } = solved({
      phasors: [
        known('VA', 'voltage', phase, 0),
        known('VB', 'voltage', phase, -120),
        known('VC', 'voltage', phase, 120),
        ...voltages('VAB', 'VCB'),
        ...currents('IA', 'IC'),
      ],
      readings: [
        exactReading('power', 'VA', 'IA', 4000),
        exactReading('power-factor', 'VA', 'IA', 0.6),
        exactReading('power', 'VC', 'IC', 4000),
        exactReading('power-factor', 'VC', 'IC', 0.6),
      ],
      sums: [sum('VAB', 'VA', '-VB'), sum('VCB', 'VC', '-VB')],
    })
    // Lagging: the wattmeter on C with the current of C reads the larger share.
    expectPublished(outputOf(from, 'W1'), powerOf(phasor('VCB'), phasor('IC')).active)
    expectPublished(outputOf(from, 'W2'), powerOf(phasor('VAB'), phasor('IA')).active)
  })

  test(nameOf(published('T25')), () => {
    const from = published('T25')
    const [first, second] = [1560, 2100]
    // One phase of the balanced delta: a third of the sum, and of √3 times the difference.
    const { evaluation, phasor } = solved({
      phasors: [known('V', 'voltage', 220, 0), ...currents('I')],
      readings: [
        exactReading('power', 'V', 'I', (first + second) / 3),
        exactReading('reactive-power', 'V', 'I', (second - first) / Math.sqrt(3)),
      ],
      elements: [element('impedance', 'V', 'I')],
    })
    const { active, reactive } = powerOf(phasor('V'), phasor('I'))
    expectPublished(outputOf(from, 'P'), 3 * active)
    expectPublished(outputOf(from, 'P phase'), active)
    expectPublished(outputOf(from, 'Q'), 3 * reactive)
    const { magnitude = Number.NaN, angle = Number.NaN } = evaluation.elements?.[0]?.impedance ?? {}
    expectPublished(outputOf(from, '|Z|'), magnitude)
    expectPublished(outputOf(from, 'angle'), angle)
    expectPublished(outputOf(from, 'pf'), Math.cos((angle * Math.PI) / 180))
  })

  test(nameOf(published('T13')), () => {
    const from = published('T13')
    const load = { resistance: 6, reactance: 8 }
    const { phasor } = solved({
      phasors: [
        known('VRY', 'voltage', 220, 0),
        known('VYB', 'voltage', 220, -120),
        known('VBR', 'voltage', 220, 120),
        ...currents('IRY', 'IYB', 'IBR', 'IR', 'IY', 'IB'),
      ],
      sums: [sum('IR', 'IRY', '-IBR'), sum('IY', 'IYB', '-IRY'), sum('IB', 'IBR', '-IYB')],
      elements: [
        element('impedance', 'VRY', 'IRY', load),
        element('impedance', 'VYB', 'IYB', load),
        element('impedance', 'VBR', 'IBR', load),
      ],
    })
    expectPublished(outputOf(from, 'I phase'), phasor('IRY').magnitude)
    expectPublished(outputOf(from, 'IRY angle'), phasor('IRY').angle)
    expectPublished(outputOf(from, 'I line'), phasor('IR').magnitude)
    expectPublished(outputOf(from, 'IR angle'), phasor('IR').angle)
    expectPublished(outputOf(from, 'IY angle'), phasor('IY').angle)
    expectPublished(outputOf(from, 'IB angle'), phasor('IB').angle)
    expectPublished(outputOf(from, 'P'), 3 * powerOf(phasor('VRY'), phasor('IRY')).active)
  })

  test(nameOf(published('T21')), () => {
    const from = published('T21')
    const phases = ['a', 'b', 'c'] as const
    const { phasor } = solved({
      phasors: [
        ...phases.map((phase, each) => known(`E${phase}`, 'voltage', 120, -120 * each)),
        ...voltages(...phases.flatMap((phase) => ['S', 'T', 'D', 'N'].map((of) => of + phase))),
        ...voltages('VAB'),
        ...currents(...phases.map((phase) => `I${phase}`)),
      ],
      // Source less what is lost in it is at the terminal; less what is lost in the line, at the load.
      sums: [
        ...phases.map((phase) => sum(`T${phase}`, `E${phase}`, `-S${phase}`)),
        ...phases.map((phase) => sum(`N${phase}`, `T${phase}`, `-D${phase}`)),
        sum('VAB', 'Na', '-Nb'),
      ],
      elements: phases.flatMap((phase) => [
        element('impedance', `S${phase}`, `I${phase}`, { resistance: 0.2, reactance: 0.5 }),
        element('impedance', `D${phase}`, `I${phase}`, { resistance: 0.8, reactance: 1.5 }),
        element('impedance', `N${phase}`, `I${phase}`, { resistance: 39, reactance: 28 }),
      ]),
    })
    expectPublished(outputOf(from, '|I|'), phasor('Ia').magnitude)
    expectPublished(outputOf(from, 'Ia angle'), phasor('Ia').angle)
    expectPublished(outputOf(from, 'Ib angle'), phasor('Ib').angle)
    expectPublished(outputOf(from, 'Ic angle'), phasor('Ic').angle)
    expectPublished(outputOf(from, '|VAN|'), phasor('Na').magnitude)
    expectPublished(outputOf(from, 'VAN angle'), phasor('Na').angle)
    expectPublished(outputOf(from, '|VAB|'), phasor('VAB').magnitude)
    expectPublished(outputOf(from, 'VAB angle'), phasor('VAB').angle)
    expectPublished(outputOf(from, '|Van|'), phasor('Ta').magnitude)
    expectPublished(outputOf(from, 'Van angle'), phasor('Ta').angle)
  })

  test(nameOf(published('T24')), () => {
    const from = published('T24')
    // One phase; the delta as its equivalent star, a third of 60 − j45 Ω.
    const { phasor } = solved({
      phasors: [
        known('E', 'voltage', 120, 0),
        ...voltages('VL', 'V2'),
        ...currents('I', 'I1', 'I2'),
      ],
      sums: [sum('E', 'VL', 'V2'), sum('I', 'I1', 'I2')],
      elements: [
        element('impedance', 'VL', 'I', { resistance: 2, reactance: 4 }),
        element('impedance', 'V2', 'I1', { resistance: 30, reactance: 40 }),
        element('impedance', 'V2', 'I2', { resistance: 20, reactance: -15 }),
      ],
    })
    expectPublished(outputOf(from, '|I|'), phasor('I').magnitude)
    expectPublished(outputOf(from, 'P total'), 3 * powerOf(phasor('E'), phasor('I')).active)
    expectPublished(outputOf(from, 'Re V2'), phasor('V2').real)
    expectPublished(outputOf(from, 'Im V2'), phasor('V2').imaginary)
    expectPublished(outputOf(from, '|V2|'), phasor('V2').magnitude)
    expectPublished(outputOf(from, 'V2 angle'), phasor('V2').angle)
    expectPublished(outputOf(from, '|I1|'), phasor('I1').magnitude)
    expectPublished(outputOf(from, 'I1 angle'), phasor('I1').angle)
    expectPublished(outputOf(from, '|I2|'), phasor('I2').magnitude)
    expectPublished(outputOf(from, 'I2 angle'), phasor('I2').angle)
    const [line, star, delta] = (
      [
        ['VL', 'I'],
        ['V2', 'I1'],
        ['V2', 'I2'],
      ] as const
    ).map(([voltage, current]) => powerOf(phasor(voltage), phasor(current)))
    expectPublished(outputOf(from, 'P1'), 3 * (star?.active ?? Number.NaN))
    expectPublished(outputOf(from, 'Q1'), 3 * (star?.reactive ?? Number.NaN))
    expectPublished(outputOf(from, 'P2'), 3 * (delta?.active ?? Number.NaN))
    expectPublished(outputOf(from, 'Q2'), 3 * (delta?.reactive ?? Number.NaN))
    expectPublished(outputOf(from, 'P line'), 3 * (line?.active ?? Number.NaN))
    expectPublished(outputOf(from, 'Q line'), 3 * (line?.reactive ?? Number.NaN))
  })
})

describe('published element values, solved as a sheet', () => {
  test(nameOf(published('Z07')), () => {
    const from = published('Z07')
    const { evaluation } = solved({
      frequency: { value: 50 },
      reference: 'I',
      phasors: [
        known('I', 'current', 1, 0),
        known('Va', 'voltage', Math.hypot(12, 5), (Math.atan2(5, 12) * 180) / Math.PI),
        known('Vb', 'voltage', 40, -90),
        known('Vc', 'voltage', 30, 60),
        known('Vd', 'voltage', 2.2e6, -30),
        ...voltages('VRd', 'VCd'),
      ],
      sums: [sum('Vd', 'VRd', 'VCd')],
      elements: [
        element('coil', 'Va', 'I'),
        element('capacitor', 'Vb', 'I'),
        element('coil', 'Vc', 'I'),
        element('resistor', 'VRd', 'I'),
        element('capacitor', 'VCd', 'I'),
      ],
    })
    const found = (at: number) => evaluation.elements?.[at]?.found
    expectPublished(outputOf(from, 'L (a)'), 1e3 * (found(0)?.inductance?.value ?? Number.NaN))
    expectPublished(outputOf(from, 'C (b)'), 1e6 * (found(1)?.capacitance?.value ?? Number.NaN))
    expectPublished(outputOf(from, 'R (c)'), found(2)?.resistance?.value ?? Number.NaN)
    expectPublished(outputOf(from, 'L (c)'), 1e3 * (found(2)?.inductance?.value ?? Number.NaN))
    expectPublished(outputOf(from, 'R (d)'), 1e-3 * (found(3)?.resistance?.value ?? Number.NaN))
    expectPublished(outputOf(from, 'C (d)'), 1e9 * (found(4)?.capacitance?.value ?? Number.NaN))
  })
})

describe('published uncertainties, through a whole sheet', () => {
  test(nameOf(published('G04')), () => {
    const from = published('G04')
    const value = 0.928571
    const scatter = 12e-6
    // 14 parts in a million of the reading and 2 of the range, together as one half-width.
    const halfWidth = 14e-6 * value + 2e-6
    const { evaluation } = solved({
      phasors: [unknown('V', 'voltage')],
      readings: [
        {
          id: 'r1',
          of: 'V',
          kind: 'magnitude',
          shown: value,
          limit: halfWidth,
          // Two repeats this far off their mean have s = √2 times as much, and their mean s / √2.
          repeats: [value - scatter, value + scatter],
        },
      ],
    })
    const factor = coverageFactor([
      { uncertainty: halfWidth / Math.sqrt(3), shape: 'rectangular' },
      { uncertainty: scatter, shape: 'normal', freedom: 1 },
    ])
    const expanded = evaluation.phasors[0]?.magnitudeLimit ?? Number.NaN
    expectPublished(outputOf(from, 'uc'), 1e6 * (expanded / factor))
  })
})
