import { describe, expect, test } from 'vitest'
import type { Phasor } from '../../src/sheet'
import { expectPublished, nameOf, outputOf, published } from './cases'
import { currents, element, known, solved, sum, unknown, voltages } from './solve'

describe('published circuits, solved from the supply and the elements', () => {
  test(nameOf(published('S13')), () => {
    const from = published('S13')
    const { phasor, evaluation } = solved({
      frequency: { value: 60 },
      phasors: [known('V', 'voltage', 10, 0), ...voltages('ER', 'EL'), ...currents('I')],
      sums: [sum('V', 'ER', 'EL')],
      elements: [
        element('resistor', 'ER', 'I', { resistance: 5 }),
        element('coil', 'EL', 'I', { resistance: 0, inductance: 0.01 }),
      ],
    })
    expectPublished(outputOf(from, '|I|'), phasor('I').magnitude)
    expectPublished(outputOf(from, 'I angle'), phasor('I').angle)
    expectPublished(outputOf(from, 'Re I'), phasor('I').real)
    expectPublished(outputOf(from, 'Im I'), phasor('I').imaginary)
    expectPublished(outputOf(from, '|ER|'), phasor('ER').magnitude)
    expectPublished(outputOf(from, '|EL|'), phasor('EL').magnitude)
    expectPublished(outputOf(from, 'EL angle'), phasor('EL').angle)
    expectPublished(outputOf(from, 'Re ER'), phasor('ER').real)
    expectPublished(outputOf(from, 'Im EL'), phasor('EL').imaginary)
    expect(evaluation.agreement?.verdict).toBe('nothing-to-check')
  })

  test(nameOf(published('P01')), () => {
    const from = published('P01')
    const { phasor } = solved({
      frequency: { value: 60 },
      phasors: [known('V', 'voltage', 10, 0), ...currents('IR', 'IL', 'I')],
      sums: [sum('I', 'IR', 'IL')],
      elements: [
        element('resistor', 'V', 'IR', { resistance: 5 }),
        element('coil', 'V', 'IL', { resistance: 0, inductance: 0.01 }),
      ],
    })
    expectPublished(outputOf(from, 'IR'), phasor('IR').magnitude)
    expectPublished(outputOf(from, '|IL|'), phasor('IL').magnitude)
    expectPublished(outputOf(from, '|I|'), phasor('I').magnitude)
    expectPublished(outputOf(from, 'I angle'), phasor('I').angle)
  })

  test(nameOf(published('P02')), () => {
    const from = published('P02')
    const { phasor } = solved({
      frequency: { value: 60 },
      phasors: [known('V', 'voltage', 10, 0), ...currents('IR', 'IC', 'I')],
      sums: [sum('I', 'IR', 'IC')],
      elements: [
        element('resistor', 'V', 'IR', { resistance: 5 }),
        element('capacitor', 'V', 'IC', { capacitance: 100e-6 }),
      ],
    })
    expectPublished(outputOf(from, '|IC|'), 1000 * phasor('IC').magnitude)
    expectPublished(outputOf(from, '|I|'), phasor('I').magnitude)
    expectPublished(outputOf(from, 'I angle'), phasor('I').angle)
  })

  test(nameOf(published('P04')), () => {
    const from = published('P04')
    const { phasor } = solved({
      frequency: { value: 60 },
      phasors: [
        known('V', 'voltage', 120, 0),
        ...voltages('EC1', 'ER', 'EL', 'EC2'),
        ...currents('I', 'IR', 'ILC'),
      ],
      sums: [sum('V', 'EC1', 'ER'), sum('ER', 'EL', 'EC2'), sum('I', 'IR', 'ILC')],
      elements: [
        element('capacitor', 'EC1', 'I', { capacitance: 4.7e-6 }),
        element('resistor', 'ER', 'IR', { resistance: 470 }),
        element('coil', 'EL', 'ILC', { resistance: 0, inductance: 0.65 }),
        element('capacitor', 'EC2', 'ILC', { capacitance: 1.5e-6 }),
      ],
    })
    expectPublished(outputOf(from, '|I|'), 1000 * phasor('I').magnitude)
    expectPublished(outputOf(from, 'I angle'), phasor('I').angle)
    expectPublished(outputOf(from, '|EC1|'), phasor('EC1').magnitude)
    expectPublished(outputOf(from, 'EC1 angle'), phasor('EC1').angle)
    expectPublished(outputOf(from, '|ER|'), phasor('ER').magnitude)
    expectPublished(outputOf(from, 'ER angle'), phasor('ER').angle)
    expectPublished(outputOf(from, '|IR|'), 1000 * phasor('IR').magnitude)
    expectPublished(outputOf(from, '|ILC|'), 1000 * phasor('ILC').magnitude)
    expectPublished(outputOf(from, 'ILC angle'), phasor('ILC').angle)
    expectPublished(outputOf(from, '|EL|'), phasor('EL').magnitude)
    expectPublished(outputOf(from, 'EL angle'), phasor('EL').angle)
    expectPublished(outputOf(from, '|EC2|'), phasor('EC2').magnitude)
    expectPublished(outputOf(from, 'EC2 angle'), phasor('EC2').angle)
  })

  test(nameOf(published('P08')), () => {
    const from = published('P08')
    const { phasor } = solved({
      phasors: [known('V', 'voltage', 40, 0), ...currents('I1', 'I2', 'I3', 'I')],
      sums: [sum('I', 'I1', 'I2', 'I3')],
      elements: [
        element('impedance', 'V', 'I1', { resistance: 5, reactance: 12 }),
        element('impedance', 'V', 'I2', { resistance: 3, reactance: -4 }),
        element('resistor', 'V', 'I3', { resistance: 8 }),
      ],
    })
    expectPublished(outputOf(from, 'Re I'), phasor('I').real)
    expectPublished(outputOf(from, 'Im I'), phasor('I').imaginary)
    expectPublished(outputOf(from, 'angle'), phasor('I').angle)
  })

  test(nameOf(published('P09')), () => {
    const from = published('P09')
    const { phasor } = solved({
      phasors: [
        known('V', 'voltage', 50, 0),
        ...voltages('V5', 'Vp'),
        ...currents('I', 'I1', 'I2'),
      ],
      sums: [sum('V', 'V5', 'Vp'), sum('I', 'I1', 'I2')],
      elements: [
        element('resistor', 'V5', 'I', { resistance: 5 }),
        element('resistor', 'Vp', 'I1', { resistance: 8 }),
        element('impedance', 'Vp', 'I2', { resistance: 0, reactance: 6 }),
      ],
    })
    for (const id of ['I', 'I1', 'I2']) {
      expectPublished(outputOf(from, `|${id}|`), phasor(id).magnitude)
      expectPublished(outputOf(from, `${id} angle`), phasor(id).angle)
    }
  })

  test(nameOf(published('P11')), () => {
    const from = published('P11')
    const { phasor } = solved({
      frequency: { value: 50 },
      phasors: [known('V', 'voltage', 250, 0), ...currents('Icoil', 'IC', 'I')],
      sums: [sum('I', 'Icoil', 'IC')],
      elements: [
        element('coil', 'V', 'Icoil', { resistance: 18, inductance: 79.58e-3 }),
        element('capacitor', 'V', 'IC', { capacitance: 64.96e-6 }),
      ],
    })
    expectPublished(outputOf(from, '|I|'), phasor('I').magnitude)
    expectPublished(outputOf(from, 'I angle'), phasor('I').angle)
    expectPublished(outputOf(from, '|Icoil|'), phasor('Icoil').magnitude)
    expectPublished(outputOf(from, 'Icoil angle'), phasor('Icoil').angle)
    expectPublished(outputOf(from, '|IC|'), phasor('IC').magnitude)
  })

  test(nameOf(published('P14')), () => {
    const from = published('P14')
    // i = 8 cos 200000 t: its peak value is what the source gives for every phasor.
    const { phasor } = solved({
      frequency: { value: 200_000 / (2 * Math.PI) },
      phasors: [known('I', 'current', 8, 0), ...voltages('V'), ...currents('I1', 'I2', 'I3')],
      sums: [sum('I', 'I1', 'I2', 'I3')],
      elements: [
        element('resistor', 'V', 'I1', { resistance: 10 }),
        element('coil', 'V', 'I2', { resistance: 6, inductance: 40e-6 }),
        element('capacitor', 'V', 'I3', { capacitance: 1e-6 }),
      ],
    })
    for (const id of ['V', 'I1', 'I2', 'I3']) {
      expectPublished(outputOf(from, `|${id}|`), phasor(id).magnitude)
      expectPublished(outputOf(from, `${id} angle`), phasor(id).angle)
    }
  })
})

