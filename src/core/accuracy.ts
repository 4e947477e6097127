import { MINUS_SIGNS, readCellText } from './cell-text'
import { readFigure } from './figure'
import { parseAngle } from './parse-angle'
import { parseNumber } from './parse-number'
import { failure, type Result, success } from './result'

/**
 * What a maker promises of a meter on one function and range: the true value lies within the sum of
 * these half-widths of what is shown.
 */
export interface AccuracyStatement {
  /** Per cent of what is shown. */
  readonly percentOfReading: number
  /** Per cent of the range's end. */
  readonly percentOfRange: number
  /** Steps of the last digit on the display. */
  readonly digits: number
  /** In the unit of what is shown. */
  readonly absolute: number
}

const NOTHING: AccuracyStatement = {
  percentOfReading: 0,
  percentOfRange: 0,
  digits: 0,
  absolute: 0,
}

const EXAMPLE = '±(0.7 % + 3 digits)'
const LEADING_SIGN = new RegExp(`^(?:±|\\+\\s*/?\\s*[${MINUS_SIGNS}])\\s*`, 'u')

const READING = 'reading|rdg|rd|value|indication'
const RANGE = 'range|rng|scale|full[ -]?scale|f\\.?s\\.?d?\\.?|span'
const PERCENT = new RegExp(
  `^(.+?)\\s*(%|ppm)\\s*(?:of\\s+)?(?:the\\s+)?(${READING}|${RANGE})?$`,
  'iu',
)
const DIGITS = /^(.*[\d.,])\s*(?:digits?|dgts?|d|counts?|cts?|lsd)$/i
const CLASS = /^(?:accuracy\s+)?(?:class|cl\.?)\s*(.+)$/i
const ONLY_RANGE = new RegExp(`^(?:${RANGE})$`, 'iu')

/**
 * Reads an accuracy as makers print it: ±(0.7 % + 3 digits), ±(1 % of reading + 0.2 % of range),
 * ±0.5°, 14 ppm + 2 ppm of range, class 0.5 (IEC 60051: per cent of the range's end). A percentage
 * that does not say of what is of the reading; a whole number alone after one counts digits, as in
 * ±(0.5 % + 2). `unit` is that of what is shown. What cannot be read is refused in one sentence.
 */
export function parseAccuracy(text: string, unit: string): Result<AccuracyStatement> {
  const cell = readCellText(text, EXAMPLE)
  if (!cell.ok) return cell
  let statement = NOTHING
  for (const [index, term] of termsOf(cell.value).entries()) {
    const read = readTerm(term, unit, index > 0)
    if (!read.ok) return read
    statement = plus(statement, read.value)
  }
  return success(statement)
}

/** The terms between the plus signs, without ± and brackets; a sign inside an exponent parts nothing. */
function termsOf(text: string): readonly string[] {
  const bare = text.replace(LEADING_SIGN, '').trim()
  const inner = /^[([](.*)[)\]]$/.exec(bare)?.[1] ?? bare
  return inner
    .replace(LEADING_SIGN, '')
    .split(/(?<!\d[eE])\+/)
    .map((term) => term.trim())
}

function plus(one: AccuracyStatement, other: Partial<AccuracyStatement>): AccuracyStatement {
  return {
    percentOfReading: one.percentOfReading + (other.percentOfReading ?? 0),
    percentOfRange: one.percentOfRange + (other.percentOfRange ?? 0),
    digits: one.digits + (other.digits ?? 0),
    absolute: one.absolute + (other.absolute ?? 0),
  }
}

function readTerm(
  term: string,
  unit: string,
  mayCountDigits: boolean,
): Result<Partial<AccuracyStatement>> {
  const ofClass = CLASS.exec(term)?.[1]
  if (ofClass !== undefined) {
    return mapSize(ofClass, (percentOfRange) => ({ percentOfRange }))
  }
  const [, figure, sign = '', of = ''] = PERCENT.exec(term) ?? []
  if (figure !== undefined) {
    const scale = sign === '%' ? 1 : 1e-4
    return mapSize(figure, (size) =>
      ONLY_RANGE.test(of) ? { percentOfRange: size * scale } : { percentOfReading: size * scale },
    )
  }
  const counted =
    DIGITS.exec(term)?.[1] ?? (mayCountDigits && /^\d+$/.test(term) ? term : undefined)
  if (counted !== undefined) return mapSize(counted, (digits) => ({ digits }))
  return readAbsolute(term, unit)
}

function readAbsolute(term: string, unit: string): Result<Partial<AccuracyStatement>> {
  if (/^[\d.,]+$/.test(term)) {
    return failure(`Say what the ${term} counts: %, % of range, digits or ${unit || 'units'}.`)
  }
  const read = unit === '°' ? parseAngle(term) : parseNumber(term, { unit })
  if (!read.ok) return failure(`“${term}” is no accuracy: write it like ${EXAMPLE}.`)
  return read.value.value < 0 ? negative(term) : success({ absolute: read.value.value })
}

function mapSize(
  text: string,
  make: (size: number) => Partial<AccuracyStatement>,
): Result<Partial<AccuracyStatement>> {
  const read = readFigure(text.trim(), 0)
  if (!read.ok) return failure(`“${text}” is no figure: write the accuracy like ${EXAMPLE}.`)
  return read.value.value < 0 ? negative(text) : success(make(read.value.value))
}

function negative(text: string): { readonly ok: false; readonly problem: string } {
  return failure(`An accuracy is not negative: write “${text}” without its minus sign.`)
}

/** The half-widths that a statement gives one reading, in the unit of what is shown. */
export interface AccuracyLimits {
  /** The part that is an error of the meter's scale: common to all readings on the range. */
  readonly ofReading: number
  readonly ofRange: number
  readonly digits: number
  readonly absolute: number
}

/** What must be known of a reading. */
export interface AccuracyOf {
  readonly value: number
  /** The end of the range. */
  readonly range?: number | undefined
  /** The step of the last digit. */
  readonly resolution?: number | undefined
}

/**
 * The half-widths of a reading by a statement. Their sum is the limit: JCGM 100:2008, 4.3.7, example 2,
 * takes "so much of the reading plus so much of the range" for one half-width. Never negative. Fails
 * where the statement counts in the range or in digits, and the range or the digits are not known.
 */
export function accuracyLimits(
  statement: AccuracyStatement,
  { value, range, resolution }: AccuracyOf,
): Result<AccuracyLimits> {
  if (statement.percentOfRange > 0 && range === undefined) {
    return failure('The accuracy is a part of the range: say on which range the meter was.')
  }
  if (statement.digits > 0 && resolution === undefined) {
    return failure('The accuracy counts digits: type the reading with its digits as shown.')
  }
  return success({
    ofReading: (Math.abs(value) * statement.percentOfReading) / 100,
    ofRange: (Math.abs(range ?? 0) * statement.percentOfRange) / 100,
    digits: (resolution ?? 0) * statement.digits,
    absolute: statement.absolute,
  })
}

/** The limit that a statement comes to: the sum of its half-widths. */
export function totalLimit({ ofReading, ofRange, digits, absolute }: AccuracyLimits): number {
  return ofReading + ofRange + digits + absolute
}
