import { describe, it } from 'vitest'
import {
  accuracyLimits,
  angleOf,
  degreesOfPower,
  magnitudeOf,
  parseAccuracy,
  rmsOfAverageResponding,
  totalLimit,
} from '../../src/core'
import { layout } from '../../src/drawing'
import { limitOf, quick, type Reading, type Sheet, standardUncertaintyOf } from '../../src/sheet'
import { phasor, polar as polarPhasor, sheetOf } from '../sheet/sheets'
import { expectPublished, nameOf, outputOf, published } from './cases'
import { check, input } from './phasors'

/** The first figure in an input of a case. */
function figureIn(text: string): number {
  const found = /-?\d+(?:\.\d+)?(?:e-?\d+)?/.exec(text)
  if (found === null) throw new Error(`there is no figure in ${text}`)
  return Number(found[0])
}

function limitsOn(sheet: Sheet) {
  return (sheet.readings ?? []).map((reading) => {
    const limit = limitOf(sheet, reading)
    if (limit === undefined) throw new Error('the reading says nothing')
    return { limit }
  })
}

describe('meters that average', () => {
  check('F10', (from) => {
    const shown = figureIn(input(from, 'reading'))
    return {
      'true rms square': rmsOfAverageResponding(shown, 'square'),
      'true rms triangle': rmsOfAverageResponding(shown, 'triangle'),
    }
  })
})

const specified = published('G04')

describe(nameOf(specified), () => {
  const value = figureIn(input(specified, 'V'))
  const statement = parseAccuracy('14 ppm of reading + 2 ppm of range', 'V')
  if (!statement.ok) throw new Error(statement.problem)
  const limits = accuracyLimits(statement.value, { value, range: 1 })
  if (!limits.ok) throw new Error(limits.problem)
  const halfWidth = totalLimit(limits.value)
  const reading = { of: 'V', kind: 'magnitude', shown: value, limit: halfWidth } as const

  it('the half-width, and its standard uncertainty as limit / √3', () => {
    expectPublished(outputOf(specified, 'half-width a'), halfWidth * 1e6)
    const sheet = sheetOf({ phasors: [phasor('V')], readings: [{ id: 'r1', ...reading }] })
    const uncertainty = standardUncertaintyOf(limitsOn(sheet))
    expectPublished(outputOf(specified, 'u(spec)'), uncertainty * 1e6)
    expectPublished(outputOf(specified, 'u²(spec)'), (uncertainty * 1e6) ** 2)
  })

  it('combined with what repeats add, s / √n', () => {
    const scatter = figureIn(input(specified, 'Type A u')) * 1e-6
    // Two repeats this far off their mean have s = √2 times as much, and their mean s / √2.
    const repeats = [value - scatter, value + scatter]
    const sheet = sheetOf({ phasors: [phasor('V')], readings: [{ id: 'r1', ...reading, repeats }] })
    expectPublished(outputOf(specified, 'uc'), standardUncertaintyOf(limitsOn(sheet)) * 1e6)
  })
})

const resistors = published('G06')

describe(nameOf(resistors), () => {
  const count = 10
  const ids = Array.from({ length: count }, (_, index) => `Z${index + 1}`)
  const percent = 100 * (0.1 / 1000) * Math.sqrt(3)

  function chain(readings: readonly Reading[]): number {
    const sheet = sheetOf({
      phasors: ids.map((id) => phasor(id, 'impedance')),
      instruments: [
        {
          id: 'm1',
          name: 'Standard',
          accuracy: [{ of: 'resistance', text: `±${percent} % of reading` }],
        },
      ],
      readings,
    })
    return standardUncertaintyOf(limitsOn(sheet))
  }
  const read = (of: string, index: number) =>
    ({ id: `r${index + 1}`, of, kind: 'magnitude', shown: '1000' }) as const

  it('with one standard in common adds up in proportion', () => {
    const together = chain(ids.map((of, index) => ({ ...read(of, index), instrument: 'm1' })))
    expectPublished(outputOf(resistors, 'uc correlated'), together)
  })

  it('with limits of their own adds up by squares', () => {
    const limit = (1000 * percent) / 100
    const apart = chain(ids.map((of, index) => ({ ...read(of, index), limit })))
    expectPublished(outputOf(resistors, 'uc if treated as independent'), apart)
  })
})

describe('watts and power factors', () => {
  check('U06', (from) => ({
    '|angle|': degreesOfPower(
      figureIn(input(from, 'P')),
      figureIn(input(from, 'V')),
      figureIn(input(from, 'I')),
    ),
  }))

  check('U10', () => {
    const factor = { id: 'r1', of: 'V', with: 'I', kind: 'power-factor', shown: '0.866' } as const
    const sheet = sheetOf({
      phasors: [{ ...phasor('V'), angle: { value: 20, text: '20' } }, phasor('I', 'current')],
      reference: 'V',
      readings: [{ ...factor, sense: 'leads' }],
    })
    return { 'I angle': quick(sheet).phasors[1]?.angle ?? Number.NaN }
  })
})

describe('scale drawings', () => {
  check('R09', () => {
    const sheet = sheetOf({
      phasors: [polarPhasor('I1', '20', '0', 'current'), polarPhasor('I2', '10', '60', 'current')],
      sums: [{ id: 's1', terms: [{ phasor: 'I1' }, { phasor: 'I2' }] }],
    })
    const scene = layout(sheet, quick(sheet))
    const drawn = scene.arrows.find(({ key }) => key === 'resultant:s1')
    const scale = scene.unitsPerCentimetre.current
    if (drawn === undefined || scale === undefined) throw new Error('the resultant is not drawn')
    const along = { re: drawn.to.x - drawn.from.x, im: drawn.to.y - drawn.from.y }
    return { peak: (magnitudeOf(along) / 10) * scale, angle: angleOf(along) }
  })
})

describe('readings through the evaluation', () => {
  it('4 + j3 typed is 5 at the published angle', () => {
    const from = published('R05')
    const sheet = sheetOf({
      phasors: [
        {
          ...phasor('V'),
          real: { value: 4, text: '4' },
          imaginary: { value: 3, text: '3' },
        },
        polarPhasor('W', '5', '36.87'),
      ],
    })
    const [first, second] = quick(sheet).phasors
    expectPublished(outputOf(from, '|z|'), first?.magnitude ?? Number.NaN)
    expectPublished(outputOf(from, 'angle'), first?.angle ?? Number.NaN)
    expectPublished(outputOf(from, 'Re of 5∠36.87'), second?.real ?? Number.NaN)
    expectPublished(outputOf(from, 'Im of 5∠36.87'), second?.imaginary ?? Number.NaN)
  })
})
