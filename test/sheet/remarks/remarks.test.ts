import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Reading, remarksOn, type Sheet } from '../../../src/sheet'
import { anySheet } from '../arbitrary-sheet'
import { refused, unhurried } from '../laws'
import { jobOf, meter, oneReading } from '../readings/jobs'

function said(sheet: Sheet): readonly string[] {
  return remarksOn(sheet).map(({ text }) => text)
}

const of = (reading: object, parts: Partial<Sheet> = {}) =>
  said(oneReading(reading as Reading, parts))

describe('nonsense is caught in words', () => {
  it('a shift longer than its period', () => {
    expect(of({ kind: 'shift', of: 'V', shift: '9.1', period: '8', sense: 'lags' })).toEqual([
      'The shift of 9.1 is longer than the period of 8: a trace is never more than one period behind. Check which figure is which.',
    ])
    expect(of({ kind: 'shift', of: 'V', shift: '8', period: '8', sense: 'lags' })).toEqual([])
  })

  it('an ellipse intercept above its height', () => {
    expect(of({ kind: 'ellipse', of: 'V', intercept: '4.1', height: '4' })[0]).toMatch(
      /^The intercept of 4.1 is above the height of 4: /,
    )
    expect(of({ kind: 'ellipse', of: 'V', intercept: '4', height: '4' })).toEqual([])
  })

  it('power above voltage times current, beyond what their limits allow', () => {
    const withPower = (shown: string) =>
      said(
        jobOf(
          ['I', 'V'],
          [
            { id: 'r1', kind: 'magnitude', of: 'I', shown: '2.00' },
            { id: 'r2', kind: 'magnitude', of: 'V', shown: '230' },
            { id: 'r3', kind: 'power', of: 'V', with: 'I', shown },
          ],
        ),
      )
    expect(withPower('500')).toEqual([
      '500.0 W is more than V times I, which is 460.0 VA: there cannot be more. Check ratios, turns and decimal points.',
    ])
    expect(withPower('465')).toEqual([])
    expect(withPower('-500')).toHaveLength(1)
  })

  it('a power factor above 1 and zero turns, which no sheet takes', () => {
    const sheet = oneReading({ kind: 'power-factor', of: 'V', with: 'I', shown: '0.9' } as Reading)
    expect(refused(sheet, { kind: 'set-reading', id: 'r1', change: { shown: '1.02' } })).toBe(
      'A power factor lies between −1 and 1.',
    )
    const clamp = oneReading({ kind: 'magnitude', of: 'I', shown: '1.26' } as Reading)
    expect(refused(clamp, { kind: 'set-reading', id: 'r1', change: { turns: 0 } })).toBe(
      'There is at least one turn.',
    )
  })

  it('a mean that its repeats do not have', () => {
    const repeats = [9.9, 10, 10.1]
    expect(of({ kind: 'magnitude', of: 'V', shown: '10.0', repeats })).toEqual([])
    expect(of({ kind: 'magnitude', of: 'V', shown: '11.0', repeats })[0]).toMatch(
      /^11.0 is not the mean of the 3 repeats, which is 10.0000/,
    )
  })
})

describe('instruments', () => {
  const due = { ...meter, calibrationDue: '2026-01-31' }
  const volts = { kind: 'magnitude', of: 'V', shown: '48.20', instrument: 'm1' }

  it('whose calibration had lapsed on the day of the test are pointed out', () => {
    const on = (date: string) => of(volts, { instruments: [due], job: { date } })
    expect(on('2026-02-01')).toEqual([
      'The calibration of Bench meter (B-17) was due on 2026-01-31, before the test of 2026-02-01: have it checked, and say so in the report.',
    ])
    expect(on('2026-01-31')).toEqual([])
    expect(of(volts, { instruments: [due] })).toEqual([])
    expect(
      of({ ...volts, struck: true }, { instruments: [due], job: { date: '2027-01-01' } }),
    ).toEqual([])
  })

  it('are held to their range and to their category', () => {
    expect(of({ ...volts, shown: '61.2', range: 60 })[0]).toBe(
      '61.2 V is beyond the range of 60 V: the accuracy does not hold there. Check the reading and the range.',
    )
    expect(of({ ...volts, shown: '690' }, {})).toEqual([
      '690 V is beyond the range of 600 V: the accuracy does not hold there. Check the reading and the range.',
      '690 V is above what Bench meter is made for, CAT III 600 V: do not measure it so again.',
    ])
    expect(of({ ...volts, shown: '59.9', range: 60 })).toEqual([])
  })

  it('whose accuracy cannot serve are said to', () => {
    const vague = { ...meter, accuracy: [{ of: 'voltage', text: 'quite good' }] } as const
    expect(of(volts, { instruments: [vague] })[0]).toMatch(
      /^The voltage accuracy of Bench meter is not used/,
    )
    const power = { kind: 'power', of: 'V', with: 'I', shown: '12', instrument: 'm1' }
    expect(of(power)).toEqual([
      'The limit is assumed. The accuracy is a part of the range: say on which range the meter was.',
    ])
  })

  it('that load the circuit by more than a tenth of the limit are pointed out', () => {
    const divider = (ohms: number, limit: number) =>
      jobOf(
        ['I', 'V', 'V2'],
        [{ id: 'r1', kind: 'magnitude', of: 'V2', shown: '5.0', instrument: 'm1', limit }],
        {
          instruments: [{ ...meter, inputResistance: { value: ohms } }],
          elements: [
            {
              id: 'e1',
              kind: 'resistor',
              voltage: 'V',
              current: 'I',
              resistance: { value: 10_000 },
            },
            {
              id: 'e2',
              kind: 'resistor',
              voltage: 'V2',
              current: 'I',
              marked: { resistance: { value: 10_000 } },
            },
          ],
          circuit: { series: [{ element: 'e1' }, { element: 'e2' }] },
        },
      )
    // Seen from the meter, 10 kΩ beside 10 kΩ are 5 kΩ: 1 MΩ takes 5/1005 of the voltage off.
    const drop = 5 * (5 / 1005)
    expect(said(divider(1e6, drop * 9))[0]).toMatch(
      /^The 1.00 MΩ of Bench meter change the voltage V2 by about 25 mV/,
    )
    expect(said(divider(1e6, drop * 11))).toEqual([])
    const { circuit: _, ...unknown } = divider(1e6, drop)
    expect(said(unknown)).toEqual([])
  })
})

it(
  'any sheet can be looked at, and remarks are whole sentences about parts of it',
  unhurried,
  () => {
    fc.assert(
      fc.property(anySheet, (sheet) => {
        const ids = new Set(
          [...(sheet.readings ?? []), ...(sheet.instruments ?? [])].map(({ id }) => id),
        )
        for (const { about, text } of remarksOn(sheet)) {
          expect(ids).toContain(about)
          expect(text).toMatch(/^[\p{Lu}\d−].*[.]$/su)
          expect(text).not.toMatch(/NaN|undefined|\[object/)
        }
      }),
    )
  },
)
