import { failure, type Result, success } from './result'
import { maybeUnitWord, type UnitWord } from './units'

/** Marks that show nothing: joiners, direction marks, the byte order mark, the soft hyphen. */
const INVISIBLE = /[\u00ad\u200b-\u200f\u202a-\u202e\u2060-\u2064\u2066-\u2069\ufeff]/g

/** Every sign for minus that a keyboard, a meter's software or a spreadsheet may give, for a character class. */
export const MINUS_SIGNS = '\\-−–‐‑'

const LONGEST = 120

/** The text of a cell without marks that show nothing and without spaces about it. */
export function tidy(text: string): string {
  return text.replace(INVISIBLE, '').trim()
}

/** The tidy text of a cell; refused where it is empty, longer than any value, or more than one line. */
export function readCellText(text: string, example: string): Result<string> {
  const cell = tidy(text)
  if (cell === '') return failure(`Type a value, such as ${example}.`)
  if (cell.length > LONGEST)
    return failure(`That is too long for one value: type one such as ${example}.`)
  if (/\p{Cc}/u.test(cell))
    return failure(`That is more than one cell: type one value, such as ${example}.`)
  return success(cell)
}

/** Whether a sign is one of the minus signs. */
export function isMinus(sign: string): boolean {
  return sign !== '' && sign !== '+'
}

/** A figure, and the word after it. */
export interface Split {
  /** What stands before the word. */
  readonly figure: string
  /** Empty where there is none. */
  readonly word: string
  /** Undefined where there is no word, or none that the program knows. */
  readonly meaning: UnitWord | undefined
}

/** Parts the word at the end (mV, k, °) from the figure before it. */
export function splitUnit(text: string): Split {
  const letters = /(?:(?!π)[\p{L}°º˚%])+$/u.exec(text)?.[0] ?? ''
  // π is a figure, however it is spelled.
  const word = letters === 'pi' ? '' : letters
  const figure = text.slice(0, text.length - word.length).trimEnd()
  return { figure, word, meaning: word === '' ? undefined : maybeUnitWord(word) }
}

/** Takes the brackets off `(…) unit` and gives what they hold and the word after them. */
export function maybeBracketed(
  text: string,
): { readonly inner: string; readonly word: string } | undefined {
  const { figure, word } = splitUnit(text)
  const inner = /^\(([^()]*)\)$/.exec(figure)?.[1]
  return inner === undefined ? undefined : { inner: inner.trim(), word }
}
