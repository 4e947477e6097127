import { expect } from 'vitest'
import {
  apply,
  commit,
  createHistory,
  describeEdit,
  type Edit,
  parseSheet,
  redo,
  type Sheet,
  serializeSheet,
  undo,
} from '../../src/sheet'

/** For tests that try many cases: a busy machine is no reason to fail. */
export const unhurried = { timeout: 600_000 }

/**
 * The sheet after an edit, once every law of edits is asserted: the sheet that was given is not
 * touched; the edit does the same when it has been through JSON; what comes out is a valid sheet; undo
 * gives the same bytes back, and redo those of the result; the edit has words.
 */
export function applied(sheet: Sheet, edit: Edit): Sheet {
  const before = deepFreeze(structuredClone(sheet))
  const bytes = serializeSheet(before)
  const result = apply(before, deepFreeze(edit))
  if (!result.ok) throw new Error(`${edit.kind} was refused: ${result.problem}`)
  const after = result.value
  expect(apply(before, JSON.parse(JSON.stringify(edit)))).toEqual(result)
  expectValid(after)
  const done = commit(createHistory(before), after, describeEdit(before, edit))
  expect(serializeSheet(undo(done).sheet)).toBe(bytes)
  expect(serializeSheet(redo(undo(done)).sheet)).toBe(serializeSheet(after))
  expectWords(before, edit)
  return after
}

/** The sentence with which an edit is refused; the sheet that was given is not touched. */
export function refused(sheet: Sheet, edit: Edit): string {
  const before = deepFreeze(structuredClone(sheet))
  const result = apply(before, deepFreeze(edit))
  if (result.ok) throw new Error(`${edit.kind} was not refused`)
  expect(result.problem).toMatch(/^[A-Z“].*[.]$/su)
  expect(apply(before, JSON.parse(JSON.stringify(edit)))).toEqual(result)
  return result.problem
}

/** Asserts that a sheet is valid, and in a form that a file keeps to the last sign. */
export function expectValid(sheet: Sheet): void {
  const parsed = parseSheet(sheet)
  expect(parsed.ok ? [] : parsed.errors).toEqual([])
  expect(parsed).toEqual({ ok: true, sheet })
}

function expectWords(sheet: Sheet, edit: Edit): void {
  const words = describeEdit(sheet, edit)
  expect(words).toMatch(/^[A-Z]/)
  expect(words).not.toMatch(/undefined|null|\[object|\.$/)
}

/** The value with everything in it frozen, so that a change to it throws. */
export function deepFreeze<Value>(value: Value): Value {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    for (const item of Object.values(value)) deepFreeze(item)
    Object.freeze(value)
  }
  return value
}
