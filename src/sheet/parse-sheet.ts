import { toCanonical } from './canonical'
import { checkFigures } from './checks/figures'
import { checkIds } from './checks/ids'
import { findUnplain } from './checks/plain'
import { checkReferences } from './checks/references'
import { checkRelations } from './checks/relations'
import { findMisshapen, isShapedSheet } from './checks/shape'
import { MAXIMUM_ERRORS, MAXIMUM_FILE_BYTES } from './limits'
import { type SheetError, type SheetResult, sheetFailure } from './sheet-result'
import type { Sheet } from './types'

/**
 * Reads a sheet from a JSON value that may be anything. The sheet is a copy in canonical order, with
 * every unknown field kept; otherwise each error names the path of what is wrong.
 */
export function parseSheet(input: unknown): SheetResult {
  const unplain = firstOf(findUnplain(input))
  if (unplain.length > 0) return { ok: false, errors: unplain }
  const foreign = whyForeign(input)
  if (foreign !== undefined) return { ok: false, errors: [foreign] }
  if (!isShapedSheet(input)) return { ok: false, errors: firstOf(findMisshapen(input)) }
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
  const errors = firstOf(both(findUnplain(sheet), findMisshapen(sheet)))
  return errors.length > 0 ? errors : findContradictions(sheet)
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

/** Why a value is no sheet of this version at all, so that its parts need not be looked at. */
function whyForeign(input: unknown): SheetError | undefined {
  if (typeof input !== 'object' || input === null || Array.isArray(input)) {
    return { path: '', message: 'This is not a sheet: a sheet is an object, in braces.' }
  }
  if (!('format' in input) || input.format !== 'phasogon-sheet') {
    const message = 'This is not a sheet: its format must be "phasogon-sheet".'
    return { path: 'format', message }
  }
  if ('version' in input && typeof input.version === 'number' && input.version > 1) {
    const message = `This sheet was made by a newer version of the program (${input.version}): open it there, or bring this one up to date.`
    return { path: 'version', message }
  }
  return undefined
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