describe('published three-phase circuits, solved', () => {
  const phases = ['a', 'b', 'c'] as const

  test(nameOf(published('T20')), () => {
    const from = published('T20')
    const loads = { a: [0, 5], b: [10, 0], c: [0, -10] } as const
    const { phasor } = solved({
      phasors: [
        known('Va', 'voltage', 120, 0),
        known('Vb', 'voltage', 120, -120),
        known('Vc', 'voltage', 120, 120),
        ...voltages('Ua', 'Ub', 'Uc', 'VN'),
        ...currents('Ia', 'Ib', 'Ic'),
      ],
      sums: [...phases.map((p) => sum(`V${p}`, `U${p}`, 'VN')), sum(0, 'Ia', 'Ib', 'Ic')],
      elements: phases.map((p) =>
        element('impedance', `U${p}`, `I${p}`, {
          resistance: loads[p][0],
          reactance: loads[p][1],
        }),
      ),
    })
    for (const id of ['Ia', 'Ib', 'Ic']) {
      expectPublished(outputOf(from, `|${id}|`), phasor(id).magnitude)
      expectPublished(outputOf(from, `${id} angle`), phasor(id).angle)
    }
    expectPublished(outputOf(from, 'PB'), 10 * phasor('Ib').magnitude ** 2)
    expectPublished(outputOf(from, 'QA'), 5 * phasor('Ia').magnitude ** 2)
  })

  test(nameOf(published('T19')), () => {
    const from = published('T19')
    const { phasor } = solved({
      phasors: [
        known('VRY', 'voltage', 3300, 0),
        known('VYB', 'voltage', 3300, -120),
        ...voltages('VR', 'VY', 'VB'),
        ...currents('IR', 'IY', 'IB'),
      ],
      sums: [sum('VRY', 'VR', '-VY'), sum('VYB', 'VY', '-VB'), sum(0, 'IR', 'IY', 'IB')],
      elements: [
        element('impedance', 'VR', 'IR', { resistance: 5, reactance: -10 }),
        element('impedance', 'VY', 'IY', { resistance: 6, reactance: 5 }),
        element('impedance', 'VB', 'IB', { resistance: 3, reactance: 15 }),
      ],
    })
    expectPublished(outputOf(from, '|IR|'), phasor('IR').magnitude)
    expectPublished(outputOf(from, 'IR angle'), phasor('IR').angle)
  })

  test(nameOf(published('T06')), () => {
    const from = published('T06')
    const { phasor } = solved({
      frequency: { value: 50 },
      phasors: [
        known('VRY', 'voltage', 415, 0),
        known('VYB', 'voltage', 415, -120),
        known('VBR', 'voltage', 415, 120),
        ...currents('IRY', 'IYB', 'IBR', 'IR', 'IY', 'IB'),
      ],
      sums: [sum('IR', 'IRY', '-IBR'), sum('IY', 'IYB', '-IRY'), sum('IB', 'IBR', '-IYB')],
      elements: [
        element('resistor', 'VRY', 'IRY', { resistance: 100 }),
        element('coil', 'VYB', 'IYB', { resistance: 20, inductance: 0.191 }),
        element('capacitor', 'VBR', 'IBR', { capacitance: 30e-6 }),
      ],
    })
    expectPublished(outputOf(from, 'I RY'), phasor('IRY').magnitude)
    expectPublished(outputOf(from, 'I YB'), phasor('IYB').magnitude)
    expectPublished(outputOf(from, 'I BR'), phasor('IBR').magnitude)
    for (const id of ['IR', 'IY', 'IB']) {
      expectPublished(outputOf(from, id), phasor(id).magnitude)
    }
  })

  test(nameOf(published('T23')), () => {
    const from = published('T23')
    const { phasor } = solved({
      phasors: [
        known('Va', 'voltage', 100, 0),
        known('Vb', 'voltage', 100, 120),
        known('Vc', 'voltage', 100, -120),
        ...currents('Ia', 'Ib', 'Ic', 'In'),
      ],
      threePhase: [{ id: 'load', phasors: ['Ia', 'Ib', 'Ic'], neutral: 'In', wires: 4 }],
      elements: [
        element('resistor', 'Va', 'Ia', { resistance: 15 }),
        element('impedance', 'Vb', 'Ib', { resistance: 10, reactance: 5 }),
        element('impedance', 'Vc', 'Ic', { resistance: 6, reactance: -8 }),
      ],
    })
    for (const id of ['Ia', 'Ib', 'Ic', 'In']) {
      expectPublished(outputOf(from, `|${id}|`), phasor(id).magnitude)
    }
    expectPublished(outputOf(from, 'Ib angle'), phasor('Ib').angle)
    expectPublished(outputOf(from, 'Ic angle'), phasor('Ic').angle)
    // The source's neutral current is positive from source to load.
    expectPublished(outputOf(from, 'In angle'), phasor('In').angle - 180)
  })
})

