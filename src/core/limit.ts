import { maybeBracketed, splitUnit } from './cell-text'
import { type Figure, readFigure } from './figure'
import { failure, type Result, success } from './result'

/** A limit as it is typed: half a width in the unit of the value, or a percentage of the value. */
export type Limit = { readonly absolute: number } | { readonly percent: number }

/** Half the width that a limit gives a value, in the value's unit; 0 means exact. */
export function absoluteLimit(limit: Limit, value: number): number {
  if ('absolute' in limit) return limit.absolute
  // Twelve digits, so that 1 % of 48.2 is kept and shared as 0.482, without the tail of a rounding.
  return Number(((Math.abs(value) * limit.percent) / 100).toPrecision(12))
}

const PLUS_MINUS = /±|\+\s*\/\s*[-−–]|\+[-−–]/

/** Whether a text is a limit alone: ± 0.5. */
export function isLimitText(text: string): boolean {
  return text.search(PLUS_MINUS) === 0
}

/** A text parted at its ±; the limit is undefined where it has none. Refused: two limits. */
export function splitLimit(
  text: string,
): Result<{ readonly value: string; readonly limit: string | undefined }> {
  const bracketed = maybeBracketed(text)
  const [value = '', limit, extra] = (bracketed?.inner ?? text).split(PLUS_MINUS)
  if (extra !== undefined) return failure(`“${text}” holds more than one limit: write one ±.`)
  if (limit === undefined) return success({ value: text, limit })
  if (bracketed === undefined || bracketed.word === '') {
    return success({ value: value.trim(), limit: limit.trim() })
  }
  // In (48.2 ± 0.5) mV the unit is that of both.
  const isPercent = splitUnit(limit).meaning?.unit === '%'
  return success({
    value: `${value.trim()} ${bracketed.word}`,
    limit: isPercent ? limit.trim() : `${limit.trim()} ${bracketed.word}`,
  })
}

/** Reads what stands after ±, with the reader of the value's own figures. */
export function readLimit(
  text: string,
  readFigures: (text: string) => Result<Figure>,
): Result<Limit> {
  if (text === '') return failure('The limit is missing: write it after ±, such as ± 0.5 or ± 1 %.')
  const { figure, meaning } = splitUnit(text)
  const isPercent = meaning?.unit === '%'
  const read = isPercent ? readFigure(figure, 0) : readFigures(text)
  if (!read.ok) return read
  const size = read.value.value
  if (size < 0)
    return failure(`A limit cannot be negative: write ± ${text.replace(/^[-−–‐‑]\s*/, '')}.`)
  return success(isPercent ? { percent: size } : { absolute: size })
}

/** What was typed for a limit in a field of its own, as `parseCell` reads a limit: with ± before it. */
export function asLimit(text: string): string {
  return /^(±|\+\s*\/?\s*[-−])/.test(text) ? text : `± ${text}`
}
