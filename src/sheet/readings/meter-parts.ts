import {
  type AccuracyLimits,
  type AccuracyStatement,
  accuracyLimits,
  formatNumber,
  parseAccuracy,
  type Result,
  resolutionOf,
  success,
} from '../../core'
import { assumedOf } from '../assumed'
import { indexOf } from '../sheet-index'
import type { Accuracy, Instrument, Reading, Sheet } from '../types'
import { accuracyRowOf, UNIT_OF_FUNCTION } from './accuracy-row'
import { type LimitPart, type SharedLimitPart, sharedWithinLimit, withinLimit } from './limit-part'
import type { Figure, Indication } from './observed'

/** The errors of the meter itself, and who says how large they may be. */
export interface MeterParts {
  readonly from: 'stated' | 'instrument' | 'assumed'
  readonly own: readonly LimitPart[]
  readonly shared: readonly SharedLimitPart[]
  readonly problem?: string
}

/** What the meter alone makes uncertain of a reading. */
export function meterParts(sheet: Sheet, reading: Reading, indication: Indication): MeterParts {
  if (reading.limit !== undefined) {
    const limit = spread(indication, reading.limit)
    return { from: 'stated', own: [withinLimit('as stated', limit)], shared: [] }
  }
  const instrument = indexOf(sheet).instruments.get(reading.instrument ?? '')
  const found = instrument && instrumentParts(instrument, reading, indication)
  if (found?.ok) return found.value
  const assumed: MeterParts = {
    from: 'assumed',
    own: [withinLimit('assumed', assumedLimit(sheet, indication))],
    shared: [],
  }
  return found === undefined ? assumed : { ...assumed, problem: found.problem }
}

/** How far an error of the display, either way, can move what the reading comes to. */
function spread({ moves }: Figure, error: number): number {
  return Math.max(Math.abs(moves(error)), Math.abs(moves(-error)))
}

function assumedLimit(sheet: Sheet, indication: Indication): number {
  const { percent, degrees } = assumedOf(sheet)
  const { observed, value, resolution = 0 } = indication
  if (indication.assumed === 'degrees') {
    return observed.kind === 'sine' ? sineSpread(observed.value, degrees) : degrees
  }
  // A part of nothing would make a reading of 0 exact: it is as good as its last digit.
  if (value === 0) return spread(indication, resolution / 2)
  return (Math.abs(observed.value) * percent) / 100
}

/** How far a turn of so many degrees can move a sine. */
function sineSpread(sine: number, degrees: number): number {
  const angle = Math.asin(sine)
  const turn = (degrees * Math.PI) / 180
  return Math.max(
    Math.abs(Math.sin(Math.min(angle + turn, Math.PI / 2)) - sine),
    Math.abs(Math.sin(Math.max(angle - turn, -Math.PI / 2)) - sine),
  )
}

/** Undefined where the instrument states nothing for the function and range. */
function instrumentParts(
  instrument: Instrument,
  reading: Reading,
  indication: Indication,
): Result<MeterParts> | undefined {
  const { of, value } = indication
  if (of === undefined) return undefined
  const row = accuracyRowOf(instrument, of, value, reading.range)
  if (row === undefined) return undefined
  const statement = parseAccuracy(row.text, UNIT_OF_FUNCTION[of])
  if (!statement.ok) return statement
  const range = reading.range ?? row.range
  const first = limitsOf(statement.value, indication, range)
  if (!first.ok) return first
  const beside = indication.beside && limitsOf(statement.value, indication.beside, range)
  if (beside !== undefined && !beside.ok) return beside
  return success({
    from: 'instrument',
    own: [
      ...ownParts(statement.value, first.value, indication, ''),
      ...(beside && indication.beside
        ? ownParts(statement.value, beside.value, indication.beside, ' of the period')
        : []),
    ],
    shared: gainParts(instrument, row, statement.value, first.value, indication),
  })
}

function limitsOf(
  statement: AccuracyStatement,
  { value, resolution }: Figure,
  range: number | undefined,
): Result<AccuracyLimits> {
  return accuracyLimits(statement, { value, range, resolution })
}

function ownParts(
  statement: AccuracyStatement,
  limits: AccuracyLimits,
  figure: Figure,
  suffix: string,
): readonly LimitPart[] {
  const named: readonly (readonly [string, number])[] = [
    [`${figureText(statement.percentOfRange)} % of the range`, limits.ofRange],
    [statement.digits === 1 ? '1 digit' : `${figureText(statement.digits)} digits`, limits.digits],
    ['as the maker states', limits.absolute],
  ]
  return named
    .filter(([, limit]) => limit > 0)
    .map(([name, limit]) => withinLimit(name + suffix, spread(figure, limit)))
}

/** The error of the meter's scale. It is no error of a ratio of two figures, such as a shift's. */
function gainParts(
  { id, name }: Instrument,
  { of, range }: Accuracy,
  { percentOfReading }: AccuracyStatement,
  { ofReading }: AccuracyLimits,
  { value, moves, beside }: Indication,
): readonly SharedLimitPart[] {
  if (ofReading === 0 || beside !== undefined) return []
  const error = ['gain', id, of, ...(range === undefined ? [] : [range])].join(':')
  const words = `${figureText(percentOfReading)} % of the reading, common to what ${name} showed on this range`
  return [sharedWithinLimit(words, error, moves(Math.sign(value) * ofReading))]
}

/** A figure of a statement as it was printed, without the tail of a rounding. */
function figureText(value: number): string {
  const text = String(Number(value.toPrecision(6)))
  const resolution = resolutionOf(text)
  return resolution === undefined ? text : formatNumber(value, -Math.round(Math.log10(resolution)))
}
