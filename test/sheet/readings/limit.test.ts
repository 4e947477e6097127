import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  limitOf,
  type Reading,
  type Sheet,
  standardUncertaintyOf,
  wordsOf,
} from '../../../src/sheet'
import { anySheet } from '../arbitrary-sheet'
import { unhurried } from '../laws'
import { readingOf } from '../sheets'
import { jobOf, oneReading } from './jobs'

function limit(reading: object, parts: Partial<Sheet> = {}) {
  const sheet = oneReading(reading as Reading, parts)
  const found = limitOf(sheet, readingOf(sheet, 'r1'))
  if (found === undefined) throw new Error('the reading says nothing')
  return found
}

function limitsOf(sheet: Sheet) {
  return (sheet.readings ?? []).map((reading) => {
    const found = limitOf(sheet, reading)
    if (found === undefined) throw new Error('the reading says nothing')
    return { limit: found }
  })
}

const volts = { kind: 'magnitude', of: 'V', instrument: 'm1' }

describe('the limit of a reading', () => {
  it('is the stated one first, whatever the instrument says, divided by the turns with the reading', () => {
    const found = limit({
      kind: 'magnitude',
      of: 'I',
      shown: '1.26',
      turns: 4,
      limit: 0.02,
      instrument: 'm1',
    })
    expect(found).toMatchObject({ from: 'stated', limit: 0.005, shared: [] })
    expect(found.own).toEqual([
      { name: 'as stated', limit: 0.005, uncertainty: 0.005 / Math.sqrt(3), shape: 'rectangular' },
    ])
  })

  it('is that of the instrument for the function and range, with the digits as typed', () => {
    const small = limit({ ...volts, shown: '48.20' })
    expect(small.from).toBe('instrument')
    expect(small.limit).toBeCloseTo(48.2 * 0.007 + 0.03, 12)
    const large = limit({ ...volts, shown: '230', range: 600 })
    expect(large.limit).toBeCloseTo(2.3 + 1.2, 12)
    expect(large.own).toMatchObject([
      { name: '0.2 % of the range', limit: expect.closeTo(1.2, 12) },
    ])
    expect(large.shared).toMatchObject([{ error: 'gain:m1:voltage:600' }])
  })

  it('is assumed, and says so, where nobody stated one', () => {
    expect(limit({ kind: 'magnitude', of: 'V', shown: '48.2' })).toMatchObject({
      from: 'assumed',
      limit: expect.closeTo(0.482, 12),
    })
    expect(limit({ kind: 'angle', of: 'V', shown: '37' })).toMatchObject({
      from: 'assumed',
      limit: 1,
    })
    const assumed = { percent: 2, degrees: 0.5 }
    expect(limit({ kind: 'magnitude', of: 'V', shown: '50' }, { assumed }).limit).toBe(1)
    expect(limit({ kind: 'angle', of: 'V', shown: '37' }, { assumed }).limit).toBe(0.5)
  })

  it('of nothing shown is half a digit, so that no reading is exact by being zero', () => {
    expect(limit({ kind: 'magnitude', of: 'V', shown: '0.00' }).limit).toBe(0.005)
  })

  it('falls back on what is assumed, and says why, where the accuracy asks for a range', () => {
    const found = limit({ kind: 'power', of: 'V', with: 'I', shown: '12', instrument: 'm1' })
    expect(found.from).toBe('assumed')
    expect(found.problem).toBe(
      'The accuracy is a part of the range: say on which range the meter was.',
    )
    const ranged = limit({
      kind: 'power',
      of: 'V',
      with: 'I',
      shown: '12',
      instrument: 'm1',
      range: 500,
    })
    expect(ranged).toMatchObject({ from: 'instrument', limit: 5 })
  })

  it('of a shift and of an ellipse comes in degrees', () => {
    const shift = { kind: 'shift', of: 'V', shift: '1.3', period: '8', sense: 'leads' }
    expect(limit({ ...shift, limit: 0.1 }).limit).toBeCloseTo(4.5, 12)
    const ellipse = {
      kind: 'ellipse',
      of: 'V',
      intercept: '4',
      height: '4',
      sense: 'leads',
      limit: 0.1,
    }
    const acute = (Math.asin(3.9 / 4) * 180) / Math.PI
    expect(limit(ellipse).limit).toBeCloseTo(90 - acute, 9)
  })

  it('of a shift has no part of the scale of its time base, which cancels against the period', () => {
    const found = limit({
      kind: 'shift',
      of: 'V',
      shift: '1.30',
      period: '8.00',
      sense: 'lags',
      instrument: 'm1',
    })
    expect(found.from).toBe('instrument')
    expect(found.shared).toEqual([])
    expect(found.own.map(({ name }) => name)).toEqual(['1 digit', '1 digit of the period'])
    expect(found.own[0]?.limit).toBeCloseTo((360 * 0.01) / 8, 12)
    expect(found.own[1]?.limit).toBeCloseTo((58.5 / 8) * 0.01, 12)
  })

  it('is never negative and always a number, on any sheet', unhurried, () => {
    fc.assert(
      fc.property(anySheet, (sheet) => {
        for (const reading of sheet.readings ?? []) {
          expect(wordsOf(sheet, reading)).not.toMatch(/NaN|undefined|\[object/)
          const found = limitOf(sheet, reading)
          if (found === undefined) continue
          expect(found.limit).toBeGreaterThanOrEqual(0)
          for (const part of [...found.own, ...found.shared]) {
            expect(part.uncertainty).toBeGreaterThanOrEqual(0)
          }
        }
      }),
    )
  })

  it('scales with the unit of its value', () => {
    const figure = fc.integer({ min: 0, max: 5999 }).map((steps) => (steps / 100).toFixed(2))
    fc.assert(
      fc.property(figure, fc.option(fc.integer({ min: 0, max: 50 })), (digits, stated) => {
        const inVolts = { ...volts, range: 60, shown: digits }
        const milli = { ...volts, range: 60, shown: `${(Number(digits) * 1000).toFixed(0)} mV` }
        const both = stated === null ? {} : { limit: stated / 10 }
        const exact = (reading: object) => limit({ ...reading, ...both }).limit
        const coarser = limit({ ...milli, ...both })
        expect(exact(inVolts)).toBeGreaterThanOrEqual(coarser.limit)
        expect(exact({ ...inVolts, ratio: 1000 }) / 1000).toBeCloseTo(exact(inVolts), 12)
        expect(exact({ ...inVolts, shunt: 0.1, of: 'I' }) / 10).toBeCloseTo(exact(inVolts), 12)
      }),
    )
  })
})

describe('errors in common', () => {
  const two = (first: object, second: object, parts: Partial<Sheet> = {}) =>
    jobOf(
      ['I', 'V', 'V2'],
      [
        { id: 'r1', ...volts, ...first } as Reading,
        { id: 'r2', ...volts, of: 'V2', ...second } as Reading,
      ],
      parts,
    )

  it('of one function and range cancel in a difference, and those of two ranges do not', () => {
    const alike = limitsOf(two({ shown: '48.20' }, { shown: '48.20' }))
    const difference = ([one, other]: typeof alike) =>
      standardUncertaintyOf([
        ...(one ? [one] : []),
        ...(other ? [{ ...other, sensitivity: -1 }] : []),
      ])
    expect(difference(alike)).toBeCloseTo((Math.SQRT2 * 0.03) / Math.sqrt(3), 12)
    const apart = limitsOf(two({ shown: '48.20' }, { shown: '48.20', range: 600 }))
    expect(difference(apart)).toBeGreaterThan((48.2 * 0.007) / Math.sqrt(3))
  })

  it('of a channel go to all through it: ratio to magnitudes and powers, phase error to angles', () => {
    const channels = [
      { id: 'ct', ratio: { value: 40, limit: 0.4 }, phaseError: { value: 1, limit: 0.5 } },
    ]
    const sheet = jobOf(
      ['V', 'I'],
      [
        { id: 'r1', kind: 'magnitude', of: 'I', shown: '1.2', limit: 0, channel: 'ct' },
        { id: 'r2', kind: 'angle', of: 'I', shown: '-30', limit: 0, channel: 'ct' },
      ],
      { channels },
    )
    const [size, turn] = limitsOf(sheet)
    expect(size?.limit.shared).toMatchObject([
      { error: 'ratio:ct', limit: expect.closeTo(0.48, 12) },
    ])
    expect(turn?.limit.shared).toMatchObject([{ error: 'phase:ct', limit: 0.5 }])
    expect(turn?.limit.shared[0]?.sensitivity).toBeCloseTo(-0.5 / Math.sqrt(3), 12)
  })

  it('of drift belong to a pass, and to powers twice', () => {
    const sheet = two(
      { shown: '50', limit: 0, pass: 'A' },
      { shown: '40', limit: 0, pass: 'A' },
      { drift: 2 },
    )
    for (const [index, size] of [1, 0.8].entries()) {
      expect(limitsOf(sheet)[index]?.limit.shared).toMatchObject([
        { error: 'drift:A', limit: size },
      ])
    }
    const power = limit({ kind: 'power', of: 'V', with: 'I', shown: '100', limit: 0 }, { drift: 2 })
    expect(power.own).toMatchObject([{ limit: 0 }, { name: 'drift of the supply', limit: 4 }])
  })

  it('of repeats in the same passes go together as they were observed', () => {
    const first = [5.007, 4.994, 5.005, 4.99, 4.999]
    const second = [19.663e-3, 19.639e-3, 19.64e-3, 19.685e-3, 19.678e-3]
    const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value / 5, 0)
    const covariance = (a: readonly number[], b: readonly number[]) =>
      a.reduce((sum, value, at) => sum + (value - mean(a)) * ((b[at] ?? 0) - mean(b)), 0) / 20
    const [one, other] = limitsOf(
      two(
        { shown: mean(first), repeats: first, limit: 0, pass: 'P' },
        { shown: mean(second), repeats: second, limit: 0, pass: 'P' },
      ),
    )
    if (one === undefined || other === undefined) throw new Error('there are two readings')
    expect(standardUncertaintyOf([one]) ** 2).toBeCloseTo(covariance(first, first), 15)
    const together = standardUncertaintyOf([one, other]) ** 2
    expect(together).toBeCloseTo(
      covariance(first, first) + covariance(second, second) + 2 * covariance(first, second),
      15,
    )
    expect(one.limit.shared.map(({ group }) => group)).toEqual(Array(5).fill('repeats:P:5'))
  })

  it('of repeats without a pass are each reading’s own, s / √n with n − 1 degrees of freedom', () => {
    const found = limit({ ...volts, shown: '10', limit: 0, repeats: [9.9, 10, 10.1] })
    expect(found.own[1]).toMatchObject({ shape: 'normal', freedom: 2 })
    expect(found.own[1]?.uncertainty).toBeCloseTo(0.1 / Math.sqrt(3), 12)
  })
})