describe('published unknowns, solved from readings', () => {
  test(nameOf(published('U06')), () => {
    const from = published('U06')
    const { element: found, phasor } = solved({
      frequency: { value: 50 },
      phasors: [...voltages('V'), ...currents('I')],
      readings: [
        { id: 'r1', of: 'V', kind: 'magnitude', shown: '120' },
        { id: 'r2', of: 'I', kind: 'magnitude', shown: '8' },
        { id: 'r3', of: 'V', kind: 'power', with: 'I', shown: '400' },
      ],
      elements: [element('impedance', 'V', 'I')],
    })
    expectPublished(outputOf(from, 'R'), found(0)?.found?.resistance?.value ?? 0)
    expectPublished(outputOf(from, 'X'), found(0)?.found?.reactance?.value ?? 0)
    expectPublished(outputOf(from, '|Z|'), found(0)?.impedance?.magnitude ?? 0)
    expectPublished(outputOf(from, '|angle|'), -phasor('I').angle)
  })

  test(nameOf(published('W03')), () => {
    const from = published('W03')
    const { evaluation } = solved({
      frequency: { value: 60 },
      phasors: [...voltages('V'), ...currents('I')],
      readings: [
        { id: 'r1', of: 'V', kind: 'magnitude', shown: '240' },
        { id: 'r2', of: 'I', kind: 'magnitude', shown: '9.615' },
        { id: 'r3', of: 'V', kind: 'power', with: 'I', shown: '1.5 kW' },
      ],
      elements: [element('impedance', 'V', 'I')],
    })
    const { real = 0, imaginary = 0, magnitude = 0 } = evaluation.elements?.[0]?.impedance ?? {}
    expectPublished(outputOf(from, 'pf'), real / magnitude)
    expectPublished(outputOf(from, 'Q'), (imaginary * 9.615 ** 2) / 1000)
    // X of the source stands in parallel: V² / Q.
    expectPublished(outputOf(from, 'X'), magnitude ** 2 / imaginary)
  })

  test(nameOf(published('U13')), () => {
    const from = published('U13')
    const { phasor } = solved({
      phasors: voltages('Vab', 'Vbc', 'Vca'),
      readings: [
        { id: 'r1', of: 'Vab', kind: 'magnitude', shown: '100' },
        { id: 'r2', of: 'Vbc', kind: 'magnitude', shown: '150' },
        { id: 'r3', of: 'Vca', kind: 'magnitude', shown: '200' },
      ],
      sums: [sum(0, 'Vab', 'Vbc', 'Vca')],
      chosen: [{ phasor: 'Vbc', magnitude: 150, angle: -120 }],
    })
    const turned = (id: string, degrees: number) => {
      const { magnitude, angle } = phasor(id)
      const radians = ((angle + degrees) * Math.PI) / 180
      return [magnitude * Math.cos(radians), magnitude * Math.sin(radians)] as const
    }
    const part = (turn: number) => {
      const terms = [turned('Vab', 0), turned('Vbc', turn), turned('Vca', -turn)]
      const [re, im] = [0, 1].map((k) => terms.reduce((all, term) => all + (term[k] ?? 0), 0) / 3)
      return Math.hypot(re ?? 0, im ?? 0)
    }
    expectPublished(outputOf(from, '|V1| line'), part(120))
    expectPublished(outputOf(from, '|V2| line'), part(-120))
  })
})

