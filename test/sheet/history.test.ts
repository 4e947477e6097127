import fc from 'fast-check'
import { expect, test } from 'vitest'
import {
  apply,
  commit,
  createHistory,
  describeEdit,
  type History,
  redo,
  type Sheet,
  serializeSheet,
  undo,
} from '../../src/sheet'
import { anyEdit, type EditOf } from './arbitrary-edit'
import { anySheet } from './arbitrary-sheet'
import { deepFreeze, expectValid, unhurried } from './laws'
import { sheetOf } from './sheets'

/** The history after those edits that can be made, and the bytes of every sheet on the way. */
function make(
  sheet: Sheet,
  edits: readonly EditOf[],
): { history: History; bytes: readonly string[] } {
  let history = createHistory(deepFreeze(sheet))
  const bytes = [serializeSheet(sheet)]
  for (const editOf of edits) {
    const edit = editOf(history.sheet)
    if (edit === undefined) continue
    const result = apply(history.sheet, deepFreeze(edit))
    if (!result.ok || result.value === history.sheet) continue
    history = commit(history, deepFreeze(result.value), describeEdit(history.sheet, edit))
    bytes.push(serializeSheet(history.sheet))
  }
  return { history, bytes }
}

test(
  'any edits in any order leave a valid sheet; as many undos give the same bytes back, and redos likewise',
  unhurried,
  () => {
    fc.assert(
      fc.property(anySheet, fc.array(anyEdit, { maxLength: 12 }), (sheet, edits) => {
        const { history, bytes } = make(sheet, edits)
        expectValid(history.sheet)
        let moved = history
        for (const expected of bytes.slice(0, -1).reverse()) {
          moved = undo(moved)
          expect(serializeSheet(moved.sheet)).toBe(expected)
        }
        expect(moved.past).toEqual([])
        expect(moved.sheet).toBe(sheet)
        for (const expected of bytes.slice(1)) {
          moved = redo(moved)
          expect(serializeSheet(moved.sheet)).toBe(expected)
        }
        expect(moved).toEqual(history)
      }),
    )
  },
)

test('random edits are often made, and of every kind', unhurried, () => {
  const made = new Set<string>()
  for (const [sheet, edits] of fc.sample(fc.tuple(anySheet, fc.array(anyEdit)), {
    seed: 3,
    numRuns: 900,
  })) {
    for (const editOf of edits) {
      const edit = editOf(sheet)
      if (edit !== undefined && apply(sheet, edit).ok) made.add(edit.kind)
    }
  }
  expect([...made].sort()).toEqual([
    'add-element',
    'add-hazard',
    'add-phasor',
    'add-reading',
    'add-sum',
    'choose',
    'clear-hand',
    'count-element',
    'drag-tip',
    'duplicate-phasor',
    'group-branches',
    'move-phasor',
    'move-sum',
    'place-phasor',
    'remove-circuit',
    'remove-element',
    'remove-hand-arrow',
    'remove-hazard',
    'remove-phasor',
    'remove-reading',
    'remove-sum',
    'set-details',
    'set-drawing',
    'set-element',
    'set-element-value',
    'set-hand-arrow',
    'set-hazard',
    'set-job',
    'set-known',
    'set-phasor',
    'set-reading',
    'set-report',
    'set-sum',
    'set-value',
    'start-circuit',
  ])
})

test('a new step after an undo drops what was taken back', () => {
  const [first, second, third] = ['1', '2', '3'].map((title) => sheetOf({ title })) as [
    Sheet,
    Sheet,
    Sheet,
  ]
  const back = undo(commit(createHistory(first), second, 'Change the title'))
  expect(back.future[0]?.description).toBe('Change the title')
  const again = commit(back, third)
  expect(again.future).toEqual([])
  expect(redo(again)).toBe(again)
  expect(undo(again).sheet).toBe(first)
})

test('nothing to undo or redo, and the same sheet again, change nothing', () => {
  const history = createHistory(sheetOf({}))
  expect(undo(history)).toBe(history)
  expect(redo(history)).toBe(history)
  expect(commit(history, history.sheet)).toBe(history)
})

test('five hundred steps are kept, the latest ones', () => {
  let history = createHistory(sheetOf({ title: '0' }))
  for (let step = 1; step <= 510; step += 1) {
    history = commit(history, { ...history.sheet, title: String(step) })
  }
  expect(history.past).toHaveLength(500)
  for (let step = 0; step < 600; step += 1) history = undo(history)
  expect(history.sheet.title).toBe('10')
  expect(history.future).toHaveLength(500)
})
