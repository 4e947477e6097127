import { failure, type Result, success } from '../../core'
import type { Id, Sheet } from '../types'
import { type Change, withChange } from './change'

/** The lists that edits add to, take from and reorder. */
export type ListName = 'phasors' | 'readings' | 'instruments' | 'channels' | 'sums' | 'elements'

type Entry<Name extends ListName> = NonNullable<Sheet[Name]>[number]

const NAMES: { readonly [name in ListName]: string } = {
  phasors: 'phasor',
  readings: 'reading',
  instruments: 'instrument',
  channels: 'channel',
  sums: 'sum',
  elements: 'element',
}

/** The sheet with another list; an empty one is left out, but for that of the phasors. */
export function withList<Name extends ListName>(
  sheet: Sheet,
  name: Name,
  entries: readonly Entry<Name>[],
): Sheet {
  const list = name === 'phasors' ? entries : orNone(entries)
  return withChange<Sheet>(sheet, { [name]: list } as Change<Sheet>)
}

/** The list, or null where it is empty, so that a change leaves the field out. */
export function orNone<Item>(entries: readonly Item[]): readonly Item[] | null {
  return entries.length === 0 ? null : entries
}

/** The entry with that id. Fails where there is none. */
export function entryOf<Name extends ListName>(
  sheet: Sheet,
  name: Name,
  id: Id,
): Result<Entry<Name>> {
  const entries: readonly Entry<Name>[] = sheet[name] ?? []
  const entry = entries.find((other) => other.id === id)
  return entry === undefined
    ? failure(`There is no ${NAMES[name]} "${id}" on this sheet.`)
    : success(entry)
}

/** The sheet with entries put in before index `at`; omitted: at the end. */
export function withAdded<Name extends ListName>(
  sheet: Sheet,
  name: Name,
  added: readonly Entry<Name>[],
  at?: number,
): Sheet {
  const entries: readonly Entry<Name>[] = sheet[name] ?? []
  return withList(sheet, name, entries.toSpliced(at ?? entries.length, 0, ...added))
}

/** The sheet with one entry replaced by the one of the same id. */
export function withReplaced<Name extends ListName>(
  sheet: Sheet,
  name: Name,
  entry: Entry<Name>,
): Sheet {
  const entries: readonly Entry<Name>[] = sheet[name] ?? []
  return withList(
    sheet,
    name,
    entries.map((other) => (other.id === entry.id ? entry : other)),
  )
}

/** The sheet with one entry moved to index `to`, counted in the list without it. */
export function withMoved<Name extends ListName>(
  sheet: Sheet,
  name: Name,
  id: Id,
  to: number,
): Result<Sheet> {
  const found = entryOf(sheet, name, id)
  if (!found.ok) return found
  const others = (sheet[name] ?? []).filter((entry) => entry.id !== id) as Entry<Name>[]
  const place = Math.min(Math.max(Math.trunc(to), 0), others.length)
  return success(withList(sheet, name, others.toSpliced(place, 0, found.value)))
}
