import fc from 'fast-check'
import { expect, test } from 'vitest'
import { type Evaluation, exampleSheet, quick, type Reading, type Sheet } from '../../src/sheet'
import { anySheet } from './arbitrary-sheet'
import { deepFreeze, unhurried } from './laws'
import { phasor, polar, rectangular, sheetOf } from './sheets'

function partsOf(evaluation: Evaluation, id: string) {
  const found = evaluation.phasors.find((value) => value.id === id)
  if (found === undefined) throw new Error(`there is no phasor ${id}`)
  return found
}

function sumIn(evaluation: Evaluation, id: string) {
  const found = evaluation.sums.find((value) => value.id === id)
  if (found === undefined) throw new Error(`there is no sum ${id}`)
  return found
}

test('a typed phasor is evaluated in both forms', () => {
  const evaluation = quick(
    sheetOf({ phasors: [polar('V1', '5', '90'), rectangular('V2', '3', '-4')] }),
  )
  expect(partsOf(evaluation, 'V1')).toEqual({
    id: 'V1',
    magnitude: 5,
    angle: 90,
    real: 0,
    imaginary: 5,
    asRead: { magnitude: 5, angle: 90 },
    magnitudeState: 'given',
    angleState: 'given',
  })
  const second = partsOf(evaluation, 'V2')
  expect(second).toMatchObject({ real: 3, imaginary: -4, magnitude: 5 })
  expect(second.angle).toBeCloseTo(-53.13010235415598, 12)
})

test('what is open is left out, part by part', () => {
  const evaluation = quick(
    sheetOf({
      phasors: [
        polar('V0', '1', '0'),
        { ...phasor('V1'), magnitude: { value: 5 } },
        { ...phasor('V2'), angle: { value: 30 } },
        phasor('V3'),
      ],
      sums: [{ id: 's1', terms: [{ phasor: 'V0' }, { phasor: 'V1' }] }],
    }),
  )
  expect(partsOf(evaluation, 'V1')).toEqual({
    id: 'V1',
    magnitude: 5,
    asRead: { magnitude: 5 },
    magnitudeState: 'given',
    angleState: 'open',
  })
  expect(partsOf(evaluation, 'V2')).toMatchObject({ angle: 30, magnitudeState: 'open' })
  expect(partsOf(evaluation, 'V3')).toEqual({
    id: 'V3',
    asRead: {},
    magnitudeState: 'open',
    angleState: 'open',
  })
  expect(evaluation.sums).toEqual([{ id: 's1' }])
})

test('the angle of nothing is open, and nothing adds nothing', () => {
  const evaluation = quick(
    sheetOf({
      phasors: [polar('V0', '2', '0'), polar('V1', '0', '30'), rectangular('V2', '0', '0')],
      sums: [{ id: 's1', terms: [{ phasor: 'V0' }, { phasor: 'V1' }, { phasor: 'V2' }] }],
    }),
  )
  expect(partsOf(evaluation, 'V1')).toEqual({
    id: 'V1',
    magnitude: 0,
    real: 0,
    imaginary: 0,
    asRead: { magnitude: 0, angle: 30 },
    magnitudeState: 'given',
    angleState: 'open',
  })
  expect(partsOf(evaluation, 'V2')).not.toHaveProperty('angle')
  expect(sumIn(evaluation, 's1').resultant).toMatchObject({ magnitude: 2, angle: 0 })
})

const reference = polar('V0', '10', '0')
const withReadings = (...readings: readonly Reading[]): Sheet =>
  sheetOf({
    phasors: [reference, phasor('V1'), phasor('I', 'current')],
    instruments: [{ id: 'm1', name: 'phase meter', angles: 'lag-positive' }],
    channels: [
      { id: 'ct1', ratio: { value: 20, text: '100/5' }, turns: 2, reversed: true },
      { id: 'ct2', phaseError: { value: 0.5 } },
    ],
    readings,
  })

