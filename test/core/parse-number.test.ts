import { describe, expect, it } from 'vitest'
import { parseNumber, type Typed } from '../../src/core'

function read(text: string, unit = 'V'): Typed {
  const result = parseNumber(text, { unit })
  if (!result.ok) throw new Error(`${text}: ${result.problem}`)
  return result.value
}

function problem(text: string, unit = 'V'): string {
  const result = parseNumber(text, { unit })
  if (result.ok) throw new Error(`${text} was read as ${result.value.value}`)
  return result.problem
}

describe('a number', () => {
  it.each([
    ['48.2', 48.2],
    ['48,2', 48.2],
    ['23.40', 23.4],
    ['+5', 5],
    ['-5', -5],
    ['−5', -5],
    ['– 5', -5],
    ['.5', 0.5],
    [',5', 0.5],
    ['5.', 5],
    ['007', 7],
    ['0', 0],
    ['1e3', 1000],
    ['1.5E-3', 0.0015],
    ['1,5e−3', 0.0015],
    ['2e+2', 200],
  ])('is read from %s', (text, value) => {
    expect(read(text)).toEqual({ value, text })
  })

  it.each([
    ['1 234.5', 1234.5],
    ['1 234,5', 1234.5],
    ['1\u2009234.5', 1234.5],
    ['1\u202f234.5', 1234.5],
    ['1\u00a0234\u00a0567', 1234567],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1,234,567', 1234567],
    ['1.234.567', 1234567],
  ])('may have its thousands parted: %s', (text, value) => {
    expect(read(text)).toEqual({ value, text })
  })

  it('has no negative zero', () => {
    expect(Object.is(read('-0').value, 0)).toBe(true)
    expect(Object.is(read('−0.00/3').value, 0)).toBe(true)
  })

  it('is refused where a comma may be a decimal point or part thousands', () => {
    expect(problem('1,234')).toBe('“1,234” can be read two ways: write 1.234 or 1234.')
    expect(problem('12,345 mV')).toBe('“12,345” can be read two ways: write 12.345 or 12345.')
    expect(read('0,234').value).toBe(0.234)
    expect(read('12,34').value).toBe(12.34)
  })

  it.each(['', '   ', '\u200b'])('is asked for where the cell is empty: “%s”', (text) => {
    expect(problem(text)).toBe('Type a value, such as 48.2 or 230 m.')
  })

  it.each([
    ['1e400', '“1e400” is too large: check its exponent.'],
    ['9e308 k', '“9e308 k” is too large: check its exponent.'],
    ['1e-400', '“1e-400” is too small: check its exponent, or write 0.'],
    ['1e300*1e300', '“1e300*1e300” is too large: check the figures.'],
    ['48 2', '“48 2” is more than one number: write one, without the space.'],
    ['12 34', '“12 34” is more than one number: write one, without the space.'],
    ['1 2345', '“1 2345” is more than one number: write one, without the space.'],
    ['5+3', '“5+3” is a sum: work it out first, or mark the imaginary part with a j.'],
    ['48..2', '“48..2” is not a number: write one such as 48.2 or 0.24/3.'],
    ['--5', '“--5” is not a number: write one such as 48.2 or 0.24/3.'],
    ['abc', '“abc” is not a number: write one such as 48.2 or 0.24/3.'],
    ['NaN', '“NaN” is not a number: write one such as 48.2 or 0.24/3.'],
    ['Infinity', '“Infinity” is not a number: write one such as 48.2 or 0.24/3.'],
    ['0x10', '“0x10” is not a number: write one such as 48.2 or 0.24/3.'],
    ['=A1', '“=A1” is not a number: write one such as 48.2 or 0.24/3.'],
    ['<b>5</b>', '“<b>5<” is not a number: write one such as 48.2 or 0.24/3.'],
    ['48.2\n50', 'That is more than one cell: type one value, such as 48.2 or 230 m.'],
    ['9'.repeat(121), 'That is too long for one value: type one such as 48.2 or 230 m.'],
  ])('is refused in one sentence: %s', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })

  it('loses marks that show nothing', () => {
    expect(read('\u200e48.2\u200f\ufeff')).toEqual({ value: 48.2, text: '48.2' })
    expect(read('  48.2\t')).toEqual({ value: 48.2, text: '48.2' })
  })
})

