import { failure, parseAngle, parseNumber, type Result, resolutionOf, success } from '../core'
import type { Shown } from './types'

/** The unit in which a figure is given: an SI unit, empty for a bare number, or `°` for an angle. */
export type FigureUnit = string

/** What digits were read before: in a drag the same ones are read again in every frame. */
const known = new Map<string, Result<number>>()
const MOST_KNOWN = 20_000

/**
 * The value of digits as typed or as a display showed them, in the unit, with or without a prefix.
 * Fails with a sentence where they are no figure in that unit.
 */
export function parseDigits(text: string, unit: FigureUnit): Result<number> {
  const key = `${unit}|${text}`
  const before = known.get(key)
  if (before !== undefined) return before
  const parsed = unit === '°' ? parseAngle(text) : parseNumber(text, { unit })
  const value = parsed.ok ? success(parsed.value.value) : failure(parsed.problem)
  if (known.size >= MOST_KNOWN) known.clear()
  known.set(key, value)
  return value
}

/** The value of what a display showed. */
export function parseShown(shown: Shown, unit: FigureUnit): Result<number> {
  return typeof shown === 'number' ? success(shown) : parseDigits(shown, unit)
}

/** The step of the last digit that a display showed; nothing where the text shows none. */
export function resolutionOfShown(shown: Shown): { readonly resolution?: number } {
  const resolution = resolutionOf(String(shown))
  return resolution === undefined ? {} : { resolution }
}