test.each<[string, number, Partial<Extract<Reading, { kind: 'magnitude' }>>]>([
  ['as it was shown', 12.5, { shown: '12.50' }],
  ['as a number', 12.5, { shown: 12.5 }],
  ['with a prefix', 0.23, { shown: '230 m' }],
  ['a peak of a sine, ÷ √2', 10 / Math.SQRT2, { shown: 10, form: 'peak' }],
  ['peak to peak of a sine, ÷ 2√2', 5 / Math.SQRT2, { shown: 10, form: 'peak-to-peak' }],
  ['over turns in the clamp', 2.5, { shown: 12.5, turns: 5 }],
  ['times a ratio', 250, { shown: 12.5, ratio: 20 }],
  ['over a shunt', 1.25, { shown: '125 mV', shunt: 0.1 }],
  ['through a channel', 125, { shown: 12.5, channel: 'ct1' }],
])('a magnitude is read %s', (_, magnitude, reading) => {
  const shown = { id: 'r1', of: 'I', kind: 'magnitude' as const, shown: 0, ...reading }
  const value = partsOf(quick(withReadings(shown)), 'I')
  expect(value.magnitude).toBeCloseTo(magnitude, 12)
  expect(value).toMatchObject({ magnitudeState: 'given', asRead: { magnitude: value.magnitude } })
})

test.each<[string, number, Partial<Extract<Reading, { kind: 'angle' }>>]>([
  ['with its sign, anticlockwise positive', -30.5, { shown: '-30.5' }],
  ['as a lead', 30, { shown: '30', sense: 'leads' }],
  ['as a lag', -30, { shown: '30', sense: 'lags' }],
  ['in radians', 90, { shown: '1.5707963267948966 rad' }],
  ['on a meter that counts lag as positive', -30, { shown: 30, instrument: 'm1' }],
  ['on such a meter with the word for it', 30, { shown: 30, sense: 'leads', instrument: 'm1' }],
  ['through a channel the wrong way round', -150, { shown: 30, channel: 'ct1' }],
  ['through a channel whose output leads', 29.5, { shown: 30, channel: 'ct2' }],
  ['from 0° to 360°', -120, { shown: 240 }],
])('an angle is read %s', (_, angle, reading) => {
  const shown = { id: 'r1', of: 'V1', kind: 'angle' as const, shown: 0, ...reading }
  expect(partsOf(quick(withReadings(shown)), 'V1').angle).toBeCloseTo(angle, 12)
})

test('an angle counts from the phasor it was measured against', () => {
  const sheet = withReadings(
    { id: 'r1', of: 'V1', kind: 'angle', shown: 20, against: 'I' },
    { id: 'r2', of: 'I', kind: 'angle', shown: 35, sense: 'lags' },
  )
  const evaluation = quick(sheet)
  expect(partsOf(evaluation, 'I').angle).toBe(-35)
  expect(partsOf(evaluation, 'V1').angle).toBe(-15)
})

test('a reading wins over what was typed, several count with their mean, struck ones not at all', () => {
  const typed = sheetOf({
    phasors: [reference, polar('V1', '99', '99')],
    readings: [
      { id: 'r1', of: 'V1', kind: 'magnitude', shown: 10 },
      { id: 'r2', of: 'V1', kind: 'magnitude', shown: 11 },
      { id: 'r3', of: 'V1', kind: 'magnitude', shown: 500, struck: true },
      { id: 'r4', of: 'V1', kind: 'angle', shown: 179 },
      { id: 'r5', of: 'V1', kind: 'angle', shown: -177 },
    ],
  })
  const value = partsOf(quick(typed), 'V1')
  expect(value.magnitude).toBe(10.5)
  expect(value.angle).toBe(-179)
})

test('angles that were measured in a circle fall back on what was typed', () => {
  const circle = sheetOf({
    phasors: [reference, { ...phasor('A'), angle: { value: 20 } }, phasor('B'), phasor('C')],
    readings: [
      { id: 'r1', of: 'A', kind: 'angle', shown: 5, against: 'B' },
      { id: 'r2', of: 'B', kind: 'angle', shown: 5, against: 'A' },
    ],
  })
  const evaluation = quick(circle)
  expect(partsOf(evaluation, 'A').angle).toBeDefined()
  expect(partsOf(evaluation, 'B').angle).toBeDefined()
  expect(partsOf(evaluation, 'C').angle).toBeUndefined()
})

