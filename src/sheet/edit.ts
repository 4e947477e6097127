import { failure, type Result, success } from '../core'
import { toCanonical } from './canonical'
import {
  type SetDetails,
  type SetDrawing,
  type SetJob,
  setDetails,
  setDrawing,
  setJob,
} from './edits/details'
import { type DragTip, dragTip } from './edits/drag-tip'
import type { EditKind } from './edits/edit-kind'
import {
  type AddPhasor,
  type AddRows,
  addPhasor,
  addRows,
  type DuplicatePhasor,
  duplicatePhasor,
  type MovePhasor,
  movePhasor,
} from './edits/phasors'
import { type PlacePhasor, placePhasor } from './edits/place-phasor'
import {
  type AddReading,
  addReading,
  type RemoveReading,
  removeReading,
  type SetReading,
  setReading,
} from './edits/readings'
import { type RemovePhasor, removePhasor } from './edits/remove-phasor'
import { type SetKnown, setKnown } from './edits/set-known'
import { type SetPhasor, setPhasor } from './edits/set-phasor'
import { type SetValue, setValue } from './edits/set-value'
import {
  type AddSum,
  addSum,
  type MoveSum,
  moveSum,
  type RemoveSum,
  removeSum,
  type SetSum,
  setSum,
} from './edits/sums'
import { findErrors } from './parse-sheet'
import type { Sheet } from './types'

/** Several edits as one step: all of them, or none where one fails. */
export interface Several {
  readonly kind: 'several'
  readonly edits: readonly Edit[]
}

interface EditByKind {
  readonly 'set-details': SetDetails
  readonly 'set-job': SetJob
  readonly 'set-drawing': SetDrawing
  readonly 'add-phasor': AddPhasor
  readonly 'remove-phasor': RemovePhasor
  readonly 'duplicate-phasor': DuplicatePhasor
  readonly 'move-phasor': MovePhasor
  readonly 'set-phasor': SetPhasor
  readonly 'set-value': SetValue
  readonly 'set-known': SetKnown
  readonly 'drag-tip': DragTip
  readonly 'place-phasor': PlacePhasor
  readonly 'add-sum': AddSum
  readonly 'remove-sum': RemoveSum
  readonly 'set-sum': SetSum
  readonly 'move-sum': MoveSum
  readonly 'add-reading': AddReading
  readonly 'remove-reading': RemoveReading
  readonly 'set-reading': SetReading
  readonly 'add-rows': AddRows
  readonly several: Several
}

/** A change to a sheet as a plain value: it can be written as JSON and read back. */
export type Edit = EditByKind[keyof EditByKind]

const several: EditKind<Several> = {
  apply: (sheet, { edits }) => {
    let changed: Result<Sheet> = success(sheet)
    for (const edit of edits) {
      if (!changed.ok) return changed
      changed = applyUnchecked(changed.value, edit)
    }
    return changed
  },
  describe: (sheet, { edits }) => {
    const [first, ...others] = edits
    if (first === undefined) return 'Change nothing'
    const description = describeEdit(sheet, first)
    return others.length === 0 ? description : `${description}, and ${others.length} more`
  },
}

const KINDS: { readonly [kind in keyof EditByKind]: EditKind<EditByKind[kind]> } = {
  'set-details': setDetails,
  'set-job': setJob,
  'set-drawing': setDrawing,
  'add-phasor': addPhasor,
  'remove-phasor': removePhasor,
  'duplicate-phasor': duplicatePhasor,
  'move-phasor': movePhasor,
  'set-phasor': setPhasor,
  'set-value': setValue,
  'set-known': setKnown,
  'drag-tip': dragTip,
  'place-phasor': placePhasor,
  'add-sum': addSum,
  'remove-sum': removeSum,
  'set-sum': setSum,
  'move-sum': moveSum,
  'add-reading': addReading,
  'remove-reading': removeReading,
  'set-reading': setReading,
  'add-rows': addRows,
  several,
}

/**
 * The sheet after an edit, or one plain sentence that says why it cannot be made. The given sheet is
 * never changed; what an edit does not touch is shared with it. Throws only for an edit whose kind
 * does not exist, which no user can cause.
 */
export function apply(sheet: Sheet, edit: Edit): Result<Sheet> {
  const changed = applyUnchecked(sheet, toCanonical(edit))
  if (!changed.ok || isLight(edit)) return changed
  const [error] = findErrors(changed.value)
  return error === undefined ? changed : failure(error.message)
}

/** A few words for an edit of this sheet, as in "Undo: Change the angle of Vcoil". */
export function describeEdit(sheet: Sheet, edit: Edit): string {
  return wordsFor(sheet, edit)
}

function applyUnchecked<Kind extends keyof EditByKind>(
  sheet: Sheet,
  edit: EditByKind[Kind] & { readonly kind: Kind },
): Result<Sheet> {
  return kindOf<Kind>(edit.kind).apply(sheet, edit)
}

function wordsFor<Kind extends keyof EditByKind>(
  sheet: Sheet,
  edit: EditByKind[Kind] & { readonly kind: Kind },
): string {
  return kindOf<Kind>(edit.kind).describe(sheet, edit)
}

function isLight(edit: Edit): boolean {
  return edit.kind === 'several' ? edit.edits.every(isLight) : kindOf(edit.kind).isLight === true
}

function kindOf<Kind extends keyof EditByKind>(kind: Kind): EditKind<EditByKind[Kind]> {
  if (!Object.hasOwn(KINDS, kind)) throw new TypeError(`There is no edit of the kind "${kind}".`)
  return KINDS[kind]
}