describe('a unit', () => {
  it.each([
    ['48.2 V', 'V', 48.2],
    ['48.2V', 'V', 48.2],
    ['230 mV', 'V', 0.23],
    ['230mV', 'V', 0.23],
    ['11 kV', 'V', 11000],
    ['5 v', 'V', 5],
    ['3 volts', 'V', 3],
    ['120 mA', 'A', 0.12],
    ['5 µA', 'A', 0.000005],
    ['5 \u03bcA', 'A', 0.000005],
    ['5 uA', 'A', 0.000005],
    ['10 Ω', 'Ω', 10],
    ['10 \u2126', 'Ω', 10],
    ['10 ohm', 'Ω', 10],
    ['47R', 'Ω', 47],
    ['1.5 kΩ', 'Ω', 1500],
    ['2.2 MΩ', 'Ω', 2200000],
    ['3 kVA', 'VA', 3000],
    ['50 Hz', 'Hz', 50],
    ['1.5 kHz', 'Hz', 1500],
    ['4 kvar', 'var', 4000],
    ['2 mH', 'H', 0.002],
    ['47 nF', 'F', 4.7e-8],
    ['12 mm', 'mm', 12],
  ])('goes with its figure: %s', (text, unit, value) => {
    expect(read(text, unit)).toEqual({ value, text })
  })

  it.each([
    ['1.5k', 1500],
    ['1.5 k', 1500],
    ['1.5K', 1500],
    ['230m', 0.23],
    ['2M', 2e6],
    ['3u', 3e-6],
    ['4 G', 4e9],
    ['7p', 7e-12],
  ])('may be left out after its prefix: %s', (text, value) => {
    expect(read(text)).toEqual({ value, text })
    expect(read(text, '')).toEqual({ value, text })
  })

  it.each([
    ['4k7', 'V', 4700],
    ['4k7', 'Ω', 4700],
    ['4k7 Ω', 'Ω', 4700],
    ['2M2', 'Ω', 2200000],
    ['4R7', 'Ω', 4.7],
    ['R47', 'Ω', 0.47],
    ['4m7', 'A', 0.0047],
    ['1u5', 'F', 1.5e-6],
    ['100R', 'Ω', 100],
  ])('may stand for the decimal point (IEC 60062): %s', (text, unit, value) => {
    expect(read(text, unit)).toEqual({ value, text })
  })

  it.each([
    ['5 A', 'V', 'This value is in V, so “A” does not fit: write V, or leave the unit out.'],
    ['5 mA', 'V', 'This value is in V, so “mA” does not fit: write V, or leave the unit out.'],
    ['4R7', 'V', 'This value is in V, so “R” does not fit: write V, or leave the unit out.'],
    ['5 W', 'VA', 'This value is in VA, so “W” does not fit: write VA, or leave the unit out.'],
    [
      '5 furlongs',
      'V',
      'This value is in V, so “furlongs” does not fit: write V, or leave the unit out.',
    ],
    ['5 %', 'V', 'This value is in V, so “%” does not fit: write V, or leave the unit out.'],
    ['82°', 'V', 'This value is in V, so “°” does not fit: write V, or leave the unit out.'],
    ['5 V', '', 'This value has no unit: leave out “V”.'],
    ['5k', 'mm', 'This value is in mm, so “k” does not fit: write mm, or leave the unit out.'],
    ['5 kmm', 'mm', 'This value is in mm, so “kmm” does not fit: write mm, or leave the unit out.'],
  ])('that does not match is refused in words: %s in a cell of %s', (text, unit, sentence) => {
    expect(problem(text, unit)).toBe(sentence)
  })
})

