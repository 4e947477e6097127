import { parseSheetText, type Sheet } from '../../sheet'
import { createIdentity, type Store } from '../store'
import type { Keeping } from './browser'
import { chooseLinked } from './choose'
import { staleNotice } from './first'
import type { KeptSheet } from './record'

/** Opens a kept sheet. False where its text cannot be read; the notice then says so. */
export function openKept(store: Store, { keeper }: Keeping, record: KeptSheet): boolean {
  const { id, text, title, copy } = record
  const result = parseSheetText(text)
  if (!result.ok) {
    store.getState().notify({
      tone: 'problem',
      text: `“${title}” was not opened: ${result.errors[0]?.message ?? 'it is no sheet.'} It was left as it is.`,
    })
    return false
  }
  if (store.getState().identity.id === id) return true
  store.getState().open(result.sheet, 'kept', undefined, { id, ...(copy && { copy }) })
  keeper.follow(record)
  return true
}

/**
 * Opens what a link brought: one's own sheet in its newest kept state, anyone else's as a copy that
 * replaces nothing.
 */
export async function openLinked(store: Store, keeping: Keeping, sheet: Sheet): Promise<void> {
  const { id } = store.getState().identity
  const choice = await keeping.storage.read().then(
    ({ sheets }) => chooseLinked(sheet, sheets, id),
    () => ({ kind: 'foreign', sheet }) as const,
  )
  if (choice.kind === 'kept' && openKept(store, keeping, choice.record)) {
    if (choice.isStale) store.getState().notify(staleNotice(store, sheet))
    return
  }
  const copy = { of: sheet.title, why: 'link' } as const
  store.getState().open(sheet, 'link', undefined, createIdentity(copy))
}

/**
 * Opens what a file held as a sheet of its own, which is kept at once; where just this state is kept
 * already, that sheet is opened.
 */
export async function openFiled(store: Store, keeping: Keeping, sheet: Sheet): Promise<void> {
  const { id } = store.getState().identity
  const choice = await keeping.storage.read().then(
    ({ sheets }) => chooseLinked(sheet, sheets, id),
    () => undefined,
  )
  const isKept = choice?.kind === 'kept' && !choice.isStale
  if (isKept && openKept(store, keeping, choice.record)) return
  store.getState().open(sheet, 'file')
}
