import { success } from '../../core'
import { idsOf } from '../checks/ids'
import { labelOf, nameOfSum } from '../names'
import { newIdBeside } from '../new-id'
import type { Id, Phasor, PhasorId, Reading, Sheet } from '../types'
import type { EditKind } from './edit-kind'
import { entryOf, withAdded, withMoved, withReplaced } from './lists'

/** Adds a phasor, at an index (omitted: the last), and as the last term of a sum where one is named. */
export interface AddPhasor {
  readonly kind: 'add-phasor'
  readonly phasor: Phasor
  readonly at?: number
  readonly term?: { readonly sum: Id; readonly sign?: 1 | -1 }
}

/** Adds a copy of a phasor below it, with copies of the readings of it that are in use. */
export interface DuplicatePhasor {
  readonly kind: 'duplicate-phasor'
  readonly id: PhasorId
  readonly as: PhasorId
}

/** Moves a phasor in the list to the index `to`, counted in the list without it. */
export interface MovePhasor {
  readonly kind: 'move-phasor'
  readonly id: PhasorId
  readonly to: number
}

/** Adds rows from a spreadsheet: phasors, and the readings of those that were read. */
export interface AddRows {
  readonly kind: 'add-rows'
  readonly phasors: readonly Phasor[]
  readonly readings: readonly Reading[]
}

/** Adds a phasor. */
export const addPhasor: EditKind<AddPhasor> = {
  apply: (sheet, { phasor, at, term }) => {
    const added = withAdded(sheet, 'phasors', [phasor], at)
    if (term === undefined) return success(added)
    const found = entryOf(sheet, 'sums', term.sum)
    if (!found.ok) return found
    const sign = term.sign === undefined ? {} : { sign: term.sign }
    const terms = [...found.value.terms, { phasor: phasor.id, ...sign }]
    return success(withReplaced(added, 'sums', { ...found.value, terms }))
  },
  describe: (sheet, { phasor, term }) =>
    term === undefined
      ? `Add ${phasor.label}`
      : `Add ${phasor.label} to the sum ${nameOfSum(sheet, term.sum)}`,
}

/** Adds a copy of a phasor. */
export const duplicatePhasor: EditKind<DuplicatePhasor> = {
  apply: (sheet, { id, as }) => {
    const found = entryOf(sheet, 'phasors', id)
    if (!found.ok) return found
    const at = sheet.phasors.indexOf(found.value) + 1
    const copy = { ...withTailAside(found.value), id: as }
    const added = withAdded(sheet, 'phasors', [copy], at)
    return success(withAdded(added, 'readings', copiesOfReadings(added, id, as)))
  },
  describe: (sheet, { id }) => `Duplicate ${labelOf(sheet, id)}`,
}

/** How far a copy lies from what was copied, in millimetres to the right and down. */
const ASIDE = 5

function withTailAside(phasor: Phasor): Phasor {
  const { tail } = phasor
  if (tail === undefined || 'tipOf' in tail) return phasor
  return { ...phasor, tail: { ...tail, x: tail.x + ASIDE, y: tail.y - ASIDE } }
}

function copiesOfReadings(sheet: Sheet, id: PhasorId, as: PhasorId): readonly Reading[] {
  const taken = idsOf(sheet)
  return (sheet.readings ?? [])
    .filter((reading) => reading.of === id && !reading.struck)
    .map((reading) => {
      const copy = { ...reading, id: newIdBeside(taken, reading.id), of: as }
      taken.add(copy.id)
      return copy
    })
}

/** Moves a phasor in the list. */
export const movePhasor: EditKind<MovePhasor> = {
  apply: (sheet, { id, to }) => withMoved(sheet, 'phasors', id, to),
  describe: (sheet, { id }) => `Move ${labelOf(sheet, id)} in the list`,
}

/** Adds rows from a spreadsheet. */
export const addRows: EditKind<AddRows> = {
  apply: (sheet, { phasors, readings }) =>
    success(withAdded(withAdded(sheet, 'phasors', phasors), 'readings', readings)),
  describe: (_, { phasors }) =>
    phasors.length === 1 ? 'Paste 1 row' : `Paste ${phasors.length} rows`,
}
