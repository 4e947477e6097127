import { describe, test } from 'vitest'
import { expectPublished, nameOf, outputOf, published } from './cases'
import {
  capacitor,
  coil,
  impedance,
  type Part,
  predictedFrom,
  resistor,
  type Supply,
} from './circuits'

const volts = (magnitude: number, angle = 0): Supply => ({ side: 'voltage', magnitude, angle })
const amperes = (magnitude: number, angle = 0): Supply => ({ side: 'current', magnitude, angle })

type Outputs = { readonly [name: string]: number }

/** One test a case: every value that is named, as a sheet predicts it, against what was published. */
function predicts(id: string, compute: () => Outputs): void {
  const from = published(id)
  test(nameOf(from), () => {
    for (const [name, value] of Object.entries(compute())) {
      expectPublished(outputOf(from, name), value)
    }
  })
}

const radians = (degrees: number) => (degrees * Math.PI) / 180

describe('published impedances, predicted from a sheet', () => {
  predicts('Z01', () => {
    const [low, high] = [60, 10e3].map((f) => predictedFrom(coil('L', 3e-3), f, volts(120)))
    return {
      'XL 60 Hz': low?.whole().magnitude ?? Number.NaN,
      'XL 10 kHz': high?.whole().magnitude ?? Number.NaN,
      'I 60 Hz': low?.predicted('I').magnitude ?? Number.NaN,
      'I 10 kHz': high?.predicted('I').magnitude ?? Number.NaN,
    }
  })

  predicts('Z02', () => {
    const low = predictedFrom(capacitor('C', 5e-6), 60, volts(120))
    const high = predictedFrom(capacitor('C', 5e-6), 10e3, volts(120))
    return {
      'XC 60 Hz': low.whole().magnitude,
      'XC 10 kHz': high.whole().magnitude,
      'I 60 Hz': low.predicted('I').magnitude,
      'I 10 kHz': high.predicted('I').magnitude,
    }
  })

  predicts('Z04', () => {
    // The source counts in peak values: the sheet's proportions are the same.
    const of = (part: Part) => predictedFrom(part, 60, volts(10))
    const [r, c, l] = [of(resistor('R', 100)), of(capacitor('C', 10e-6)), of(coil('L', 15e-3))]
    return {
      'IR peak': r.predicted('I').magnitude,
      XC: c.whole().magnitude,
      'IC peak': c.predicted('I').magnitude,
      XL: l.whole().magnitude,
      'IL peak': l.predicted('I').magnitude,
    }
  })

  predicts('Z05', () => {
    const l = predictedFrom(coil('L', 0.4), 60, volts(115))
    const c = predictedFrom(capacitor('C', 10e-6), 60, volts(120))
    return {
      XL: l.whole().magnitude,
      IL: l.predicted('I').magnitude,
      XC: c.whole().magnitude,
      IC: c.predicted('I').magnitude,
    }
  })

  predicts('Z10', () => {
    const at = (magnitude: number, degrees: number) =>
      [magnitude * Math.cos(radians(degrees)), magnitude * Math.sin(radians(degrees))] as const
    const parallel = [impedance('Z1', ...at(4.76, 35)), impedance('Z2', ...at(7.36, -48))]
    const { whole } = predictedFrom({ parallel }, undefined, volts(10))
    return { '|Z|': whole().magnitude, angle: whole().angle }
  })
})

const s01 = (...more: readonly Part[]): Part => ({
  series: [resistor('R', 40), coil('L', 3e-3), ...more],
})

