import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { accuracyLimits, parseAccuracy, totalLimit } from '../../src/core'

const nothing = { percentOfReading: 0, percentOfRange: 0, digits: 0, absolute: 0 }

function read(text: string, unit = 'V') {
  const parsed = parseAccuracy(text, unit)
  if (!parsed.ok) throw new Error(parsed.problem)
  return parsed.value
}

function problemOf(text: string, unit = 'V'): string {
  const parsed = parseAccuracy(text, unit)
  return parsed.ok ? '' : parsed.problem
}

describe('an accuracy statement', () => {
  it('is read as makers print it', () => {
    const expected = { ...nothing, percentOfReading: 0.7, digits: 3 }
    for (const text of [
      '±(0.7 % + 3 digits)',
      '±(0.7%+3dgt)',
      '0.7 % + 3 digits',
      '+/-(0.7% of reading + 3 counts)',
      '± 0.7 % rdg + 3 d',
      '±(0,7 % + 3)',
      '(±0.7 % + 3 LSD)',
    ]) {
      expect(read(text), text).toEqual(expected)
    }
  })

  it('tells a part of the reading from a part of the range', () => {
    const expected = { ...nothing, percentOfReading: 1, percentOfRange: 0.2 }
    expect(read('±(1 % of reading + 0.2 % of range)')).toEqual(expected)
    expect(read('±(0.2 % of full scale + 1 % rdg)')).toEqual(expected)
    expect(read('±(0.2 % FS + 1 %)')).toEqual(expected)
    expect(read('14 ppm of reading + 2 ppm of range').percentOfReading).toBeCloseTo(0.0014, 15)
    expect(read('14 ppm of reading + 2 ppm of range').percentOfRange).toBeCloseTo(0.0002, 15)
  })

  it('takes a class for per cent of the end of the range', () => {
    expect(read('class 0.5')).toEqual({ ...nothing, percentOfRange: 0.5 })
    expect(read('Cl. 1.5')).toEqual({ ...nothing, percentOfRange: 1.5 })
  })

  it('may be in the unit of what is shown', () => {
    expect(read('±0.5°', '°')).toEqual({ ...nothing, absolute: 0.5 })
    expect(read('±(0.5 % + 20 mV)')).toEqual({ ...nothing, percentOfReading: 0.5, absolute: 0.02 })
  })

  it('is refused in words where it says nothing for certain', () => {
    expect(problemOf('')).toMatch(/Type a value/)
    expect(problemOf('±0.5')).toBe('Say what the 0.5 counts: %, % of range, digits or V.')
    expect(problemOf('good')).toMatch(/“good” is no accuracy/)
    expect(problemOf('±(-1 % + 2 digits)')).toMatch(/not negative/)
    expect(problemOf('±(0.5 % + 2 A)')).toMatch(/“2 A” is no accuracy/)
  })

  it('gives one half-width that is the sum of its parts', () => {
    const limits = accuracyLimits(read('±(0.7 % + 3 digits)'), { value: 230, resolution: 0.1 })
    expect(limits.ok && limits.value).toEqual({
      ofReading: (230 * 0.7) / 100,
      ofRange: 0,
      digits: 3 * 0.1,
      absolute: 0,
    })
    expect(limits.ok && totalLimit(limits.value)).toBeCloseTo(1.91, 12)
  })

  it('asks for the range or the digits where it counts in them', () => {
    expect(accuracyLimits(read('class 1'), { value: 5 })).toEqual({
      ok: false,
      problem: 'The accuracy is a part of the range: say on which range the meter was.',
    })
    expect(accuracyLimits(read('1 % + 2 digits'), { value: 5 })).toEqual({
      ok: false,
      problem: 'The accuracy counts digits: type the reading with its digits as shown.',
    })
  })

  it('never gives a negative limit or none that is a number, at zero and at the ends of a range too', () => {
    const size = fc.double({ min: 0, max: 50, noNaN: true })
    const value = fc.oneof(
      fc.constantFrom(0, -0, 600, -600, 5e-324, 1e300),
      fc.double({ min: -1e6, max: 1e6, noNaN: true }),
    )
    fc.assert(
      fc.property(
        size,
        size,
        fc.nat(20),
        size,
        value,
        (reading, range, digits, absolute, shown) => {
          const limits = accuracyLimits(
            { percentOfReading: reading, percentOfRange: range, digits, absolute },
            { value: shown, range: 600, resolution: 0.1 },
          )
          if (!limits.ok) throw new Error(limits.problem)
          for (const part of Object.values(limits.value)) expect(part).toBeGreaterThanOrEqual(0)
          expect(Number.isFinite(totalLimit(limits.value))).toBe(true)
        },
      ),
    )
  })

  it('gives a limit that scales with the unit', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e4, noNaN: true }),
        fc.integer({ min: -6, max: 6 }),
        (value, power) => {
          const statement = { ...nothing, percentOfReading: 0.7, percentOfRange: 0.1, digits: 3 }
          const scale = 10 ** power
          const limits = (by: number) => {
            const found = accuracyLimits(statement, {
              value: value * by,
              range: 600 * by,
              resolution: 0.1 * by,
            })
            return found.ok ? totalLimit(found.value) : Number.NaN
          }
          expect(limits(scale) / scale).toBeCloseTo(limits(1), 9)
        },
      ),
    )
  })
})
