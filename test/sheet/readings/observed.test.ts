import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { interceptOfDegrees, sinDegrees, tiltOfDegrees, wrapDegrees } from '../../../src/core'
import { observedOf, quick, type Reading, type Sheet } from '../../../src/sheet'
import { phasorOf, readingOf } from '../sheets'
import { jobOf, oneReading } from './jobs'

function observed(reading: object, parts: Partial<Sheet> = {}) {
  const sheet = oneReading(reading as Reading, parts)
  return observedOf(sheet, readingOf(sheet, 'r1'))
}

function asRead(sheet: Sheet, id: string) {
  phasorOf(sheet, id)
  return quick(sheet).phasors.find((phasor) => phasor.id === id)?.asRead
}

const angle = fc.integer({ min: -1799, max: 1800 }).map((tenths) => tenths / 10 || 0)

describe('what a reading comes to', () => {
  it('divides by turns and shunts, multiplies by ratios, and takes peaks for rms', () => {
    const shown = { kind: 'magnitude', of: 'I', shown: '1.26' }
    expect(observed({ ...shown, turns: 4 })).toEqual({ kind: 'magnitude', value: 0.315 })
    expect(observed({ ...shown, ratio: 40 })).toEqual({ kind: 'magnitude', value: 50.4 })
    expect(observed({ ...shown, shunt: 0.01 })).toEqual({ kind: 'magnitude', value: 126 })
    expect(observed({ ...shown, form: 'peak' })).toMatchObject({ value: 1.26 * Math.SQRT1_2 })
    const channels = [{ id: 'ct1', ratio: { value: 40 }, turns: 2 }]
    expect(observed({ ...shown, channel: 'ct1' }, { channels })).toMatchObject({ value: 25.2 })
  })

  it('takes a shift for its share of a turn, a lead or a lag', () => {
    const shift = { kind: 'shift', of: 'V', shift: '1.3', period: '8' }
    expect(observed({ ...shift, sense: 'leads' })).toEqual({ kind: 'angle', value: 58.5 })
    expect(observed({ ...shift, sense: 'lags' })).toEqual({ kind: 'angle', value: -58.5 })
  })

  it('takes an ellipse with tilt and sense for an angle, and else for a sine', () => {
    const ellipse = { kind: 'ellipse', of: 'V', intercept: '2', height: '4' }
    const rising = observed({ ...ellipse, tilt: 'rising', sense: 'lags' })
    expect(rising).toMatchObject({ kind: 'angle', value: expect.closeTo(-30, 12) })
    expect(observed(ellipse)).toEqual({ kind: 'sine', value: 0.5, either: true, turn: 0 })
    expect(observed({ ...ellipse, sense: 'lags' })).toMatchObject({ value: -0.5, either: false })
    expect(observed({ ...ellipse, intercept: '4', sense: 'leads' })).toMatchObject({ value: 90 })
    expect(observed({ ...ellipse, intercept: '0', tilt: 'falling' })).toMatchObject({ value: 180 })
    expect(observed({ ...ellipse, intercept: '4.1', sense: 'leads' })).toBeUndefined()
  })

  it('turns power, reactive power and power factor through what is connected the wrong way round', () => {
    const channels = [
      { id: 'vt', ratio: { value: 10 } },
      { id: 'ct', ratio: { value: 40 }, reversed: true, phaseError: { value: 0.5 } },
    ]
    const power = {
      kind: 'power',
      of: 'V',
      with: 'I',
      shown: '12',
      channel: 'vt',
      currentChannel: 'ct',
    }
    expect(observed(power, { channels })).toEqual({
      kind: 'power',
      value: -4800,
      with: 'I',
      turn: -0.5,
    })
    const factor = {
      kind: 'power-factor',
      of: 'V',
      with: 'I',
      shown: '0.8',
      sense: 'lags',
      channel: 'ct',
    }
    expect(observed(factor, { channels })).toMatchObject({ value: -0.8, sense: 'leads', turn: 0.5 })
  })

  it('inverts: what a meter would show of an angle is read as that angle, in every kind', () => {
    fc.assert(
      fc.property(angle, fc.constantFrom('5.00', '20.0', '0.02'), (degrees, period) => {
        const sense = degrees < 0 ? 'lags' : 'leads'
        const size = Math.abs(degrees)
        const shift = (size / 360) * Number(period)
        const shown = {
          angle: { kind: 'angle', shown: degrees },
          words: { kind: 'angle', shown: size, sense },
          shift: { kind: 'shift', shift, period, sense },
          factor: {
            kind: 'power-factor',
            with: 'I',
            shown: Math.cos((degrees * Math.PI) / 180),
            sense: sense === 'leads' ? 'lags' : 'leads',
          },
          ellipse: {
            kind: 'ellipse',
            intercept: Math.min(interceptOfDegrees(degrees, 4), 4),
            height: 4,
            tilt: tiltOfDegrees(degrees),
            sense,
          },
        }
        for (const [name, reading] of Object.entries(shown)) {
          const sheet = oneReading({ of: 'V', ...reading } as unknown as Reading)
          const found = asRead(sheet, 'V')?.angle ?? Number.NaN
          // A sine and a cosine are flat where they are 1: a rounding there turns the angle by its root.
          const apart = Math.abs(wrapDegrees(found - degrees))
          expect(apart, name).toBeLessThan(name === 'ellipse' || name === 'factor' ? 2e-6 : 1e-9)
        }
        const open = {
          kind: 'ellipse',
          intercept: Math.min(interceptOfDegrees(degrees, 4), 4),
          height: 4,
          sense,
        }
        const sine = observed({ of: 'V', ...open })
        if (sine?.kind === 'sine') expect(sine.value).toBeCloseTo(sinDegrees(degrees), 9)
      }),
    )
  })

  it('inverts for a magnitude through every factor', () => {
    const factor = fc.integer({ min: 1, max: 400 }).map((tenths) => tenths / 10)
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e4, noNaN: true }),
        fc.integer({ min: 1, max: 10 }),
        factor,
        factor,
        fc.constantFrom(...(['rms', 'peak', 'peak-to-peak'] as const)),
        (value, turns, ratio, shunt, form) => {
          const crest = { rms: 1, peak: Math.SQRT2, 'peak-to-peak': 2 * Math.SQRT2 }[form]
          const shown = (value * turns * shunt * crest) / ratio
          const found = observed({ kind: 'magnitude', of: 'I', shown, turns, ratio, shunt, form })
          expect(found?.value).toBeCloseTo(value, 7)
        },
      ),
    )
  })
})

