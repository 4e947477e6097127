import { describe, expect, it } from 'vitest'
import {
  formatAngle,
  formatLimit,
  formatNumber,
  formatPolar,
  formatQuantity,
  formatRectangular,
} from '../../src/core'

describe('a printed number', () => {
  it.each([
    [48.2, 2, '48.20'],
    [48.2, 0, '48'],
    [-48.25, 1, '−48.3'],
    [1234, -2, '1200'],
    [-0.04, 1, '0.0'],
    [0, 2, '0.00'],
    [Number.NaN, 1, '–'],
    [Number.POSITIVE_INFINITY, 1, '–'],
  ])('%d with %d decimals', (value, decimals, text) => {
    expect(formatNumber(value, decimals)).toBe(text)
  })
})

describe('a printed quantity', () => {
  it.each([
    [48.2, 'V', '48.20 V'],
    [0.23, 'V', '230.0 mV'],
    [1500, 'V', '1.500 kV'],
    [-1500, 'A', '−1.500 kA'],
    [0, 'V', '0 V'],
    [0.0000047, 'F', '4.700 µF'],
    [2.2e6, 'Ω', '2.200 MΩ'],
    [999.96, 'V', '1.000 kV'],
    [1234.5, '', '1235'],
    [1.25, '%', '1.250 %'],
    [30, '°', '30.00°'],
    [1500, 'mm', '1500 mm'],
    [1e-15, 'A', '1.000e−15 A'],
    [1e16, 'V', '1.000e16 V'],
    [Number.NaN, 'V', '–'],
  ])('has four digits where nothing else is known: %d %s', (value, unit, text) => {
    expect(formatQuantity(value, unit)).toBe(text)
  })

  it.each([
    [48.2, 0.1, '48.2 V'],
    [48.2, 0.01, '48.20 V'],
    [48, 1, '48 V'],
    [0.23, 0.001, '230 mV'],
    [0.23, 0.01, '0.23 V'],
    [4700, 100, '4.7 kV'],
    [120, 10, '0.12 kV'],
    [999.96, 0.1, '1.0000 kV'],
    [0, 0.01, '0.00 V'],
  ])('shows the digits that are known: %d to %d', (value, resolution, text) => {
    expect(formatQuantity(value, 'V', { resolution })).toBe(text)
  })

  it('has no more digits than two of its limit', () => {
    expect(formatQuantity(48.1983, 'V', { limit: 0.5 })).toBe('48.20 V')
    expect(formatQuantity(48.1983, 'V', { limit: 5 })).toBe('48.2 V')
    expect(formatQuantity(48.1983, 'V', { limit: 0.048, resolution: 0.0001 })).toBe('48.198 V')
    expect(formatQuantity(48.1983, 'V', { limit: 0.5, resolution: 0.1 })).toBe('48.2 V')
    expect(formatQuantity(1234, 'V', { limit: 150 })).toBe('1.23 kV')
    expect(formatQuantity(48.2, 'V', { limit: 0, resolution: 0.1 })).toBe('48.2 V')
  })

  it('can have another number of digits', () => {
    expect(formatQuantity(48.1983, 'V', { digits: 6 })).toBe('48.1983 V')
    expect(formatQuantity(0.2, 'A', { digits: 1 })).toBe('0.2 A')
  })
})

describe('a printed angle', () => {
  it('has tenths, and no space before the °', () => {
    expect(formatAngle(82)).toBe('82.0°')
    expect(formatAngle(-90)).toBe('−90.0°')
  })

  it('is wrapped before and after it is rounded', () => {
    expect(formatAngle(270)).toBe('−90.0°')
    expect(formatAngle(-179.96)).toBe('180.0°')
    expect(formatAngle(-0.04)).toBe('0.0°')
  })

  it('shows the digits that are known and that the limit supports', () => {
    expect(formatAngle(82.123, { resolution: 0.01 })).toBe('82.12°')
    expect(formatAngle(82.123, { resolution: 1 })).toBe('82°')
    expect(formatAngle(82.123, { limit: 1 })).toBe('82.1°')
    expect(formatAngle(82.123, { limit: 20 })).toBe('82°')
    expect(formatAngle(82.123, { limit: 0 })).toBe('82.1°')
  })

  it('is an en dash where it is not finite', () => {
    expect(formatAngle(Number.NaN)).toBe('–')
  })
})

describe('a printed phasor', () => {
  it('is magnitude and angle', () => {
    expect(formatPolar({ magnitude: 48.2, angle: 82 }, 'V')).toBe('48.20 V ∠ 82.0°')
    const options = { magnitude: { resolution: 0.1 }, angle: { resolution: 1 } }
    expect(formatPolar({ magnitude: 48.2, angle: 82 }, 'V', options)).toBe('48.2 V ∠ 82°')
  })

  it('is real and imaginary part, the j before its figure', () => {
    expect(formatRectangular({ re: 6.7, im: 47.7 }, 'V', { resolution: 0.1 })).toBe('6.7 + j47.7 V')
    expect(formatRectangular({ re: 6.7, im: -47.7 }, 'V', { resolution: 0.1 })).toBe(
      '6.7 − j47.7 V',
    )
    expect(formatRectangular({ re: -3, im: 4 }, '')).toBe('−3.000 + j4.000')
    expect(formatRectangular({ re: 0, im: 0 }, 'V')).toBe('0 + j0 V')
    expect(formatRectangular({ re: Number.NaN, im: 0 }, 'V')).toBe('–')
  })

  it('has one prefix and one place value for both parts', () => {
    expect(formatRectangular({ re: 6700, im: 0.4 }, 'V')).toBe('6.700 + j0.000 kV')
    expect(formatRectangular({ re: 0.0067, im: -0.0477 }, 'V')).toBe('6.70 − j47.70 mV')
  })

  it('shows no minus before what rounds to nothing', () => {
    expect(formatRectangular({ re: 5, im: -0.0001 }, 'V')).toBe('5.000 + j0.000 V')
  })
})

describe('a printed limit', () => {
  it.each([
    [0.5, 'V', '± 0.5 V'],
    [0.25, 'V', '± 0.25 V'],
    [12, 'V', '± 12 V'],
    [0.03, 'A', '± 0.03 A'],
    [0.00005, 'V', '± 0.05 mV'],
    [1250, 'V', '± 1.3 kV'],
    [1, '°', '± 1°'],
    [0, 'V', '± 0 V'],
    [0.1 + 0.2, 'V', '± 0.3 V'],
    [3, '', '± 3'],
    [Number.NaN, 'V', '± –'],
  ])('%d %s', (limit, unit, text) => {
    expect(formatLimit(limit, unit)).toBe(text)
  })

  it('is rounded up, so that it does not look tighter than it is', () => {
    expect(formatLimit(0.482, 'V')).toBe('± 0.49 V')
    expect(formatLimit(0.0996, 'V')).toBe('± 0.1 V')
  })

  it('may be a percentage', () => {
    expect(formatLimit({ percent: 1.5 }, 'V')).toBe('± 1.5 %')
    expect(formatLimit({ absolute: 0.5 }, 'V')).toBe('± 0.5 V')
  })
})
