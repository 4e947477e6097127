import type { SheetError } from '../sheet-result'
import type { Id, Sheet } from '../types'

/** The lists of a sheet whose entries have an `Id`. */
export const NAMED_LISTS = [
  'phasors',
  'readings',
  'instruments',
  'channels',
  'sums',
  'elements',
  'threePhase',
  'hand',
] as const

/** Every id of a sheet, whatever it names. */
export function idsOf(sheet: Sheet): Set<Id> {
  return new Set(NAMED_LISTS.flatMap((list) => (sheet[list] ?? []).map((part) => part.id)))
}

/** Finds ids that name two parts of a sheet. */
export function* checkIds(sheet: Sheet): Generator<SheetError> {
  const seen = new Map<Id, string>()
  for (const list of NAMED_LISTS) {
    for (const [index, { id }] of (sheet[list] ?? []).entries()) {
      const path = `${list}[${index}]`
      const earlier = seen.get(id)
      if (earlier === undefined) seen.set(id, path)
      else yield { path: `${path}.id`, message: `The id "${id}" is taken already, by ${earlier}.` }
    }
  }
}
