import type { Sheet } from './types'

/** A sheet that can be gone back to, and what was done to it next. */
export interface Step {
  readonly sheet: Sheet
  /** As `describeEdit` says it; empty where nobody said. */
  readonly description: string
}

/** The sheet as it is, with the steps that led to it and those that were taken back. */
export interface History {
  /** The oldest first. The last one's description says what undo takes back. */
  readonly past: readonly Step[]
  readonly sheet: Sheet
  /** The next first. The first one's description says what redo does again. */
  readonly future: readonly Step[]
}

/** The most steps that can be taken back. */
const MOST_STEPS = 500

/** A history that begins with this sheet. */
export function createHistory(sheet: Sheet): History {
  return { past: [], sheet, future: [] }
}

/** The history after a step to another sheet. What was taken back before is gone; the same sheet is no step. */
export function commit(history: History, sheet: Sheet, description = ''): History {
  if (sheet === history.sheet) return history
  const past = [...history.past.slice(1 - MOST_STEPS), { sheet: history.sheet, description }]
  return { past, sheet, future: [] }
}

/** The history one step back; itself where there is none. */
export function undo(history: History): History {
  const last = history.past.at(-1)
  if (last === undefined) return history
  const { sheet, description } = last
  return {
    past: history.past.slice(0, -1),
    sheet,
    future: [{ sheet: history.sheet, description }, ...history.future],
  }
}

/** The history one step forward again; itself where nothing was taken back. */
export function redo(history: History): History {
  const [next, ...future] = history.future
  if (next === undefined) return history
  const { sheet, description } = next
  return { past: [...history.past, { sheet: history.sheet, description }], sheet, future }
}
