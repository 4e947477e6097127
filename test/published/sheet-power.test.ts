import { describe, test } from 'vitest'
import { angleOf, degreesFromRadians, fromPolar, magnitudeOf, subtract } from '../../src/core'
import { studentTwoSidedPoint } from '../../src/core/estimate'
import type { CircuitElement, Phasor, Reading } from '../../src/sheet'
import { expectPublished, nameOf, outputOf, published } from './cases'
import {
  answerTo,
  capacitor,
  coil,
  exactly,
  exactReading,
  known,
  predictedFrom,
  sum,
  unknown,
} from './circuits'
import { input, readAll } from './phasors'

type Outputs = { readonly [name: string]: number | undefined }

/** One test a case: every value that is named, as a sheet's readings give it, against what was published. */
function gives(id: string, compute: () => Outputs): void {
  const from = published(id)
  test(nameOf(from), () => {
    for (const [name, value] of Object.entries(compute())) {
      expectPublished(outputOf(from, name), value ?? Number.NaN)
    }
  })
}

const element = (
  kind: CircuitElement['kind'],
  voltage: string,
  current: string,
  id = 'Z',
): CircuitElement => ({ id, kind, voltage, current })

const shows = (id: string, of: string, shown: number): Reading =>
  exactReading({ id, of, kind: 'magnitude', shown })
const takes = (id: string, of: string, current: string, shown: number): Reading =>
  exactReading({ id, of, kind: 'power', with: current, shown })

