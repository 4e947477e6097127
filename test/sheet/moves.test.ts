import { describe, expect, test } from 'vitest'
import { type Evaluation, movesOf, type Reading, type Sheet } from '../../src/sheet'
import { phasor, reads, sheetWith } from './estimate/sheets'

/** What is best of a voltage and a current: 100 V at 30°, 2 A at 0°. */
const best: Evaluation = {
  phasors: [state('I', 2, 0), state('V', 100, 30)],
  sums: [],
  hand: [],
}

function state(id: string, magnitude: number, angle: number): Evaluation['phasors'][number] {
  return { id, magnitude, angle, asRead: {}, magnitudeState: 'adjusted', angleState: 'adjusted' }
}

function sheetOf(...readings: readonly Reading[]): Sheet {
  return sheetWith({ phasors: [phasor('I', 'current'), phasor('V')], reference: 'I', readings })
}

describe('how far a reading moved', () => {
  test.each<[string, Reading, number, string, number]>([
    ['a magnitude, in volts', reads('V', 99.5, 1, 'r'), 0.5, 'V', 0.5],
    ['a magnitude, in amperes', reads('I', 2.1, 0.2, 'r'), -0.1, 'A', 0.5],
    [
      'an angle, in degrees',
      { id: 'r', of: 'V', kind: 'angle', shown: 32, limit: 4 },
      -2,
      '°',
      0.5,
    ],
    [
      'an angle that was read as lagging',
      { id: 'r', of: 'I', kind: 'angle', against: 'V', shown: 29, sense: 'lags', limit: 2 },
      -1,
      '°',
      0.5,
    ],
    [
      'a power, in watts',
      { id: 'r', of: 'V', kind: 'power', with: 'I', shown: 170, limit: 10 },
      200 * Math.cos(Math.PI / 6) - 170,
      'W',
      (200 * Math.cos(Math.PI / 6) - 170) / 10,
    ],
    [
      'reactive power, in var',
      { id: 'r', of: 'V', kind: 'reactive-power', with: 'I', shown: 101, limit: 2 },
      -1,
      'var',
      0.5,
    ],
    [
      'a power factor, without a unit',
      { id: 'r', of: 'V', kind: 'power-factor', with: 'I', shown: 0.86, limit: 0.01 },
      Math.cos(Math.PI / 6) - 0.86,
      '',
      (Math.cos(Math.PI / 6) - 0.86) / 0.01,
    ],
  ])('is best less read: %s', (_, reading, moved, unit, share) => {
    const [move] = movesOf(sheetOf(reading), best)
    expect(move?.moved).toBeCloseTo(moved, 9)
    expect(move?.unit).toBe(unit)
    expect(move?.share).toBeCloseTo(share, 9)
  })

  test('has no share where the reading is exact', () => {
    const [move] = movesOf(sheetOf(reads('V', 99.5, 0, 'r')), best)
    expect(move).toEqual({ reading: 'r', moved: 0.5, unit: 'V' })
  })

  test('is not said of readings that are struck, or whose best value is open', () => {
    const open = { ...best, phasors: best.phasors.map(({ magnitude: _, ...rest }) => rest) }
    expect(movesOf(sheetOf({ ...reads('V', 99, 1, 'r'), struck: true }), best)).toEqual([])
    expect(movesOf(sheetOf(reads('V', 99, 1, 'r')), open)).toEqual([])
  })

  test('keeps the order of the sheet', () => {
    const sheet = sheetOf(reads('V', 99, 1, 'b'), reads('I', 2, 1, 'a'))
    expect(movesOf(sheet, best).map(({ reading }) => reading)).toEqual(['b', 'a'])
  })
})
