import fc from 'fast-check'
import { expect, test } from 'vitest'
import { parseSheet } from '../../src/sheet'
import { FIELD_ORDER } from '../../src/sheet/canonical'
import { anySheet } from './arbitrary-sheet'
import { unhurried } from './laws'

test('every random sheet is valid', unhurried, () => {
  fc.assert(
    fc.property(anySheet, (sheet) => {
      const parsed = parseSheet(sheet)
      expect(parsed.ok ? [] : parsed.errors).toEqual([])
      expect(parsed).toEqual({ ok: true, sheet })
    }),
  )
})

test(
  'random sheets reach every field of the schema, and every field has its place in the order',
  unhurried,
  () => {
    const seen = new Set<string>()
    for (const sheet of fc.sample(anySheet, { seed: 7, numRuns: 300 })) collect(sheet, seen)
    expect(FIELD_ORDER.filter((field) => !seen.has(field))).toEqual([])
  },
)

function collect(value: unknown, into: Set<string>): void {
  if (typeof value !== 'object' || value === null) return
  for (const [field, item] of Object.entries(value)) {
    into.add(field)
    collect(item, into)
  }
}
