import { describe, expect, test } from 'vitest'
import { describeEdit, type Edit, quick, type Sheet } from '../../../src/sheet'
import { applied, refused } from '../laws'
import { polar, sheetOf } from '../sheets'

const sheet: Sheet = sheetOf({
  phasors: [polar('V1', '30', '0'), polar('V2', '40', '90')],
  sums: [{ id: 's1', label: 'VS', terms: [{ phasor: 'V1' }, { phasor: 'V2' }] }],
})
const stroke = {
  kind: 'set-hand-arrow',
  id: 'h1',
  sum: 's1',
  stands: 'V1',
  from: { x: 50, y: 50 },
  to: { x: 110, y: 50 },
} as const satisfies Edit

describe('drawing by hand', () => {
  test('adds the arrow and what it stands for', () => {
    const after = applied(sheet, stroke)
    const { kind: _, ...arrow } = stroke
    expect(after.hand).toEqual([arrow])
    expect(describeEdit(sheet, stroke)).toBe('Draw V1 by hand')
    expect(describeEdit(after, stroke)).toBe('Redraw V1 by hand')
    const closing: Edit = { ...stroke, id: 'h2', stands: 'closing' }
    expect(describeEdit(sheet, closing)).toBe('Draw the closing arrow of VS by hand')
  })

  test('the first arrow freezes scale and origin in the same step', () => {
    const pinned: Edit = {
      kind: 'several',
      edits: [
        {
          kind: 'set-drawing',
          drawing: { origin: { x: 50, y: 50 }, unitsPerCentimetre: { voltage: 5 } },
        },
        stroke,
      ],
    }
    const after = applied(sheet, pinned)
    expect(describeEdit(sheet, pinned)).toBe('Draw V1 by hand')
    expect(quick(after).hand[0]).toMatchObject({ magnitude: 30, angle: 0, within: true })
  })

  test('an arrow that is drawn anew takes the place of the old one', () => {
    const drawn = applied(applied(sheet, stroke), { ...stroke, id: 'h2', stands: 'V2' })
    const after = applied(drawn, { ...stroke, to: { x: 111, y: 51 } })
    expect(after.hand?.map(({ id, to }) => [id, to.x])).toEqual([
      ['h1', 111],
      ['h2', 110],
    ])
  })

  test('an arrow stands for what the sheet has, under a name that is free', () => {
    expect(refused(sheet, { ...stroke, stands: 'V9' })).toContain('V9')
    expect(refused(sheet, { ...stroke, sum: 's9' })).toContain('s9')
    expect(refused(sheet, { ...stroke, id: 'V1' })).toContain('taken')
    expect(refused(sheet, { ...stroke, id: 'closing' })).toContain('closing')
    expect(refused(sheet, { ...stroke, to: { x: Number.NaN, y: 0 } })).toContain('places')
  })

  test('rubbing out takes one arrow, those of a sum, or all', () => {
    const { sum: _, ...loose } = stroke
    const both = applied(applied(sheet, stroke), { ...loose, id: 'h2', stands: 'V2' })
    expect(applied(both, { kind: 'remove-hand-arrow', id: 'h1' }).hand).toHaveLength(1)
    expect(applied(both, { kind: 'clear-hand', sum: 's1' }).hand?.[0]?.id).toBe('h2')
    expect(applied(both, { kind: 'clear-hand' })).not.toHaveProperty('hand')
    expect(refused(sheet, { kind: 'remove-hand-arrow', id: 'h1' })).toContain('h1')
    expect(describeEdit(both, { kind: 'remove-hand-arrow', id: 'h2' })).toBe('Rub out V2')
  })

  test('arrows go with the phasor and the sum that they stand for', () => {
    const drawn = applied(sheet, stroke)
    expect(applied(drawn, { kind: 'remove-phasor', id: 'V1' })).not.toHaveProperty('hand')
    expect(applied(drawn, { kind: 'remove-sum', id: 's1' })).not.toHaveProperty('hand')
  })
})
