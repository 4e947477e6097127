import { success } from '../../core'
import { nameOfSum } from '../names'
import type { Id, Sheet, Sum } from '../types'
import { type Change, withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, orNone, withAdded, withMoved, withReplaced } from './lists'

/** Adds a sum after the others. */
export interface AddSum {
  readonly kind: 'add-sum'
  readonly sum: Sum
}

/** Removes a sum, and the hand arrows that were drawn for it. */
export interface RemoveSum {
  readonly kind: 'remove-sum'
  readonly id: Id
}

/** Changes a sum; null takes a field away. */
export interface SetSum {
  readonly kind: 'set-sum'
  readonly id: Id
  readonly change: Change<Pick<Sum, 'label' | 'equals' | 'arrangement' | 'start'>> & {
    readonly terms?: Sum['terms']
  }
}

/** Moves a sum in the list to the index `to`, counted in the list without it. */
export interface MoveSum {
  readonly kind: 'move-sum'
  readonly id: Id
  readonly to: number
}

/** Adds a sum. */
export const addSum: EditKind<AddSum> = {
  apply: (sheet, { sum }) => success(withAdded(sheet, 'sums', [sum])),
  describe: (sheet, { sum }) => `Add the sum ${nameOfSum({ ...sheet, sums: [sum] }, sum.id)}`,
}

/** Removes a sum. */
export const removeSum: EditKind<RemoveSum> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'sums', id)
    return found.ok ? success(withoutSums(sheet, new Set([id]))) : found
  },
  describe: (sheet, { id }) => `Delete the sum ${nameOfSum(sheet, id)}`,
}

/** Changes a sum. */
export const setSum: EditKind<SetSum> = {
  apply: (sheet, { id, change }) => {
    const found = entryOf(sheet, 'sums', id)
    if (!found.ok) return found
    return success(withReplaced(sheet, 'sums', withChange<Sum>(found.value, change)))
  },
  describe: (sheet, { id }) => `Change the sum ${nameOfSum(sheet, id)}`,
}

/** Moves a sum in the list. */
export const moveSum: EditKind<MoveSum> = {
  apply: (sheet, { id, to }) => withMoved(sheet, 'sums', id, to),
  describe: (sheet, { id }) => `Move the sum ${nameOfSum(sheet, id)} in the list`,
}

/** The sheet without some sums and without the hand arrows that were drawn for them. */
export function withoutSums(sheet: Sheet, ids: ReadonlySet<Id>): Sheet {
  if (ids.size === 0) return sheet
  return withChange<Sheet>(sheet, {
    sums: orNone((sheet.sums ?? []).filter((sum) => !ids.has(sum.id))),
    hand: orNone((sheet.hand ?? []).filter(({ sum }) => sum === undefined || !ids.has(sum))),
  })
}
