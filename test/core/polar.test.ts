import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  differenceDegrees,
  fromPolar,
  magnitudeOf,
  toPolar,
  wrapDegrees,
  ZERO,
} from '../../src/core'
import { degrees, finite, size } from './random'

describe('polar and rectangular form', () => {
  it('of a phasor on an axis are exact', () => {
    expect(fromPolar(48.2, 90)).toEqual({ re: 0, im: 48.2 })
    expect(fromPolar(48.2, 180)).toEqual({ re: -48.2, im: 0 })
    expect(fromPolar(48.2, -90)).toEqual({ re: 0, im: -48.2 })
    expect(fromPolar(48.2, 360)).toEqual({ re: 48.2, im: 0 })
    expect(toPolar({ re: 0, im: -48.2 })).toEqual({ magnitude: 48.2, angle: -90 })
    expect(toPolar({ re: -48.2, im: 0 })).toEqual({ magnitude: 48.2, angle: 180 })
  })

  it('of zero have the angle 0', () => {
    expect(toPolar(ZERO)).toEqual({ magnitude: 0, angle: 0 })
    expect(fromPolar(0, 82)).toEqual(ZERO)
  })

  it('lead back to the same magnitude and angle', () => {
    fc.assert(
      fc.property(size, degrees, (magnitude, angle) => {
        const again = toPolar(fromPolar(magnitude, angle))
        expect(Math.abs(again.magnitude - magnitude)).toBeLessThanOrEqual(5e-16 * magnitude)
        expect(Math.abs(differenceDegrees(again.angle, wrapDegrees(angle)))).toBeLessThan(2e-13)
      }),
    )
  })

  it('lead back to the same real and imaginary part', () => {
    fc.assert(
      fc.property(finite, finite, (re, im) => {
        const { magnitude, angle } = toPolar({ re, im })
        const again = fromPolar(magnitude, angle)
        const off = magnitudeOf({ re: again.re - re, im: again.im - im })
        expect(off).toBeLessThanOrEqual(2e-15 * magnitude)
      }),
    )
  })

  it('take a turned magnitude for a negative one', () => {
    fc.assert(
      fc.property(size, fc.integer({ min: -360, max: 360 }), (magnitude, angle) => {
        const turned = fromPolar(magnitude, angle + 180)
        const negative = fromPolar(-magnitude, angle)
        expect(turned).toEqual(negative)
      }),
    )
  })
})
