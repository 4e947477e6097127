import type { Cell, Table } from '../../sheet'

/** What a spreadsheet may take for the start of a formula, wide signs and leading blanks included. */
const FORMULA = /^\s*[=+\-@＝＋－＠]|^[\t\r\n]/u

/** So that a spreadsheet takes the text for UTF-8, and Ω and ° for themselves. */
const BYTE_ORDER_MARK = '\ufeff'

/**
 * A table as CSV of RFC 4180: commas, CRLF, quotes where they are needed. Figures stand as numbers with
 * a decimal point; a text that a spreadsheet could take for a formula begins with an apostrophe.
 */
export async function toCsv({ head, rows }: Table): Promise<string> {
  const { default: papa } = await import('papaparse')
  const cells = [head, ...rows].map((row) => row.map((cell) => cell ?? ''))
  return `${BYTE_ORDER_MARK}${papa.unparse(cells, { escapeFormulae: FORMULA, newline: '\r\n' })}\r\n`
}

/** A table as tab-separated text, as a spreadsheet takes it from the clipboard; every cell on one line. */
export function toTabbed({ head, rows }: Table): string {
  return [head, ...rows].map((row) => row.map(tabbedCell).join('\t')).join('\n')
}

function tabbedCell(cell: Cell): string {
  if (typeof cell === 'number') return String(cell)
  const line = (cell ?? '').replace(/[\t\r\n]+/gu, ' ')
  return FORMULA.test(line) ? `'${line}` : line
}
