import { expect, test } from 'vitest'
import { type CellOptions, parseCell } from '../../../src/core'
import { type Edit, exampleSheet, quick, type Sheet, type ValuePart } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { phasor, phasorOf, polar, readingOf, rectangular, sheetOf } from '../sheets'

/** The edit that typing a text into a cell of a voltage makes. */
function typing(id: string, part: ValuePart, text: string): Edit {
  const options: CellOptions = { unit: 'V', ...(part === 'whole' ? {} : { part }) }
  const value = parseCell(text, options)
  if (!value.ok) throw new Error(value.problem)
  return { kind: 'set-value', id, part, value: value.value }
}

const sheet: Sheet = sheetOf({
  phasors: [
    { ...polar('V0', '10', '0') },
    {
      ...phasor('V1'),
      magnitude: { value: 24, text: '24.0', limit: 0.2 },
      angle: { value: 30, text: '30' },
    },
    rectangular('V2', '3.0', '4.0'),
    phasor('V3'),
    phasor('V4'),
  ],
  readings: [
    { id: 'r1', of: 'V4', kind: 'magnitude', shown: '12.0', limit: 0.1 },
    { id: 'r2', of: 'V4', kind: 'angle', shown: '45', sense: 'lags' },
  ],
})

test('a typed part changes with its digits, and keeps a limit that is not given anew', () => {
  const changed = applied(sheet, typing('V1', 'magnitude', '25,50'))
  expect(phasorOf(changed, 'V1').magnitude).toEqual({ value: 25.5, text: '25,50', limit: 0.2 })
  expect(phasorOf(changed, 'V1').angle).toEqual({ value: 30, text: '30' })
  const limited = applied(sheet, typing('V1', 'magnitude', '25.5 ± 1 %'))
  expect(phasorOf(limited, 'V1').magnitude).toEqual({ value: 25.5, text: '25.5', limit: 0.255 })
})

test('an angle beyond half a turn is kept as typed and counts the short way round', () => {
  const changed = applied(sheet, typing('V1', 'angle', '270'))
  expect(phasorOf(changed, 'V1').angle?.value).toBe(-90)
})

test('a whole phasor in any cell settles both parts', () => {
  for (const part of ['magnitude', 'angle', 'real', 'imaginary', 'whole'] as const) {
    const changed = applied(sheet, typing('V3', part, '48.2 ∠ 82°'))
    expect(phasorOf(changed, 'V3')).toMatchObject({
      magnitude: { value: 48.2, text: '48.2' },
      angle: { value: 82 },
    })
  }
  const changed = applied(sheet, typing('V1', 'magnitude', '6.7 + j47.7'))
  expect(phasorOf(changed, 'V1')).toEqual({
    ...phasor('V1'),
    real: { value: 6.7, text: '6.7' },
    imaginary: { value: 47.7, text: '47.7' },
  })
})

test('a limit alone changes the limit alone', () => {
  const changed = applied(sheet, typing('V1', 'magnitude', '± 0.5'))
  expect(phasorOf(changed, 'V1').magnitude).toEqual({ value: 24, text: '24.0', limit: 0.5 })
  const percent = applied(sheet, typing('V1', 'whole', '± 1 %'))
  expect(phasorOf(percent, 'V1').magnitude?.limit).toBe(0.24)
  const angle = applied(sheet, typing('V1', 'angle', '± 2'))
  expect(phasorOf(angle, 'V1').angle).toEqual({ value: 30, text: '30', limit: 2 })
  const real = applied(sheet, typing('V2', 'real', '± 0.1'))
  expect(phasorOf(real, 'V2').real).toEqual({ value: 3, text: '3.0', limit: 0.1 })
  const read = applied(sheet, typing('V4', 'magnitude', '± 2 %'))
  expect(readingOf(read, 'r1')).toMatchObject({ shown: '12.0', limit: 0.24 })
})

