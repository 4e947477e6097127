import type { Channel, CircuitElement, Id, Instrument, Phasor, PhasorId, Sheet } from '../types'

/** What a sheet names, by its id, and the place of each phasor and element in the estimator's problem. */
export interface Names {
  readonly sheet: Sheet
  readonly phasor: ReadonlyMap<PhasorId, number>
  readonly element: ReadonlyMap<Id, number>
  readonly phasors: readonly Phasor[]
  readonly elements: readonly CircuitElement[]
  readonly instruments: ReadonlyMap<Id, Instrument>
  readonly channels: ReadonlyMap<Id, Channel>
}

function byId<Part extends { readonly id: Id }>(parts: readonly Part[] = []): Map<Id, Part> {
  return new Map(parts.map((part) => [part.id, part]))
}

function placeById(parts: readonly { readonly id: Id }[]): Map<Id, number> {
  return new Map(parts.map(({ id }, place) => [id, place]))
}

/** The names of a sheet. Elements on phasors that are not there are left out. */
export function namesOf(sheet: Sheet): Names {
  const phasor = placeById(sheet.phasors)
  const elements = (sheet.elements ?? []).filter(
    ({ voltage, current }) => phasor.has(voltage) && phasor.has(current),
  )
  return {
    sheet,
    phasor,
    element: placeById(elements),
    phasors: sheet.phasors,
    elements,
    instruments: byId(sheet.instruments),
    channels: byId(sheet.channels),
  }
}
