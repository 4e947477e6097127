import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatMillimetres } from '../../../src/drawing/svg/number'

describe('a number of millimetres', () => {
  it.each([
    [0, '0'],
    [-0, '0'],
    [1, '1'],
    [96.4, '96.4'],
    [-12.05, '-12.05'],
    [0.0004, '0'],
    [-0.0004, '0'],
    [0.0006, '0.001'],
    [-0.25, '-0.25'],
    [19.9996, '20'],
    [100.1, '100.1'],
    [Number.NaN, '0'],
    [Number.POSITIVE_INFINITY, '1000000000'],
    [-1e300, '-1000000000'],
  ])('%d is written %s', (value, text) => {
    expect(formatMillimetres(value)).toBe(text)
  })

  it('reads back within half a thousandth, with at most three decimals', () => {
    const number = fc.double({ min: -1e6, max: 1e6, noNaN: true })
    fc.assert(
      fc.property(number, (value) => {
        const text = formatMillimetres(value)
        expect(text).toMatch(/^-?\d+(\.\d{0,2}[1-9])?$/)
        expect(Math.abs(Number(text) - value)).toBeLessThanOrEqual(0.0005000001)
      }),
    )
  })
})
