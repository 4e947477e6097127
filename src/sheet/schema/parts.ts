import * as v from 'valibot'
import { MAXIMUM_ENTRIES } from '../limits'
import { digitsSchema, textSchema } from './text'

/** An object with these fields; it may have others, which nobody looks at. */
export function fields<const Entries extends v.ObjectEntries>(entries: Entries) {
  return v.pipe(v.custom<object>(isFields, NOT_FIELDS), v.looseObject(entries, missingField))
}

/** One of several objects, told apart by the field `kind`. */
export function kinds<Part>(
  table: Readonly<Record<string, v.GenericSchema<unknown, Part>>>,
): v.GenericSchema<unknown, Part> {
  const unknownKind = v.pipe(
    fields({ kind: oneOf(Object.keys(table)) }),
    v.transform((): never => {
      throw new Error('A kind that is in the table has a schema.')
    }),
  )
  return v.lazy((input) => {
    const kind = isFields(input) && 'kind' in input ? input.kind : undefined
    return (typeof kind === 'string' && Object.hasOwn(table, kind) && table[kind]) || unknownKind
  })
}

/** The sentence for what is no object, or lacks a field that it needs. */
function missingField(issue: v.LooseObjectIssue): string {
  return issue.expected === 'Object' ? NOT_FIELDS : `The field ${issue.expected} is missing.`
}

const NOT_FIELDS = 'This must be an object: named fields in braces.'

function isFields(input: unknown): input is object {
  return typeof input === 'object' && input !== null && !Array.isArray(input)
}

/** A list of at most so many entries; they are looked at only where there are no more. */
export function list<const Item extends v.GenericSchema>(item: Item, longest = MAXIMUM_ENTRIES) {
  return v.pipe(
    v.custom<unknown[]>(Array.isArray, 'This must be a list, in square brackets.'),
    v.maxLength(longest, `There are too many entries here: at most ${longest} are read.`),
    v.array(item),
  )
}

/** One of a few words. */
export function oneOf<const Words extends readonly string[]>(words: Words) {
  return v.picklist(words, `This must be one of: ${words.join(', ')}.`)
}

/** Any finite number. */
export const numberSchema = v.pipe(
  v.number('This must be a number.'),
  v.finite('This must be a finite number.'),
)

/** A finite number that is not below zero. */
export const notNegativeSchema = v.pipe(numberSchema, v.minValue(0, 'This must not be negative.'))

/** A finite number above zero. */
export const positiveSchema = v.pipe(numberSchema, v.gtValue(0, 'This must be more than zero.'))

/** A whole number of turns. */
export const turnsSchema = v.pipe(
  numberSchema,
  v.integer('Turns are a whole number.'),
  v.minValue(1, 'There is at least one turn.'),
)

/** True or false. */
export const flagSchema = v.boolean('This must be true or false.')

/** A place on the paper. */
export const placeSchema = fields({ x: numberSchema, y: numberSchema })

/** A `Typed` whose value passes a schema of its own. */
export const typed = <const Value extends v.GenericSchema<number>>(value: Value) =>
  fields({
    value,
    text: v.exactOptional(digitsSchema),
    limit: v.exactOptional(notNegativeSchema),
  })

/** Any value that someone typed. */
export const typedSchema = typed(numberSchema)

/** A typed value that is not below zero. */
export const typedNotNegativeSchema = typed(notNegativeSchema)

/** A typed value above zero. */
export const typedPositiveSchema = typed(positiveSchema)

/** A typed magnitude: its sign is an angle of 180°. */
export const typedMagnitudeSchema = typed(
  v.pipe(
    numberSchema,
    v.minValue(0, 'A magnitude is not negative: turn the angle by 180° instead.'),
  ),
)

const shownNumberSchema = v.pipe(
  v.number('This must be what the display showed: a number, or its digits in quotation marks.'),
  v.finite('This must be a finite number.'),
)

/** What a display showed: a number, or its digits. */
export const shownSchema = v.lazy((input) =>
  typeof input === 'string' ? digitsSchema : shownNumberSchema,
)

/** Free text that may be left out. */
export const maybeText = v.exactOptional(textSchema)
