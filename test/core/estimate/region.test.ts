import { describe, expect, test } from 'vitest'
import { createRandom, normalDeviate, regionOf } from '../../../src/core/estimate'

/** 2.4477: the square root of the 95 % point of chi-square with two degrees of freedom, −2 ln 0.05. */
const FACTOR = Math.sqrt(-2 * Math.log(0.05))

describe('the region of a tip', () => {
  test('reaches 2.45 standard uncertainties along each part where they are independent', () => {
    const { major, minor, turn } = regionOf({ real: 9, imaginary: 4, both: 0 })
    expect([major, minor, turn]).toEqual([3 * FACTOR, 2 * FACTOR, 0].map((x) => expect.closeTo(x)))
    expect(FACTOR).toBeCloseTo(2.45, 2)
  })

  test('is turned the way in which the parts move together', () => {
    const rising = regionOf({ real: 2, imaginary: 2, both: 1 })
    expect(rising.turn).toBeCloseTo(45, 12)
    expect(rising.major).toBeCloseTo(FACTOR * Math.sqrt(3), 9)
    expect(rising.minor).toBeCloseTo(FACTOR, 9)
    expect(regionOf({ real: 2, imaginary: 2, both: -1 }).turn).toBeCloseTo(-45, 12)
    expect(regionOf({ real: 1, imaginary: 4, both: 0 }).turn).toBeCloseTo(90, 12)
  })

  test('is a line where the parts move as one', () => {
    expect(regionOf({ real: 1, imaginary: 1, both: 1 }).minor).toBe(0)
  })

  test('holds nineteen tips in twenty', () => {
    const random = createRandom(24_477)
    const { major, minor, turn } = regionOf({ real: 4, imaginary: 2, both: 1.5 })
    const [cosine, sine] = [Math.cos((turn * Math.PI) / 180), Math.sin((turn * Math.PI) / 180)]
    const draws = 20_000
    let inside = 0
    for (let each = 0; each < draws; each++) {
      // Two deviates with that covariance: the second follows the first by 1.5 / 2.
      const [one, other] = [normalDeviate(random), normalDeviate(random)]
      const re = 2 * one
      const im = 0.75 * one + Math.sqrt(2 - 0.75 ** 2) * other
      const along = (cosine * re + sine * im) / major
      const across = (cosine * im - sine * re) / minor
      if (along ** 2 + across ** 2 <= 1) inside++
    }
    // Four standard deviations of a share of 95 % in so many draws.
    expect(Math.abs(inside / draws - 0.95)).toBeLessThan(4 * Math.sqrt((0.95 * 0.05) / draws))
  })
})