describe('published elements, found from what a sheet holds', () => {
  gives('Z07', () => {
    const found = (kind: CircuitElement['kind'], magnitude: number, angle: number) =>
      answerTo({
        frequency: { value: 50 },
        phasors: [known('V', 'voltage', magnitude, angle), known('I', 'current', 1)],
        elements: [element(kind, 'V', 'I')],
      }).element('Z')?.found
    const a = found('coil', Math.hypot(12, 5), degreesFromRadians(Math.atan2(5, 12)))
    const b = found('capacitor', 40, -90)
    const c = found('coil', 30, 60)
    const d = answerTo({
      frequency: { value: 50 },
      phasors: [
        known('V', 'voltage', 2.2e6, -30),
        known('I', 'current', 1),
        unknown('VR', 'voltage'),
        unknown('VC', 'voltage'),
      ],
      sums: [sum('V', 'VR', 'VC')],
      elements: [element('resistor', 'VR', 'I', 'R'), element('capacitor', 'VC', 'I', 'C')],
    })
    return {
      'L (a)': 1e3 * (a?.inductance?.value ?? Number.NaN),
      'C (b)': 1e6 * (b?.capacitance?.value ?? Number.NaN),
      'R (c)': c?.resistance?.value,
      'L (c)': 1e3 * (c?.inductance?.value ?? Number.NaN),
      'R (d)': 1e-3 * (d.element('R')?.found?.resistance?.value ?? Number.NaN),
      'C (d)': 1e9 * (d.element('C')?.found?.capacitance?.value ?? Number.NaN),
    }
  })

  gives('U03', () => {
    const { element: of } = answerTo({
      frequency: { value: 5e3 },
      phasors: [
        known('V', 'voltage', 50, 30),
        known('I', 'current', 31.4, 52.48),
        ...['I1', 'I2', 'I3'].map((id) => unknown(id, 'current')),
      ],
      sums: [sum('I', 'I1', 'I2', 'I3')],
      elements: [
        element('impedance', 'V', 'I1', 'Z1'),
        {
          ...element('impedance', 'V', 'I2', 'Z2'),
          resistance: exactly(8),
          reactance: exactly(6),
        } as CircuitElement,
        { ...element('resistor', 'V', 'I3', 'Z3'), resistance: exactly(10) } as CircuitElement,
      ],
    })
    const z = of('Z1')?.impedance
    return {
      'Re Z1': z?.real,
      'Im Z1': z?.imaginary,
      C: -1e6 / (2 * Math.PI * 5e3 * (z?.imaginary ?? Number.NaN)),
    }
  })

  gives('U06', () => {
    const { element: of, evaluation } = answerTo({
      frequency: { value: 50 },
      phasors: [unknown('V', 'voltage'), unknown('I', 'current')],
      readings: [shows('r1', 'V', 120), shows('r2', 'I', 8), takes('r3', 'V', 'I', 400)],
      elements: [element('coil', 'V', 'I')],
    })
    const z = of('Z')?.impedance
    return {
      R: z?.real,
      '|Z|': z?.magnitude,
      X: z?.imaginary,
      pf: evaluation.power?.at(-1)?.factor,
      '|angle|': z?.angle,
    }
  })

  gives('U07', () => {
    const { phasor, element: of } = answerTo({
      frequency: { value: 60 },
      phasors: [
        known('V', 'voltage', 100),
        ...['VR', 'VC'].map((id) => unknown(id, 'voltage')),
        unknown('I', 'current'),
      ],
      readings: [
        takes('r1', 'V', 'I', 100),
        exactReading({
          id: 'r2',
          of: 'V',
          kind: 'power-factor',
          with: 'I',
          shown: 0.5,
          sense: 'leads',
        }),
      ],
      sums: [sum('V', 'VR', 'VC')],
      elements: [element('resistor', 'VR', 'I', 'R'), element('capacitor', 'VC', 'I', 'C')],
    })
    return {
      I: phasor('I').magnitude,
      R: of('R')?.found?.resistance?.value,
      '|Z|': 100 / phasor('I').magnitude,
      C: 1e6 * (of('C')?.found?.capacitance?.value ?? Number.NaN),
    }
  })

  gives('U08', () => {
    const { element: of } = answerTo({
      frequency: { value: 200 },
      phasors: [
        known('V', 'voltage', 120),
        ...['I', 'IR', 'IC'].map((id) => unknown(id, 'current')),
      ],
      readings: [
        shows('r1', 'I', 2),
        exactReading({
          id: 'r2',
          of: 'V',
          kind: 'power-factor',
          with: 'I',
          shown: 0.6,
          sense: 'leads',
        }),
      ],
      sums: [sum('I', 'IR', 'IC')],
      elements: [element('resistor', 'V', 'IR', 'R'), element('capacitor', 'V', 'IC', 'C')],
    })
    return {
      R: of('R')?.found?.resistance?.value,
      C: 1e6 * (of('C')?.found?.capacitance?.value ?? Number.NaN),
    }
  })

  gives('U10', () => {
    const { phasor, element: of } = answerTo({
      frequency: { value: 1e4 / (2 * Math.PI) },
      // 141.4 V is a peak; φ = π / 9 is 20°.
      phasors: [
        known('V', 'voltage', 141.4 / Math.SQRT2, 20),
        ...['VR', 'VC'].map((id) => unknown(id, 'voltage')),
        unknown('I', 'current'),
      ],
      reference: 'V',
      readings: [
        takes('r1', 'V', 'I', 1732),
        exactReading({
          id: 'r2',
          of: 'V',
          kind: 'power-factor',
          with: 'I',
          shown: 0.866,
          sense: 'leads',
        }),
      ],
      sums: [sum('V', 'VR', 'VC')],
      elements: [element('resistor', 'VR', 'I', 'R'), element('capacitor', 'VC', 'I', 'C')],
    })
    return {
      '|I|': phasor('I').magnitude,
      'I angle': phasor('I').angle,
      R: of('R')?.found?.resistance?.value,
      C: 1e6 * (of('C')?.found?.capacitance?.value ?? Number.NaN),
    }
  })
})

describe('published impedances from repeated readings, as sheets', () => {
  const from = published('G01')
  const column = (name: string) => input(from, name).split(',').map(Number)
  const volts = column('V (V)')
  const amperes = column('I (mA)').map((current) => current / 1000)
  const angles = column('φ (rad)').map(degreesFromRadians)
  const mean = (values: readonly number[]) =>
    values.reduce((total, value) => total + value, 0) / values.length

  const impedanceOf = (sets: readonly number[]) => {
    const reading = (id: string, of: string, kind: string, all: readonly number[]) => {
      const repeats = sets.map((at) => all[at] ?? Number.NaN)
      const several = repeats.length > 1 ? { repeats, pass: 'sets' } : {}
      return exactReading({ id, of, kind, shown: mean(repeats), ...several })
    }
    const { element: of } = answerTo({
      reference: 'I',
      phasors: [unknown('I', 'current'), unknown('V', 'voltage')],
      readings: [
        reading('r1', 'V', 'magnitude', volts),
        reading('r2', 'I', 'magnitude', amperes),
        reading('r3', 'V', 'angle', angles),
      ],
      elements: [element('impedance', 'V', 'I')],
    })
    return of('Z')
  }

  gives('G01', () => {
    const z = impedanceOf([0, 1, 2, 3, 4])
    const coverage = studentTwoSidedPoint(0.05, 4)
    return {
      R: z?.impedance?.real,
      X: z?.impedance?.imaginary,
      Z: z?.impedance?.magnitude,
      'u(R)': (z?.found?.resistance?.expanded ?? Number.NaN) / coverage,
      'u(X)': (z?.found?.reactance?.expanded ?? Number.NaN) / coverage,
    }
  })

  gives('G02', () => {
    const single = volts.map((_, at) => {
      const z = impedanceOf([at])?.impedance
      return {
        [`R${at + 1}`]: z?.real,
        [`X${at + 1}`]: z?.imaginary,
        [`Z${at + 1}`]: z?.magnitude,
      }
    })
    return Object.assign({}, ...single)
  })
})

