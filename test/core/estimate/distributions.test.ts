import { describe, expect, test } from 'vitest'
import {
  chiSquarePoint,
  chiSquareTail,
  combinedUncertainty,
  coverageFactor,
  effectiveFreedom,
  expandedUncertainty,
  normalTwoSidedPoint,
  studentTwoSidedPoint,
  studentTwoTails,
  type UncertaintyPart,
} from '../../../src/core/estimate'
import { logGamma, upperGamma } from '../../../src/core/estimate/gamma'
import { expectPublished, nameOf, outputOf, published } from '../../published/cases'

describe('the gamma function', () => {
  test('is the factorial at whole numbers and √π at a half', () => {
    let factorial = 1
    for (let n = 1; n <= 20; n++) {
      expect(logGamma(n)).toBeCloseTo(Math.log(factorial), 12)
      factorial *= n
    }
    expect(logGamma(0.5)).toBeCloseTo(0.5 * Math.log(Math.PI), 13)
  })

  test('is a Poisson sum, cut off, for a whole first argument', () => {
    for (const [a, x] of [
      [1, 0.3],
      [3, 2.5],
      [7, 20],
      [40, 33],
    ] as const) {
      let term = Math.exp(-x)
      let sum = 0
      for (let k = 0; k < a; k++) {
        sum += term
        term *= x / (k + 1)
      }
      expect(Math.abs(upperGamma(a, x) / sum - 1)).toBeLessThan(1e-12)
    }
  })
})

describe('chi-square', () => {
  // Tables of the chi-square distribution, upper 5 % and 1 % points (NIST/SEMATECH e-Handbook, 1.3.6.7.4; from memory).
  test.each([
    [1, 0.05, 3.841],
    [2, 0.05, 5.991],
    [5, 0.05, 11.07],
    [10, 0.05, 18.307],
    [30, 0.05, 43.773],
    [100, 0.05, 124.342],
    [1, 0.01, 6.635],
    [20, 0.01, 37.566],
  ])(
    'with %i degrees of freedom exceeds its printed point for %f',
    (freedom, exceeded, printed) => {
      expect(Math.abs(chiSquarePoint(exceeded, freedom) - printed)).toBeLessThanOrEqual(0.0005)
      expect(chiSquareTail(chiSquarePoint(exceeded, freedom), freedom)).toBeCloseTo(exceeded, 12)
    },
  )

  test('with no freedom says nothing', () => {
    expect(chiSquareTail(0, 0)).toBe(1)
    expect(chiSquarePoint(0.05, 0)).toBe(0)
  })
})

describe("Student's t", () => {
  // Tables of Student's t, two-sided 95 % (GUM table G.2; from memory).
  test.each([
    [1, 12.71],
    [4, 2.78],
    [10, 2.23],
    [18, 2.1],
    [50, 2.01],
  ])('with %i degrees of freedom has its printed 95 %% point', (freedom, printed) => {
    expect(Math.abs(studentTwoSidedPoint(0.05, freedom) - printed)).toBeLessThanOrEqual(0.005)
  })

  test('with one and two degrees of freedom agrees with its closed forms', () => {
    for (const t of [0.1, 1, 4.3, 30]) {
      expect(studentTwoTails(t, 1)).toBeCloseTo(1 - (2 / Math.PI) * Math.atan(t), 13)
      expect(studentTwoTails(t, 2)).toBeCloseTo(1 - t / Math.sqrt(2 + t * t), 13)
    }
  })

  test('with endless freedom is normal', () => {
    const test95 = outputOf(published('K04'), 'critical')
    expectPublished(test95, normalTwoSidedPoint(0.05))
    expect(studentTwoSidedPoint(0.05, Number.POSITIVE_INFINITY)).toBeCloseTo(1.95996398454, 10)
  })
})

describe('the coverage factor', () => {
  const part = (uncertainty: number, freedom?: number): UncertaintyPart =>
    freedom === undefined
      ? { uncertainty, shape: 'rectangular' }
      : { uncertainty, shape: 'normal', freedom }

  test(nameOf(published('G05')), () => {
    const from = published('G05')
    const parts = [part(0.25, 9), part(0.57, 4), part(0.82, 14)]
    expectPublished(outputOf(from, 'uc rel'), combinedUncertainty(parts))
    expectPublished(outputOf(from, 'νeff'), effectiveFreedom(parts))
    expectPublished(outputOf(from, 't95(19)'), studentTwoSidedPoint(0.05, 19))
    // The source multiplies its own roundings, 2.09 · 1.03; carried in full the product is 2.1547.
    expect(
      Math.abs(expandedUncertainty(parts) - Number(outputOf(from, 'U95 rel').printed)),
    ).toBeLessThanOrEqual(0.05)
  })

  test(nameOf(published('G08')), () => {
    const from = published('G08')
    const resolution = 0.05 / Math.sqrt(3)
    const calibrator = 0.011 / Math.sqrt(3)
    expectPublished(outputOf(from, 'u(resolution)'), resolution)
    expectPublished(outputOf(from, 'u(calibrator)'), calibrator)
    const parts: UncertaintyPart[] = [
      { uncertainty: 0.001, shape: 'normal' },
      part(resolution),
      part(calibrator),
    ]
    expectPublished(outputOf(from, 'u(E)'), combinedUncertainty(parts))
    expectPublished(outputOf(from, 'U (k = 1.65)'), expandedUncertainty(parts))
  })

  test('is 2 where two limits of like size add up, and 1.65 where there is one', () => {
    expect(coverageFactor([part(1), part(1)])).toBe(2)
    expect(coverageFactor([part(1)])).toBe(1.65)
    expect(coverageFactor([])).toBe(2)
  })

  test('comes from the freedom where a few repeats dominate', () => {
    expect(coverageFactor([part(1, 4), part(0.1)])).toBeCloseTo(
      studentTwoSidedPoint(0.05, 4 * 1.01 ** 2),
      12,
    )
  })
})