describe('published currents at a node', () => {
  test(nameOf(published('K01')), () => {
    const from = published('K01')
    const half = 0.005
    const rounded = (id: string, magnitude: number, angle: number): Phasor => ({
      ...unknown(id, 'current'),
      magnitude: { value: magnitude, limit: half },
      angle: { value: angle, limit: half },
    })
    const { evaluation } = solved({
      reference: 'V',
      phasors: [
        known('V', 'voltage', 1, 0),
        rounded('IA', 558.4, -28.58),
        rounded('A633', 81.33, -37.74),
        rounded('A671', 478.29, -27.03),
        rounded('IB', 414.87, -140.91),
        rounded('B633', 61.12, -159.09),
        rounded('B645', 143.02, -142.66),
        rounded('B671', 215.12, -134.66),
        rounded('IC', 586.6, 93.59),
        rounded('C633', 62.7, 80.48),
        rounded('C645', 65.21, 57.83),
        rounded('C671', 475.5, 99.9),
      ],
      sums: [
        sum('IA', 'A633', 'A671'),
        sum('IB', 'B633', 'B645', 'B671'),
        sum('IC', 'C633', 'C645', 'C671'),
      ],
    })
    expect(evaluation.sums.map(({ closes }) => closes)).toEqual([true, true, true])
    expect(evaluation.agreement?.verdict).toBe('agree')
    expect(evaluation.agreement?.degreesOfFreedom).toBe(6)
    const resultants = evaluation.sums.map(({ resultant }) => resultant?.magnitude ?? 0)
    ;['|IA|', '|IB|', '|IC|'].forEach((name, k) => {
      expectPublished(outputOf(from, name), resultants[k] ?? 0)
    })
  })
})
