import { failure, formatLimit, formatQuantity, parseCell, type Result, success } from '../../core'
import { parseShown } from '../digits'
import { plainFigure } from '../plain-figure'
import type { Typed } from '../types'
import { type ElementValue, unitOfElementValue } from './values'

/**
 * Reads a value of an element with or without its unit and limit: `150 mH`, `16µ ± 5 %`, `12`; a limit
 * alone changes that of the value before. Refused in one sentence; what is negative is left to the
 * check of the sheet, since only an impedance may be so.
 */
export function parseElementValue(
  text: string,
  value: ElementValue,
  before?: Typed,
): Result<Typed> {
  const cell = parseCell(text, { unit: unitOfElementValue(value) })
  if (!cell.ok) return cell
  if (cell.value.form === 'number') return success(cell.value.number)
  if (cell.value.form === 'limit' && before !== undefined) {
    const { limit } = cell.value
    const width =
      'percent' in limit ? (Math.abs(before.value) * limit.percent) / 100 : limit.absolute
    return success({ ...before, limit: width })
  }
  return failure('Type one value with its unit, such as 150 mH, 16 µF ± 5 % or 12 Ω.')
}

/** A value of an element as it was typed, with its unit; without its limit. */
export function formatElementValue({ value, text }: Typed, of: ElementValue): string {
  const unit = unitOfElementValue(of)
  if (text === undefined) return plainFigure(value, unit)
  const parsed = parseShown(text, unit)
  // Digits that carry their unit, or a prefix, stay as they are.
  if (!parsed.ok) return formatQuantity(value, unit)
  return /[\p{L}Ω]$/u.test(text) ? text : `${text} ${unit}`
}

/** The limit of a value: in per cent where that is how it comes out even, such as ± 5 %, else in the unit. */
export function formatElementLimit({ value, limit }: Typed, of: ElementValue): string | undefined {
  if (limit === undefined) return undefined
  const percent = (limit / Math.abs(value)) * 100
  const even = Number(percent.toPrecision(2))
  const unit = unitOfElementValue(of)
  if (limit > 0 && Math.abs(percent - even) <= 1e-9 * percent) {
    return formatLimit({ percent: even }, unit)
  }
  return limit === 0
    ? formatLimit(0, unit)
    : `± ${formatQuantity(limit, unit, { digits: 2, like: value })}`
}
