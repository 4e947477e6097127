import { isMinus, MINUS_SIGNS } from './cell-text'
import { failure, type Result, success } from './result'
import { exponentOfPrefix, PREFIX_LETTERS } from './units'

/** A figure that was read; the resolution is the place value of its last digit, where it has one. */
export interface Figure {
  readonly value: number
  readonly resolution?: number
}

/** The spaces that may part thousands: plain, no-break, figure, punctuation, thin, narrow no-break. */
const GROUP_SPACE = '[ \\u00a0\\u2007\\u2008\\u2009\\u202f]'

const SIGNED = new RegExp(`^([+${MINUS_SIGNS}]?)\\s*(.*)$`, 'su')
const EXPONENT = new RegExp(`^(.*?\\d[.,]?)[eE]([+${MINUS_SIGNS}]?)(\\d{1,4})$`, 'su')
const PREFIXED = new RegExp(`^(.*[\\d.,])\\s*([${PREFIX_LETTERS}])$`, 'su')
/** IEC 60062: a letter in the decimal point's place, R for none: 4k7, 4R7, R47. */
const LETTER_FOR_POINT = new RegExp(`^(\\d*)([R${PREFIX_LETTERS}])(\\d+)$`, 'u')

const SUM = new RegExp(`\\d\\s*[+${MINUS_SIGNS}]\\s*\\d`, 'u')
const ONE_SEPARATOR = /^(?:\d+[.,]?\d*|[.,]\d+)$/
const TWO_READINGS = /^[1-9]\d{0,2},\d{3}$/
const SPACED_GROUPS = new RegExp(`^\\d{1,3}(?:${GROUP_SPACE}\\d{3})+(?:[.,]\\d*)?$`, 'u')
const COMMA_GROUPS = /^\d{1,3}(?:(?:,\d{3})+\.\d*|(?:,\d{3}){2,})$/
const POINT_GROUPS = /^\d{1,3}(?:(?:\.\d{3})+,\d*|(?:\.\d{3}){2,})$/

/** The digits with a decimal point and nothing else; undefined where they are no decimal number. */
function maybeDigits(text: string): string | undefined {
  if (ONE_SEPARATOR.test(text)) return text.replace(',', '.')
  if (SPACED_GROUPS.test(text)) return text.replace(/[^\d.,]/g, '').replace(',', '.')
  if (COMMA_GROUPS.test(text)) return text.replaceAll(',', '')
  if (POINT_GROUPS.test(text)) return text.replaceAll('.', '').replace(',', '.')
  return undefined
}

/** A decimal from its digits and a power of ten: as one literal, so that 230 m is exactly 0.23. */
function toFigure(digits: string, exponent: number, text: string): Result<Figure> {
  const value = Number(`${digits}e${exponent}`)
  if (!Number.isFinite(value)) return failure(`“${text}” is too large: check its exponent.`)
  if (value === 0 && /[1-9]/.test(digits)) {
    return failure(`“${text}” is too small: check its exponent, or write 0.`)
  }
  const decimals = digits.includes('.') ? digits.length - digits.indexOf('.') - 1 : 0
  return success({ value, resolution: Number(`1e${exponent - decimals}`) })
}

function unreadable(text: string): { readonly ok: false; readonly problem: string } {
  if (SUM.test(text)) {
    return failure(`“${text}” is a sum: work it out first, or mark the imaginary part with a j.`)
  }
  if (/\d\s+\d/.test(text)) {
    return failure(`“${text}” is more than one number: write one, without the space.`)
  }
  return failure(
    text === ''
      ? 'A figure is missing: write one such as 48.2 or 0.24/3.'
      : `“${text}” is not a number: write one such as 48.2 or 0.24/3.`,
  )
}

/** A decimal number without a sign: 48.2, 48,2, 1 234.5, 1e3, 1.5k, 4k7. */
function readDecimal(text: string, exponent: number): Result<Figure> {
  const coded = LETTER_FOR_POINT.exec(text)
  if (coded !== null) {
    const [, whole = '', letter = '', rest = ''] = coded
    return toFigure(
      `${whole === '' ? '0' : whole}.${rest}`,
      exponent + (exponentOfPrefix(letter) ?? 0),
      text,
    )
  }
  const prefixed = PREFIXED.exec(text)
  const prefixExponent = exponentOfPrefix(prefixed?.[2] ?? '') ?? 0
  const [, mantissa = prefixed?.[1] ?? text, sign = '', power = '0'] =
    EXPONENT.exec(prefixed?.[1] ?? text) ?? []
  if (TWO_READINGS.test(mantissa)) {
    const point = mantissa.replace(',', '.')
    const whole = mantissa.replace(',', '')
    return failure(`“${mantissa}” can be read two ways: write ${point} or ${whole}.`)
  }
  const digits = maybeDigits(mantissa)
  if (digits === undefined) return unreadable(text)
  const scientific = isMinus(sign) ? -Number(power) : Number(power)
  return toFigure(digits, exponent + prefixExponent + scientific, text)
}

/** A factor without a sign: a decimal, π, or a square root. */
function readFactor(text: string, exponent: number): Result<Figure> {
  if (text === 'π' || text === 'pi') return success({ value: Math.PI * 10 ** exponent })
  const [, bare, bracketed = bare] = /^(?:√\s*([^()]*)|(?:√|sqrt)\s*\(([^()]*)\))$/.exec(text) ?? []
  if (bracketed === undefined) return readDecimal(text, exponent)
  const under = readDecimal(bracketed.trim(), 0)
  return under.ok ? success({ value: Math.sqrt(under.value.value) * 10 ** exponent }) : under
}

function readSignedFactor(text: string, exponent: number): Result<Figure> {
  const [, sign = '', size = ''] = SIGNED.exec(text) ?? []
  if (sign !== '' && SIGNED.exec(size)?.[1] !== '') return unreadable(text)
  const factor = readFactor(size.trim(), exponent)
  if (!factor.ok || !isMinus(sign)) return factor
  return success({ ...factor.value, value: -factor.value.value + 0 })
}

const OPERATOR = /([*×·⋅/÷])/

/** Whether a text is a product or a quotient, so that its last digit shows no resolution. */
export function isExpression(text: string): boolean {
  return OPERATOR.test(text)
}

/**
 * Reads a figure, times ten to `exponent`: a decimal number, or products and quotients of them, worked
 * out from left to right (0.24/3, 1.5/10*360, 400/√3). Refused in words: what is no number, what can be
 * read two ways, what a double cannot hold, and a division by zero.
 */
export function readFigure(text: string, exponent: number): Result<Figure> {
  const [first = '', ...rest] = text.split(OPERATOR)
  const start = readSignedFactor(first.trim(), exponent)
  if (!start.ok || rest.length === 0) return start
  let value = start.value.value
  for (let index = 0; index < rest.length; index += 2) {
    const factor = readSignedFactor((rest[index + 1] ?? '').trim(), 0)
    if (!factor.ok) return factor
    const isDivision = rest[index] === '/' || rest[index] === '÷'
    if (isDivision && factor.value.value === 0)
      return failure(`“${text}” divides by zero: check the figures.`)
    value = isDivision ? value / factor.value.value : value * factor.value.value
  }
  if (!Number.isFinite(value)) return failure(`“${text}” is too large: check the figures.`)
  return success({ value })
}
