import type { Channel, Id, Instrument, Phasor, PhasorId, Sheet } from './types'

/** The parts of a sheet that readings name, by id. */
export interface SheetIndex {
  readonly phasors: ReadonlyMap<PhasorId, Phasor>
  readonly instruments: ReadonlyMap<Id, Instrument>
  readonly channels: ReadonlyMap<Id, Channel>
}

const indexes = new WeakMap<Sheet, SheetIndex>()

/** The index of a sheet, made once for each: a sheet never changes. */
export function indexOf(sheet: Sheet): SheetIndex {
  const known = indexes.get(sheet)
  if (known !== undefined) return known
  const index = {
    phasors: byId(sheet.phasors),
    instruments: byId(sheet.instruments),
    channels: byId(sheet.channels),
  }
  indexes.set(sheet, index)
  return index
}

function byId<Part extends { readonly id: Id }>(
  parts: readonly Part[] = [],
): ReadonlyMap<Id, Part> {
  return new Map(parts.map((part) => [part.id, part]))
}
