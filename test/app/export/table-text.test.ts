import fc from 'fast-check'
import papa from 'papaparse'
import { expect, test } from 'vitest'
import { toCsv, toTabbed } from '../../../src/app/export/table-text'
import type { Table } from '../../../src/sheet'
import { text } from '../../sheet/arbitrary-text'

const tableOf = (...rows: Table['rows']): Table => ({ name: 'sums', head: ['a', 'b'], rows })

test('a CSV has CRLF after every line, quotes where they are needed, and says that it is UTF-8', async () => {
  const csv = await toCsv(tableOf(['V, "coil"', 2], ['two\nlines', undefined]))
  expect(csv).toBe('\ufeffa,b\r\n"V, ""coil""",2\r\n"two\nlines",\r\n')
})

test('numbers stay numbers, negative ones and small ones too', async () => {
  expect(await toCsv(tableOf([-1.5, 2.5e-9]))).toBe('\ufeffa,b\r\n-1.5,2.5e-9\r\n')
  expect(toTabbed(tableOf([-1.5, 2.5e-9]))).toBe('a\tb\n-1.5\t2.5e-9')
})

test.each(['=1+1', '+49', '-VS', '@SUM(A1)', ' =1', '\t=1', '\r=1', '\n=1', '＝1', '－1'])(
  'the text %j cannot start a formula',
  async (cell) => {
    const csv = await toCsv(tableOf(['x', cell]))
    expect(papa.parse<string[]>(csv, { delimiter: ',' }).data[1]?.[1]).toMatch(/^'/)
    const tabbed = toTabbed(tableOf(['x', cell]))
      .split('\n')[1]
      ?.split('\t')[1]
    expect(tabbed).toMatch(/^'/)
  },
)

test('any text comes back from a CSV as it was, but for the apostrophe before a formula', async () => {
  await fc.assert(
    fc.asyncProperty(text, text, async (one, other) => {
      const csv = await toCsv(tableOf([one, other]))
      const { data, errors } = papa.parse<string[]>(csv, { newline: '\r\n', delimiter: ',' })
      expect(errors).toEqual([])
      expect(data[1]?.map((cell) => cell.replace(/^'/, ''))).toEqual(
        [one, other].map((cell) => cell.replace(/^'/, '')),
      )
    }),
  )
})

test('no cell on the clipboard breaks its row', () => {
  fc.assert(
    fc.property(text, text, (one, other) => {
      const lines = toTabbed(tableOf([one, other])).split(/\r\n|\n|\r/)
      expect(lines.map((line) => line.split('\t').length)).toEqual([2, 2])
    }),
  )
})
