import { exampleSheet, parseLink, parseSheetText, type Sheet, type SheetResult } from '../../sheet'
import { createIdentity, createStore, type Notice, type Store } from '../store'
import { type Choice, chooseLast, chooseLinked } from './choose'
import type { KeptSheet } from './record'
import type { Recovered } from './recover'

/** What is known when the page opens. */
export interface Beginning {
  /** The fragment of the address; empty where there is none. */
  readonly hash: string
  /** The kept sheets, the latest change first. */
  readonly sheets: readonly KeptSheet[]
  /** The sheet that this tab had open last. */
  readonly last: string | undefined
  readonly recovered: Recovered
}

/** The page's store as it opens, and what is kept of the sheet in it. */
export interface First {
  readonly store: Store
  readonly record: KeptSheet | undefined
}

/**
 * Opens the first sheet: that of the address, in its newest kept state where it is one's own; else the
 * last one of the tab, or of all; else the example.
 */
export function createFirst(beginning: Beginning): First {
  const { hash, sheets, last, recovered } = beginning
  const linked = hash === '' || hash === '#' ? undefined : parseLink(hash)
  const choice = linked?.ok ? chooseLinked(linked.sheet, sheets, last) : chooseLast(sheets, last)
  const first = createChosen(choice, sheets)
  const told =
    maybeRefusal(linked) ?? maybeStale(choice, linked, first.store) ?? maybeRecovered(recovered)
  if (told) first.store.getState().notify(told)
  return first
}

function createChosen(choice: Choice, sheets: readonly KeptSheet[]): First {
  if (choice.kind === 'foreign') {
    const { title } = choice.sheet
    const identity = createIdentity({ of: title, why: 'link' })
    return { store: createStore(choice.sheet, 'link', identity), record: undefined }
  }
  // What was kept of a sheet may be spoiled inside; the next one is then shown.
  const candidates = choice.kind === 'kept' ? [choice.record, ...sheets] : []
  for (const record of candidates) {
    const result = parseSheetText(record.text)
    if (result.ok) {
      const { id, copy } = record
      const identity = { id, ...(copy && { copy }) }
      return { store: createStore(result.sheet, 'kept', identity), record }
    }
  }
  return { store: createStore(exampleSheet, 'example'), record: undefined }
}

function maybeRefusal(linked: SheetResult | undefined): Notice | undefined {
  if (linked === undefined || linked.ok) return undefined
  return {
    tone: 'problem',
    text: `The link in the address was not opened: ${linked.errors[0]?.message ?? 'it holds no sheet.'}`,
  }
}

function maybeStale(
  choice: Choice,
  linked: SheetResult | undefined,
  store: Store,
): Notice | undefined {
  if (!linked?.ok || choice.kind !== 'kept' || !choice.isStale) return undefined
  return staleNotice(store, linked.sheet)
}

/** Says that a link was an earlier state of one's own sheet, and offers that state as a copy. */
export function staleNotice(store: Store, sheet: Sheet): Notice {
  return {
    tone: 'news',
    text: 'This link holds an earlier state of this sheet. What is shown is the newer one that was kept here.',
    verbs: [
      {
        verb: 'Open the earlier state as a copy',
        act: () =>
          store
            .getState()
            .open(sheet, 'link', undefined, createIdentity({ of: sheet.title, why: 'link' })),
      },
    ],
  }
}

function maybeRecovered({ copies, unread }: Recovered): Notice | undefined {
  if (copies > 0) {
    return {
      tone: 'news',
      text: 'A tab was closed before its last change was kept, and the sheet had been changed elsewhere since: that change is kept as a copy in My sheets.',
    }
  }
  if (unread > 0) {
    return {
      tone: 'problem',
      text: 'A tab was closed before its last change was kept, and the note of that change cannot be read. Check the figures typed last.',
    }
  }
  return undefined
}
