import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { differenceDegrees, wrapDegrees } from '../../../src/core'
import {
  apply,
  describeEdit,
  quick,
  type Reading,
  referenceOf,
  type Sheet,
} from '../../../src/sheet'
import { anySheet } from '../arbitrary-sheet'
import { applied, refused, unhurried } from '../laws'
import { phasors } from '../readings/jobs'
import { phasorOf, polar, readingOf, rectangular, sheetOf } from '../sheets'

const reverse = (id: string) => ({ kind: 'reverse-phasor', id }) as const

const readings: readonly Reading[] = [
  { id: 'r1', of: 'V', kind: 'magnitude', shown: '48.0' },
  { id: 'r2', of: 'V', kind: 'angle', shown: '37.1', sense: 'leads' },
  { id: 'r3', of: 'W', kind: 'angle', shown: '-120', against: 'V' },
  { id: 'r4', of: 'V', kind: 'shift', shift: '1.3', period: '8.0', sense: 'leads' },
  {
    id: 'r5',
    of: 'V',
    kind: 'ellipse',
    intercept: '2',
    height: '4',
    tilt: 'rising',
    sense: 'leads',
  },
  { id: 'r6', of: 'V', kind: 'power', with: 'I', shown: '31.5 W' },
  { id: 'r7', of: 'V', kind: 'power-factor', with: 'I', shown: '0.80', sense: 'lags' },
  { id: 'r8', of: 'W', kind: 'magnitude', shown: '10' },
]

const job: Sheet = sheetOf({
  reference: 'I',
  phasors: [
    ...phasors('I'),
    { ...phasors('V')[0], id: 'V', label: 'V', quantity: 'voltage', from: 'a', to: 'b' },
    ...phasors('W'),
    polar('X', '20', '30.50'),
    rectangular('Y', '3.0', '-4.0'),
  ],
  readings,
  sums: [
    { id: 's1', terms: [{ phasor: 'V' }, { phasor: 'X', sign: -1 }], equals: 'W' },
    { id: 's2', terms: [{ phasor: 'X' }, { phasor: 'Y' }], equals: 'V' },
  ],
})

describe('reversing a phasor', () => {
  it('exchanges its terminals and turns every reading of it as exchanged leads would', () => {
    const turned = applied(job, reverse('V'))
    expect(phasorOf(turned, 'V')).toMatchObject({ from: 'b', to: 'a' })
    expect(readingOf(turned, 'r1')).toEqual(readings[0])
    expect(readingOf(turned, 'r2')).toMatchObject({ shown: '142.9', sense: 'lags' })
    expect(readingOf(turned, 'r3')).toMatchObject({ shown: '60' })
    expect(readingOf(turned, 'r4')).toMatchObject({ shift: '5.3', sense: 'leads' })
    expect(readingOf(turned, 'r5')).toMatchObject({ tilt: 'falling', sense: 'lags' })
    expect(readingOf(turned, 'r6')).toMatchObject({ shown: '−31.5 W' })
    expect(readingOf(turned, 'r7')).toMatchObject({ shown: '−0.80', sense: 'leads' })
    expect(readingOf(turned, 'r8')).toEqual(readings[7])
  })

  it('changes its sign in every sum, and all signs of a sum that it must be', () => {
    const turned = applied(job, reverse('V'))
    expect(turned.sums).toEqual([
      {
        id: 's1',
        terms: [
          { phasor: 'V', sign: -1 },
          { phasor: 'X', sign: -1 },
        ],
        equals: 'W',
      },
      {
        id: 's2',
        terms: [
          { phasor: 'X', sign: -1 },
          { phasor: 'Y', sign: -1 },
        ],
        equals: 'V',
      },
    ])
  })

  it('turns what was typed, in either form, with digits as fine as before', () => {
    expect(phasorOf(applied(job, reverse('X')), 'X').angle).toEqual({
      value: -149.5,
      text: '−149.50',
    })
    expect(phasorOf(applied(job, reverse('Y')), 'Y')).toMatchObject({
      real: { value: -3, text: '−3.0' },
      imaginary: { value: 4, text: '4.0' },
    })
  })

  it('is refused for the reference, and where an element or a three-phase system ties it down', () => {
    expect(refused(job, reverse('I'))).toMatch(/^I is the reference, at 0° by definition/)
    const elements = [
      { id: 'e1', label: 'R1', kind: 'resistor', voltage: 'V', current: 'I' },
    ] as const
    expect(refused({ ...job, elements }, reverse('V'))).toMatch(/take R1 out of the circuit first/)
    const threePhase = [{ id: 't1', phasors: ['V', 'W', 'X'] }] as const
    expect(refused({ ...job, threePhase }, reverse('W'))).toMatch(/three-phase system t1/)
    expect(describeEdit(job, reverse('V'))).toBe('Reverse V')
  })

  it('leaves the evaluation as it was, but for its own sign, on any sheet', unhurried, () => {
    const spread = (sheet: Sheet) => ({
      ...sheet,
      elements: [],
      threePhase: [],
      hand: [],
      readings: (sheet.readings ?? []).map((reading) => ({ ...reading, corrected: undefined })),
    })
    let count = 0
    fc.assert(
      fc.property(anySheet, fc.nat(7), (drawn, at) => {
        const { circuit: _, ...rest } = spread(drawn)
        const sheet = JSON.parse(JSON.stringify(rest)) as Sheet
        const phasor = sheet.phasors[at % (sheet.phasors.length || 1)]
        if (phasor === undefined || referenceOf(sheet) === phasor.id) return
        const result = apply(sheet, reverse(phasor.id))
        if (!result.ok) throw new Error(result.problem)
        // Figures of a thousand billion degrees or seconds have no digits left for half a turn.
        const figures = JSON.stringify(sheet.readings).match(/[\d.]+e[+-]?\d+|\d{7,}/g)
        if (figures !== null) return
        count += 1
        const before = quick(sheet)
        const after = quick(result.value)
        for (const [index, found] of before.phasors.entries()) {
          const other = after.phasors[index]
          const turn = found.id === phasor.id ? 180 : 0
          expect(other?.asRead.magnitude).toBe(found.asRead.magnitude)
          expect(other?.angleState).toBe(found.angleState)
          if (found.angle === undefined || other?.angle === undefined) continue
          const apart = differenceDegrees(other.angle, wrapDegrees(found.angle + turn))
          expect(Math.abs(apart)).toBeLessThan(1e-6)
        }
      }),
      { numRuns: 300 },
    )
    expect(count).toBeGreaterThan(20)
  })

  it('twice gives the same sheet, where every figure is a decimal', () => {
    const turned = applied(applied(job, reverse('V')), reverse('V'))
    const bare = (sheet: Sheet) =>
      JSON.parse(JSON.stringify(sheet).replaceAll('−', '-').replaceAll(' W"', '"')) as Sheet
    expect(bare(turned)).toEqual(bare(job))
  })
})
