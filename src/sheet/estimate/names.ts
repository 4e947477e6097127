import type { CircuitElement, Id, Phasor, PhasorId, Sheet } from '../types'

/** The place of each phasor and element of a sheet in the estimator's problem. */
export interface Names {
  readonly sheet: Sheet
  readonly phasor: ReadonlyMap<PhasorId, number>
  readonly element: ReadonlyMap<Id, number>
  readonly phasors: readonly Phasor[]
  readonly elements: readonly CircuitElement[]
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
  return { sheet, phasor, element: placeById(elements), phasors: sheet.phasors, elements }
}