describe('published series circuits, predicted from a sheet', () => {
  predicts('S01', () => {
    const rlc = s01(capacitor('C', 5e-6))
    const low = predictedFrom(rlc, 60, volts(120))
    const high = predictedFrom(rlc, 10e3, volts(120))
    return {
      '|Z| 60 Hz': low.whole().magnitude,
      '|Z| 10 kHz': high.whole().magnitude,
      'I 60 Hz': low.predicted('I').magnitude,
      'I 10 kHz': high.predicted('I').magnitude,
    }
  })

  predicts('S02', () => {
    const rlc = s01(capacitor('C', 5e-6))
    const f0 = predictedFrom(rlc, 1000, volts(120)).evaluation.resonance?.frequency ?? Number.NaN
    return { f0: f0 / 1000, I: predictedFrom(rlc, f0, volts(120)).predicted('I').magnitude }
  })

  predicts('S03', () => {
    const rlc = s01(capacitor('C', 5e-6))
    const low = predictedFrom(rlc, 60, volts(120))
    const f0 = low.evaluation.resonance?.frequency ?? Number.NaN
    return {
      pf: low.evaluation.power?.at(-1)?.factor ?? Number.NaN,
      '|phase|': Math.abs(low.whole().angle),
      'P 60 Hz': low.power('total').active,
      'P f0': predictedFrom(rlc, f0, volts(120)).power('total').active,
    }
  })

  predicts('S04', () => {
    const lc: Part = { series: [coil('L', 3e-3), capacitor('C', 5e-6)] }
    const size = (part: Part, f: number) => predictedFrom(part, f, volts(120)).whole().magnitude
    return {
      'RL 60': size(s01(), 60),
      'RL 10k': size(s01(), 10e3),
      'LC 60': size(lc, 60),
      'LC 10k': size(lc, 10e3),
    }
  })

  const s05: Part = { series: [resistor('R', 1e3), coil('L', 150e-6), capacitor('C', 25e-9)] }

  predicts('S05', () => {
    const low = predictedFrom(s05, 500, volts(408))
    const high = predictedFrom(s05, 7500, volts(408))
    const f0 = high.evaluation.resonance?.frequency ?? Number.NaN
    return {
      '|Z| 500': low.whole().magnitude / 1000,
      '|Z| 7.5k': high.whole().magnitude / 1000,
      'I 500': 1000 * low.predicted('I').magnitude,
      'I 7.5k': 1000 * high.predicted('I').magnitude,
      f0: f0 / 1000,
      'I f0': predictedFrom(s05, f0, volts(408)).predicted('I').magnitude,
    }
  })

  predicts('S06', () => {
    const printed = predictedFrom(s05, 7.5, volts(408))
    const f0 = printed.evaluation.resonance?.frequency ?? Number.NaN
    return {
      pf: printed.evaluation.power?.at(-1)?.factor ?? Number.NaN,
      '|phase|': Math.abs(printed.whole().angle),
      P: printed.power('total').active,
      'P f0': predictedFrom(s05, f0, volts(408)).power('total').active,
    }
  })

  predicts('S07', () => {
    const series = [resistor('R', 4), coil('L', 3e-3), capacitor('C', 0.8e-3)]
    const { z, whole, predicted } = predictedFrom({ series }, 200, volts(0.1))
    return {
      XC: z('VC', 'I').magnitude,
      XL: z('VL', 'I').magnitude,
      '|Z|': whole().magnitude,
      I0: predicted('I').magnitude,
      phase: radians(whole().angle),
    }
  })

  predicts('S08', () => {
    const series = [resistor('R', 400), capacitor('C', 4e-6)]
    const { whole, predicted } = predictedFrom({ series }, 60, volts(120))
    return {
      '|Z|': whole().magnitude,
      I0: predicted('I').magnitude,
      lead: predicted('I').angle / 180,
      VR: predicted('VR').magnitude,
      VC: predicted('VC').magnitude,
    }
  })

  predicts('S13', () => {
    const series = [resistor('R', 5), coil('L', 10e-3)]
    const { whole, predicted } = predictedFrom({ series }, 60, volts(10))
    const [i, er, el] = ['I', 'VR', 'VL'].map(predicted)
    return {
      '|Z|': whole().magnitude,
      'Z angle': whole().angle,
      '|I|': i?.magnitude ?? Number.NaN,
      'I angle': i?.angle ?? Number.NaN,
      'Re I': i?.real ?? Number.NaN,
      'Im I': i?.imaginary ?? Number.NaN,
      '|ER|': er?.magnitude ?? Number.NaN,
      '|EL|': el?.magnitude ?? Number.NaN,
      'EL angle': el?.angle ?? Number.NaN,
      'Re ER': er?.real ?? Number.NaN,
      'Im ER': er?.imaginary ?? Number.NaN,
      'Re EL': el?.real ?? Number.NaN,
      'Im EL': el?.imaginary ?? Number.NaN,
    }
  })

  predicts('S18', () => {
    const series = [coil('L', 120e-3, 5), capacitor('C', 100e-6)]
    const { predicted } = predictedFrom({ series }, 50, volts(300))
    return {
      I: predicted('I').magnitude,
      angle: -predicted('I').angle,
      Vcoil: predicted('VL').magnitude,
      VC: predicted('VC').magnitude,
    }
  })

  predicts('S19', () => {
    const rc: Part = { series: [resistor('R3', 10), capacitor('C3', 0.25e-6)] }
    const series = [resistor('R1', 8), coil('L2', 130e-6, 5), rc]
    const { predicted, evaluation } = predictedFrom({ series }, 20e3, volts(40))
    const third = evaluation.comparison?.find(({ phasor }) => phasor.startsWith('Vg'))
    return {
      I: predicted('I').magnitude,
      angle: -predicted('I').angle,
      V1: predicted('VR1').magnitude,
      V2: predicted('VL2').magnitude,
      V3: third?.predicted.magnitude ?? Number.NaN,
    }
  })

  predicts('S20', () => {
    const series = [coil('L', 0.286e-3, 4), resistor('R', 8), capacitor('C', 1.273e-6)]
    const { predicted } = predictedFrom({ series }, 5e3, amperes(5))
    return { V: predicted('V').magnitude, angle: predicted('V').angle }
  })

  predicts('S22', () => {
    const series = [resistor('R', 8), capacitor('C', 2.653e-6), coil('L', 0.477e-3, 5)]
    const { predicted } = predictedFrom({ series }, 4e3, amperes(6))
    return {
      'Re V': predicted('V').real,
      'Im V': predicted('V').imaginary,
      angle: predicted('V').angle,
    }
  })

  predicts('S23', () => {
    const size = (resistance: number, reactance: number) =>
      predictedFrom(impedance('Z', resistance, reactance), undefined, volts(10)).whole().magnitude
    return { '|Z| RL': size(100, 60), '|Z| RC': size(60, -50) }
  })

  predicts('S24', () => {
    const series = [resistor('R', 90), coil('L', 32e-3), capacitor('C', 5e-6)]
    const { whole, predicted } = predictedFrom({ series }, 5000 / (2 * Math.PI), volts(750, 30))
    return {
      '|Z|': whole().magnitude,
      'Z angle': whole().angle,
      '|I|': predicted('I').magnitude,
      'I angle': predicted('I').angle,
    }
  })
})

