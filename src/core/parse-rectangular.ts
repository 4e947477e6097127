import { isMinus, MINUS_SIGNS, maybeBracketed, splitUnit } from './cell-text'
import { splitLimit } from './limit'
import { readLimited, toTyped } from './parse-number'
import { readQuantity } from './quantity'
import { failure, type Result, success } from './result'
import type { Typed } from './typed'

/** j, J or i, which is part of no word; a j may stand against the unit, as in 47.7jV. */
const IMAGINARY_UNIT = /(?<!\p{L})[jJi](?!\p{L})|(?<=\d)[jJ]/u
/** A sign between two figures: not the first thing, and not the one in 1e−3, in +/− or after × and ÷. */
const PARTING_SIGN = new RegExp(`(?<=[^eE/+*×·÷\\s])\\s*([+${MINUS_SIGNS}])(?!\\s*/)\\s*`, 'gu')

/** Whether a text is meant as real and imaginary part: it holds a j, or an i, that is part of no word. */
export function isRectangularText(text: string): boolean {
  return IMAGINARY_UNIT.test(text)
}

/** What a rectangular text holds. The real part is undefined where only an imaginary one was typed. */
export interface RectangularValue {
  readonly real: Typed | undefined
  readonly imaginary: Typed
}

/** The texts of the two parts, each with its own sign; the real one is empty where there is none. */
interface Parts {
  readonly real: string
  readonly imaginary: string
}

const SHAPE = 'Write it like 6.7 + j47.7, 6.7 − j47.7 or −j12.'

/** j before its figure: 6.7 + j47.7 V. Undefined where no sign stands between the parts. */
function maybeLeading(before: string, after: string): Parts | undefined {
  const sign = new RegExp(`[+${MINUS_SIGNS}]$`, 'u').exec(before)?.[0] ?? ''
  const real = before.slice(0, before.length - sign.length).trim()
  if (real !== '' && sign === '') return undefined
  return { real, imaginary: `${isMinus(sign) ? sign : ''}${after}` }
}

/** j after its figure: 6.7 + 47.7j V. */
function toTrailing(before: string, unit: string): Parts {
  const suffix = unit === '' ? '' : ` ${unit}`
  const parting = [...before.matchAll(PARTING_SIGN)].at(-1)
  if (parting === undefined) return { real: '', imaginary: `${before}${suffix}` }
  const [whole, sign = ''] = parting
  const figure = before.slice(parting.index + whole.length)
  return {
    real: before.slice(0, parting.index),
    imaginary: `${isMinus(sign) ? sign : ''}${figure}${suffix}`,
  }
}

function splitParts(text: string): Result<Parts> {
  const at = text.search(IMAGINARY_UNIT)
  const before = text.slice(0, at).trim()
  const after = text.slice(at + 1).trim()
  if (isRectangularText(after)) return failure(`Only one part carries a j. ${SHAPE}`)
  const parts = /[\dπ]/.test(after) ? maybeLeading(before, after) : toTrailing(before, after)
  if (parts === undefined) return failure(`The sign between the two parts is missing. ${SHAPE}`)
  if (!/[\dπ]/.test(parts.imaginary)) return failure(`The figure of the j is missing. ${SHAPE}`)
  return success(parts)
}

/** In (6.7 + j47.7) mV the unit is that of both parts. */
function splitBracketed(text: string): Result<Parts> {
  const bracketed = maybeBracketed(text)
  if (bracketed === undefined) return splitParts(text)
  const parts = splitParts(bracketed.inner)
  if (!parts.ok || bracketed.word === '') return parts
  const { real, imaginary } = parts.value
  return success({
    real: real === '' ? '' : `${real} ${bracketed.word}`,
    imaginary: `${imaginary} ${bracketed.word}`,
  })
}

/** In 6.7 + j47.7 mV, too, the unit at the end is that of both parts: as the program prints it. */
function shareUnit({ real, imaginary }: Parts): Result<Parts> {
  const [first, second] = [splitUnit(real), splitUnit(imaginary)]
  const isPrefixed = (part: typeof first) =>
    part.meaning?.unit !== undefined && part.meaning.exponent !== 0
  if (isPrefixed(first) && second.word === '') {
    return failure(
      `It is open whether “${first.word}” is the unit of both parts: write it with each.`,
    )
  }
  if (real === '' || first.word !== '' || !isPrefixed(second)) return success({ real, imaginary })
  return success({ real: `${real} ${second.word}`, imaginary })
}

/** A limit after the whole could be that of the whole or of the imaginary part alone. */
function isOpenWhoseLimit({ real, imaginary }: Parts): boolean {
  const [first, second] = [splitLimit(real), splitLimit(imaginary)]
  if (real === '' || !first.ok || !second.ok) return false
  return first.value.limit === undefined && second.value.limit !== undefined
}

/** Reads real and imaginary part, such as 6.7 + j47.7, 6.7+47.7j or −j12; both in `unit`. */
export function readRectangular(text: string, unit: string): Result<RectangularValue> {
  const split = splitBracketed(text)
  const parts = split.ok ? shareUnit(split.value) : split
  if (!parts.ok) return parts
  if (isOpenWhoseLimit(parts.value)) {
    return failure('Give each part its own limit, such as 6.7 ± 0.1 + j47.7 ± 0.5.')
  }
  const imaginary = readLimited(parts.value.imaginary, (figures) => readQuantity(figures, unit))
  if (!imaginary.ok) return imaginary
  if (parts.value.real === '') {
    return success({ real: undefined, imaginary: toTyped(imaginary.value) })
  }
  const real = readLimited(parts.value.real, (figures) => readQuantity(figures, unit))
  if (!real.ok) return real
  return success({ real: toTyped(real.value), imaginary: toTyped(imaginary.value) })
}
