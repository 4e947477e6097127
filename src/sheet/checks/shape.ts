import * as v from 'valibot'
import { MAXIMUM_ENTRIES } from '../limits'
import { circuitSchema } from '../schema/circuit'
import { entrySchemas, sheetSchema } from '../schema/sheet'
import { joinPath, type SheetError } from '../sheet-result'
import type { Sheet } from '../types'

/** Whether a value has the shape of a sheet: every part there, of the right type and in range. */
export function isShapedSheet(input: unknown): input is Sheet {
  return findMisshapen(input).next().done === true
}

/**
 * Finds parts that are missing, of the wrong type or out of range. The lists are gone through entry by
 * entry, and only as far as errors are asked for, so that a hostile sheet cannot make millions of them.
 */
export function* findMisshapen(input: unknown): Generator<SheetError> {
  yield* errorsOf(sheetSchema, input, '')
  for (const [name, schema] of Object.entries(entrySchemas)) {
    const entries = fieldOf(input, name)
    if (!Array.isArray(entries) || entries.length > MAXIMUM_ENTRIES) continue
    for (const [index, entry] of entries.entries()) {
      yield* errorsOf(schema, entry, `${name}[${index}]`)
    }
  }
  const circuit = fieldOf(input, 'circuit')
  if (circuit !== undefined) yield* errorsOf(circuitSchema, circuit, 'circuit')
}

function* errorsOf(
  schema: v.GenericSchema<unknown, unknown>,
  input: unknown,
  path: string,
): Generator<SheetError> {
  // One issue of a circuit is enough: a tree can hold a great many.
  const { issues = [] } = v.safeParse(schema, input, { abortEarly: schema === circuitSchema })
  for (const issue of issues) yield { path: pathOf(issue, path), message: issue.message }
}

function pathOf(issue: v.BaseIssue<unknown>, start: string): string {
  const keys = (issue.path ?? []).map(({ key }) => (typeof key === 'number' ? key : String(key)))
  return keys.reduce(joinPath, start)
}

function fieldOf(input: unknown, name: string): unknown {
  if (typeof input !== 'object' || input === null || !Object.hasOwn(input, name)) return undefined
  return Reflect.get(input, name)
}
