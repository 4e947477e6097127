import { type Sheet, serializeSheet } from '../../sheet'
import type { Copy } from '../store'
import { markOf } from './mark'
import { isCopy, type KeptSheet } from './record'

/** A change on its way into the store: the whole sheet, and what it was made upon. */
export interface Entry {
  readonly id: string
  /** The revision that the change was made upon; 0 where the sheet was not kept yet. */
  readonly base: number
  /** The page that made it, and how many changes that page had made by then. */
  readonly page: string
  readonly count: number
  readonly title: string
  readonly words: string
  readonly text: string
  readonly copy?: Copy
}

/** What is known of a change beside its sheet. */
export type EntryDetails = Pick<Entry, 'id' | 'base' | 'page' | 'count' | 'copy'>

/** The change that brings a sheet to this state. */
export function createEntry(sheet: Sheet, details: EntryDetails): Entry {
  return {
    ...details,
    title: sheet.title,
    words: [sheet.title, ...Object.values(sheet.job ?? {})].join(' '),
    text: serializeSheet(sheet),
  }
}

/** Reads a change from the text that `JSON.stringify` made of it; undefined where it is none. */
export function parseEntry(text: string): Entry | undefined {
  try {
    const entry: Partial<Record<keyof Entry, unknown>> = JSON.parse(text)
    const isEntry =
      [entry.id, entry.page, entry.title, entry.words, entry.text].every(
        (part) => typeof part === 'string',
      ) &&
      [entry.base, entry.count].every(Number.isSafeInteger) &&
      (entry.copy === undefined || isCopy(entry.copy))
    return isEntry ? (entry as Entry) : undefined
  } catch {
    return undefined
  }
}

/**
 * What becomes of a change. It is written where it was made upon what is kept, or follows the same
 * page's last change; it is included where the store has that change, or a later one of its page,
 * already; it is in conflict where another page has changed the sheet in the meantime.
 */
export function judge(
  kept: KeptSheet | undefined,
  entry: Entry,
): 'write' | 'included' | 'conflict' {
  if (kept === undefined) return 'write'
  if ((kept.seen[entry.page] ?? 0) >= entry.count) return 'included'
  return kept.revision === entry.base || kept.writer === entry.page ? 'write' : 'conflict'
}

const mostMarks = 400
const mostPages = 16

/** What is kept of a sheet after a change; `touched` and `saved` as in `KeptSheet`. */
export function createRecord(
  kept: KeptSheet | undefined,
  entry: Entry,
  { touched, saved }: Pick<KeptSheet, 'touched' | 'saved'>,
): KeptSheet {
  const { id, page, count, title, words, text, copy } = entry
  const mark = markOf(text)
  const { [page]: _, ...others } = kept?.seen ?? {}
  const marks = (kept?.marks ?? []).filter((each) => each !== mark)
  return {
    id,
    revision: Math.max(kept?.revision ?? 0, entry.base) + 1,
    writer: page,
    seen: Object.fromEntries([...Object.entries(others).slice(1 - mostPages), [page, count]]),
    touched,
    saved,
    title,
    words,
    text,
    marks: [...marks.slice(1 - mostMarks), mark],
    ...(copy && { copy }),
  }
}

/** The change as a sheet of its own, beside the one that it cannot be written to. */
export function toCopy(entry: Entry): Entry {
  return {
    ...entry,
    // Whoever sets this change aside, its own page or a later one, makes the same copy.
    id: markOf(`${entry.id} ${entry.page} ${entry.count}`),
    base: 0,
    copy: { of: entry.title, why: 'tabs' },
  }
}