test('the reference is the named one, else the first typed at 0° without a limit, else the first', () => {
  const phasors = [
    polar('A', '1', '20'),
    { ...phasor('B'), angle: { value: 0, limit: 1 } },
    { ...phasor('C'), angle: { value: 0 } },
    phasor('D'),
  ]
  const readings: readonly Reading[] = [{ id: 'r1', of: 'D', kind: 'angle', shown: 5 }]
  const angleOf = (sheet: Partial<Sheet>) =>
    partsOf(quick(sheetOf({ phasors, readings, ...sheet })), 'D').angle
  expect(angleOf({})).toBe(5)
  expect(angleOf({ reference: 'A' })).toBe(25)
  expect(angleOf({ phasors: [polar('A', '1', '20'), phasor('D')] })).toBe(25)
  expect(angleOf({ phasors: [phasor('A'), phasor('D')] })).toBe(5)
})

test('a named reference lies at 0° though it was read against another', () => {
  const sheet = sheetOf({
    reference: 'I',
    phasors: [phasor('I', 'current'), { ...phasor('V1'), angle: { value: 50 } }],
    readings: [{ id: 'r1', of: 'I', kind: 'angle', shown: 20, against: 'V1', sense: 'lags' }],
  })
  expect(partsOf(quick(sheet), 'I').angle).toBe(0)
})

test('a sum has its exact resultant, what was measured, and the gap between them', () => {
  const evaluation = quick(
    sheetOf({
      phasors: [
        polar('A', '3', '0'),
        polar('B', '4', '90'),
        polar('C', '1', '0'),
        polar('M', '4', '90'),
      ],
      sums: [
        {
          id: 's1',
          terms: [{ phasor: 'A' }, { phasor: 'B' }, { phasor: 'C', sign: -1 }],
          equals: 'M',
        },
        { id: 's2', terms: [{ phasor: 'A' }, { phasor: 'B' }], equals: 0 },
        { id: 's3', terms: [{ phasor: 'A' }] },
        { id: 's4', terms: [] },
      ],
    }),
  )
  expect(sumIn(evaluation, 's1')).toEqual({
    id: 's1',
    resultant: {
      magnitude: Math.sqrt(20),
      angle: expect.closeTo(63.43494882292201, 12),
      real: 2,
      imaginary: 4,
    },
    measured: { magnitude: 4, angle: 90 },
    closingError: { magnitude: 2, angle: 180, percent: 50 },
  })
  expect(sumIn(evaluation, 's2')).toEqual({
    id: 's2',
    resultant: expect.objectContaining({ magnitude: 5, real: 3, imaginary: 4 }),
    closingError: { magnitude: 5, angle: expect.closeTo(-126.86989764584402, 12), percent: 125 },
  })
  expect(sumIn(evaluation, 's3')).not.toHaveProperty('closingError')
  expect(sumIn(evaluation, 's4')).toEqual({ id: 's4' })
})

test('what was measured in part is shown in part, and gives no gap', () => {
  const evaluation = quick(
    sheetOf({
      phasors: [polar('A', '3', '0'), { ...phasor('M'), magnitude: { value: 3 } }],
      sums: [{ id: 's1', terms: [{ phasor: 'A' }], equals: 'M' }],
    }),
  )
  expect(sumIn(evaluation, 's1')).toMatchObject({ measured: { magnitude: 3 } })
  expect(sumIn(evaluation, 's1')).not.toHaveProperty('closingError')
})

