import { readCellText, splitUnit } from './cell-text'
import type { Figure } from './figure'
import { absoluteLimit, type Limit, readLimit, splitLimit } from './limit'
import { readQuantity } from './quantity'
import { failure, type Result, success } from './result'
import type { Typed } from './typed'

/** Reads figures in the unit of one value. */
export type ReadFigures = (text: string) => Result<Figure>

/** Whether one of two figures carries a prefixed unit and the other none: 48.2 ± 5 mV. */
function isOpenWhoseUnit(one: string, other: string): boolean {
  const [first, second] = [splitUnit(one), splitUnit(other)]
  const isPrefixed = (unit: string | undefined, exponent: number) =>
    unit !== undefined && exponent !== 0
  return (
    (first.word === '' && isPrefixed(second.meaning?.unit, second.meaning?.exponent ?? 0)) ||
    (second.word === '' && isPrefixed(first.meaning?.unit, first.meaning?.exponent ?? 0))
  )
}

/** A value as it was typed, and its limit as it was typed. */
export interface LimitedText {
  readonly value: number
  readonly text: string
  readonly limit: Limit | undefined
}

/** Reads a figure with its unit, with or without a limit after ±. The text is the figure's alone. */
export function readLimited(text: string, readFigures: ReadFigures): Result<LimitedText> {
  const parts = splitLimit(text)
  if (!parts.ok) return parts
  const { value: valueText, limit: limitText } = parts.value
  const value = readFigures(valueText)
  if (!value.ok) return value
  const read = { value: value.value.value, text: valueText }
  if (limitText === undefined) return success({ ...read, limit: undefined })
  if (isOpenWhoseUnit(valueText, limitText)) {
    return failure(
      'It is open which figure the unit belongs to: write it with both the value and its limit.',
    )
  }
  const limit = readLimit(limitText, readFigures)
  if (!limit.ok) return limit
  if (!Number.isFinite(absoluteLimit(limit.value, read.value))) {
    return failure(`“± ${limitText}” is too large: check the figures.`)
  }
  return success({ ...read, limit: limit.value })
}

/** What was typed as the sheet keeps it: the limit as half a width in the value's unit. */
export function toTyped({ value, text, limit }: LimitedText): Typed {
  if (limit === undefined) return { value, text }
  return { value, text, limit: absoluteLimit(limit, value) }
}

/**
 * Reads one figure in a unit, such as 48.2, 48,2, 230 mV, 1.5k, 4k7, 0.24/3 or 48.2 ± 1 %; a value in
 * `unit` itself (V, A, Ω, VA, Hz, …; empty where there is none). A comma may be the decimal point, and
 * a space may part thousands. The digits are kept in `text`, without the limit: it reads as the same
 * value again. What cannot be read is refused in one sentence, and so is a unit that does not match.
 */
export function parseNumber(text: string, { unit }: { readonly unit: string }): Result<Typed> {
  const cell = readCellText(text, '48.2 or 230 m')
  if (!cell.ok) return cell
  const read = readLimited(cell.value, (figures) => readQuantity(figures, unit))
  return read.ok ? success(toTyped(read.value)) : read
}
