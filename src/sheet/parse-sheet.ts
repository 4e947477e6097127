import * as v from 'valibot'
import { toCanonical } from './canonical'
import { checkFigures } from './checks/figures'
import { checkIds } from './checks/ids'
import { findUnplain } from './checks/plain'
import { checkReferences } from './checks/references'
import { checkRelations } from './checks/relations'
import { MAXIMUM_ERRORS, MAXIMUM_FILE_BYTES } from './limits'
import { sheetSchema } from './schema/sheet'
import { joinPath, type SheetError, type SheetResult, sheetFailure } from './sheet-result'
import type { Sheet } from './types'

/**
 * Reads a sheet from a JSON value that may be anything. The sheet is a copy in canonical order, with
 * every unknown field kept; otherwise each error names the path of what is wrong.
 */
export function parseSheet(input: unknown): SheetResult {
  const unplain = firstOf(findUnplain(input))
  if (unplain.length > 0) return { ok: false, errors: unplain }
  const newer = versionAbove(input)
  if (newer !== undefined) return sheetFailure('version', newer)
  if (!isShapedRight(input)) return { ok: false, errors: findMisshapen(input) }
  const errors = findContradictions(input)
  return errors.length === 0 ? { ok: true, sheet: toCanonical(input) } : { ok: false, errors }
}

/** Reads a sheet from JSON text of at most 5 MB. */
export function parseSheetText(text: string): SheetResult {
  if (text.length > MAXIMUM_FILE_BYTES || utf8Length(text) > MAXIMUM_FILE_BYTES) {
    return sheetFailure('', 'This is too large for a sheet: at most 5 MB are read.')
  }
  let input: unknown
  try {
    input = JSON.parse(text.replace(/^\ufeff/, ''))
  } catch {
    return sheetFailure('', 'This is not a sheet: its text is not JSON, or it is cut short.')
  }
  return parseSheet(input)
}

/** Everything that is wrong with a sheet that an edit made; empty where nothing is. */
export function findErrors(sheet: Sheet): readonly SheetError[] {
  const unplain = firstOf(findUnplain(sheet))
  if (unplain.length > 0) return unplain
  return isShapedRight(sheet) ? findContradictions(sheet) : findMisshapen(sheet)
}

function isShapedRight(input: unknown): input is Sheet {
  return v.is(sheetSchema, input)
}

function findMisshapen(input: unknown): readonly SheetError[] {
  return firstOf((v.safeParse(sheetSchema, input).issues ?? []).map(toError))
}

function findContradictions(sheet: Sheet): readonly SheetError[] {
  const names = firstOf(both(checkIds(sheet), checkReferences(sheet)))
  return names.length > 0 ? names : firstOf(both(checkRelations(sheet), checkFigures(sheet)))
}

function* both<Item>(first: Iterable<Item>, second: Iterable<Item>): Generator<Item> {
  yield* first
  yield* second
}

function firstOf(errors: Iterable<SheetError>): readonly SheetError[] {
  const first: SheetError[] = []
  for (const error of errors) {
    if (first.length === MAXIMUM_ERRORS) break
    first.push(error)
  }
  return first
}

function toError(issue: v.BaseIssue<unknown>): SheetError {
  let path = ''
  for (const { key } of issue.path ?? []) {
    path = joinPath(path, typeof key === 'number' ? key : String(key))
  }
  return { path, message: issue.message }
}

function versionAbove(input: unknown): string | undefined {
  if (typeof input !== 'object' || input === null || !('version' in input)) return undefined
  const { version } = input
  if (typeof version !== 'number' || version <= 1) return undefined
  return `This sheet was made by a newer version of the program (${version}): open it there, or bring this one up to date.`
}

function utf8Length(text: string): number {
  let length = text.length
  for (let index = 0; index < text.length; index += 1) {
    const code = text.charCodeAt(index)
    if (code > 0x7ff && (code < 0xd800 || code > 0xdfff)) length += 2
    else if (code > 0x7f) length += 1
  }
  return length
}
