import { describe, expect, it } from 'vitest'
import { absoluteLimit, type CellOptions, type CellValue, parseCell } from '../../src/core'

function read(text: string, options: CellOptions = { unit: 'V' }): CellValue {
  const result = parseCell(text, options)
  if (!result.ok) throw new Error(`${text}: ${result.problem}`)
  return result.value
}

function problem(text: string, options: CellOptions = { unit: 'V' }): string {
  const result = parseCell(text, options)
  if (result.ok) throw new Error(`${text} was read as ${JSON.stringify(result.value)}`)
  return result.problem
}

describe('a figure in a cell', () => {
  it('is a number of the unit of the cell', () => {
    expect(read('230 mV')).toEqual({ form: 'number', number: { value: 0.23, text: '230 mV' } })
    expect(read('4k7', { unit: 'Ω' })).toEqual({
      form: 'number',
      number: { value: 4700, text: '4k7' },
    })
  })

  it('may be negative, except where the cell is a magnitude', () => {
    expect(read('-5')).toEqual({ form: 'number', number: { value: -5, text: '-5' } })
    expect(read('-5', { unit: 'V', part: 'real' })).toEqual(read('-5'))
    expect(problem('-5', { unit: 'V', part: 'magnitude' })).toBe(
      'A magnitude cannot be negative: leave the minus out and turn the angle by 180°.',
    )
  })

  it('is in degrees where the cell is an angle', () => {
    const angle = { form: 'number', number: { value: -90, text: '270' } }
    expect(read('270', { unit: 'V', part: 'angle' })).toEqual(angle)
    expect(read('270', { unit: '°' })).toEqual(angle)
    expect(problem('5 V', { unit: 'V', part: 'angle' })).toMatch(/^An angle is in degrees or rad/)
    expect(problem('', { unit: '°' })).toBe('Type a value, such as 82 or −90.')
  })

  it('takes its limit along', () => {
    expect(read('48.2 ± 1 %')).toEqual({
      form: 'number',
      number: { value: 48.2, text: '48.2', limit: 0.482 },
    })
  })

  it('is refused in the words of its own reader', () => {
    expect(problem('5 A')).toBe(
      'This value is in V, so “A” does not fit: write V, or leave the unit out.',
    )
    expect(problem('')).toBe('Type a value, such as 48.2 or 48.2 ∠ 82°.')
  })
})

describe('a limit alone', () => {
  it.each([
    ['± 0.5', { absolute: 0.5 }],
    ['±0,5 V', { absolute: 0.5 }],
    ['+/- 50 mV', { absolute: 0.05 }],
    ['+- 1', { absolute: 1 }],
    ['± 1 %', { percent: 1 }],
    ['±1%', { percent: 1 }],
    ['± 0', { absolute: 0 }],
  ])('is half a width or a percentage: %s', (text, limit) => {
    expect(read(text)).toEqual({ form: 'limit', limit })
  })

  it('is in degrees where the cell is an angle', () => {
    expect(read('± 1', { unit: '°' })).toEqual({ form: 'limit', limit: { absolute: 1 } })
    expect(problem('± 1 %', { unit: 'V', part: 'angle' })).toBe(
      'The limit of an angle is in degrees, not in percent: write it like ± 1°.',
    )
  })

  it.each([
    ['±', 'The limit is missing: write it after ±, such as ± 0.5 or ± 1 %.'],
    ['± −1 %', 'A limit cannot be negative: write ± 1 %.'],
    ['± 1 ± 2', '“± 1 ± 2” holds more than one limit: write one ±.'],
    ['± 1 A', 'This value is in V, so “A” does not fit: write V, or leave the unit out.'],
    ['± big', '“big” is not a number: write one such as 48.2 or 0.24/3.'],
  ])('is refused in one sentence: %s', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })

  it('resolves to half a width, from a percentage by the size of the value', () => {
    expect(absoluteLimit({ absolute: 0.5 }, -48.2)).toBe(0.5)
    expect(absoluteLimit({ percent: 1 }, -48.2)).toBe(0.482)
    expect(absoluteLimit({ percent: 5 }, 0)).toBe(0)
  })
})

