import { describe } from 'vitest'
import {
  add,
  angleOf,
  type Complex,
  conjugate,
  divide,
  fromPolar,
  magnitudeOf,
  multiply,
  negate,
  scaleBy,
  subtract,
} from '../../src/core'
import { published } from './cases'
import {
  at,
  balanced,
  check,
  input,
  polar,
  powerOf,
  read,
  readAll,
  reciprocal,
  sum,
} from './phasors'

const SQRT3 = Math.sqrt(3)

describe('complex power', () => {
  check('W07', (from) => {
    const voltage = read(input(from, 'V'), 'V')
    const current = divide(voltage, read(input(from, 'Z'), 'Ω'))
    const power = powerOf(voltage, current)
    return {
      'Re I': current.re,
      'Im I': current.im,
      P: power.re,
      Q: power.im,
      S: magnitudeOf(power),
    }
  })

  check('W09', (from) => {
    const [coil, capacitor] = [read('3 + j4 Ω', 'Ω'), read('−j10 Ω', 'Ω')]
    const together = divide(multiply(coil, capacitor), add(coil, capacitor))
    const current = divide(read(input(from, 'V'), 'V'), add({ re: 5, im: 0 }, together))
    const across = multiply(current, together)
    return {
      'P in 5 Ω': powerOf(scaleBy(current, 5), current).re,
      'P in −j10': powerOf(across, divide(across, capacitor)).re,
      'P in 3+j4': powerOf(across, divide(across, coil)).re,
    }
  })

  check('W11', () => {
    const impedance = read('60 − j80 Ω', 'Ω')
    const voltage = read('120 V', 'V')
    const current = divide(voltage, impedance)
    const power = powerOf(voltage, current)
    return {
      '|Z|': magnitudeOf(impedance),
      I: magnitudeOf(current),
      angle: angleOf(impedance),
      pf: power.re / magnitudeOf(power),
      P: power.re,
      // The source states the size of the reactive power of a capacitor.
      Q: -power.im,
      S: magnitudeOf(power),
    }
  })

  check('W14', (from) => {
    const voltage = read('200 V', 'V')
    const currents = ['Z1', 'Z2'].map((name) => divide(voltage, read(input(from, name), 'Ω')))
    const total = sum(...currents)
    const power = powerOf(voltage, total)
    return {
      P: power.re,
      Q: power.im,
      ...polar('|I|', 'I angle', total),
      pf: power.re / magnitudeOf(power),
    }
  })

  check('K02', (from) => {
    const volts = readAll(input(from, 'V671').replace('of 2401.7771 V', ''), 'pu').map((each) =>
      scaleBy(each, 2401.7771),
    )
    const load: Complex = { re: 385e3, im: 220e3 }
    const legs = [0, 1, 2].map((leg) => {
      const voltage = subtract(at(volts, leg), at(volts, (leg + 1) % 3))
      return conjugate(divide(load, voltage))
    })
    const deltaLine = [0, 1, 2].map((line) => subtract(at(legs, line), at(legs, (line + 2) % 3)))
    const to692 = readAll(input(from, 'to 692'), 'A')
    // There is no phase b to 684.
    const to684 = readAll(input(from, 'to 684').replace(' -,', ' 0,'), 'A')
    const into = [0, 1, 2].map((line) => sum(at(to692, line), at(to684, line), at(deltaLine, line)))
    return {
      ...polar('|IA in|', 'IA angle', at(into, 0)),
      ...polar('|IB in|', 'IB angle', at(into, 1)),
      ...polar('|IC in|', 'IC angle', at(into, 2)),
    }
  })

  check('K03', (from) => {
    const volts = balanced(2401.7771, 0)
    const ratios = input(from, 'regulator ratios').split(',').map(Number)
    const amperes = readAll(input(published('K01'), 'into 632 from regulator'), 'A')
    const powers = volts.map((voltage, phase) =>
      scaleBy(powerOf(voltage, scaleBy(at(amperes, phase), at(ratios, phase))), 1 / 1000),
    )
    const parts = ['A', 'B', 'C'].map((phase, index) => ({
      [`P${phase}`]: at(powers, index).re,
      [`Q${phase}`]: at(powers, index).im,
    }))
    return Object.assign({}, ...parts)
  })
})

