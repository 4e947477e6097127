import { splitUnit } from './cell-text'
import { type Figure, isExpression, readFigure } from './figure'
import { failure, type Result } from './result'
import { takesPrefix } from './units'

/** A cell in another unit than the one typed: what to do about it. */
function wrongUnit(
  written: string,
  unit: string,
): { readonly ok: false; readonly problem: string } {
  if (unit === '') return failure(`This value has no unit: leave out “${written}”.`)
  return failure(
    `This value is in ${unit}, so “${written}” does not fit: write ${unit}, or leave the unit out.`,
  )
}

/** The IEC 60062 letter R stands for the decimal point of a resistance, and of nothing else. */
const RESISTANCE_CODE = /^\d*R\d+$/

/**
 * Reads a figure with or without its unit, as a value in that unit: 230 mV in V is 0.23. A prefix may
 * stand alone (1.5k). A unit that does not match is refused in words, and so is a lone prefix that
 * stands apart from a product or quotient, as it could belong to the whole or to the last factor.
 */
export function readQuantity(text: string, unit: string): Result<Figure> {
  const { figure, word, meaning } = splitUnit(text)
  if (figure === '' || word === '') {
    return RESISTANCE_CODE.test(text) && unit !== 'Ω' ? wrongUnit('R', unit) : readFigure(text, 0)
  }
  if (meaning === undefined) return wrongUnit(word, unit)
  if (meaning.unit !== undefined) {
    return meaning.unit === unit ? readFigure(figure, meaning.exponent) : wrongUnit(word, unit)
  }
  if (unit !== '' && !takesPrefix(unit)) return wrongUnit(word, unit)
  if (isExpression(figure) && /\s/.test(text.slice(figure.length))) {
    return failure(
      `It is open what “${word}” belongs to: write it against its figure, or with the unit.`,
    )
  }
  return readFigure(text, 0)
}
