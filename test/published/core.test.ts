import { describe } from 'vitest'
import {
  add,
  angleOf,
  degreesFromRadians,
  divide,
  fromPolar,
  magnitudeOf,
  multiply,
  radiansFromDegrees,
  resultant,
  scaleBy,
  subtract,
} from '../../src/core'
import { published } from './cases'
import { at, check, input, polar, read, readAll, reciprocal, sum } from './phasors'

describe('resultants', () => {
  check('R01', (from) =>
    polar('|E|', 'angle', sum(read(input(from, 'E1'), 'V'), read(input(from, 'E2'), 'V'))),
  )

  check('R02', (from) =>
    polar('|E|', 'angle', sum(read(input(from, 'E1'), 'V'), read('6 V ∠45°', 'V'))),
  )

  check('R02', (from) =>
    polar(
      '|E|',
      'angle',
      resultant([
        { value: read(input(from, 'E1'), 'V') },
        { value: read('6 V ∠225°', 'V'), sign: -1 },
      ]),
    ),
  )

  check('R04', (from) => {
    const total = resultant([
      { value: read(input(from, 'E1'), 'V') },
      { value: read('12 V ∠35°', 'V'), sign: -1 },
      { value: read(input(from, 'E3'), 'V') },
    ])
    return { Re: total.re, Im: total.im, ...polar('|E|', 'angle', total) }
  })

  check('R07', () => {
    const total = sum(read('50'), read('100 ∠ −π/6 rad'))
    return { peak: magnitudeOf(total), angle: radiansFromDegrees(angleOf(total)) }
  })

  check('R08', () => {
    const total = sum(read('20'), read('10 ∠ π/3 rad'))
    return { peak: magnitudeOf(total), angle: radiansFromDegrees(angleOf(total)) }
  })

  check('R09', () => polar('peak', 'angle', sum(read('20'), read('10 ∠ π/3 rad'))))

  check('R13', () => polar('peak', 'angle', sum(read('20 ∠ −30°'), read('40 ∠ 60°'))))

  // A sine is a cosine 90° later.
  check('R14', () => polar('peak', 'angle', sum(read('4 ∠ 30°'), fromPolar(5, -20 - 90))))

  check('K01', (from) => {
    const branches = ['to 633', 'to 645', 'to 671'].map((name) => readAll(input(from, name), 'A'))
    const into = [0, 1, 2].map((phase) => sum(...branches.map((branch) => at(branch, phase))))
    return {
      ...polar('|IA|', 'IA angle', at(into, 0)),
      ...polar('|IB|', 'IB angle', at(into, 1)),
      ...polar('|IC|', 'IC angle', at(into, 2)),
    }
  })
})

describe('polar and rectangular', () => {
  check('R05', () => {
    const back = read('5 ∠36.87°')
    return {
      ...polar('|z|', 'angle', read('4 + j3')),
      'Re of 5∠36.87': back.re,
      'Im of 5∠36.87': back.im,
    }
  })

  check('R06', (from) => {
    const pairs = (name: string, mark: string) =>
      input(from, name)
        .split(';')
        .map((each) => each.split(mark).map((part) => read(part.trim())))
        .map((pair) => [at(pair, 0), at(pair, 1)] as const)
    const products = pairs('products', '·').map(([a, b]) => multiply(a, b))
    const quotients = pairs('quotients', '/').map(([a, b]) => divide(a, b))
    const reciprocals = pairs('reciprocals', '/').map(([a, b]) => divide(a, b))
    return {
      ...polar('prod1', 'prod1 angle', at(products, 0)),
      ...polar('prod2', 'prod2 angle', at(products, 1)),
      prod3: magnitudeOf(at(products, 2)),
      ...polar('quot1', 'quot1 angle', at(quotients, 0)),
      ...polar('quot2', 'quot2 angle', at(quotients, 1)),
      ...polar('quot3', 'quot3 angle', at(quotients, 2)),
      recip1: magnitudeOf(at(reciprocals, 0)),
      recip3: magnitudeOf(at(reciprocals, 2)),
    }
  })

  check('Z07', () => ({
    'R (c)': read('30∠60° Ω', 'Ω').re,
    'R (d)': read('2.20e6∠-30° Ω', 'Ω').re / 1000,
  }))

  check('F08', () => {
    const phase = degreesFromRadians(0.36)
    return {
      phase,
      'i(0)': fromPolar(120, phase).im,
      'i(8 ms)': fromPolar(120, phase + degreesFromRadians(100 * Math.PI * 0.008)).im,
    }
  })
})