describe('published powers, from a sheet’s meters', () => {
  gives('W03', () => {
    const readings = [shows('r1', 'V', 240), shows('r2', 'I', 9.615), takes('r3', 'V', 'I', 1500)]
    const load = answerTo({
      phasors: [unknown('V', 'voltage'), unknown('I', 'current')],
      readings,
      frequency: { value: 60 },
      elements: [element('coil', 'V', 'I')],
    })
    const { active, reactive, apparent } = load.power('total')
    const found = load.element('Z')?.found
    const inductance = found?.inductance?.value ?? Number.NaN
    const after = predictedFrom(
      {
        parallel: [
          // The coil and its resistance as found; the source goes on with 80 µF.
          coil('L', inductance, found?.resistance?.value),
          capacitor('C', 80e-6),
        ],
      },
      60,
      { side: 'voltage', magnitude: 240 },
    )
    return {
      S: apparent / 1000,
      pf: active / apparent,
      Q: reactive / 1000,
      'XC 80µF': after.z('V', 'IC').magnitude,
      IC: after.predicted('IC').magnitude,
      Qc: -after.power('C').reactive / 1000,
      Qnet: after.power('total').reactive,
      'S after': after.power('total').apparent / 1000,
      'pf after': after.evaluation.power?.at(-1)?.factor,
      'I after': after.predicted('I').magnitude,
    }
  })

  gives('K02', () => {
    const base = 2401.7771
    const [a, b, c] = readAll('0.9900∠-5.30, 1.0529∠-122.34, 0.9778∠116.02', '')
    const voltage = (id: string, value = { re: Number.NaN, im: 0 }): Phasor =>
      known(id, 'voltage', base * magnitudeOf(value), angleOf(value))
    const pairs = ['AB', 'BC', 'CA'] as const
    const { phasor } = answerTo({
      reference: 'VA',
      phasors: [
        voltage('VA', a),
        voltage('VB', b),
        voltage('VC', c),
        ...pairs.map((pair) => unknown(`V${pair}`, 'voltage')),
        ...pairs.map((pair) => unknown(`I${pair}`, 'current')),
        ...['IA', 'IB', 'IC'].map((id) => unknown(id, 'current')),
        known('A692', 'current', 229.11, -18.18),
        known('B692', 'current', 69.61, -55.19),
        known('C692', 'current', 178.38, 109.39),
        known('A684', 'current', 63.07, -39.12),
        known('C684', 'current', 71.15, 121.62),
      ],
      sums: [
        sum('VAB', 'VA', '-VB'),
        sum('VBC', 'VB', '-VC'),
        sum('VCA', 'VC', '-VA'),
        sum('IA', 'A692', 'A684', 'IAB', '-ICA'),
        sum('IB', 'B692', 'IBC', '-IAB'),
        sum('IC', 'C692', 'C684', 'ICA', '-IBC'),
      ],
      readings: pairs.flatMap((pair) => [
        takes(`p${pair}`, `V${pair}`, `I${pair}`, 385e3),
        exactReading({
          id: `q${pair}`,
          of: `V${pair}`,
          kind: 'reactive-power',
          with: `I${pair}`,
          shown: 220e3,
        }),
      ]),
    })
    const parts = ['A', 'B', 'C'].map((phase) => ({
      [`|I${phase} in|`]: phasor(`I${phase}`).magnitude,
      [`I${phase} angle`]: phasor(`I${phase}`).angle,
    }))
    return Object.assign({}, ...parts)
  })

  gives('K03', () => {
    const ratios = input(published('K03'), 'regulator ratios').split(',').map(Number)
    const amperes = readAll(input(published('K01'), 'into 632 from regulator'), 'A')
    const phases = ['A', 'B', 'C'] as const
    const { power } = answerTo({
      reference: 'VA',
      phasors: phases.flatMap((phase, at) => {
        const current = amperes[at] ?? { re: Number.NaN, im: 0 }
        const ratio = ratios[at] ?? Number.NaN
        return [
          known(`V${phase}`, 'voltage', 2401.7771, at === 2 ? 120 : -120 * at),
          known(`I${phase}`, 'current', ratio * magnitudeOf(current), angleOf(current)),
        ]
      }),
      elements: phases.map((phase) => element('impedance', `V${phase}`, `I${phase}`, `Z${phase}`)),
    })
    const parts = phases.map((phase) => ({
      [`P${phase}`]: power(`Z${phase}`).active / 1000,
      [`Q${phase}`]: power(`Z${phase}`).reactive / 1000,
    }))
    return Object.assign({}, ...parts)
  })
})

