import fc from 'fast-check'
import { expect, test } from 'vitest'
import { fileNameOf } from '../../../src/app/export/file-name'
import { emptySheet, type Sheet } from '../../../src/sheet'
import { text } from '../../sheet/arbitrary-text'

const sheetOf = (title: string, number?: string): Sheet => ({
  ...emptySheet(),
  title,
  ...(number !== undefined && { job: { number } }),
})

test.each([
  ['Pump 2', 'V-118', 'V-118 Pump 2.pdf'],
  ['Pump 2', undefined, 'Pump 2.pdf'],
  ['', '  ', 'Phasogon sheet.pdf'],
  ['a/b\\c: "d"?', '7', '7 a-b-c- -d.pdf'],
  ['..hidden. ', undefined, 'hidden.pdf'],
  ['con', undefined, 'con-.pdf'],
  ['con.1', undefined, 'con-.1.pdf'],
  ['Contactor', undefined, 'Contactor.pdf'],
  ['two\nlines\tand a tab', undefined, 'two-lines-and a tab.pdf'],
  ['変圧器 3', 'Ω', 'Ω 変圧器 3.pdf'],
])('the title %j of job %j is saved as %s', (title, number, name) => {
  expect(fileNameOf(sheetOf(title, number), 'pdf')).toBe(name)
})

test('a long title is cut between characters, and does not end on a blank', () => {
  const name = fileNameOf(sheetOf(`${'👩'.repeat(79)} x`), 'pdf')
  expect(name).toBe(`${'👩'.repeat(79)}.pdf`)
})

test('whatever the title, every file system takes the name', () => {
  fc.assert(
    fc.property(text, text, (title, number) => {
      const name = fileNameOf(sheetOf(title, number), 'csv')
      expect(name).toMatch(/^[^.\s<>:"/\\|?*\p{Cc}\p{Cf}][^<>:"/\\|?*\p{Cc}\p{Cf}]*\.csv$/u)
      expect(name).not.toMatch(/[.\s-]\.csv$|^(con|prn|aux|nul|com\d|lpt\d)\./i)
    }),
  )
})
