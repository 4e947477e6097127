import { toCopy } from './entry'
import type { Journal } from './journal'
import type { Storage } from './storage'

/** What was found of pages that ended before their last change was kept. */
export interface Recovered {
  /** How many changes had to become copies, since another tab had changed their sheet. */
  readonly copies: number
  /** How many notes of a change could not be read. */
  readonly unread: number
}

/**
 * Brings the changes in the journal into the store. It may meet a page that is still at work: a change
 * that is kept already is not kept twice. Throws what the storage throws, and has then lost nothing.
 */
export async function recover(journal: Journal, storage: Storage): Promise<Recovered> {
  let copies = 0
  let unread = 0
  for (const unsaved of journal.read()) {
    const { entry } = unsaved
    if (entry === undefined) unread += 1
    else if ((await storage.save(entry)).kind === 'conflict') {
      copies += 1
      await storage.save(toCopy(entry))
    }
    journal.settle(unsaved)
  }
  return { copies, unread }
}
