import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { exampleSheet, parseSheet, parseSheetText, serializeSheet } from '../../src/sheet'
import { anySheet } from './arbitrary-sheet'
import { unhurried } from './laws'
import { sheetOf } from './sheets'

test('a file gives back the sheet that was saved, to the last sign', unhurried, () => {
  fc.assert(
    fc.property(anySheet, (sheet) => {
      const file = serializeSheet(sheet)
      const opened = parseSheetText(file)
      expect(opened).toEqual({ ok: true, sheet })
      expect(opened.ok && serializeSheet(opened.sheet)).toBe(file)
    }),
  )
})

test('a file is indented text whose fields stand in one order, whatever edits came before', () => {
  const { title, ...rest } = exampleSheet
  const shuffled = { ...rest, title, job: { date: '2026-11-24', number: 'V-118' } }
  const lines = serializeSheet(shuffled).split('\n')
  expect(lines.slice(0, 8)).toEqual([
    '{',
    '  "format": "phasogon-sheet",',
    '  "version": 1,',
    '  "title": "Valve actuator 7: cable, choke and motor",',
    '  "revision": "0",',
    '  "job": {',
    '    "number": "V-118",',
    '    "date": "2026-11-24"',
  ])
  expect(lines.at(-1)).toBe('')
})

test('a file that was saved opens, however long ago', () => {
  const saved = readFileSync(new URL('fixtures/twelve-phasors.json', import.meta.url), 'utf8')
  const opened = parseSheetText(saved)
  expect(opened.ok && opened.sheet.phasors).toHaveLength(12)
  expect(opened.ok && JSON.parse(serializeSheet(opened.sheet))).toEqual(JSON.parse(saved))
})

test('fields that the schema does not know are kept word for word', () => {
  const sheet: unknown = {
    ...exampleSheet,
    'x-later': { b: [1, null, { a: true }], a: 'é\u0000' },
    phasors: exampleSheet.phasors.map((phasor) => ({ ...phasor, colour: 'teal' })),
  }
  const opened = parseSheetText(JSON.stringify(sheet))
  expect(opened).toEqual({ ok: true, sheet })
  const text = opened.ok ? serializeSheet(opened.sheet) : ''
  expect(parseSheetText(text)).toEqual({ ok: true, sheet })
  expect(text.indexOf('"b"')).toBeLessThan(text.indexOf('"a"'))
})

test('what a correction keeps of a reading stays in its own order', () => {
  const original = { shown: '3', kind: 'magnitude', id: 'r2' }
  const readings = (exampleSheet.readings ?? []).map((reading) =>
    reading.id === 'r2'
      ? { ...reading, corrected: { mistake: 'decade-slip' as const, original } }
      : reading,
  )
  const text = serializeSheet(sheetOf({ ...exampleSheet, readings }))
  expect(text.replace(/\s/g, '')).toContain(JSON.stringify(original))
})

test('marks that turn the direction of writing are escaped in a file', () => {
  const sheet = sheetOf({ title: '\u202e4.84 V\u202c \u2028 end' })
  const file = serializeSheet(sheet)
  expect(file).toContain('\\u202e4.84 V\\u202c \\u2028 end')
  expect(parseSheetText(file)).toEqual({ ok: true, sheet })
})

test('a mark at the head of a file, as some editors write it, is passed over', () => {
  expect(parseSheetText(`\ufeff${serializeSheet(exampleSheet)}`).ok).toBe(true)
})

test('zero is kept without a sign', () => {
  const phasor = { id: 'V1', label: 'V1', quantity: 'voltage', angle: { value: -0 } }
  const parsed = parseSheet({ format: 'phasogon-sheet', version: 1, title: '', phasors: [phasor] })
  expect(parsed.ok && Object.is(parsed.sheet.phasors[0]?.angle?.value, 0)).toBe(true)
})
