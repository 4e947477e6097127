import { failure, parseAngle, parseNumber, type Result, success } from '../core'
import type { Shown } from './types'

/** The unit in which a figure is given: an SI unit, empty for a bare number, or `°` for an angle. */
export type FigureUnit = string

/**
 * The value of digits as typed or as a display showed them, in the unit, with or without a prefix.
 * Fails with a sentence where they are no figure in that unit.
 */
export function parseDigits(text: string, unit: FigureUnit): Result<number> {
  const parsed = unit === '°' ? parseAngle(text) : parseNumber(text, { unit })
  return parsed.ok ? success(parsed.value.value) : failure(parsed.problem)
}

/** The value of what a display showed. */
export function parseShown(shown: Shown, unit: FigureUnit): Result<number> {
  return typeof shown === 'number' ? success(shown) : parseDigits(shown, unit)
}