test('a limit of what is typed in the other form, or not at all, is refused with what to do', () => {
  expect(refused(sheet, typing('V1', 'real', '± 1'))).toContain('magnitude and angle')
  expect(refused(sheet, typing('V2', 'magnitude', '± 1'))).toContain('real and imaginary part')
  expect(refused(sheet, typing('V3', 'magnitude', '± 1'))).toContain('first')
})

test('a real part makes a polar phasor rectangular, and a magnitude a rectangular one polar', () => {
  const made = applied(sheet, typing('V1', 'real', '20'))
  expect(phasorOf(made, 'V1').real).toEqual({ value: 20, text: '20' })
  expect(phasorOf(made, 'V1').imaginary?.value).toBeCloseTo(12, 12)
  expect(phasorOf(made, 'V1')).not.toHaveProperty('magnitude')
  const back = applied(sheet, typing('V2', 'magnitude', '10'))
  expect(phasorOf(back, 'V2').magnitude).toEqual({ value: 10, text: '10' })
  expect(phasorOf(back, 'V2').angle?.value).toBeCloseTo(53.13010235415598, 12)
  expect(phasorOf(back, 'V2')).not.toHaveProperty('imaginary')
})

test('one part of a rectangular phasor leaves the digits of the other', () => {
  const changed = applied(sheet, typing('V2', 'imaginary', '-1.5'))
  expect(phasorOf(changed, 'V2')).toEqual({
    ...phasor('V2'),
    real: { value: 3, text: '3.0' },
    imaginary: { value: -1.5, text: '-1.5' },
  })
})

test('a first real part stands on the real axis until the imaginary part is typed', () => {
  const half = applied(sheet, typing('V3', 'real', '5'))
  expect(phasorOf(half, 'V3')).toMatchObject({ real: { value: 5 }, imaginary: { value: 0 } })
  const whole = applied(half, typing('V3', 'imaginary', '2'))
  expect(phasorOf(whole, 'V3')).toMatchObject({ real: { value: 5 }, imaginary: { value: 2 } })
})

test('a real part beside a magnitude without an angle is refused', () => {
  const sized = applied(sheet, typing('V3', 'magnitude', '5'))
  expect(refused(sized, typing('V3', 'real', '3'))).toContain('type both at once')
})

test('where a part was read, the reading changes and the phasor stays untyped', () => {
  const changed = applied(sheet, typing('V4', 'magnitude', '12.50 ± 0.2'))
  expect(phasorOf(changed, 'V4')).toEqual(phasor('V4'))
  expect(readingOf(changed, 'r1')).toMatchObject({ shown: '12.50', limit: 0.2 })
  const kept = applied(sheet, typing('V4', 'magnitude', '12.50'))
  expect(readingOf(kept, 'r1')).toMatchObject({ shown: '12.50', limit: 0.1 })
})

test('an angle that was read as a lag stays one, and becomes a lead where its sign turns', () => {
  const lag = applied(sheet, typing('V4', 'angle', '-50.5'))
  expect(readingOf(lag, 'r2')).toMatchObject({ shown: '50.5', sense: 'lags' })
  const lead = applied(sheet, typing('V4', 'angle', '12.5'))
  expect(readingOf(lead, 'r2')).toMatchObject({ shown: '12.5', sense: 'leads' })
})

test('a rectangular value of a phasor that was read goes into its readings', () => {
  const changed = applied(sheet, typing('V4', 'whole', '3 + j4'))
  expect(phasorOf(changed, 'V4')).toEqual(phasor('V4'))
  const value = quick(changed).phasors.find(({ id }) => id === 'V4')
  expect(value?.real).toBeCloseTo(3, 10)
  expect(value?.imaginary).toBeCloseTo(4, 10)
  const part = applied(sheet, typing('V4', 'real', '10'))
  expect(quick(part).phasors.find(({ id }) => id === 'V4')?.real).toBeCloseTo(10, 10)
})

