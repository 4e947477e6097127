import { readCellText } from './cell-text'
import { isLimitText, type Limit, readLimit, splitLimit } from './limit'
import { readAngle, readDegrees } from './parse-angle'
import { type ReadFigures, readLimited, toTyped } from './parse-number'
import { isPolarText, negativeMagnitude, readPolar } from './parse-polar'
import { isRectangularText, readRectangular } from './parse-rectangular'
import { readQuantity } from './quantity'
import { failure, type Result, success } from './result'
import type { Typed } from './typed'

/** What was typed into a cell: one figure, a limit alone, or a whole phasor in either form. */
export type CellValue =
  | { readonly form: 'number'; readonly number: Typed }
  | { readonly form: 'limit'; readonly limit: Limit }
  | { readonly form: 'polar'; readonly magnitude: Typed; readonly angle: Typed }
  | { readonly form: 'rectangular'; readonly real: Typed; readonly imaginary: Typed }

/** The part of a phasor that a cell shows. */
export type CellPart = 'magnitude' | 'angle' | 'real' | 'imaginary'

/** Which cell a text was typed into. */
export interface CellOptions {
  /** The unit of the phasor's quantity, empty where it has none; ° makes the cell one of angles. */
  readonly unit: string
  /** Where it is `angle`, a lone figure or limit is in degrees; left out, a lone figure may be any part. */
  readonly part?: CellPart | undefined
}

/**
 * Reads what may be typed into a cell of the schedule: a figure (48.2, 48,2, 1 234.5, 230 mV, 1.5k, 4k7,
 * 0.24/3, 1e3), a limit alone (± 0.5, ± 1 %) or behind a figure, magnitude and angle (48.2 ∠ 82°,
 * 48.2 at 1.43 rad), or real and imaginary part (6.7 + j47.7, 6.7+47.7j, −j12). Values are in `unit` and
 * in degrees in (−180°, 180°]; each `text` keeps its digits as typed, without the limit, and reads as the
 * same value again. What cannot be read, or could be read in two ways, is refused in one sentence.
 */
export function parseCell(text: string, options: CellOptions): Result<CellValue> {
  const cell = readCellText(text, isAngleCell(options) ? '82 or −90' : '48.2 or 48.2 ∠ 82°')
  if (!cell.ok) return cell
  if (isLimitText(cell.value)) return readLimitForm(cell.value, options)
  if (isPolarText(cell.value)) return readPolarForm(cell.value, options)
  if (isRectangularText(cell.value)) return readRectangularForm(cell.value, options)
  if (/<\s*[-−\d]/.test(cell.value)) {
    return failure('Write the angle after ∠ or the word at, such as 48.2 at 82.')
  }
  return readNumberForm(cell.value, options)
}

function isAngleCell({ unit, part }: CellOptions): boolean {
  return part === 'angle' || unit === '°'
}

function readersOf(options: CellOptions): ReadFigures {
  return isAngleCell(options) ? readDegrees : (figures) => readQuantity(figures, options.unit)
}

function readLimitForm(text: string, options: CellOptions): Result<CellValue> {
  const parts = splitLimit(text)
  if (!parts.ok) return parts
  const limit = readLimit(parts.value.limit ?? '', readersOf(options))
  if (!limit.ok) return limit
  if (isAngleCell(options) && 'percent' in limit.value) {
    return failure('The limit of an angle is in degrees, not in percent: write it like ± 1°.')
  }
  return success({ form: 'limit', limit: limit.value })
}

function readPolarForm(text: string, { unit }: CellOptions): Result<CellValue> {
  const polar = readPolar(text, unit)
  return polar.ok ? success({ form: 'polar', ...polar.value }) : polar
}

function readRectangularForm(text: string, { unit, part }: CellOptions): Result<CellValue> {
  const read = readRectangular(text, unit)
  if (!read.ok) return read
  const { real, imaginary } = read.value
  if (real === undefined && part === 'imaginary')
    return success({ form: 'number', number: imaginary })
  return success({ form: 'rectangular', real: real ?? { value: 0 }, imaginary })
}

function readNumberForm(text: string, options: CellOptions): Result<CellValue> {
  if (isAngleCell(options)) {
    const angle = readAngle(text)
    return angle.ok ? success({ form: 'number', number: angle.value }) : angle
  }
  const read = readLimited(text, readersOf(options))
  if (!read.ok) return read
  if (options.part === 'magnitude' && read.value.value < 0) return negativeMagnitude()
  return success({ form: 'number', number: toTyped(read.value) })
}
