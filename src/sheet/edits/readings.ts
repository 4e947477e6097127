import { success } from '../../core'
import { labelOf } from '../names'
import type { Id, Reading, Sheet } from '../types'
import { type Change, withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, orNone, withAdded, withReplaced } from './lists'

/** Adds a reading after the others. */
export interface AddReading {
  readonly kind: 'add-reading'
  readonly reading: Reading
}

/** Removes a reading. */
export interface RemoveReading {
  readonly kind: 'remove-reading'
  readonly id: Id
}

/** Changes a reading; null takes a field away. */
export interface SetReading {
  readonly kind: 'set-reading'
  readonly id: Id
  readonly change: Omit<Change<Reading>, 'id'>
}

/** Adds a reading. */
export const addReading: EditKind<AddReading> = {
  apply: (sheet, { reading }) => success(withAdded(sheet, 'readings', [reading])),
  describe: (sheet, { reading }) => `Add a reading of ${labelOf(sheet, reading.of)}`,
}

/** Removes a reading. */
export const removeReading: EditKind<RemoveReading> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'readings', id)
    return found.ok ? success(withoutReadings(sheet, new Set([id]))) : found
  },
  describe: (sheet, { id }) => `Delete the reading of ${labelOf(sheet, readOf(sheet, id))}`,
}

/** Changes a reading. */
export const setReading: EditKind<SetReading> = {
  apply: (sheet, { id, change }) => {
    const found = entryOf(sheet, 'readings', id)
    if (!found.ok) return found
    return success(withReplaced(sheet, 'readings', withChange<Reading>(found.value, change)))
  },
  describe: (sheet, { id, change }) => {
    const verb = change.struck === true ? 'Strike' : 'Change'
    return `${verb} the reading of ${labelOf(sheet, readOf(sheet, id))}`
  },
}

/** The sheet without some readings. */
export function withoutReadings(sheet: Sheet, ids: ReadonlySet<Id>): Sheet {
  const left = (sheet.readings ?? []).filter((reading) => !ids.has(reading.id))
  return withChange<Sheet>(sheet, { readings: orNone(left) })
}

function readOf(sheet: Sheet, id: Id): Id {
  return (sheet.readings ?? []).find((reading) => reading.id === id)?.of ?? id
}