describe('published parallel circuits, predicted from a sheet', () => {
  predicts('P01', () => {
    const parallel = [resistor('R', 5), coil('L', 10e-3)]
    const { predicted, whole } = predictedFrom({ parallel }, 60, volts(10))
    const { magnitude, angle } = whole()
    return {
      IR: predicted('IR').magnitude,
      '|IL|': predicted('IL').magnitude,
      '|I|': predicted('I').magnitude,
      'I angle': predicted('I').angle,
      '|Z|': magnitude,
      'Re Z': magnitude * Math.cos(radians(angle)),
      'Im Z': magnitude * Math.sin(radians(angle)),
    }
  })

  predicts('P02', () => {
    const parallel = [resistor('R', 5), capacitor('C', 100e-6)]
    const { predicted, whole } = predictedFrom({ parallel }, 60, volts(10))
    const { magnitude, angle } = whole()
    return {
      '|IC|': 1000 * predicted('IC').magnitude,
      '|I|': predicted('I').magnitude,
      'I angle': predicted('I').angle,
      '|Z|': magnitude,
      'Re Z': magnitude * Math.cos(radians(angle)),
      'Im Z': 1000 * magnitude * Math.sin(radians(angle)),
    }
  })

  predicts('P07', () => {
    const parallel = [coil('L', 120e-3, 3e3), capacitor('C', 0.02e-6)]
    const { predicted, whole, power } = predictedFrom({ parallel }, 5e3, volts(40))
    return {
      Icoil: 1000 * predicted('IL').magnitude,
      IC: 1000 * predicted('IC').magnitude,
      I: 1000 * predicted('I').magnitude,
      angle: predicted('I').angle,
      '|Z|': whole().magnitude / 1000,
      P: 1000 * power('total').active,
    }
  })

  predicts('P08', () => {
    const parallel = [impedance('Z1', 5, 12), impedance('Z2', 3, -4), resistor('Z3', 8)]
    const { predicted } = predictedFrom({ parallel }, undefined, volts(40))
    const { real, imaginary, angle } = predicted('I')
    return { 'Re I': real, 'Im I': imaginary, angle }
  })

  predicts('P11', () => {
    const parallel = [coil('L', 79.58e-3, 18), capacitor('C', 64.96e-6)]
    const { predicted, whole } = predictedFrom({ parallel }, 50, volts(250))
    const { magnitude, angle } = whole()
    return {
      'Re Z': magnitude * Math.cos(radians(angle)),
      'Im Z': magnitude * Math.sin(radians(angle)),
      '|I|': predicted('I').magnitude,
      'I angle': predicted('I').angle,
      '|Icoil|': predicted('IL').magnitude,
      'Icoil angle': predicted('IL').angle,
      '|IC|': predicted('IC').magnitude,
    }
  })

  predicts('P12', () => {
    const parallel = [coil('L', 200e-3, 60), capacitor('C', 20e-6)]
    const { resonance } = predictedFrom({ parallel }, 50, volts(20)).evaluation
    const fr = resonance?.frequency ?? Number.NaN
    const there = predictedFrom({ parallel }, fr, volts(20))
    return {
      fr,
      RD: there.whole().magnitude,
      I: there.predicted('I').magnitude,
      Q: resonance?.quality ?? Number.NaN,
    }
  })

  predicts('P13', () => {
    const series = [coil('L', 100e-3), capacitor('C', 10e-6)]
    const { z, evaluation } = predictedFrom({ series }, 159.155, amperes(1))
    return {
      f: evaluation.resonance?.frequency ?? Number.NaN,
      X: z('VL', 'I').magnitude,
    }
  })

  predicts('P14', () => {
    const parallel = [
      resistor('Z1', 10),
      { series: [resistor('R', 6), coil('L', 40e-6)] },
      capacitor('Z3', 1e-6),
    ] satisfies readonly Part[]
    const frequency = 200e3 / (2 * Math.PI)
    const { whole, predicted, at } = predictedFrom({ parallel }, frequency, amperes(8))
    return {
      '|Y|': 1 / whole().magnitude,
      'Y angle': -whole().angle,
      '|V|': predicted('V').magnitude,
      'V angle': predicted('V').angle,
      '|I1|': predicted('IZ1').magnitude,
      'I1 angle': predicted('IZ1').angle,
      '|I2|': at('R', 'current').magnitude,
      'I2 angle': at('R', 'current').angle,
      '|I3|': predicted('IZ3').magnitude,
      'I3 angle': predicted('IZ3').angle,
    }
  })
})

