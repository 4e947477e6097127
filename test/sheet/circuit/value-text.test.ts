import { expect, test } from 'vitest'
import { formatElementLimit, formatElementValue, parseElementValue } from '../../../src/sheet'

function value(...typed: Parameters<typeof parseElementValue>) {
  const read = parseElementValue(...typed)
  if (!read.ok) throw new Error(read.problem)
  return read.value
}

test('a value is read with its unit, its prefix and its limit', () => {
  expect(value('150 mH', 'inductance')).toEqual({ value: 0.15, text: '150 mH' })
  expect(value('12', 'resistance')).toEqual({ value: 12, text: '12' })
  const capacitance = value('16 µF ± 5 %', 'capacitance')
  expect(capacitance).toMatchObject({ value: 16e-6, text: '16 µF' })
  expect(capacitance.limit).toBeCloseTo(0.8e-6, 18)
})

test('a limit alone changes that of the value before', () => {
  expect(value('± 10 %', 'resistance', { value: 12, text: '12' })).toEqual({
    value: 12,
    text: '12',
    limit: 1.2,
  })
  expect(value('± 0.5', 'resistance', { value: 12 })).toEqual({ value: 12, limit: 0.5 })
  expect(parseElementValue('± 10 %', 'resistance').ok).toBe(false)
})

test('what is no single value in the unit is refused in words', () => {
  for (const text of ['12 V', '3 + j4', '5 ∠ 30', '', 'much']) {
    const read = parseElementValue(text, 'inductance')
    expect(read.ok ? text : read.problem).toMatch(/\.$/)
  }
})

test('a value is shown as it was typed, with its unit', () => {
  expect(formatElementValue({ value: 0.15, text: '150 mH' }, 'inductance')).toBe('150 mH')
  expect(formatElementValue({ value: 12, text: '12.0' }, 'resistance')).toBe('12.0 Ω')
  expect(formatElementValue({ value: 16e-6 }, 'capacitance')).toBe('16 µF')
  expect(formatElementValue({ value: 100 }, 'resistance')).toBe('100 Ω')
  expect(formatElementValue({ value: 10e3 }, 'resistance')).toBe('10 kΩ')
  expect(formatElementValue({ value: 0 }, 'resistance')).toBe('0 Ω')
  expect(formatElementValue({ value: -40 }, 'reactance')).toBe('−40 Ω')
})

test('what is shown is read again as the same value', () => {
  for (const typed of [{ value: 0.15, text: '150 mH' }, { value: 0.15 }, { value: 2.2e-9 }]) {
    expect(value(formatElementValue(typed, 'inductance'), 'inductance').value).toBeCloseTo(
      typed.value,
      18,
    )
  }
})

test('a limit is in per cent where that comes out even', () => {
  expect(formatElementLimit({ value: 16e-6, limit: 0.8e-6 }, 'capacitance')).toBe('± 5 %')
  expect(formatElementLimit({ value: 16e-6, limit: 0.7e-6 }, 'capacitance')).toBe('± 0.70 µF')
  expect(formatElementLimit({ value: 12, limit: 0 }, 'resistance')).toBe('± 0 Ω')
  expect(formatElementLimit({ value: 12 }, 'resistance')).toBeUndefined()
})
