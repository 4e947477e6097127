import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  type Complex,
  fromPolar,
  magnitudeOf,
  resultant,
  resultantOfPolar,
  type SignedTerm,
  subtract,
} from '../../src/core'
import { createRandom, shuffled } from './random'

/** What a doubly compensated sum of up to 4,096 terms may leave of the sum of their sizes. */
const LEFT_OVER = 2 ** -90

const seed = fc.integer()

/** A number whose binary exponent is drawn from a wide range. */
function drawWide(random: () => number): number {
  return (random() - 0.5) * 2 ** Math.round((random() - 0.5) * 400)
}

/** Phasors and their negatives, one after the other in any order; they add up to nothing. */
function drawPairs(count: number, random: () => number): readonly SignedTerm[] {
  const values = Array.from(
    { length: count },
    (): Complex => ({ re: drawWide(random), im: drawWide(random) }),
  )
  return shuffled(
    [
      ...values.map((value) => ({ value })),
      ...values.map((value): SignedTerm => ({ value, sign: -1 })),
    ],
    random,
  )
}

function sizesOf(terms: readonly SignedTerm[], part: keyof Complex): number {
  return terms.reduce((total, { value }) => total + Math.abs(value[part]), 0)
}

function plainSum(terms: readonly SignedTerm[], part: keyof Complex): number {
  return terms.reduce((total, { value, sign = 1 }) => total + sign * value[part], 0)
}

describe('the resultant', () => {
  it('of no phasors is zero', () => {
    expect(resultant([])).toEqual({ re: 0, im: 0 })
    expect(resultantOfPolar(new Float64Array(), new Float64Array())).toEqual({ re: 0, im: 0 })
  })

  it('of one phasor is that phasor, and of one taken off its negative', () => {
    const value = { re: 3, im: -4 }
    expect(resultant([{ value }])).toEqual(value)
    expect(resultant([{ value, sign: -1 }])).toEqual({ re: -3, im: 4 })
  })

  it('of a 3 V and a 4 V phasor in quadrature is 5 V', () => {
    expect(magnitudeOf(resultant([{ value: fromPolar(3, 0) }, { value: fromPolar(4, 90) }]))).toBe(
      5,
    )
  })

  it('of a balanced three-phase set is exactly zero', () => {
    for (const start of [0, 30, 60, 90]) {
      const set = [0, -120, 120].map(
        (step): SignedTerm => ({ value: fromPolar(230, start + step) }),
      )
      expect(magnitudeOf(resultant(set)), `from ${start}°`).toBe(0)
    }
    expect(resultant([0, -120, 120].map((angle) => ({ value: fromPolar(230, angle) })))).toEqual({
      re: 0,
      im: 0,
    })
  })

  it('takes any iterable, once', () => {
    function* terms(): Generator<SignedTerm> {
      yield { value: { re: 1, im: 2 } }
      yield { value: { re: 3, im: 4 }, sign: -1 }
    }
    expect(resultant(terms())).toEqual({ re: -2, im: -2 })
  })

  it('of shuffled pairs ± x is within 2⁻⁹⁰ of the sum of their sizes', () => {
    fc.assert(
      fc.property(seed, fc.integer({ min: 1, max: 2048 }), (start, count) => {
        const terms = drawPairs(count, createRandom(start))
        const { re, im } = resultant(terms)
        expect(Math.abs(re)).toBeLessThanOrEqual(LEFT_OVER * sizesOf(terms, 're'))
        expect(Math.abs(im)).toBeLessThanOrEqual(LEFT_OVER * sizesOf(terms, 'im'))
      }),
      { numRuns: 40 },
    )
  })

  it('of such pairs is beyond a plain loop', () => {
    const terms = drawPairs(2048, createRandom(1))
    expect(Math.abs(plainSum(terms, 're'))).toBeGreaterThan(LEFT_OVER * sizesOf(terms, 're'))
  })

  it('does not depend on the order of its terms', () => {
    fc.assert(
      fc.property(seed, fc.integer({ min: 1, max: 500 }), (start, count) => {
        const random = createRandom(start)
        const terms = Array.from(
          { length: count },
          (): SignedTerm => ({
            value: { re: drawWide(random), im: drawWide(random) },
            sign: random() < 0.5 ? 1 : -1,
          }),
        )
        const one = resultant(terms)
        const other = resultant(shuffled(terms, random))
        for (const part of ['re', 'im'] as const) {
          const rounding = Number.EPSILON * Math.abs(one[part]) + LEFT_OVER * sizesOf(terms, part)
          expect(Math.abs(one[part] - other[part])).toBeLessThanOrEqual(rounding)
        }
      }),
      { numRuns: 50 },
    )
  })

  it('keeps a small term between two large ones that cancel', () => {
    const terms = [1e16, 1, -1e16].map((re) => ({ value: { re, im: 0 } }))
    expect(plainSum(terms, 're')).toBe(0)
    expect(resultant(terms)).toEqual({ re: 1, im: 0 })
  })

  it('keeps a small term that single compensation would lose', () => {
    const terms = [1e32, 1e16, 1, -1e16, -1e32].map((re) => ({ value: { re, im: 0 } }))
    expect(resultant(terms).re).toBe(1)
  })

  it('is not finite where a term is not, or where the terms outgrow a double', () => {
    expect(resultant([{ value: { re: Number.NaN, im: 1 } }]).re).toBeNaN()
    const huge = { value: { re: 1.5e308, im: 0 } }
    expect(Number.isFinite(resultant([huge, huge]).re)).toBe(false)
  })
})

