import { describe, expect, test } from 'vitest'
import {
  asAdjusted,
  asAlternative,
  asFormerlyAdjusted,
  quick,
  type Sheet,
  withFormerValues,
} from '../../src/sheet'
import { evaluate } from '../../src/sheet/estimate'
import { phasor, reads, sheetWith } from './estimate/sheets'

/** A triangle of voltages, one angle read too: it does not close as it was read. */
const triangle: Sheet = sheetWith({
  phasors: [phasor('V'), phasor('V1'), phasor('V2')],
  sums: [{ id: 's', terms: [{ phasor: 'V1' }, { phasor: 'V2' }], equals: 'V' }],
  readings: [
    reads('V', 100, 1, 'r1'),
    reads('V1', 60, 1, 'r2'),
    reads('V2', 70, 1, 'r3'),
    { id: 'r4', of: 'V1', kind: 'angle', shown: 44, limit: 1 },
    { id: 'r5', of: 'V2', kind: 'angle', shown: -36, limit: 1 },
  ],
})
/** The same without the angles: two drawings. */
const twofold: Sheet = { ...triangle, readings: (triangle.readings ?? []).slice(0, 3) }

describe('as adjusted', () => {
  const whole = evaluate(triangle)
  const adjusted = asAdjusted(triangle, whole)

  test('every phasor stands as if its best value had been read', () => {
    for (const { asRead, magnitude, angle } of adjusted.phasors) {
      expect(asRead).toEqual({ magnitude, angle })
    }
    expect(adjusted.phasors[1]?.magnitude).not.toBe(60)
  })

  test('the sums close, so that no gap is left', () => {
    expect(whole.sums[0]?.closingError?.magnitude).toBeGreaterThan(0.1)
    expect(adjusted.sums[0]?.closingError).toBeUndefined()
    expect(adjusted.sums[0]?.closes).toBeUndefined()
    expect(adjusted.sums[0]?.resultant?.magnitude).toBeCloseTo(whole.phasors[0]?.magnitude ?? 0, 9)
  })

  test('what is open stays open', () => {
    const open = { ...triangle, readings: (triangle.readings ?? []).slice(0, 1) }
    expect(asAdjusted(open, evaluate(open)).phasors[1]?.asRead).toEqual({})
  })
})

describe('as another drawing', () => {
  test('its values stand, and the sums of these', () => {
    const whole = evaluate(twofold)
    const other = whole.alternatives?.[1]
    if (!other) throw new Error('There is one drawing alone.')
    const shown = asAlternative(twofold, whole, other)
    expect(shown.phasors.map(({ angle }) => angle)).toEqual(other.phasors.map(({ angle }) => angle))
    expect(shown.phasors[1]?.angle).toBeCloseTo(-(whole.phasors[1]?.angle ?? 0), 9)
    expect(shown.sums[0]?.closingError).toBeUndefined()
  })
})

describe('until a new answer comes', () => {
  const whole = evaluate(twofold)
  const edited: Sheet = {
    ...twofold,
    readings: (twofold.readings ?? []).map((each) =>
      each.id === 'r2' ? reads('V1', 61, 1, 'r2') : each,
    ),
  }

  test('what was solved keeps its value, what was read is new', () => {
    const waiting = withFormerValues(edited, quick(edited), whole)
    const [, first] = waiting.phasors
    expect([first?.magnitude, first?.magnitudeState]).toEqual([61, 'given'])
    expect([first?.angle, first?.angleState]).toEqual([whole.phasors[1]?.angle, 'solved'])
  })

  test('a gap against a former value says nothing', () => {
    const waiting = withFormerValues(edited, quick(edited), whole)
    expect(waiting.sums[0]?.resultant).toBeDefined()
    expect(waiting.sums[0]?.closingError).toBeUndefined()
  })

  test('nothing is filled in where nothing was worked out before', () => {
    const at = quick(edited)
    expect(withFormerValues(edited, at, undefined)).toBe(at)
  })

  test('the adjusted diagram is the one before; a phasor that is new stands as it was read', () => {
    const { phasors } = edited
    const added = { ...phasor('V9'), magnitude: { value: 9 }, angle: { value: 90 } }
    const more = { ...edited, phasors: [...phasors, added] }
    const shown = asFormerlyAdjusted(more, quick(more), whole)
    expect(shown.phasors[1]?.magnitude).toBe(whole.phasors[1]?.magnitude)
    expect(shown.phasors[3]?.magnitude).toBe(9)
  })
})
