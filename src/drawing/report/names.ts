import { type Id, labelOf, type Phasor, type Quantity, type Sheet, type Sum } from '../../sheet'
import type { TextRun } from '../scene'
import { labelRuns } from '../text/label-runs'
import type { Cell } from './columns'
import { STYLES } from './style'

/** What stands where nothing is known. */
export const NOTHING: Cell = { text: '–' }

/** A cell of plain text; a dash where there is none. */
export function cell(text: string | undefined): Cell {
  return text === undefined || text.trim() === '' ? NOTHING : { text }
}

/** The em of a symbol in a line of text, in millimetres. */
const SYMBOL_SIZE = 1.12 * STYLES.body.size

/** A label, set as a symbol with its subscript. */
export function labelCell(label: string): Cell {
  return { text: label, words: [labelRuns(label, SYMBOL_SIZE)] }
}

/** Several labels with signs between them, set as symbols: `V1 + V2 = V`. */
export function symbolsCell(text: string, labels: ReadonlySet<string>): Cell {
  const words = text
    .split(' ')
    .map((word) => symbolRuns(word, labels) ?? [{ ...STYLES.body, text: word }])
  return { text, words }
}

/** The runs of a label, with a sign before it or a comma behind it; undefined where it is none. */
function symbolRuns(word: string, labels: ReadonlySet<string>): TextRun[] | undefined {
  const [, sign = '', label = '', stop = ''] = /^(−?)(.*?)([,:]?)$/u.exec(word) ?? []
  if (!labels.has(label)) return undefined
  const plain = (text: string) => (text === '' ? [] : [{ ...STYLES.body, text }])
  return [...plain(sign), ...labelRuns(label, SYMBOL_SIZE), ...plain(stop)]
}

/** The labels of all phasors. */
export function labelsOf(sheet: Sheet): ReadonlySet<string> {
  return new Set(sheet.phasors.map(({ label }) => label))
}

/** The phasor of an id. */
export function phasorOf(sheet: Sheet, id: Id): Phasor | undefined {
  return sheet.phasors.find((phasor) => phasor.id === id)
}

/** How a sum is called: its label, else what it must equal, else its place. */
export function nameOfSum(sheet: Sheet, sum: Sum): string {
  if (sum.label !== undefined) return sum.label
  if (typeof sum.equals === 'string') return labelOf(sheet, sum.equals)
  return `Sum ${(sheet.sums ?? []).findIndex(({ id }) => id === sum.id) + 1}`
}

/** A sum in symbols: `V1 + V2 − V3 = V`. */
export function equationOf(sheet: Sheet, { terms, equals }: Sum): string {
  const left = terms
    .map(({ phasor, sign = 1 }, at) => {
      const label = labelOf(sheet, phasor)
      if (at === 0) return sign < 0 ? `−${label}` : label
      return sign < 0 ? `− ${label}` : `+ ${label}`
    })
    .join(' ')
  const right = equals === 0 ? ' = 0' : equals === undefined ? '' : ` = ${labelOf(sheet, equals)}`
  return `${left || 'no terms'}${right}`
}

/** What kind of quantity a sum is of: that of its first term, else of what it must equal. */
export function quantityOfSum(sheet: Sheet, { terms, equals }: Sum): Quantity {
  const first = terms[0] && phasorOf(sheet, terms[0].phasor)
  const other = typeof equals === 'string' ? phasorOf(sheet, equals) : undefined
  return first?.quantity ?? other?.quantity ?? 'other'
}

/** So many of something, in words: `1 reading`, `2 readings`. */
export function counted(count: number, name: string): string {
  return count === 1 ? `1 ${name}` : `${count} ${name}s`
}
