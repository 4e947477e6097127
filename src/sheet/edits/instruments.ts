import { success } from '../../core'
import type { Id, Instrument, Sheet } from '../types'
import { type Change, withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, orNone, withAdded, withReplaced } from './lists'

/** Adds an instrument after the others. */
export interface AddInstrument {
  readonly kind: 'add-instrument'
  readonly instrument: Instrument
}

/** Changes an instrument; null takes a field away. */
export interface SetInstrument {
  readonly kind: 'set-instrument'
  readonly id: Id
  readonly change: Omit<Change<Instrument>, 'id' | 'name'> & { readonly name?: string }
}

/** Removes an instrument; what it showed stays, without saying what showed it. */
export interface RemoveInstrument {
  readonly kind: 'remove-instrument'
  readonly id: Id
}

/** Adds an instrument. */
export const addInstrument: EditKind<AddInstrument> = {
  apply: (sheet, { instrument }) => success(withAdded(sheet, 'instruments', [instrument])),
  describe: (_, { instrument }) => `Add the instrument ${instrument.name}`,
}

/** Changes an instrument. */
export const setInstrument: EditKind<SetInstrument> = {
  apply: (sheet, { id, change }) => {
    const found = entryOf(sheet, 'instruments', id)
    if (!found.ok) return found
    return success(withReplaced(sheet, 'instruments', withChange<Instrument>(found.value, change)))
  },
  describe: (sheet, { id }) => `Change the instrument ${nameOfInstrument(sheet, id)}`,
}

/** Removes an instrument. */
export const removeInstrument: EditKind<RemoveInstrument> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'instruments', id)
    if (!found.ok) return found
    const left = (sheet.instruments ?? []).filter((instrument) => instrument.id !== id)
    const readings = (sheet.readings ?? []).map((reading) =>
      reading.instrument === id ? withChange(reading, { instrument: null }) : reading,
    )
    return success(
      withChange<Sheet>(sheet, { instruments: orNone(left), readings: orNone(readings) }),
    )
  },
  describe: (sheet, { id }) => `Delete the instrument ${nameOfInstrument(sheet, id)}`,
}

/** How an instrument is called in a sentence: its name, or its id where there is no such instrument. */
export function nameOfInstrument(sheet: Sheet, id: Id): string {
  return (sheet.instruments ?? []).find((instrument) => instrument.id === id)?.name || id
}
