import { createHash } from 'node:crypto'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import {
  exampleSheet,
  fingerprintOf,
  parseLink,
  parseSheetText,
  serializeLink,
  serializeSheet,
} from '../../src/sheet'
import { anySheet } from './arbitrary-sheet'
import { applied, unhurried } from './laws'

test('a fingerprint is three groups of four hexadecimal digits', () => {
  expect(fingerprintOf(exampleSheet)).toMatch(/^[0-9a-f]{4} [0-9a-f]{4} [0-9a-f]{4}$/)
})

test('anyone can work it out from the file: the beginning of the SHA-256 of its JSON without spaces', () => {
  const json = JSON.stringify(JSON.parse(serializeSheet(exampleSheet)))
  const digest = createHash('sha256').update(json).digest('hex')
  expect(fingerprintOf(exampleSheet).replaceAll(' ', '')).toBe(digest.slice(0, 12))
})

test('a sheet has the same fingerprint after a file and after a link', unhurried, () => {
  fc.assert(
    fc.property(anySheet, (sheet) => {
      const filed = parseSheetText(serializeSheet(sheet))
      const linked = parseLink(serializeLink(sheet))
      if (!filed.ok || !linked.ok) throw new Error('the sheet was not read back')
      expect(fingerprintOf(filed.sheet)).toBe(fingerprintOf(sheet))
      expect(fingerprintOf(linked.sheet)).toBe(fingerprintOf(sheet))
    }),
    { numRuns: 25 },
  )
})

test('whoever signs and whoever prints on other paper keep the fingerprint', () => {
  const signed = applied(exampleSheet, {
    kind: 'set-job',
    job: { checkedBy: 'A. Berg', checkedDate: '2026-11-30', approvedBy: 'C. Dahl' },
  })
  const printed = applied(signed, {
    kind: 'set-drawing',
    drawing: { paper: 'A3', orientation: 'portrait', origin: { x: 20, y: 20 } },
  })
  expect(fingerprintOf(printed)).toBe(fingerprintOf(exampleSheet))
})

test('any figure, name, sentence or scale that changes gives another fingerprint', () => {
  const before = fingerprintOf(exampleSheet)
  const changed = [
    applied(exampleSheet, { kind: 'set-reading', id: 'r2', change: { shown: '28.90' } }),
    applied(exampleSheet, { kind: 'set-job', job: { testedBy: 'E. Falk' } }),
    applied(exampleSheet, { kind: 'set-details', revision: '1' }),
    applied(exampleSheet, { kind: 'set-report', report: { conclusion: 'Accepted.' } }),
    applied(exampleSheet, {
      kind: 'set-drawing',
      drawing: { unitsPerCentimetre: { voltage: 5 } },
    }),
  ].map(fingerprintOf)
  expect(new Set([before, ...changed]).size).toBe(changed.length + 1)
})
