import * as v from 'valibot'

const LONGEST_TEXT = 20_000
const LONGEST_LABEL = 100
const UNPRINTABLE = /(?![\t\n\r])\p{Cc}|\p{Cs}|\p{Noncharacter_Code_Point}/u
const MARKUP = /<[a-z/!?]/i
const DIRECTION_MARK = /\p{Bidi_Control}/u

const textOfLength = (longest: number) =>
  v.pipe(
    v.string('This must be text, in quotation marks.'),
    v.maxLength(longest, `This text is too long: keep it to ${longest} characters.`),
    v.check(
      (text) => !UNPRINTABLE.test(text),
      'This text holds a character that cannot be printed: type it again without it.',
    ),
  )

/** Free text: any script and direction, several lines, nothing that cannot be printed. */
export const textSchema = textOfLength(LONGEST_TEXT)

/**
 * A name that is set on the drawing and read out beside figures: one line, not blank, without markup
 * and without marks that turn the direction of writing, since such a mark would set the figures that
 * follow it backwards.
 */
export const labelSchema = v.pipe(
  textOfLength(LONGEST_LABEL),
  v.check((text) => text.trim() !== '', 'A label needs at least one letter.'),
  v.check((text) => !/[\t\n\r]/.test(text), 'A label is one line: take out the line break or tab.'),
  v.check(
    (text) => !MARKUP.test(text),
    'A label is plain text, without markup: type Vcoil, and coil is set as the subscript.',
  ),
  v.check(
    (text) => !DIRECTION_MARK.test(text),
    'This label holds an invisible mark that turns the direction of writing: type it again without it.',
  ),
)

/** What a display showed, or digits as typed: short text. */
export const digitsSchema = textOfLength(LONGEST_LABEL)

const PROTOTYPE_NAMES: ReadonlySet<string> = new Set([
  ...Object.getOwnPropertyNames(Object.prototype),
  'prototype',
])

/** Whether a text can name a part of a sheet: the form of an `Id`, and no name that is taken. */
export function isId(text: string): boolean {
  return (
    /^[A-Za-z][A-Za-z0-9_]{0,15}$/.test(text) &&
    text !== 'total' &&
    text !== 'closing' &&
    !PROTOTYPE_NAMES.has(text)
  )
}

/** The name of a part of the sheet. */
export const idSchema = v.pipe(
  v.string('This must be an id, in quotation marks.'),
  v.check(
    isId,
    'An id is a letter and up to 15 more letters, digits or underscores; "total", "closing" and the names that every object has are taken.',
  ),
)

/** A day, or a day and time, of ISO 8601. */
export const dateSchema = v.pipe(
  textSchema,
  v.check(isDate, 'Write the date as ISO 8601 has it: 2026-03-31.'),
)

function isDate(text: string): boolean {
  const parts =
    /^(\d{4})-(\d{2})-(\d{2})(?:T\d{2}:\d{2}(?::\d{2}(?:\.\d+)?)?(?:Z|[+-]\d{2}:\d{2})?)?$/.exec(
      text,
    )
  if (parts === null) return false
  const [year, month, day] = [Number(parts[1]), Number(parts[2]), Number(parts[3])]
  const date = new Date(Date.UTC(year, month - 1, day))
  return date.getUTCMonth() === month - 1 && date.getUTCDate() === day
}
