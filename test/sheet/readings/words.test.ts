import { expect, test } from 'vitest'
import { formulasOf, type Reading, type Sheet, wordsOf } from '../../../src/sheet'
import { readingOf } from '../sheets'
import { jobOf, oneReading } from './jobs'

function words(reading: object, parts: Partial<Sheet> = {}): string {
  const sheet = oneReading(reading as Reading, parts)
  return wordsOf(sheet, readingOf(sheet, 'r1'))
}

test('a reading is told with what it comes to', () => {
  const current = { kind: 'magnitude', of: 'I', shown: '1.26', limit: 0.024 }
  expect(words({ ...current, turns: 4 })).toBe('1.26 A shown, 4 turns: 0.315 A ± 0.006 A')
  expect(words(current)).toBe('1.26 A ± 0.024 A')
  expect(words({ kind: 'magnitude', of: 'V', shown: '230' })).toBe('230 V ± 2.3 V assumed')
  expect(words({ ...current, shunt: 0.01, shown: '12.5 mV', limit: 1e-4 })).toBe(
    '12.5 mV shown, across 0.01 Ω: 1.25 A ± 0.01 A',
  )
  expect(words({ kind: 'magnitude', of: 'V', shown: '34.0', form: 'peak', limit: 0.5 })).toBe(
    '34.0 V shown, peak: 24.04 V ± 0.36 V',
  )
})

test('every angle is a sentence', () => {
  expect(words({ kind: 'angle', of: 'V', shown: '37.1' })).toBe('V leads I by 37.1° ± 1° assumed')
  expect(words({ kind: 'angle', of: 'V', shown: '37.1', sense: 'lags', limit: 0.5 })).toBe(
    'V lags I by 37.1° ± 0.5°',
  )
  expect(words({ kind: 'angle', of: 'V', shown: '0' })).toBe('V is in phase with I ± 1° assumed')
  expect(
    words({ kind: 'shift', of: 'V', shift: '1.3', period: '8', sense: 'lags', limit: 0.05 }),
  ).toBe('1.3 of 8 shown: V lags I by 58.5° ± 2.3°')
  expect(words({ kind: 'ellipse', of: 'V', intercept: '2', height: '4' })).toBe(
    '2 of 4 shown: V and I are 30.0° or 150.0° apart, which of them leads was not noted',
  )
  expect(
    words({
      kind: 'ellipse',
      of: 'V',
      intercept: '2',
      height: '4',
      tilt: 'falling',
      sense: 'leads',
    }),
  ).toBe('2 of 4 shown, falling: V leads I by 150.0° ± 1° assumed')
})

test('an instrument that counts lag from 0 to 360° is read as it counts', () => {
  const instruments = [{ id: 'm2', name: 'Phase meter', angles: 'lag-positive' as const }]
  const angle = { kind: 'angle', of: 'V', instrument: 'm2', limit: 0.5 }
  expect(words({ ...angle, shown: '322.9' }, { instruments })).toBe('V leads I by 37.1° ± 0.5°')
  expect(words({ ...angle, shown: '37.1' }, { instruments })).toBe('V lags I by 37.1° ± 0.5°')
})

test('watts and power factors tell the angle that they leave', () => {
  const sheet = jobOf(
    ['I', 'V'],
    [
      { id: 'r1', kind: 'magnitude', of: 'I', shown: '2.00' },
      { id: 'r2', kind: 'magnitude', of: 'V', shown: '230' },
      { id: 'r3', kind: 'power', of: 'V', with: 'I', shown: '230', limit: 4 },
      { id: 'r4', kind: 'reactive-power', of: 'V', with: 'I', shown: '-230', limit: 4 },
      {
        id: 'r5',
        kind: 'power-factor',
        of: 'V',
        with: 'I',
        shown: '0.50',
        sense: 'lags',
        limit: 0.01,
      },
    ],
  )
  const said = (id: string) => wordsOf(sheet, readingOf(sheet, id))
  expect(said('r3')).toBe('230 W ± 4 W, at 460 VA cos φ is 0.500: 60.0°, lead or lag not shown')
  expect(said('r4')).toBe('−230 var ± 4 var, at 460 VA sin φ is −0.500: the current leads')
  expect(said('r5')).toBe('cos φ 0.500 ± 0.01, the current lags: V leads I by 60.0°')
})

test('the formula of each conversion is told on request', () => {
  const formulas = (reading: object, parts: Partial<Sheet> = {}) => {
    const sheet = oneReading(reading as Reading, parts)
    return formulasOf(sheet, readingOf(sheet, 'r1'))
  }
  expect(formulas({ kind: 'magnitude', of: 'V', shown: '1' })).toEqual([])
  expect(formulas({ kind: 'magnitude', of: 'I', shown: '1', turns: 4, form: 'peak' })).toEqual([
    'rms = peak ÷ √2, for a sine',
    'current = shown ÷ turns through the clamp',
  ])
  expect(formulas({ kind: 'shift', of: 'V', shift: '1', period: '8', sense: 'lags' })).toEqual([
    'φ = 360° × shift ÷ period',
  ])
  const instruments = [{ id: 'm3', name: 'Old meter', responding: 'average' as const }]
  expect(
    formulas({ kind: 'magnitude', of: 'V', shown: '1', instrument: 'm3' }, { instruments }),
  ).toEqual([
    'true rms = shown × form factor of the wave ÷ 1.1107 (sine 1.1107, square 1, triangle 1.1547)',
  ])
})
