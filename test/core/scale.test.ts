import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isNiceScale, nextScale, niceScale, previousScale } from '../../src/core'

const extent = fc.double({ min: 1e-9, max: 1e9, noNaN: true })
const centimetres = fc.double({ min: 0.5, max: 100, noNaN: true })

describe('a scale that fits', () => {
  it.each([
    [52.2, 12, 5],
    [60, 12, 5],
    [60.1, 12, 10],
    [10, 10, 1],
    [11, 10, 2],
    [230, 10, 50],
    [1.84, 10, 0.2],
    [0.0184, 10, 0.002],
    [1.1, 11, 0.1],
    [0.3, 3, 0.1],
    [0.7, 7, 0.1],
    [1e6, 10, 1e5],
  ])('for %d units in %d cm is %d a centimetre', (units, room, scale) => {
    expect(niceScale(units, room)).toBe(scale)
  })

  it('is of the 1-2-5 series, and the smallest that fits', () => {
    fc.assert(
      fc.property(extent, centimetres, (units, room) => {
        const scale = niceScale(units, room)
        expect(isNiceScale(scale)).toBe(true)
        expect(units / scale).toBeLessThanOrEqual(room * (1 + 1e-11))
        expect(units / previousScale(scale)).toBeGreaterThan(room)
      }),
    )
  })

  it('is 1 where there is nothing to fit', () => {
    expect(niceScale(0, 10)).toBe(1)
    expect(niceScale(Number.NaN, 10)).toBe(1)
    expect(niceScale(Number.POSITIVE_INFINITY, 10)).toBe(1)
    expect(niceScale(10, 0)).toBe(1)
  })
})

describe('the 1-2-5 series', () => {
  it('holds 1, 2 and 5 times a power of ten, and nothing between', () => {
    for (const scale of [1, 2, 5, 10, 20, 50, 0.1, 0.2, 0.5, 1e-6, 2e-6, 5e9]) {
      expect(isNiceScale(scale), String(scale)).toBe(true)
    }
    for (const scale of [0, -1, 3, 4, 2.5, 15, 0.3, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(isNiceScale(scale), String(scale)).toBe(false)
    }
  })

  it('goes up and down one step at a time', () => {
    expect([1, 2, 5, 10].map(nextScale)).toEqual([2, 5, 10, 20])
    expect([1, 2, 5, 10].map(previousScale)).toEqual([0.5, 1, 2, 5])
    expect(nextScale(3)).toBe(5)
    expect(previousScale(3)).toBe(2)
  })

  it('leads back from the next scale to the one before it', () => {
    fc.assert(
      fc.property(extent, centimetres, (units, room) => {
        const scale = niceScale(units, room)
        expect(previousScale(nextScale(scale))).toBe(scale)
        expect(nextScale(previousScale(scale))).toBe(scale)
      }),
    )
  })
})
