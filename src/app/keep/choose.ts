import { type Sheet, serializeSheet } from '../../sheet'
import { markOf } from './mark'
import type { KeptSheet } from './record'

/** Which sheet is to be shown for a link, or for none. */
export type Choice =
  | { readonly kind: 'kept'; readonly record: KeptSheet; readonly isStale: boolean }
  | { readonly kind: 'foreign'; readonly sheet: Sheet }
  | { readonly kind: 'none' }

/**
 * Settles what a sheet from a link is. A state that a kept sheet has had is that sheet's own link, and
 * the sheet as kept, which may be newer (the link is then stale), is what counts; anything else is
 * someone else's. `sheets` are the kept ones, the latest change first; of several with that state the
 * tab's last one is meant.
 */
export function chooseLinked(
  sheet: Sheet,
  sheets: readonly KeptSheet[],
  last: string | undefined,
): Choice {
  const mark = markOf(serializeSheet(sheet))
  const own = sheets.filter(({ marks }) => marks.includes(mark))
  const record = own.find(({ id }) => id === last) ?? own[0]
  if (record === undefined) return { kind: 'foreign', sheet }
  return { kind: 'kept', record, isStale: record.marks.at(-1) !== mark }
}

/** What to show where the address holds no link: the tab's last sheet, else the last one changed. */
export function chooseLast(sheets: readonly KeptSheet[], last: string | undefined): Choice {
  const record = sheets.find(({ id }) => id === last) ?? sheets[0]
  return record === undefined ? { kind: 'none' } : { kind: 'kept', record, isStale: false }
}
