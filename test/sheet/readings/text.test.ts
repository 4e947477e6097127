import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  createReading,
  parseReadingText,
  type Reading,
  readingTable,
  readingText,
  readReadingRows,
  type Sheet,
} from '../../../src/sheet'
import { anySheet } from '../arbitrary-sheet'
import { unhurried } from '../laws'
import { jobOf, phasors } from './jobs'

function read(kind: Reading['kind'], text: string) {
  const parsed = parseReadingText(kind, text, 'current')
  if (!parsed.ok) throw new Error(parsed.problem)
  return Object.fromEntries(Object.entries(parsed.value).filter(([, value]) => value !== null))
}

/** The figures as text: a number that is printed and typed again is its digits. */
function asTyped(reading: Reading): object {
  const figures = ['shown', 'shift', 'period', 'intercept', 'height']
  const { corrected: _, ...kept } = reading
  return Object.fromEntries(
    Object.entries(kept)
      .filter(([field, value]) => value !== null && !(field === 'form' && value === 'rms'))
      .map(([field, value]) => [field, figures.includes(field) ? String(value).trim() : value]),
  )
}

describe('what is typed for a reading', () => {
  it('may say how it was taken', () => {
    expect(read('magnitude', '1.26 A, 4 turns')).toEqual({ shown: '1.26 A', turns: 4 })
    expect(read('magnitude', '1,26; 4 turns; ratio 200/5')).toEqual({
      shown: '1,26',
      turns: 4,
      ratio: 40,
    })
    expect(read('magnitude', '12.5 mV shunt 0.01')).toEqual({ shown: '12.5 mV', shunt: 0.01 })
    expect(read('magnitude', '3.4 ± 0.1 peak')).toEqual({ shown: '3.4', limit: 0.1, form: 'peak' })
    expect(read('magnitude', '3.4 A p-p')).toEqual({ shown: '3.4 A', form: 'peak-to-peak' })
    expect(read('angle', '37.1 leads')).toEqual({ shown: '37.1', sense: 'leads' })
    expect(read('angle', '-37.1°')).toEqual({ shown: '-37.1°' })
    expect(read('angle', '37.1° ± 1° lagging')).toEqual({ shown: '37.1°', limit: 1, sense: 'lags' })
    expect(read('shift', '1.3 of 8 lags')).toEqual({ shift: '1.3', period: '8', sense: 'lags' })
    expect(read('shift', '3.25 ms / 20 ms leads')).toEqual({
      shift: '3.25 ms',
      period: '20 ms',
      sense: 'leads',
    })
    expect(read('ellipse', '2.1 of 4.0 rising leads')).toEqual({
      intercept: '2.1',
      height: '4.0',
      tilt: 'rising',
      sense: 'leads',
    })
    expect(read('power', '460 W, ratio 40')).toEqual({ shown: '460 W', ratio: 40 })
    expect(read('power-factor', '0.83 lags')).toEqual({ shown: '0.83', sense: 'lags' })
  })

  it('is refused in words', () => {
    const problem = (kind: Reading['kind'], text: string) => {
      const parsed = parseReadingText(kind, text, 'current')
      return parsed.ok ? '' : parsed.problem
    }
    expect(problem('shift', '1.3 of 8')).toMatch(/such as 1.3 of 8 lags/)
    expect(problem('ellipse', '2.1')).toMatch(/intercept and the height/)
    expect(problem('magnitude', '1.26 V')).toMatch(/This value is in A/)
    expect(problem('angle', 'lags')).toMatch(/what the display showed/)
  })
})

describe('a reading printed and typed again', () => {
  it('is the same reading, of any kind on any sheet', unhurried, () => {
    fc.assert(
      fc.property(anySheet, (sheet) => {
        for (const reading of sheet.readings ?? []) {
          const quantity = sheet.phasors.find(({ id }) => id === reading.of)?.quantity ?? 'other'
          const parsed = parseReadingText(reading.kind, readingText(reading), quantity)
          if (!parsed.ok) throw new Error(`${readingText(reading)}: ${parsed.problem}`)
          expect(asTyped(createReading(reading, parsed.value, reading))).toEqual(asTyped(reading))
        }
      }),
    )
  })

  it(
    'as a row of a spreadsheet is the same reading, limits, passes, repeats and all',
    unhurried,
    () => {
      const plain = (sheet: Sheet): readonly Reading[] =>
        (sheet.readings ?? []).map((reading) => {
          const known =
            'id of kind instrument channel range limit repeats pass struck shown form turns ratio shunt against sense shift period intercept height tilt with currentChannel'.split(
              ' ',
            )
          const kept = Object.entries(reading).filter(([field]) => known.includes(field))
          return Object.fromEntries(
            kept.filter(([field, value]) =>
              field === 'pass'
                ? String(value).trim() === value && value !== ''
                : field !== 'repeats' || value.length > 0,
            ),
          ) as unknown as Reading
        })
      fc.assert(
        fc.property(anySheet, (sheet) => {
          const readings = plain(sheet)
          const table = readingTable({ ...sheet, readings })
          const rows = readReadingRows({ ...sheet, readings: [] }, table)
          expect(rows.problems).toEqual([])
          expect(rows.phasors).toEqual([])
          const bare = (list: readonly Reading[]) =>
            list.map(({ id: _, ...rest }) => asTyped(rest as Reading))
          expect(bare(rows.readings)).toEqual(bare(readings))
        }),
      )
    },
  )
})

describe('rows of a spreadsheet', () => {
  it('need no header, and find the kind in the figure', () => {
    const sheet = jobOf(['I', 'V'], [])
    const rows = readReadingRows(sheet, [
      ['I', '1.26, 4 turns'],
      ['V', '230 V', '', 'Bench meter', '600'],
      ['V', '37.1 leads', 'I'],
      ['', ''],
      ['V', 'power', '230 W', 'I'],
    ])
    expect(rows.problems).toEqual([])
    expect(rows.readings).toEqual([
      { id: 'r1', of: 'I', kind: 'magnitude', shown: '1.26', turns: 4 },
      { id: 'r2', of: 'V', kind: 'magnitude', shown: '230 V', instrument: 'm1', range: 600 },
      { id: 'r3', of: 'V', kind: 'angle', shown: '37.1', sense: 'leads', against: 'I' },
      { id: 'r4', of: 'V', kind: 'power', shown: '230 W', with: 'I' },
    ])
  })

  it('add the phasors that they name', () => {
    const sheet = jobOf(['I'], [])
    const rows = readReadingRows(sheet, [
      ['VR', '24.0'],
      ['IL', '0.5'],
      ['VR', '0 leads', 'I'],
    ])
    expect(rows.phasors).toEqual(phasors('VR', 'IL'))
    expect(rows.readings.map(({ of }) => of)).toEqual(['VR', 'IL', 'VR'])
  })

  it('that cannot be read are named', () => {
    const sheet = jobOf(['I', 'V'], [])
    expect(
      readReadingRows(sheet, [
        ['V', 'angel', '3', ''],
        ['V', 'power', '3 W', ''],
        ['V', '3', '', 'Nobody’s meter'],
        ['', '3'],
      ]).problems,
    ).toEqual([
      expect.stringMatching(/^Row 1: /),
      'Row 2: a power needs the current too. Name it under "against".',
      'Row 3: there is no instrument “Nobody’s meter” on this sheet. Add it first, or leave it out.',
      'Row 4: it names no phasor. Say what was read, such as V1.',
    ])
  })
})
