import { splitUnit, tidy } from './cell-text'
import { readFigure } from './figure'

const LONGEST = 200

/**
 * The place value of the last digit of a text, in the unit without its prefix: 0.01 for 23.40, 0.001 for
 * 230 mV, 100 for 4k7. For an angle in rad, the power of ten at or below its last digit, in degrees.
 * Undefined for a product or quotient, and for what is no figure.
 */
export function resolutionOf(text: string): number | undefined {
  const cell = tidy(text)
  if (cell.length > LONGEST) return undefined
  const { figure, meaning } = splitUnit(cell)
  const hasUnit = meaning?.unit !== undefined
  const read = readFigure(hasUnit ? figure : cell, hasUnit ? meaning.exponent : 0)
  if (!read.ok || read.value.resolution === undefined) return undefined
  // A hundredth of a radian is more than a tenth of a degree, and less than a whole one.
  return meaning?.unit === 'rad' ? read.value.resolution * 10 : read.value.resolution
}
