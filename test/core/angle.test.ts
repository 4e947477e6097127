import Decimal from 'decimal.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  angleOf,
  cosDegrees,
  degreesFromRadians,
  differenceDegrees,
  radiansFromDegrees,
  sinDegrees,
  wrapDegrees,
} from '../../src/core'
import { degrees } from './random'

/** Digits enough for every double that is met here, which decimal.js would else take at its shortest. */
const Precise = Decimal.clone({ precision: 60 })

function exactly(value: number): Decimal {
  return new Precise(value.toPrecision(80))
}

const turns = fc.integer({ min: -1_000_000, max: 1_000_000 })

describe('wrapping an angle', () => {
  it.each([
    [0, 0],
    [180, 180],
    [-180, 180],
    [180.5, -179.5],
    [-180.5, 179.5],
    [270, -90],
    [360, 0],
    [540, 180],
    [-540, 180],
    [-450, -90],
    [719.75, -0.25],
  ])('brings %d° to %d°', (angle, wrapped) => {
    expect(wrapDegrees(angle)).toBe(wrapped)
  })

  it('gives an angle above −180° and up to 180°, without a negative zero', () => {
    fc.assert(
      fc.property(degrees, (angle) => {
        const wrapped = wrapDegrees(angle)
        expect(wrapped).toBeGreaterThan(-180)
        expect(wrapped).toBeLessThanOrEqual(180)
        expect(Object.is(wrapped, -0)).toBe(false)
      }),
    )
    expect(Object.is(wrapDegrees(-360), 0)).toBe(true)
  })

  it('takes off whole turns and nothing else, exactly', () => {
    fc.assert(
      fc.property(degrees, (angle) => {
        const taken = exactly(angle)
          .minus(exactly(wrapDegrees(angle)))
          .dividedBy(360)
        expect(taken.isInteger()).toBe(true)
      }),
    )
  })

  it('does nothing to an angle that is wrapped already', () => {
    fc.assert(
      fc.property(degrees, (angle) => {
        const wrapped = wrapDegrees(angle)
        expect(wrapDegrees(wrapped)).toBe(wrapped)
      }),
    )
  })

  it('gives NaN for what is no angle', () => {
    for (const angle of [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]) {
      expect(wrapDegrees(angle)).toBeNaN()
    }
  })
})

describe('the difference of two angles', () => {
  it.each([
    [10, 350, 20],
    [350, 10, -20],
    [-179, 179, 2],
    [179, -179, -2],
    [90, -90, 180],
    [-90, 90, 180],
    [0, 180, 180],
    [45, 45, 0],
  ])('of %d° against %d° is %d°, the short way round', (a, b, difference) => {
    expect(differenceDegrees(a, b)).toBe(difference)
  })

  it('changes its sign with the order, except across half a turn', () => {
    fc.assert(
      fc.property(degrees, degrees, (a, b) => {
        const forth = differenceDegrees(a, b)
        const back = differenceDegrees(b, a)
        expect(forth === 180 ? back : -back + 0).toBe(forth)
      }),
    )
  })

  it('added to the second angle gives the first again', () => {
    fc.assert(
      fc.property(degrees, degrees, (a, b) => {
        const again = differenceDegrees(b + differenceDegrees(a, b), a)
        expect(Math.abs(again)).toBeLessThan(1e-8)
      }),
    )
  })
})

describe('sine and cosine of degrees', () => {
  it('are exactly 0, 1 or −1 at every multiple of 90°, up to a million turns away', () => {
    fc.assert(
      fc.property(turns, (turn) => {
        const base = 360 * turn
        expect([base, base + 90, base + 180, base + 270].map(sinDegrees)).toEqual([0, 1, 0, -1])
        expect([base, base + 90, base + 180, base + 270].map(cosDegrees)).toEqual([1, 0, -1, 0])
      }),
    )
    expect(sinDegrees(-180e6)).toBe(0)
    expect(cosDegrees(90 + 360e6)).toBe(0)
  })

  it('are exactly one half where they should be', () => {
    expect([30, 150, -30, -150, 390].map(sinDegrees)).toEqual([0.5, 0.5, -0.5, -0.5, 0.5])
    expect([60, -60, 120, -120, 240].map(cosDegrees)).toEqual([0.5, 0.5, -0.5, -0.5, -0.5])
  })

  it('are right to the last place, against sixty digits', () => {
    const perDegree = Precise.acos(-1).dividedBy(180)
    fc.assert(
      fc.property(degrees, (angle) => {
        const radians = perDegree.times(exactly(wrapDegrees(angle)))
        for (const [value, exact] of [
          [sinDegrees(angle), radians.sin()],
          [cosDegrees(angle), radians.cos()],
        ] as const) {
          const error = exact.minus(exactly(value)).abs().toNumber()
          // 10⁻⁵⁰: what sixty digits of π leave of the zeros at multiples of 90°.
          expect(error).toBeLessThanOrEqual(Number.EPSILON * Math.abs(value) + 1e-50)
        }
      }),
      { numRuns: 300 },
    )
  })

  it('are the same a turn away, and change sign half a turn away', () => {
    fc.assert(
      fc.property(fc.integer({ min: -360, max: 360 }), turns, (angle, turn) => {
        expect(sinDegrees(angle + 360 * turn)).toBe(sinDegrees(angle))
        expect(cosDegrees(angle + 180)).toBe(-cosDegrees(angle) + 0)
      }),
    )
  })

  it('square to one between them', () => {
    fc.assert(
      fc.property(degrees, (angle) => {
        expect(Math.abs(sinDegrees(angle) ** 2 + cosDegrees(angle) ** 2 - 1)).toBeLessThan(5e-16)
      }),
    )
  })

  it('are NaN for what is no angle', () => {
    for (const angle of [Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(sinDegrees(angle)).toBeNaN()
      expect(cosDegrees(angle)).toBeNaN()
    }
  })
})

describe('the angle of a phasor', () => {
  it.each([
    [{ re: 5, im: 0 }, 0],
    [{ re: 0, im: 5 }, 90],
    [{ re: -5, im: 0 }, 180],
    [{ re: 0, im: -5 }, -90],
    [{ re: -5, im: -0 }, 180],
    [{ re: -0, im: -5 }, -90],
    [{ re: 5, im: -0 }, 0],
    [{ re: 0, im: 0 }, 0],
    [{ re: -0, im: -0 }, 0],
    [{ re: 1, im: 1 }, 45],
    [{ re: -1, im: -1 }, -135],
    [{ re: -1, im: -1e-300 }, 180],
  ])('%o is %d°', (z, angle) => {
    expect(Object.is(angleOf(z), angle)).toBe(true)
  })

  it('is NaN where a part is not a number', () => {
    for (const z of [
      { re: Number.NaN, im: 0 },
      { re: 0, im: Number.NaN },
      { re: Number.NaN, im: 1 },
    ]) {
      expect(angleOf(z)).toBeNaN()
    }
  })
})

describe('degrees and radians', () => {
  it('are half a turn and π', () => {
    expect(degreesFromRadians(Math.PI)).toBe(180)
    expect(radiansFromDegrees(180)).toBe(Math.PI)
    expect(degreesFromRadians(-Math.PI / 2)).toBe(-90)
  })

  it('come back from each other', () => {
    fc.assert(
      fc.property(degrees, (angle) => {
        const again = degreesFromRadians(radiansFromDegrees(angle))
        expect(Math.abs(again - angle)).toBeLessThanOrEqual(4e-16 * Math.abs(angle))
      }),
    )
  })
})