describe('three phases', () => {
  check('T02', () => {
    const current = 10_000 / 120
    const [first, , third] = balanced(current, 0)
    return { 'I phase': current, 'I line': magnitudeOf(subtract(first, third)) }
  })

  check('T12', (from) => {
    const impedance = read(input(from, 'Z'), 'Ω')
    const [red, yellow, blue] = balanced(220 / SQRT3, 0)
    const currents = [red, yellow, blue].map((voltage) => divide(voltage, impedance))
    const power = sum(
      ...currents.map((current, phase) => powerOf(at([red, yellow, blue], phase), current)),
    )
    return {
      'V phase': magnitudeOf(red),
      'VRY angle': angleOf(subtract(red, yellow)),
      'VYB angle': angleOf(subtract(yellow, blue)),
      ...polar('I', 'IR angle', at(currents, 0)),
      'IY angle': angleOf(at(currents, 1)),
      'IB angle': angleOf(at(currents, 2)),
      P: power.re,
    }
  })

  check('T13', (from) => {
    const impedance = read(input(from, 'Z'), 'Ω')
    const volts = balanced(220, 0)
    const legs = volts.map((voltage) => divide(voltage, impedance))
    const lines = [0, 1, 2].map((line) => subtract(at(legs, line), at(legs, (line + 2) % 3)))
    const power = sum(...legs.map((leg, index) => powerOf(at(volts, index), leg)))
    return {
      ...polar('I phase', 'IRY angle', at(legs, 0)),
      ...polar('I line', 'IR angle', at(lines, 0)),
      'IY angle': angleOf(at(lines, 1)),
      'IB angle': angleOf(at(lines, 2)),
      P: power.re,
    }
  })

  check('T19', (from) => {
    const admittances = ['ZR', 'ZY', 'ZB'].map((name) => reciprocal(read(input(from, name), 'Ω')))
    // The source counts angles from the line voltage from R to Y, which leads R's own by 30°.
    const currents = starCurrents(balanced(3300 / SQRT3, -30), admittances)
    return polar('|IR|', 'IR angle', at(currents, 0))
  })

  check('T20', (from) => {
    const impedances = ['ZA', 'ZB', 'ZC'].map((name) => read(input(from, name), 'Ω'))
    const currents = starCurrents(balanced(120, 0), impedances.map(reciprocal))
    const powers = impedances.map((impedance, phase) =>
      scaleBy(impedance, magnitudeOf(at(currents, phase)) ** 2),
    )
    return {
      ...polar('|Ia|', 'Ia angle', at(currents, 0)),
      ...polar('|Ib|', 'Ib angle', at(currents, 1)),
      ...polar('|Ic|', 'Ic angle', at(currents, 2)),
      QA: at(powers, 0).im,
      PB: at(powers, 1).re,
    }
  })

  check('T21', (from) => {
    const source = read(input(from, 'source'), 'Ω')
    const load = read(input(from, 'load'), 'Ω')
    const total = sum(source, read(input(from, 'line'), 'Ω'), load)
    const volts = balanced(120, 0)
    const currents = volts.map((voltage) => divide(voltage, total))
    const loads = currents.map((current) => multiply(current, load))
    const terminal = subtract(at(volts, 0), multiply(at(currents, 0), source))
    return {
      ...polar('|I|', 'Ia angle', at(currents, 0)),
      'Ib angle': angleOf(at(currents, 1)),
      'Ic angle': angleOf(at(currents, 2)),
      ...polar('|VAN|', 'VAN angle', at(loads, 0)),
      ...polar('|VAB|', 'VAB angle', subtract(at(loads, 0), at(loads, 1))),
      ...polar('|Van|', 'Van angle', terminal),
    }
  })

  check('T22', () => {
    const first = divide(read('220 V ∠0°', 'V'), read('−j5 Ω', 'Ω'))
    const third = divide(read('220 V ∠-120°', 'V'), read('10 Ω', 'Ω'))
    return {
      '|I_AB|': magnitudeOf(first),
      '|I_CA|': magnitudeOf(third),
      ...polar('|Ia|', 'Ia angle', subtract(first, third)),
    }
  })

  check('T23', (from) => {
    const volts = balanced(100, 0, 120)
    const currents = ['ZA', 'ZB', 'ZC'].map((name, phase) =>
      divide(at(volts, phase), read(input(from, name), 'Ω')),
    )
    return {
      '|Ia|': magnitudeOf(at(currents, 0)),
      ...polar('|Ib|', 'Ib angle', at(currents, 1)),
      ...polar('|Ic|', 'Ic angle', at(currents, 2)),
      // The source counts the neutral's current towards the load.
      ...polar('|In|', 'In angle', negate(sum(...currents))),
    }
  })

  check('T24', (from) => {
    const line = read(input(from, 'line'), 'Ω')
    const star = read(input(from, 'star'), 'Ω')
    const delta = scaleBy(read(input(from, 'delta'), 'Ω'), 1 / 3)
    const voltage = fromPolar(120, 0)
    const together = reciprocal(add(reciprocal(star), reciprocal(delta)))
    const current = divide(voltage, add(line, together))
    const atLoad = subtract(voltage, multiply(current, line))
    const inStar = divide(atLoad, star)
    const inDelta = divide(atLoad, delta)
    const threefold = (across: Complex, through: Complex) => scaleBy(powerOf(across, through), 3)
    const starPower = threefold(atLoad, inStar)
    const deltaPower = threefold(atLoad, inDelta)
    const linePower = threefold(multiply(current, line), current)
    return {
      '|I|': magnitudeOf(current),
      'P total': threefold(voltage, current).re,
      'Re V2': atLoad.re,
      'Im V2': atLoad.im,
      ...polar('|V2|', 'V2 angle', atLoad),
      '|V2| line': SQRT3 * magnitudeOf(atLoad),
      ...polar('|I1|', 'I1 angle', inStar),
      ...polar('|I2|', 'I2 angle', inDelta),
      P1: starPower.re,
      Q1: starPower.im,
      P2: deltaPower.re,
      Q2: deltaPower.im,
      'P line': linePower.re,
      'Q line': linePower.im,
    }
  })
})

/** Currents into a star without a neutral: its point lies at Σ V·Y / Σ Y (Millman's theorem). */
function starCurrents(
  volts: readonly Complex[],
  admittances: readonly Complex[],
): readonly Complex[] {
  const driven = volts.map((voltage, phase) => multiply(voltage, at(admittances, phase)))
  const point = divide(sum(...driven), sum(...admittances))
  return volts.map((voltage, phase) => multiply(subtract(voltage, point), at(admittances, phase)))
}