test('what was read through turns, a ratio, a shunt or a channel shows what makes the value so', () => {
  const clamps = sheetOf({
    phasors: [polar('V1', '10', '0'), phasor('I', 'current')],
    instruments: [{ id: 'm1', name: 'phase meter', angles: 'lag-positive' }],
    channels: [{ id: 'ct1', ratio: { value: 20 }, reversed: true, phaseError: { value: 0.5 } }],
    readings: [
      {
        id: 'r1',
        of: 'I',
        kind: 'magnitude',
        shown: '1.0',
        turns: 5,
        form: 'peak',
        channel: 'ct1',
      },
      { id: 'r2', of: 'I', kind: 'angle', shown: '30', instrument: 'm1', channel: 'ct1' },
    ],
  })
  const changed = applied(clamps, {
    kind: 'set-value',
    id: 'I',
    part: 'whole',
    value: { form: 'polar', magnitude: { value: 8, limit: 0.4 }, angle: { value: -25.5 } },
  })
  const value = quick(changed).phasors.find(({ id }) => id === 'I')
  expect(value?.magnitude).toBeCloseTo(8, 10)
  expect(value?.angle).toBeCloseTo(-25.5, 10)
  expect(readingOf(changed, 'r1').limit).toBeCloseTo((0.4 * 5 * Math.SQRT2) / 20, 12)
})

test('the angle of the named reference is 0 and nothing else', () => {
  expect(refused(exampleSheet, typing('I', 'angle', '30'))).toContain('0° by definition')
  const typed = applied(exampleSheet, typing('I', 'angle', '0'))
  expect(phasorOf(typed, 'I').angle).toMatchObject({ value: 0 })
  expect(
    refused(
      sheetOf({ reference: 'V2', phasors: [polar('V2', '5', '0')] }),
      typing('V2', 'whole', '3+j4'),
    ),
  ).toContain('0° by definition')
})

test('a part with several readings, or a mean of repeats, is left to the readings', () => {
  const several = sheetOf({
    ...sheet,
    readings: [...(sheet.readings ?? []), { id: 'r3', of: 'V4', kind: 'magnitude', shown: 12.2 }],
  })
  expect(refused(several, typing('V4', 'magnitude', '12'))).toContain('2 readings')
  expect(refused(several, typing('V4', 'magnitude', '± 1'))).toContain('2 readings')
  const repeated = sheetOf({
    phasors: [phasor('V4')],
    readings: [{ id: 'r1', of: 'V4', kind: 'magnitude', shown: 12, repeats: [11.9, 12.1] }],
  })
  expect(refused(repeated, typing('V4', 'magnitude', '12'))).toContain('repeated')
})

test('a negative magnitude is refused, and says to turn the angle', () => {
  const value = { form: 'number', number: { value: -3 } } as const
  expect(refused(sheet, { kind: 'set-value', id: 'V1', part: 'magnitude', value })).toContain(
    '180°',
  )
})

test('a cleared cell takes away what was typed or read', () => {
  const clear = (id: string, part: ValuePart) =>
    applied(sheet, { kind: 'set-value', id, part, value: null })
  expect(phasorOf(clear('V1', 'angle'), 'V1')).not.toHaveProperty('angle')
  expect(phasorOf(clear('V2', 'real'), 'V2')).toEqual(phasor('V2'))
  expect(phasorOf(clear('V2', 'angle'), 'V2')).toMatchObject({ magnitude: { value: 5 } })
  expect(phasorOf(clear('V1', 'whole'), 'V1')).toEqual(phasor('V1'))
  expect(clear('V4', 'magnitude').readings?.map(({ id }) => id)).toEqual(['r2'])
  expect(clear('V4', 'whole')).not.toHaveProperty('readings')
})

test('an angle that was read against an open one cannot be settled before it', () => {
  const open = sheetOf({
    phasors: [polar('V1', '1', '0'), phasor('V2'), phasor('V3')],
    readings: [{ id: 'r1', of: 'V3', kind: 'angle', shown: 5, against: 'V2' }],
  })
  expect(refused(open, typing('V3', 'angle', '7'))).toContain('read against V2')
})
