import { failure, type Result, success } from '../core'
import { toCanonical } from './canonical'
import { type AddElement, addElement } from './edits/add-element'
import {
  type AddChannel,
  addChannel,
  type RemoveChannel,
  removeChannel,
  type SetChannel,
  setChannel,
} from './edits/channels'
import { type Choose, choose } from './edits/choose'
import { type ClearLimits, clearLimits } from './edits/clear-limits'
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
import { type GroupBranches, groupBranches } from './edits/group-branches'
import {
  type ClearHand,
  clearHand,
  type RemoveHandArrow,
  removeHandArrow,
  type SetHandArrow,
  setHandArrow,
} from './edits/hand'
import {
  type AddInstrument,
  addInstrument,
  type RemoveInstrument,
  removeInstrument,
  type SetInstrument,
  setInstrument,
} from './edits/instruments'
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
import {
  type RemoveCircuit,
  type RemoveElement,
  removeCircuit,
  removeElement,
} from './edits/remove-element'
import { type RemovePhasor, removePhasor } from './edits/remove-phasor'
import {
  type AddHazard,
  addHazard,
  type RemoveHazard,
  removeHazard,
  type SetHazard,
  type SetReport,
  setHazard,
  setReport,
} from './edits/report'
import { type ReversePhasor, reversePhasor } from './edits/reverse-phasor'
import {
  type CountElement,
  countElement,
  type SetElement,
  type SetElementValue,
  setElement,
  setElementValue,
} from './edits/set-element'
import { type SetKnown, setKnown } from './edits/set-known'
import { type SetPhasor, setPhasor } from './edits/set-phasor'
import { type SetValue, setValue } from './edits/set-value'
import { type StartCircuit, startCircuit } from './edits/start-circuit'
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
import { withVoidedSignatures } from './signatures'
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
  readonly 'reverse-phasor': ReversePhasor
  readonly 'set-phasor': SetPhasor
  readonly 'set-value': SetValue
  readonly 'clear-limits': ClearLimits
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
  readonly 'add-instrument': AddInstrument
  readonly 'remove-instrument': RemoveInstrument
  readonly 'set-instrument': SetInstrument
  readonly 'add-channel': AddChannel
  readonly 'remove-channel': RemoveChannel
  readonly 'set-channel': SetChannel
  readonly 'set-hand-arrow': SetHandArrow
  readonly 'remove-hand-arrow': RemoveHandArrow
  readonly 'clear-hand': ClearHand
  readonly 'start-circuit': StartCircuit
  readonly 'remove-circuit': RemoveCircuit
  readonly 'add-element': AddElement
  readonly 'group-branches': GroupBranches
  readonly 'remove-element': RemoveElement
  readonly 'set-element': SetElement
  readonly 'set-element-value': SetElementValue
  readonly 'count-element': CountElement
  readonly 'set-report': SetReport
  readonly 'add-hazard': AddHazard
  readonly 'set-hazard': SetHazard
  readonly 'remove-hazard': RemoveHazard
  readonly choose: Choose
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
    // Where the drawing is pinned together with an edit, the edit is what was done.
    const told = edits.filter(({ kind }) => kind !== 'set-drawing')
    const [first, ...others] = told.length > 0 ? told : edits
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
  'reverse-phasor': reversePhasor,
  'set-phasor': setPhasor,
  'set-value': setValue,
  'clear-limits': clearLimits,
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
  'add-instrument': addInstrument,
  'remove-instrument': removeInstrument,
  'set-instrument': setInstrument,
  'add-channel': addChannel,
  'remove-channel': removeChannel,
  'set-channel': setChannel,
  'set-hand-arrow': setHandArrow,
  'remove-hand-arrow': removeHandArrow,
  'clear-hand': clearHand,
  'start-circuit': startCircuit,
  'remove-circuit': removeCircuit,
  'add-element': addElement,
  'group-branches': groupBranches,
  'remove-element': removeElement,
  'set-element': setElement,
  'set-element-value': setElementValue,
  'count-element': countElement,
  'set-report': setReport,
  'add-hazard': addHazard,
  'set-hazard': setHazard,
  'remove-hazard': removeHazard,
  choose,
  several,
}

/**
 * The sheet after an edit, or one plain sentence that says why it cannot be made. The given sheet is
 * never changed; what an edit does not touch is shared with it. Signatures that stood for what the edit
 * changes are voided with it, and the revision is raised. Throws only for an edit whose kind
 * does not exist, which no user can cause.
 */
export function apply(sheet: Sheet, edit: Edit): Result<Sheet> {
  const made = applyUnchecked(sheet, toCanonical(edit))
  if (!made.ok) return made
  const changed = withVoidedSignatures(sheet, made.value)
  const [error] = isLight(edit) ? [] : findErrors(changed)
  return error === undefined ? success(changed) : failure(error.message)
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