describe('magnitude and angle in a cell', () => {
  const plain = {
    form: 'polar',
    magnitude: { value: 48.2, text: '48.2' },
    angle: { value: 82, text: '82' },
  }

  it.each(['48.2 ∠ 82', '48.2∠82', '48.2 at 82', '48.2  at  82'])(
    'are parted by ∠ or at: %s',
    (text) => {
      expect(read(text)).toEqual(plain)
      expect(read(text, { unit: 'V', part: 'angle' })).toEqual(plain)
    },
  )

  it.each([
    ['48.2 V ∠ 82.0°', '48.2 V', 48.2, '82.0°', 82],
    ['230 mV at −120°', '230 mV', 0.23, '−120°', -120],
    ['48,2 ∠ 82,5', '48,2', 48.2, '82,5', 82.5],
    ['48.2∠82° V', '48.2 V', 48.2, '82°', 82],
    ['48.2 ∠ 82 mV', '48.2 mV', 0.0482, '82', 82],
    ['0.24/3 ∠ 1.5/10*360', '0.24/3', 0.08, '1.5/10*360', 54],
    ['0 ∠ 0', '0', 0, '0', 0],
    ['5 ∠ 270', '5', 5, '270', -90],
  ])('keep their digits: %s', (text, magnitudeText, magnitude, angleText, angle) => {
    expect(read(text)).toEqual({
      form: 'polar',
      magnitude: { value: magnitude, text: magnitudeText },
      angle: { value: angle, text: angleText },
    })
  })

  it('read radians', () => {
    const value = read('48.2 ∠ 0.5 rad')
    expect(value.form === 'polar' && value.angle.value).toBeCloseTo(28.64789, 5)
    expect(value.form === 'polar' && value.angle.text).toBe('0.5 rad')
  })

  it('have each their own limit', () => {
    expect(read('48.2 ± 1 % ∠ 82 ± 1°')).toEqual({
      form: 'polar',
      magnitude: { value: 48.2, text: '48.2', limit: 0.482 },
      angle: { value: 82, text: '82', limit: 1 },
    })
    expect(read('(48.2 ± 0.5) V at (82 ± 1)°')).toEqual({
      form: 'polar',
      magnitude: { value: 48.2, text: '48.2 V', limit: 0.5 },
      angle: { value: 82, text: '82 °', limit: 1 },
    })
  })

  const SHAPE = 'Write one magnitude and one angle, such as 48.2 ∠ 82° or 48.2 at 82.'
  it.each([
    ['-5 ∠ 30', 'A magnitude cannot be negative: leave the minus out and turn the angle by 180°.'],
    ['48.2 ∠', SHAPE],
    ['∠ 82', SHAPE],
    ['at 82', SHAPE],
    ['48.2 at', SHAPE],
    ['1 ∠ 2 ∠ 3', SHAPE],
    ['48.2<82', 'Write the angle after ∠ or the word at, such as 48.2 at 82.'],
    ['48.2 ∠ 82 ± 1 %', 'The limit of an angle is in degrees, not in percent: write it like ± 1°.'],
    ['48.2 A ∠ 82', 'This value is in V, so “A” does not fit: write V, or leave the unit out.'],
    ['48.2 ∠ 82 A', 'This value is in V, so “A” does not fit: write V, or leave the unit out.'],
    ['48.2 ∠ east', '“east” is not a number: write one such as 48.2 or 0.24/3.'],
    ['abc at 30', '“abc” is not a number: write one such as 48.2 or 0.24/3.'],
    ['48.2 V ∠ 82 V', 'An angle is in degrees or rad, so “V” does not fit: write 82° or 1.43 rad.'],
  ])('are refused in one sentence: %s', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })
})