describe('a product or quotient', () => {
  it.each([
    ['0.24/3', 0.08],
    ['0.24 / 3', 0.08],
    ['1.5/10*360', 54],
    ['2×3', 6],
    ['2·3', 6],
    ['6÷4', 1.5],
    ['24m/3', 0.008],
    ['0,24/3', 0.08],
    ['-6/3', -2],
    ['6/-3', -2],
    ['1 200/2', 600],
    ['0.24/3 mV', 0.00008],
    ['230 * √3', 230 * Math.sqrt(3)],
    ['400/sqrt(3)', 400 / Math.sqrt(3)],
    ['325/√(2)', 325 / Math.sqrt(2)],
    ['2*π', 2 * Math.PI],
    ['2*pi', 2 * Math.PI],
    ['pi/2', Math.PI / 2],
  ])('is worked out: %s', (text, value) => {
    expect(read(text)).toEqual({ value, text })
  })

  it.each([
    ['1/0', '“1/0” divides by zero: check the figures.'],
    ['5*', 'A figure is missing: write one such as 48.2 or 0.24/3.'],
    ['/5', 'A figure is missing: write one such as 48.2 or 0.24/3.'],
    ['5//5', 'A figure is missing: write one such as 48.2 or 0.24/3.'],
    ['√-4', '“-4” is not a number: write one such as 48.2 or 0.24/3.'],
    ['24/3 m', 'It is open what “m” belongs to: write it against its figure, or with the unit.'],
    ['5/x', 'This value is in V, so “x” does not fit: write V, or leave the unit out.'],
  ])('is refused in one sentence: %s', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })
})

describe('a limit behind a figure', () => {
  it.each([
    ['48.2 ± 0.5', 48.2, '48.2', 0.5],
    ['48.2±0.5', 48.2, '48.2', 0.5],
    ['48.2 +/- 0.5', 48.2, '48.2', 0.5],
    ['48.2 +/−0.5', 48.2, '48.2', 0.5],
    ['48.2 +-0.5', 48.2, '48.2', 0.5],
    ['48,2 ± 0,5', 48.2, '48,2', 0.5],
    ['48.2 ± 0.5 V', 48.2, '48.2', 0.5],
    ['48.2 V ± 0.5 V', 48.2, '48.2 V', 0.5],
    ['48.2 V ± 0.5', 48.2, '48.2 V', 0.5],
    ['48.2 V ± 50 mV', 48.2, '48.2 V', 0.05],
    ['230 mV ± 5 mV', 0.23, '230 mV', 0.005],
    ['(230 ± 5) mV', 0.23, '230 mV', 0.005],
    ['(230 ± 1 %) mV', 0.23, '230 mV', 0.0023],
    ['48.2 ± 1 %', 48.2, '48.2', 0.482],
    ['48.2 ± 1%', 48.2, '48.2', 0.482],
    ['-48.2 ± 1 %', -48.2, '-48.2', 0.482],
    ['1.5k ± 5', 1500, '1.5k', 5],
    ['48.2 ± 5m', 48.2, '48.2', 0.005],
    ['0.24/3 ± 0.1/3', 0.08, '0.24/3', 0.1 / 3],
    ['48.2 ± 0', 48.2, '48.2', 0],
  ])('is half a width in the unit of the value: %s', (text, value, kept, limit) => {
    expect(read(text)).toEqual({ value, text: kept, limit })
  })

  it.each([
    ['48.2 ± -1', 'A limit cannot be negative: write ± 1.'],
    ['48.2 ±', 'The limit is missing: write it after ±, such as ± 0.5 or ± 1 %.'],
    ['48.2 ± 1 ± 2', '“48.2 ± 1 ± 2” holds more than one limit: write one ±.'],
    ['48.2 ± 1 A', 'This value is in V, so “A” does not fit: write V, or leave the unit out.'],
    [
      '48.2 ± 50 mV',
      'It is open which figure the unit belongs to: write it with both the value and its limit.',
    ],
    [
      '230 mV ± 5',
      'It is open which figure the unit belongs to: write it with both the value and its limit.',
    ],
    ['± 1', 'A figure is missing: write one such as 48.2 or 0.24/3.'],
  ])('is refused in one sentence: %s', (text, sentence) => {
    expect(problem(text)).toBe(sentence)
  })
})
