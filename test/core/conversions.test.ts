import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  cosDegrees,
  degreesOfEllipse,
  degreesOfPower,
  degreesOfPowerFactor,
  degreesOfShift,
  formFactor,
  interceptOfDegrees,
  rmsOfAverageResponding,
  rmsOfForm,
  shiftOfDegrees,
  tiltOfDegrees,
} from '../../src/core'

const size = fc.double({ min: 1e-3, max: 1e4, noNaN: true })
const halfTurn = fc.double({ min: 0, max: 180, noNaN: true })

describe('a shift on a time base', () => {
  it('is its share of a turn', () => {
    expect(degreesOfShift(1.3, 8)).toBe(58.5)
    expect(degreesOfShift(0, 8)).toBe(0)
    expect(degreesOfShift(8, 8)).toBe(360)
    expect(degreesOfShift(1, 0)).toBeNaN()
  })

  it('inverts', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 360, noNaN: true }), size, (degrees, period) => {
        expect(degreesOfShift(shiftOfDegrees(degrees, period), period)).toBeCloseTo(degrees, 9)
      }),
    )
  })
})

describe('an ellipse', () => {
  it('gives the angle whose sine is intercept over height, by its tilt', () => {
    expect(degreesOfEllipse(2, 4, 'rising')).toBeCloseTo(30, 12)
    expect(degreesOfEllipse(2, 4, 'falling')).toBeCloseTo(150, 12)
    expect(degreesOfEllipse(0, 4, 'rising')).toBe(0)
    expect(degreesOfEllipse(0, 4, 'falling')).toBe(180)
    expect(degreesOfEllipse(4, 4, 'rising')).toBe(90)
    expect(degreesOfEllipse(4.1, 4, 'rising')).toBeNaN()
  })

  it('inverts, with its tilt', () => {
    fc.assert(
      fc.property(halfTurn, size, (degrees, height) => {
        const intercept = Math.min(interceptOfDegrees(degrees, height), height)
        const back = degreesOfEllipse(intercept, height, tiltOfDegrees(degrees))
        // The sine is flat at 90°: a rounding there turns the angle by its root.
        expect(Math.abs(back - degrees)).toBeLessThan(2e-6)
        expect(interceptOfDegrees(back, height)).toBeCloseTo(intercept, 9)
      }),
    )
  })
})

describe('watts and power factors', () => {
  it('give the angle whose cosine they are', () => {
    expect(degreesOfPower(115, 230, 1)).toBeCloseTo(60, 12)
    expect(degreesOfPower(-115, 230, 1)).toBeCloseTo(120, 12)
    expect(degreesOfPowerFactor(1)).toBe(0)
    expect(degreesOfPowerFactor(-1)).toBe(180)
    expect(degreesOfPowerFactor(1.01)).toBeNaN()
  })

  it('invert', () => {
    fc.assert(
      fc.property(halfTurn, size, size, (degrees, voltage, current) => {
        const power = voltage * current * cosDegrees(degrees)
        expect(Math.abs(degreesOfPower(power, voltage, current) - degrees)).toBeLessThan(2e-6)
      }),
    )
  })
})

describe('peaks and waves', () => {
  it('take a peak for √2 and a peak to peak for 2√2 of the rms value of a sine', () => {
    expect(rmsOfForm('rms')).toBe(1)
    expect(rmsOfForm('peak') * Math.SQRT2).toBeCloseTo(1, 15)
    expect(rmsOfForm('peak-to-peak') * 2 * Math.SQRT2).toBeCloseTo(1, 15)
  })

  it('have the form factors that integrating the wave gives', () => {
    const waves = {
      sine: (t: number) => Math.sin(2 * Math.PI * t),
      square: (t: number) => (t < 0.5 ? 1 : -1),
      triangle: (t: number) => 1 - 4 * Math.abs(t - 0.5),
    }
    const count = 100_000
    for (const wave of ['sine', 'square', 'triangle'] as const) {
      let squares = 0
      let sizes = 0
      for (let index = 0; index < count; index += 1) {
        const value = waves[wave]((index + 0.5) / count)
        squares += value * value
        sizes += Math.abs(value)
      }
      expect(formFactor(wave), wave).toBeCloseTo(Math.sqrt(squares / count) / (sizes / count), 8)
    }
  })

  it('leave a sine as an averaging meter shows it', () => {
    expect(rmsOfAverageResponding(12, 'sine')).toBe(12)
    expect(rmsOfAverageResponding(5, 'square')).toBeCloseTo(4.5016, 4)
    expect(rmsOfAverageResponding(5, 'triangle')).toBeCloseTo(5.198, 3)
  })
})