describe('impedances and admittances', () => {
  check('Z10', (from) => {
    const [first, second] = [read(input(from, 'Z1'), 'Ω'), read(input(from, 'Z2'), 'Ω')]
    return polar('|Z|', 'angle', divide(multiply(first, second), add(first, second)))
  })

  check('S23', () => ({
    '|Z| RL': magnitudeOf(read('100 + j60 Ω', 'Ω')),
    '|Z| RC': magnitudeOf(read('60 − j50 Ω', 'Ω')),
  }))

  check('P08', (from) => {
    const voltage = read(input(from, 'V'), 'V')
    const currents = ['Z1', 'Z2', 'Z3'].map((name) => divide(voltage, read(input(from, name), 'Ω')))
    const total = sum(...currents)
    return { 'Re I': total.re, 'Im I': total.im, angle: angleOf(total) }
  })

  check('P09', (from) => {
    const [resistor, coil] = [read('8 Ω', 'Ω'), read('j6 Ω', 'Ω')]
    const together = divide(multiply(resistor, coil), add(resistor, coil))
    const voltage = read(input(from, 'V'), 'V')
    const current = divide(voltage, add(read('5 Ω', 'Ω'), together))
    const across = multiply(current, together)
    return {
      ...polar('|I|', 'I angle', current),
      ...polar('|I1|', 'I1 angle', divide(across, resistor)),
      ...polar('|I2|', 'I2 angle', divide(across, coil)),
    }
  })

  check('P14', () => {
    const branches = ['10 Ω', '6 + j8 Ω', '−j5 Ω'].map((text) => reciprocal(read(text, 'Ω')))
    const admittance = sum(...branches)
    const voltage = divide({ re: 8, im: 0 }, admittance)
    const currents = branches.map((branch) => multiply(voltage, branch))
    return {
      ...polar('|Y|', 'Y angle', admittance),
      ...polar('|V|', 'V angle', voltage),
      ...polar('|I1|', 'I1 angle', at(currents, 0)),
      ...polar('|I2|', 'I2 angle', at(currents, 1)),
      ...polar('|I3|', 'I3 angle', at(currents, 2)),
    }
  })

  check('U01', (from) => {
    const total = divide(read(input(from, 'V'), 'V'), read(input(from, 'I'), 'A'))
    const second = subtract(total, read('4.36 − j2.1 Ω', 'Ω'))
    return { 'Re Z2': second.re, 'Im Z2': second.im }
  })

  check('U03', (from) => {
    const voltage = read(input(from, 'V'), 'V')
    const total = read(input(from, 'I'), 'A')
    const others = ['Z2', 'Z3'].map((name) => divide(voltage, read(input(from, name), 'Ω')))
    const first = divide(voltage, subtract(total, sum(...others)))
    return { 'Re Z1': first.re, 'Im Z1': first.im }
  })

  check('G02', () => {
    const readings = published('G01')
    const column = (name: string) => input(readings, name).split(',').map(Number)
    const volts = column('V (V)')
    const amperes = column('I (mA)').map((current) => current / 1000)
    const angles = column('φ (rad)').map(degreesFromRadians)
    const impedances = volts.map((voltage, index) =>
      divide({ re: voltage, im: 0 }, fromPolar(at(amperes, index), -at(angles, index))),
    )
    const single = impedances.map((z, index) => ({
      [`R${index + 1}`]: z.re,
      [`X${index + 1}`]: z.im,
      [`Z${index + 1}`]: magnitudeOf(z),
    }))
    const mean = scaleBy(sum(...impedances), 1 / impedances.length)
    return Object.assign({ 'mean R': mean.re, 'mean X': mean.im }, ...single)
  })
})
