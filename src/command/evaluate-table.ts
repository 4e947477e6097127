import papa from 'papaparse'
import type { Evaluation } from '../sheet'
import type { Evaluated } from './evaluate-file'

/** How large a gap is, and how large it may be; in the unit of its sum. */
interface Gap {
  readonly magnitude: number
  readonly percent: number
  readonly allowed?: number
}

const columns = ['title', 'verdict', 'gap', 'allowed', 'likeliest suspect'] as const

/** The names of the columns, as the table's first row. */
export function formatTableHead(): string {
  return toCsv([...columns])
}

/**
 * One CSV row for a sheet (RFC 4180): its title, or its file where it has none; the verdict on its
 * readings, `invalid` for what is no sheet; the gap that is largest for its sum, in the sum's unit, and
 * how large it may be; the reading that is most likely wrong. What the evaluation leaves out is empty.
 */
export function formatTableRow({ title, answer }: Evaluated): string {
  const name = title || [answer.file, answer.line].filter((part) => part !== undefined).join(':')
  if ('errors' in answer) return toCsv([name, 'invalid', '', '', ''])
  const { agreement, suspects } = answer
  const gap = largestGap(answer)
  return toCsv([
    name,
    agreement?.verdict ?? '',
    toFigure(gap?.magnitude),
    toFigure(gap?.allowed),
    suspects?.[0]?.reading ?? '',
  ])
}

function largestGap({ sums }: Evaluation): Gap | undefined {
  const gaps = sums.flatMap(({ closingError }): Gap[] => (closingError ? [closingError] : []))
  return gaps.toSorted((one, other) => other.percent - one.percent)[0]
}

/** Six figures are more than any meter shows. */
function toFigure(value: number | undefined): string {
  return value === undefined ? '' : String(Number(value.toPrecision(6)))
}

/** Titles come from anyone: none may start a formula in the spreadsheet that reads the table. */
function toCsv(cells: string[]): string {
  return papa.unparse([cells], { escapeFormulae: true })
}
