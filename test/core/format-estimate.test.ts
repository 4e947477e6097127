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
