import { apply, parseSheetText, type Sheet } from '../../sheet'
import { createName, type Store } from '../store'
import type { Keeping } from './browser'
import type { BrokenRecord, KeptSheet } from './record'

/** Whether every word of a search stands in what is known of a sheet; case does not matter. */
export function isFound({ words }: KeptSheet, search: string): boolean {
  const text = words.toLocaleLowerCase()
  return search
    .toLocaleLowerCase()
    .split(/\s+/)
    .every((word) => text.includes(word))
}

/** Gives a kept sheet another title: as an edit where it is open, else beside what is open. */
export async function renameKept(
  store: Store,
  { keeper }: Keeping,
  record: KeptSheet,
  title: string,
): Promise<void> {
  const edit = { kind: 'set-details', title } as const
  if (store.getState().identity.id === record.id) {
    store.getState().edit(edit)
    await keeper.settled()
    return
  }
  const sheet = maybeSheet(record)
  const changed = sheet && apply(sheet, edit)
  if (changed?.ok) await keeper.keepAside(record.id, changed.value, record.revision, record.copy)
}

/** Keeps a second sheet like this one, whose title says so. */
export async function duplicateKept({ keeper }: Keeping, record: KeptSheet): Promise<void> {
  const sheet = maybeSheet(record)
  if (!sheet) return
  const title = `${sheet.title || 'Untitled sheet'} (copy)`
  await keeper.keepAside(createName(), { ...sheet, title }, 0)
}

/** The sheet of a record; undefined where its text cannot be read. */
export function maybeSheet({ text }: KeptSheet): Sheet | undefined {
  const result = parseSheetText(text)
  return result.ok ? result.sheet : undefined
}

/** Whatever there is of a record that cannot be read, as text to be saved. */
export function textOfBroken({ content }: BrokenRecord): string {
  const text = (content as { text?: unknown } | null | undefined)?.text
  if (typeof text === 'string') return text
  return JSON.stringify(content, null, 2) ?? String(content)
}

/** When a sheet was changed, as it is read in a list. */
export function formatSaved(milliseconds: number): string {
  const date = new Date(milliseconds)
  return Number.isNaN(date.getTime())
    ? 'date unknown'
    : date.toLocaleString('en-GB', { dateStyle: 'medium', timeStyle: 'short' })
}
