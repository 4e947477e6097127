import papa from 'papaparse'
import { describe, expect, test } from 'vitest'
import { formatTableHead, formatTableRow } from '../../src/command/evaluate-table'
import { emptySheet, exampleSheet, quick } from '../../src/sheet'

/** The cells of a row, as an independent reading of the CSV has them. */
function cellsOf(row: string): readonly string[] {
  const { data, errors } = papa.parse<string[]>(row)
  expect(errors).toEqual([])
  expect(data).toHaveLength(1)
  return data[0] ?? []
}

const answer = { file: 'a.json', ...quick(exampleSheet) }

describe('a row of the table', () => {
  test('has the title and the gap of the sheet, and is empty where the evaluation says nothing', () => {
    const [title, verdict, gap, allowed, suspect] = cellsOf(
      formatTableRow({ title: 'Pump, "old"', answer: { ...answer, sums: answer.sums } }),
    )
    expect(title).toBe('Pump, "old"')
    expect(Number(gap)).toBeCloseTo(answer.sums[0]?.closingError?.magnitude ?? Number.NaN, 6)
    // The quick half says nothing of the readings as a whole.
    expect([verdict, allowed, suspect]).toEqual(['', '', ''])
  })

  test('has verdict, allowed gap and likeliest suspect where the evaluation has them', () => {
    const resultant = { magnitude: 1, angle: 0, real: 1, imaginary: 0 }
    const closingError = { magnitude: 2.3456789, angle: 0, percent: 5, allowed: 0.5 }
    const judged = {
      file: 'a.json',
      phasors: [],
      hand: [],
      sums: [
        { id: 's1', resultant, closingError: { magnitude: 9, angle: 0, percent: 1, allowed: 20 } },
        { id: 's2', resultant, closingError },
      ],
      agreement: {
        verdict: 'disagree' as const,
        chiSquare: 9,
        degreesOfFreedom: 1,
        probability: 0.003,
        unchecked: [],
      },
      suspects: [
        { reading: 'r3', score: 4 },
        { reading: 'r1', score: 2 },
      ],
    }
    const row = formatTableRow({ title: 'T', answer: { ...answer, ...judged } })
    expect(row).toBe('T,disagree,2.34568,0.5,r3')
  })

  test('names the file where there is no title, and calls what is no sheet invalid', () => {
    const empty = { file: 'empty.json', ...quick(emptySheet()) }
    expect(cellsOf(formatTableRow({ title: '', answer: empty }))[0]).toBe('empty.json')
    const wrong = { file: 'many.jsonl', line: 3, errors: [{ path: '', message: 'No.' }] }
    expect(formatTableRow({ title: '', answer: wrong })).toBe('many.jsonl:3,invalid,,,')
  })

  test('starts no formula in a spreadsheet, whatever a title says', () => {
    for (const title of ['=HYPERLINK("x")', '+1', '-1', '@now', '\t=1']) {
      expect(cellsOf(formatTableRow({ title, answer }))[0]).toBe(`'${title}`)
    }
  })

  test('stands below the names of its columns', () => {
    expect(formatTableHead()).toBe('title,verdict,gap,allowed,likeliest suspect')
  })
})