describe('published networks, predicted from a sheet', () => {
  predicts('P04', () => {
    const series = [
      capacitor('C1', 4.7e-6),
      {
        parallel: [resistor('R', 470), { series: [coil('L', 0.65), capacitor('C2', 1.5e-6)] }],
      },
    ] satisfies readonly Part[]
    const { at, z, whole } = predictedFrom({ series }, 60, volts(120))
    const [i, c1, r] = [at('', 'current'), at('C1', 'voltage'), at('R', 'voltage')]
    const [ir, ilc] = [at('R', 'current'), at('L', 'current')]
    const inner = { size: r.magnitude / i.magnitude, turn: r.angle - i.angle }
    return {
      XC1: z('VC1', 'I').magnitude,
      '|Z R∥LC2|': inner.size,
      angle: inner.turn,
      Re: inner.size * Math.cos(radians(inner.turn)),
      Im: inner.size * Math.sin(radians(inner.turn)),
      '|Z|': whole().magnitude,
      'Z angle': whole().angle,
      '|I|': 1000 * i.magnitude,
      'I angle': i.angle,
      'Re I': 1000 * i.real,
      'Im I': 1000 * i.imaginary,
      '|EC1|': c1.magnitude,
      'EC1 angle': c1.angle,
      '|ER|': r.magnitude,
      'ER angle': r.angle,
      '|IR|': 1000 * ir.magnitude,
      '|ILC|': 1000 * ilc.magnitude,
      'ILC angle': ilc.angle,
      '|EL|': at('L', 'voltage').magnitude,
      'EL angle': at('L', 'voltage').angle,
      '|EC2|': at('C2', 'voltage').magnitude,
      'EC2 angle': at('C2', 'voltage').angle,
    }
  })

  predicts('P09', () => {
    const series = [
      resistor('R', 5),
      { parallel: [resistor('R1', 8), impedance('Z2', 0, 6)] },
    ] satisfies readonly Part[]
    const { predicted } = predictedFrom({ series }, undefined, volts(50))
    return {
      '|I|': predicted('I').magnitude,
      'I angle': predicted('I').angle,
      '|I1|': predicted('IR1').magnitude,
      'I1 angle': predicted('IR1').angle,
      '|I2|': predicted('IZ2').magnitude,
      'I2 angle': predicted('IZ2').angle,
    }
  })

  predicts('W09', () => {
    const series = [
      resistor('R', 5),
      { parallel: [impedance('Z1', 3, 4), impedance('Z2', 0, -10)] },
    ] satisfies readonly Part[]
    const { power } = predictedFrom({ series }, undefined, volts(100))
    return {
      'P in 5 Ω': power('R').active,
      'P in −j10': power('Z2').active,
      'P in 3+j4': power('Z1').active,
    }
  })
})

