import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  add,
  type Complex,
  conjugate,
  divide,
  isFiniteComplex,
  magnitudeOf,
  multiply,
  negate,
  scaleBy,
  subtract,
  ZERO,
} from '../../src/core'
import { finite } from './random'

const complex = fc.record({ re: finite, im: finite })
const apart = complex.filter((z) => magnitudeOf(z) > 1e-6)

function expectClose(z: Complex, other: Complex, scale: number): void {
  expect(magnitudeOf({ re: z.re - other.re, im: z.im - other.im })).toBeLessThanOrEqual(
    1e-14 * scale,
  )
}

describe('arithmetic with complex numbers', () => {
  it('adds, subtracts, multiplies and divides', () => {
    const [a, b] = [
      { re: 3, im: 4 },
      { re: 1, im: -2 },
    ]
    expect(add(a, b)).toEqual({ re: 4, im: 2 })
    expect(subtract(a, b)).toEqual({ re: 2, im: 6 })
    expect(multiply(a, b)).toEqual({ re: 11, im: -2 })
    expect(divide(a, b)).toEqual({ re: -1, im: 2 })
    expect(negate(a)).toEqual({ re: -3, im: -4 })
    expect(conjugate(a)).toEqual({ re: 3, im: -4 })
    expect(scaleBy(a, 0.5)).toEqual({ re: 1.5, im: 2 })
  })

  it('undoes a product by a quotient', () => {
    fc.assert(
      fc.property(complex, apart, (a, b) => {
        expectClose(divide(multiply(a, b), b), a, magnitudeOf(a))
      }),
    )
  })

  it('gives the squared magnitude as a number times its conjugate', () => {
    fc.assert(
      fc.property(complex, (z) => {
        const square = magnitudeOf(z) ** 2
        expectClose(multiply(z, conjugate(z)), { re: square, im: 0 }, square)
      }),
    )
  })

  it('takes a number and its negative to exactly nothing', () => {
    fc.assert(
      fc.property(complex, (z) => {
        expect(add(z, negate(z))).toEqual(ZERO)
        expect(subtract(z, z)).toEqual(ZERO)
      }),
    )
  })

  it('never leaves a negative zero behind', () => {
    const results = [
      negate(ZERO),
      conjugate({ re: 1, im: 0 }),
      multiply({ re: -1, im: 0 }, ZERO),
      scaleBy({ re: 1, im: 1 }, -0),
      divide(ZERO, { re: -2, im: 0 }),
      add({ re: -0, im: -0 }, { re: -0, im: -0 }),
    ]
    for (const { re, im } of results) {
      expect(Object.is(re, -0)).toBe(false)
      expect(Object.is(im, -0)).toBe(false)
    }
  })

  it('leaves its operands as they are', () => {
    const [a, b] = [Object.freeze({ re: 3, im: 4 }), Object.freeze({ re: 1, im: -2 })]
    for (const operation of [add, subtract, multiply, divide]) operation(a, b)
    expect([a, b]).toEqual([
      { re: 3, im: 4 },
      { re: 1, im: -2 },
    ])
  })

  it('keeps results apart that were worked out one after the other', () => {
    const first = add({ re: 1, im: 2 }, { re: 3, im: 4 })
    add({ re: 10, im: 20 }, { re: 30, im: 40 })
    expect(first).toEqual({ re: 4, im: 6 })
  })
})

describe('what is not a number', () => {
  const undefinedComplex = { re: Number.NaN, im: Number.NaN }
  const bad: readonly Complex[] = [
    { re: Number.NaN, im: 0 },
    { re: 0, im: Number.NaN },
    { re: Number.POSITIVE_INFINITY, im: 1 },
    { re: 1, im: Number.NEGATIVE_INFINITY },
  ]

  it('stays NaN, and never turns into an infinity', () => {
    for (const z of bad) {
      expect(isFiniteComplex(z)).toBe(false)
      for (const operation of [add, subtract, multiply, divide]) {
        expect(operation(z, { re: 1, im: 0 })).toEqual(undefinedComplex)
        expect(operation({ re: 1, im: 0 }, z)).toEqual(undefinedComplex)
      }
      expect(negate(z)).toEqual(undefinedComplex)
      expect(conjugate(z)).toEqual(undefinedComplex)
    }
  })

  it('comes out of a division by zero, and of zero by an infinity', () => {
    expect(divide({ re: 1, im: 0 }, ZERO)).toEqual(undefinedComplex)
    expect(divide(ZERO, ZERO)).toEqual(undefinedComplex)
    expect(divide(ZERO, { re: Number.POSITIVE_INFINITY, im: 0 })).toEqual(undefinedComplex)
  })

  it('comes out where a result outgrows a double', () => {
    const huge = { re: 1e308, im: 1e308 }
    expect(add(huge, huge)).toEqual(undefinedComplex)
    expect(multiply(huge, huge)).toEqual(undefinedComplex)
    expect(scaleBy(huge, 10)).toEqual(undefinedComplex)
  })
})

describe('the magnitude', () => {
  it('of Pythagorean triples is whole', () => {
    for (const [re, im, whole] of [
      [3, 4, 5],
      [5, -12, 13],
      [-8, 15, 17],
      [20, 21, 29],
      [119, 120, 169],
    ] as const) {
      expect(magnitudeOf({ re, im })).toBe(whole)
    }
  })

  it('of the smallest and the largest phasors neither vanishes nor overflows', () => {
    expect(magnitudeOf({ re: 3e-200, im: 4e-200 }) / 5e-200).toBeCloseTo(1, 14)
    expect(magnitudeOf({ re: 3e200, im: -4e200 }) / 5e200).toBeCloseTo(1, 14)
    expect(magnitudeOf({ re: 0, im: Number.MIN_VALUE })).toBe(Number.MIN_VALUE)
  })

  it('is 0 for zero, and NaN where a part is not a number', () => {
    expect(magnitudeOf(ZERO)).toBe(0)
    expect(magnitudeOf({ re: -0, im: -0 })).toBe(0)
    expect(magnitudeOf({ re: Number.NaN, im: 1 })).toBeNaN()
  })

  it('never exceeds the sum of two magnitudes, whichever way two phasors stand', () => {
    fc.assert(
      fc.property(complex, complex, (a, b) => {
        const longest = magnitudeOf(a) + magnitudeOf(b)
        expect(magnitudeOf(add(a, b))).toBeLessThanOrEqual(longest * (1 + 1e-15))
      }),
    )
  })

  it('of a product is the product of the magnitudes', () => {
    fc.assert(
      fc.property(complex, complex, (a, b) => {
        const product = magnitudeOf(a) * magnitudeOf(b)
        expect(Math.abs(magnitudeOf(multiply(a, b)) - product)).toBeLessThanOrEqual(1e-14 * product)
      }),
    )
  })
})