describe('published two-wattmeter methods, as sheets', () => {
  gives('T07', () => {
    // The source's first wattmeter reads the larger power: its phases follow each other as a, c, b.
    // Star: the phase voltage on 8 + j8 Ω. Delta: its line current is that of a star of a third of it.
    const phase = 415 / Math.sqrt(3)
    const meters = (ohms: number) => {
      const size = phase / Math.hypot(ohms, ohms)
      const volts = ([0, 120, -120] as const).map((angle) => fromPolar(phase, angle))
      const line = (one: number, other: number) =>
        subtract(volts[one] ?? { re: 0, im: 0 }, volts[other] ?? { re: 0, im: 0 })
      const [ab, cb] = [line(0, 1), line(2, 1)]
      const { power } = answerTo({
        reference: 'VAB',
        phasors: [
          known('VAB', 'voltage', magnitudeOf(ab), angleOf(ab)),
          known('VCB', 'voltage', magnitudeOf(cb), angleOf(cb)),
          known('IA', 'current', size, -45),
          known('IC', 'current', size, -120 - 45),
        ],
        elements: [
          element('impedance', 'VAB', 'IA', 'W1'),
          element('impedance', 'VCB', 'IC', 'W2'),
        ],
      })
      return [power('W1').active, power('W2').active] as const
    }
    const [[star1, star2], [delta1, delta2]] = [meters(8), meters(8 / 3)]
    return { 'W1 star': star1, 'W2 star': star2, 'W1 delta': delta1, 'W2 delta': delta2 }
  })

  /**
   * A balanced load on three wires. Its third current is the first, 120° ahead: the second wattmeter
   * reads the same of the first current with its voltage turned back by 120°.
   */
  const balanced = (line: number, first: number, second: number) =>
    answerTo({
      reference: 'VA',
      phasors: [
        known('VA', 'voltage', line / Math.sqrt(3)),
        known('VAB', 'voltage', line, 30),
        known('VCBback', 'voltage', line, -30),
        unknown('IA', 'current'),
      ],
      readings: [takes('w1', 'VAB', 'IA', first), takes('w2', 'VCBback', 'IA', second)],
      elements: [element('impedance', 'VA', 'IA')],
    })

  gives('T08', () => {
    // The source states no line voltage: whichever it is, power and factor are the same.
    const { evaluation, power } = balanced(400, 8000, 4000)
    return { P: 3 * power('total').active, pf: evaluation.power?.at(-1)?.factor }
  })

  gives('T11', () => {
    const { evaluation, power, phasor } = balanced(415, 5200, -1700)
    return {
      P: 3 * power('total').active,
      pf: evaluation.power?.at(-1)?.factor,
      'I line': phasor('IA').magnitude,
    }
  })

  gives('T25', () => {
    // Which of the two is the first decides the sign of Q, which the source does not state.
    const { evaluation, power, element: of } = balanced(220, 2100, 1560)
    const star = of('Z')?.impedance
    const total = power('total')
    return {
      P: 3 * total.active,
      'P phase': total.active,
      Q: 3 * Math.abs(total.reactive),
      angle: Math.abs(star?.angle ?? Number.NaN),
      pf: evaluation.power?.at(-1)?.factor,
      // A delta that takes the same has three times the impedance of the star.
      '|Z|': 3 * (star?.magnitude ?? Number.NaN),
    }
  })
})
