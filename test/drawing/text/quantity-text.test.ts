import { describe, expect, it } from 'vitest'
import { formatFrequency, formatScale } from '../../../src/drawing/text/quantity-text'

describe('a scale bar', () => {
  it.each([
    [5, 'voltage', '10 mm = 5 V'],
    [0.2, 'current', '10 mm = 0.2 A'],
    [200, 'voltage', '10 mm = 200 V'],
    [2000, 'voltage', '10 mm = 2 kV'],
    [50000, 'power', '10 mm = 50 kVA'],
    [0.005, 'current', '10 mm = 5 mA'],
    [2.5, 'impedance', '10 mm = 2.5 Ω'],
    [10, 'other', '10 mm = 10'],
  ] as const)('for %d of %s a centimetre says %s', (scale, quantity, text) => {
    expect(formatScale(scale, quantity)).toBe(text)
  })
})

describe('a frequency', () => {
  it('shows the digits as typed', () => {
    expect(formatFrequency({ value: 50, text: '50.00' })).toBe('50.00 Hz')
    expect(formatFrequency({ value: 60 })).toMatch(/^60(\.0+)? Hz$/)
    expect(formatFrequency({ value: 400, text: '0.4 kHz' })).toMatch(/^400(\.0)? Hz$/)
  })
})