describe('real and imaginary part in a cell', () => {
  it.each([
    ['6.7+j47.7', '6.7', 6.7, '47.7', 47.7],
    ['6.7 + j47.7', '6.7', 6.7, '47.7', 47.7],
    ['6.7+47.7j', '6.7', 6.7, '47.7', 47.7],
    ['6.7 + 47.7 j', '6.7', 6.7, '47.7', 47.7],
    ['6.7+47.7i', '6.7', 6.7, '47.7', 47.7],
    ['6.7 - j47.7', '6.7', 6.7, '-47.7', -47.7],
    ['6.7 − j47.7 V', '6.7', 6.7, '−47.7 V', -47.7],
    ['-6.7-47.7j', '-6.7', -6.7, '-47.7', -47.7],
    ['6,7+j47,7', '6,7', 6.7, '47,7', 47.7],
    ['6.7+1e-3j', '6.7', 6.7, '1e-3', 0.001],
    ['1e-3-1e-3j', '1e-3', 0.001, '-1e-3', -0.001],
    ['6.7 + j47.7 mV', '6.7 mV', 0.0067, '47.7 mV', 0.0477],
    ['6.7 + 47.7j mV', '6.7 mV', 0.0067, '47.7 mV', 0.0477],
    ['(6.7 + j47.7) mV', '6.7 mV', 0.0067, '47.7 mV', 0.0477],
    ['(6.7 − j47.7)', '6.7', 6.7, '−47.7', -47.7],
    ['6.7 V + j47.7 V', '6.7 V', 6.7, '47.7 V', 47.7],
    ['6.7+47.7jV', '6.7', 6.7, '47.7 V', 47.7],
    ['100 + j4.7k', '100', 100, '4.7k', 4700],
    ['1 200.5 + j1 500', '1 200.5', 1200.5, '1 500', 1500],
    ['0 + j0', '0', 0, '0', 0],
  ])('are read from %s', (text, realText, real, imaginaryText, imaginary) => {
    expect(read(text)).toEqual({
      form: 'rectangular',
      real: { value: real, text: realText },
      imaginary: { value: imaginary, text: imaginaryText },
    })
  })

  it.each([
    ['j12', '12', 12],
    ['-j12', '-12', -12],
    ['−j12 V', '−12 V', -12],
    ['12j', '12', 12],
    ['- 12j', '- 12', -12],
    ['+j12', '12', 12],
  ])('are read where only the imaginary one is typed: %s', (text, kept, imaginary) => {
    const part = { value: imaginary, text: kept }
    expect(read(text)).toEqual({ form: 'rectangular', real: { value: 0 }, imaginary: part })
    expect(read(text, { unit: 'V', part: 'imaginary' })).toEqual({ form: 'number', number: part })
  })

  it('have each their own limit', () => {
    expect(read('6.7 ± 0.1 + j47.7 ± 0.5')).toEqual({
      form: 'rectangular',
      real: { value: 6.7, text: '6.7', limit: 0.1 },
      imaginary: { value: 47.7, text: '47.7', limit: 0.5 },
    })
    expect(read('6.7 +/- 0.1 + 47.7j')).toEqual({
      form: 'rectangular',
      real: { value: 6.7, text: '6.7', limit: 0.1 },
      imaginary: { value: 47.7, text: '47.7' },
    })
  })

  const SHAPE = 'Write it like 6.7 + j47.7, 6.7 − j47.7 or −j12.'
  it.each([
    ['j', `The figure of the j is missing. ${SHAPE}`],
    ['5+j', `The figure of the j is missing. ${SHAPE}`],
    ['5+jx', 'This value is in V, so “jx” does not fit: write V, or leave the unit out.'],
    ['6.7 j47.7', `The sign between the two parts is missing. ${SHAPE}`],
    ['j6.7 + j47.7', `Only one part carries a j. ${SHAPE}`],
    ['6.7jj', `Only one part carries a j. ${SHAPE}`],
    ['6.7 47.7j', '“6.7 47.7” is more than one number: write one, without the space.'],
    ['6.7 + -j4', '“6.7 +” is not a number: write one such as 48.2 or 0.24/3.'],
    ['6.7 mV + j47.7', 'It is open whether “mV” is the unit of both parts: write it with each.'],
    ['6.7 + j47.7 ± 0.5', 'Give each part its own limit, such as 6.7 ± 0.1 + j47.7 ± 0.5.'],
    ['3 + j4 Ω', 'This value is in V, so “Ω” does not fit: write V, or leave the unit out.'],
    ['3 A + j4', 'This value is in V, so “A” does not fit: write V, or leave the unit out.'],
  ])('are refused in one sentence: %s', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })
})