describe('published powers, predicted from a sheet', () => {
  predicts('W01', () => {
    const series = [resistor('R', 60), coil('L', 160e-3)]
    const { z, whole, predicted, power, evaluation } = predictedFrom({ series }, 60, volts(120))
    const { active, reactive, apparent } = power('total')
    return {
      XL: z('VL', 'I').magnitude,
      '|Z|': whole().magnitude,
      angle: whole().angle,
      I: predicted('I').magnitude,
      P: active,
      Q: reactive,
      S: apparent,
      pf: evaluation.power?.at(-1)?.factor ?? Number.NaN,
    }
  })

  predicts('W07', () => {
    const { predicted, power } = predictedFrom(impedance('Z', 3, 4), 1500, volts(50, 30))
    const { active, reactive, apparent } = power('total')
    return {
      'Re I': predicted('I').real,
      'Im I': predicted('I').imaginary,
      P: active,
      Q: reactive,
      S: apparent,
    }
  })

  predicts('W11', () => {
    const series = [resistor('R', 60), impedance('C', 0, -80)]
    const { whole, predicted, power, evaluation } = predictedFrom({ series }, undefined, volts(120))
    const { active, reactive, apparent } = power('total')
    return {
      '|Z|': whole().magnitude,
      I: predicted('I').magnitude,
      angle: whole().angle,
      pf: evaluation.power?.at(-1)?.factor ?? Number.NaN,
      P: active,
      // The source counts leading vars as positive.
      Q: -reactive,
      S: apparent,
    }
  })

  predicts('W14', () => {
    const loads = [impedance('Z1', 100, 0), impedance('Z2', 10, 20)]
    const before = predictedFrom({ parallel: loads }, 60, volts(200))
    const corrected = [...loads, capacitor('C', 46.4201917351e-6)]
    const after = predictedFrom({ parallel: corrected }, 60, volts(200))
    return {
      P: before.power('total').active,
      Q: before.power('total').reactive,
      '|I|': before.predicted('I').magnitude,
      'I angle': before.predicted('I').angle,
      pf: before.evaluation.power?.at(-1)?.factor ?? Number.NaN,
      Qc: -after.power('C').reactive,
      'I after': after.predicted('I').magnitude,
    }
  })

  predicts('T24', () => {
    // One phase of the three, the delta as the star that is its equal.
    const series = [
      impedance('Zline', 2, 4),
      { parallel: [impedance('Z1', 30, 40), impedance('Z2', 20, -15)] },
    ] satisfies readonly Part[]
    const { at, predicted, power } = predictedFrom({ series }, undefined, volts(120))
    const v2 = at('Z1', 'voltage')
    return {
      '|I|': predicted('I').magnitude,
      'P total': 3 * power('total').active,
      'Re V2': v2.real,
      'Im V2': v2.imaginary,
      '|V2|': v2.magnitude,
      'V2 angle': v2.angle,
      '|V2| line': Math.sqrt(3) * v2.magnitude,
      '|I1|': predicted('IZ1').magnitude,
      'I1 angle': predicted('IZ1').angle,
      '|I2|': predicted('IZ2').magnitude,
      'I2 angle': predicted('IZ2').angle,
      P1: 3 * power('Z1').active,
      Q1: 3 * power('Z1').reactive,
      P2: 3 * power('Z2').active,
      Q2: 3 * power('Z2').reactive,
      'P line': 3 * power('Zline').active,
      'Q line': 3 * power('Zline').reactive,
    }
  })
})