test('a sum that closes exactly has no gap at all', () => {
  const star = ['0', '120', '-120'].map((angle, index) => polar(`V${index}`, '230', angle))
  const closed = sheetOf({
    phasors: [...star, polar('X', '7', '33'), polar('Y', '7', '-147')],
    sums: [
      { id: 's1', terms: [{ phasor: 'X' }, { phasor: 'Y' }], equals: 0 },
      { id: 's2', terms: star.map(({ id }) => ({ phasor: id })), equals: 0 },
      { id: 's3', terms: [{ phasor: 'X' }, { phasor: 'X', sign: -1 }], equals: 0 },
    ],
  })
  const evaluation = quick(closed)
  for (const id of ['s1', 's2']) {
    expect(sumIn(evaluation, id).closingError?.magnitude).toBeLessThan(1e-13)
  }
  expect(sumIn(evaluation, 's3').closingError).toEqual({ magnitude: 0, angle: 0, percent: 0 })
})

test('the order of the terms does not change the resultant', () => {
  const phasors = Array.from({ length: 40 }, (_, index) =>
    polar(`V${index}`, String(index + 0.1), String((index * 37) % 180)),
  )
  fc.assert(
    fc.property(fc.shuffledSubarray(phasors, { minLength: 40 }), (shuffled) => {
      const of = (terms: typeof phasors) =>
        sumIn(
          quick(
            sheetOf({
              phasors,
              sums: [{ id: 's1', terms: terms.map(({ id }) => ({ phasor: id })) }],
            }),
          ),
          's1',
        ).resultant
      expect(of(shuffled)).toEqual(of(phasors))
    }),
    { numRuns: 20 },
  )
})

test('the example closes within half a volt', () => {
  const gap = sumIn(quick(exampleSheet), 's1').closingError
  expect(gap?.magnitude).toBeGreaterThan(0.2)
  expect(gap?.magnitude).toBeLessThan(0.5)
})

test('figures too large to add are open, never infinite', () => {
  const phasors = [
    polar('A', '1.7e308', '0'),
    polar('B', '1.7e308', '0'),
    rectangular('C', '1.7e308', '1.7e308'),
  ]
  const readings: readonly Reading[] = [
    { id: 'r1', of: 'D', kind: 'magnitude', shown: 1e300, ratio: 1e300 },
  ]
  const evaluation = quick(
    sheetOf({
      phasors: [...phasors, phasor('D')],
      readings,
      sums: [{ id: 's1', terms: [{ phasor: 'A' }, { phasor: 'B' }] }],
    }),
  )
  expect(evaluation.sums).toEqual([{ id: 's1' }])
  expect(partsOf(evaluation, 'C').magnitude).toBeUndefined()
  expect(partsOf(evaluation, 'D').magnitude).toBeUndefined()
})

test(
  'any sheet is evaluated, into numbers that JSON can carry and angles within half a turn',
  unhurried,
  () => {
    fc.assert(
      fc.property(anySheet, (sheet) => {
        const evaluation = quick(deepFreeze(sheet))
        expect(JSON.parse(JSON.stringify(evaluation))).toEqual(evaluation)
        expect(evaluation.phasors.map(({ id }) => id)).toEqual(sheet.phasors.map(({ id }) => id))
        for (const { angle, magnitude = 0 } of evaluation.phasors) {
          expect(magnitude).toBeGreaterThanOrEqual(0)
          if (angle !== undefined) expect(angle > -180 && angle <= 180).toBe(true)
        }
      }),
    )
  },
)

test('a gap beside next to nothing is in percent of the largest term', () => {
  const sheet = sheetOf({
    phasors: [
      polar('A', '3', '0'),
      { ...phasor('M'), magnitude: { value: 5e-324 }, angle: { value: 90 } },
    ],
    sums: [{ id: 's1', terms: [{ phasor: 'A' }], equals: 'M' }],
  })
  expect(sumIn(quick(sheet), 's1').closingError).toMatchObject({ magnitude: 3, percent: 100 })
})

test('a hand arrow at a scale beyond any figure is not compared', () => {
  const sheet = sheetOf({
    phasors: [polar('A', '3', '0')],
    drawing: { unitsPerCentimetre: { voltage: 5e-324 } },
    hand: [{ id: 'h1', stands: 'A', from: { x: 0, y: 0 }, to: { x: 10, y: 0 } }],
  })
  const evaluation = quick(sheet)
  expect(JSON.parse(JSON.stringify(evaluation))).toEqual(evaluation)
})
