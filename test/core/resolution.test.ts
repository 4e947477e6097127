import { describe, expect, it } from 'vitest'
import { decimalPlacesOf, resolutionOf } from '../../src/core'

describe('the resolution of a text', () => {
  it.each([
    ['48.20', 0.01],
    ['48,2', 0.1],
    ['48', 1],
    ['48.', 1],
    ['1 234.50', 0.01],
    ['1,234.50', 0.01],
    ['230 mV', 0.001],
    ['230.0 mV', 0.0001],
    ['5 kV', 1000],
    ['1.5k', 100],
    ['4k7', 100],
    ['4R70', 0.01],
    ['1e3', 1000],
    ['1.50e3', 10],
    ['−12.0', 0.1],
    ['82°', 1],
    ['82.0°', 0.1],
    ['0.50 rad', 0.1],
  ])('is the place value of its last digit: %s', (text, resolution) => {
    expect(resolutionOf(text)).toBe(resolution)
  })

  it.each(['0.24/3', '2*π', 'abc', '', '48.2 ∠ 82', '9'.repeat(500)])(
    'is open for “%s”',
    (text) => {
      expect(resolutionOf(text)).toBeUndefined()
    },
  )

  it('is so many decimal places', () => {
    expect([0.01, 0.1, 1, 10, 1000, 1e-9].map(decimalPlacesOf)).toEqual([2, 1, 0, -1, -3, 9])
  })
})