describe('the resultant of columns', () => {
  /** Columns of signed polar phasors. */
  function drawColumns(count: number, random: () => number) {
    return {
      magnitudes: Float64Array.from({ length: count }, () => random() * 100),
      degrees: Float64Array.from({ length: count }, () => (random() - 0.5) * 1500),
      signs: Int8Array.from({ length: count }, () => (random() < 0.5 ? -1 : 1)),
    }
  }

  it('is that of the same phasors one by one', () => {
    fc.assert(
      fc.property(seed, fc.integer({ min: 0, max: 2000 }), (start, count) => {
        const { magnitudes, degrees, signs } = drawColumns(count, createRandom(start))
        const terms = Array.from(
          magnitudes,
          (magnitude, index): SignedTerm => ({
            value: fromPolar(magnitude, degrees[index] ?? 0),
            sign: signs[index] === -1 ? -1 : 1,
          }),
        )
        expect(resultantOfPolar(magnitudes, degrees, signs)).toEqual(resultant(terms))
      }),
      { numRuns: 30 },
    )
  })

  it('adds all of them where no signs are given', () => {
    const magnitudes = Float64Array.of(3, 4, 5)
    const degrees = Float64Array.of(0, 90, 180)
    const result = resultantOfPolar(magnitudes, degrees)
    expect(result).toEqual({ re: -2, im: 4 })
    expect(resultantOfPolar(magnitudes, degrees, Int8Array.of(1, 1, 1))).toEqual(result)
  })

  it('of shuffled pairs ± x is within 2⁻⁹⁰ of the sum of their sizes', () => {
    fc.assert(
      fc.property(seed, fc.integer({ min: 1, max: 2048 }), (start, count) => {
        const random = createRandom(start)
        const phasors = Array.from({ length: count }, () => ({
          magnitude: Math.abs(drawWide(random)),
          angle: (random() - 0.5) * 720,
        }))
        const pairs = shuffled(
          [
            ...phasors.map((each) => ({ ...each, sign: 1 })),
            ...phasors.map((each) => ({ ...each, sign: -1 })),
          ],
          random,
        )
        const magnitudes = Float64Array.from(pairs, ({ magnitude }) => magnitude)
        const { re, im } = resultantOfPolar(
          magnitudes,
          Float64Array.from(pairs, ({ angle }) => angle),
          Int8Array.from(pairs, ({ sign }) => sign),
        )
        const sizes = magnitudes.reduce((total, magnitude) => total + magnitude, 0)
        expect(Math.abs(re)).toBeLessThanOrEqual(LEFT_OVER * sizes)
        expect(Math.abs(im)).toBeLessThanOrEqual(LEFT_OVER * sizes)
      }),
      { numRuns: 30 },
    )
  })

  it('of phasors half a turn apart is exactly zero, at any number of turns', () => {
    const degrees = Float64Array.of(30, 210 + 360e3, -45, 135 - 360e3)
    expect(resultantOfPolar(Float64Array.of(7, 7, 9, 9), degrees)).toEqual({ re: 0, im: 0 })
  })

  it('lies exactly on an axis where every term does', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: -4_000_000, max: 4_000_000 }), { minLength: 1 }),
        (halfTurns) => {
          const degrees = Float64Array.from(halfTurns, (halfTurn) => 180 * halfTurn)
          expect(resultantOfPolar(new Float64Array(degrees.length).fill(48.2), degrees).im).toBe(0)
        },
      ),
    )
  })

  it('of a closed polygon of a thousand sides is nothing but the rounding of its sides', () => {
    const degrees = Float64Array.from({ length: 1000 }, (_, side) => side * 0.36)
    const gap = resultantOfPolar(new Float64Array(1000).fill(1), degrees)
    expect(magnitudeOf(subtract(gap, { re: 0, im: 0 }))).toBeLessThan(1e-13)
  })

  it('refuses columns of different lengths', () => {
    const [two, three] = [new Float64Array(2), new Float64Array(3)]
    expect(() => resultantOfPolar(two, three)).toThrow(RangeError)
    expect(() => resultantOfPolar(two, two, new Int8Array(3))).toThrow(RangeError)
  })
})
