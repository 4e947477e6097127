import fc from 'fast-check'
import { expect, test } from 'vitest'
import { apply, type Edit, exampleSheet, type Sheet } from '../../../src/sheet'
import { applied, refused, unhurried } from '../laws'
import { phasor, phasorOf, polar, rectangular, sheetOf } from '../sheets'

const sheet: Sheet = sheetOf({
  phasors: [
    polar('V0', '10', '0'),
    {
      ...phasor('V1'),
      magnitude: { value: 5, text: '5', limit: 0.1 },
      angle: { value: 30, limit: 2 },
    },
    { ...rectangular('V2', '3', '4'), real: { value: 3, text: '3', limit: 0.5 } },
    phasor('V3'),
    { ...phasor('V4'), angle: { value: 90 } },
  ],
  readings: [
    { id: 'r1', of: 'V3', kind: 'angle', shown: 20 },
    { id: 'r2', of: 'V4', kind: 'magnitude', shown: '7.5' },
  ],
})

const drag = (id: string, magnitude: number, angle: number): Edit => ({
  kind: 'drag-tip',
  id,
  magnitude,
  angle,
})

test('a dragged tip settles magnitude and angle, and limits stay', () => {
  const dragged = applied(sheet, {
    kind: 'drag-tip',
    id: 'V1',
    magnitude: 6.5,
    angle: -120,
    magnitudeText: '6.50',
    angleText: '−120',
  })
  expect(phasorOf(dragged, 'V1')).toEqual({
    ...phasor('V1'),
    magnitude: { value: 6.5, text: '6.50', limit: 0.1 },
    angle: { value: -120, text: '−120', limit: 2 },
  })
})

test('digits that do not say the value are left out', () => {
  const edit = { kind: 'drag-tip', id: 'V1', magnitude: 6.5, angle: 0, magnitudeText: '7' } as const
  expect(phasorOf(applied(sheet, edit), 'V1').magnitude).toEqual({ value: 6.5, limit: 0.1 })
})

test('a phasor that is typed in rectangular form stays so', () => {
  const dragged = applied(sheet, drag('V2', 2, 90))
  expect(phasorOf(dragged, 'V2')).toEqual({
    ...phasor('V2'),
    real: { value: 0, limit: 0.5 },
    imaginary: { value: 2 },
  })
})

test('what a reading holds stays, and the other part follows the drag', () => {
  expect(refused(sheet, drag('V3', 5, 21))).toContain('read on a meter')
  const sized = applied(sheet, drag('V3', 5, 20))
  expect(phasorOf(sized, 'V3')).toEqual({ ...phasor('V3'), magnitude: { value: 5 } })
  expect(refused(sheet, drag('V4', 8, 90))).toContain('read on a meter')
  const turned = applied(sheet, drag('V4', 7.5, -10))
  expect(phasorOf(turned, 'V4')).toEqual({ ...phasor('V4'), angle: { value: -10 } })
})

test('the reference stays at 0° and changes its length', () => {
  expect(refused(sheet, drag('V0', 10, 5))).toContain('reference')
  const longer = applied(sheet, drag('V0', 12, 0))
  expect(phasorOf(longer, 'V0')).toMatchObject({ magnitude: { value: 12 }, angle: { value: 0 } })
  expect(refused(exampleSheet, drag('VS', 48, 10))).toContain('magnitude and angle')
})

test('a tip is not dragged to where no figure is', () => {
  for (const [magnitude, angle] of [
    [-1, 0],
    [Number.NaN, 0],
    [1, Number.POSITIVE_INFINITY],
  ] as const) {
    expect(apply(sheet, drag('V1', magnitude, angle)).ok).toBe(false)
  }
  refused(sheet, drag('V9', 1, 1))
})

test(
  'wherever a tip is dragged, the sheet stays valid though it is not checked as a whole',
  unhurried,
  () => {
    const anywhere = fc.tuple(
      fc.constantFrom('V1', 'V2'),
      fc.double({ min: 0, max: 1e9, noNaN: true }),
      fc.double({ min: -1000, max: 1000, noNaN: true }),
    )
    fc.assert(
      fc.property(anywhere, ([id, magnitude, angle]) => {
        applied(sheet, drag(id, magnitude, angle))
      }),
    )
  },
)