describe('as read', () => {
  it('a power factor with its sense settles the angle, whichever of the two is the reference', () => {
    const factor: Reading = {
      id: 'r1',
      kind: 'power-factor',
      of: 'V',
      with: 'I',
      shown: '0.5',
      sense: 'lags',
    }
    expect(asRead(jobOf(['I', 'V'], [factor]), 'V')?.angle).toBeCloseTo(60, 9)
    expect(asRead(jobOf(['V', 'I'], [factor]), 'I')?.angle).toBeCloseTo(-60, 9)
  })

  it('what two readings would have to settle, or what is open, is left out', () => {
    const power: Reading = { id: 'r1', kind: 'power', of: 'V', with: 'I', shown: '60' }
    const factor: Reading = { id: 'r2', kind: 'power-factor', of: 'V', with: 'I', shown: '0.5' }
    const ellipse: Reading = { id: 'r3', kind: 'ellipse', of: 'V', intercept: '2', height: '4' }
    for (const reading of [power, factor, ellipse]) {
      expect(asRead(jobOf(['I', 'V'], [reading]), 'V')).toEqual({})
    }
  })

  it('follows a chain of phasors that were measured one against the next, either way', () => {
    const readings: readonly Reading[] = [
      { id: 'r1', kind: 'angle', of: 'V1', against: 'V2', shown: '30' },
      { id: 'r2', kind: 'angle', of: 'I', against: 'V1', shown: '20', sense: 'lags' },
    ]
    const sheet = jobOf(['I', 'V1', 'V2'], readings)
    expect(asRead({ ...sheet, reference: 'I' }, 'V1')?.angle).toBe(20)
    expect(asRead({ ...sheet, reference: 'I' }, 'V2')?.angle).toBe(-10)
  })

  it('a struck reading settles nothing', () => {
    const shift: Reading = {
      id: 'r1',
      kind: 'shift',
      of: 'V',
      shift: '1',
      period: '8',
      sense: 'leads',
      struck: true,
    }
    expect(asRead(jobOf(['I', 'V'], [shift]), 'V')).toEqual({})
  })
})
