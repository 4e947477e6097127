import { differenceDegrees, type Quantity } from '../../core'
import { type FigureUnit, parseDigits, parseShown } from '../digits'
import { shownFigures, typedFigures } from '../figures'
import type { SheetError } from '../sheet-result'
import type { PhasorId, Reading, Sheet } from '../types'

/** Finds digits that cannot be read, that do not say the value beside them, or that no meter shows. */
export function* checkFigures(sheet: Sheet): Generator<SheetError> {
  for (const { path, typed, unit } of typedFigures(sheet)) {
    if (typed.text === undefined) continue
    const message = problemOfText(typed.text, typed.value, unit)
    if (message !== undefined) yield { path: `${path}.text`, message }
  }
  const quantities = new Map<PhasorId, Quantity>()
  for (const { id, quantity } of sheet.phasors) quantities.set(id, quantity)
  for (const [index, reading] of (sheet.readings ?? []).entries()) {
    yield* checkReading(reading, quantities.get(reading.of) ?? 'other', `readings[${index}]`)
  }
}

function problemOfText(text: string, value: number, unit: FigureUnit): string | undefined {
  const parsed = parseDigits(text, unit)
  if (!parsed.ok) return parsed.problem
  if (agree(parsed.value, value, unit)) return undefined
  return `The digits "${text}" and the value ${value} differ: correct one of them.`
}

/** Twelve significant figures: another program may have written fewer digits than a double holds. */
function agree(a: number, b: number, unit: FigureUnit): boolean {
  const difference = unit === '°' ? differenceDegrees(a, b) : a - b
  return Math.abs(difference) <= 1e-12 * Math.max(Math.abs(a), Math.abs(b))
}

function* checkReading(reading: Reading, quantity: Quantity, path: string): Generator<SheetError> {
  const values: number[] = []
  for (const { field, shown, unit } of shownFigures(reading, quantity)) {
    const parsed = parseShown(shown, unit)
    if (parsed.ok) values.push(parsed.value)
    else yield { path: `${path}.${field}`, message: parsed.problem }
  }
  const [first = 0, second = 1] = values
  const problem = PROBLEMS[reading.kind]?.(first, second)
  if (problem !== undefined) yield { path: `${path}.${problem.field}`, message: problem.message }
  if (reading.kind !== 'magnitude') return
  for (const [at, repeat] of (reading.repeats ?? []).entries()) {
    if (repeat < 0) yield { path: `${path}.repeats[${at}]`, message: NEGATIVE }
  }
}

interface Problem {
  readonly field: string
  readonly message: string
}

const NEGATIVE = 'A meter shows a magnitude without a sign: this must not be negative.'
const UNSIGNED = 'This must not be negative: say "leads" or "lags" instead.'
const EMPTY = 'This must be more than zero.'

const PROBLEMS: {
  readonly [kind in Reading['kind']]?: (first: number, second: number) => Problem | undefined
} = {
  magnitude: (shown) => (shown < 0 ? { field: 'shown', message: NEGATIVE } : undefined),
  shift: (shift, period) => {
    if (shift < 0) return { field: 'shift', message: UNSIGNED }
    return period > 0 ? undefined : { field: 'period', message: EMPTY }
  },
  ellipse: (intercept, height) => {
    if (intercept < 0) return { field: 'intercept', message: UNSIGNED }
    return height > 0 ? undefined : { field: 'height', message: EMPTY }
  },
  'power-factor': (shown) =>
    Math.abs(shown) > 1
      ? { field: 'shown', message: 'A power factor lies between −1 and 1.' }
      : undefined,
}
