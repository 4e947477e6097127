import { expect, test } from 'vitest'
import { formatEstimate } from '../../src/core'

test('a value and its limit stand in one unit', () => {
  expect(formatEstimate(0.75, 0.012, 'A')).toBe('0.750 A ± 0.012 A')
  expect(formatEstimate(12_003, 178, 'V')).toBe('12.00 kV ± 0.18 kV')
  expect(formatEstimate(0.0131e-3, 0.0003e-3, 'F')).toBe('13.10 µF ± 0.30 µF')
  expect(formatEstimate(48.1702, 0.3391, 'V')).toBe('48.17 V ± 0.34 V')
})

test('an exact value stands alone, and one that is no number is a dash', () => {
  expect(formatEstimate(48, 0, 'V')).toBe('48.00 V')
  expect(formatEstimate(Number.NaN, 1, 'V')).toBe('–')
})

test('a limit that is larger than the value sets the unit', () => {
  expect(formatEstimate(0.002, 0.5, 'V')).toBe('0.00 V ± 0.50 V')
})

test('a limit never looks tighter than it is, and an angle has its degrees', () => {
  expect(formatEstimate(94.04, 4.74, 'V')).toBe('94.0 V ± 4.8 V')
  expect(formatEstimate(-34.68, 1.03, '°')).toBe('−34.7° ± 1.1°')
})

test('a size may set the prefix of both', () => {
  expect(formatEstimate(0.1336, 0.0018, 'H', 0.1336)).toBe('133.6 mH ± 1.8 mH')
})
