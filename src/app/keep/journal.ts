import { type Entry, parseEntry } from './entry'

/** A change that a page did not see safely kept before it ended. */
export interface Unsaved {
  readonly key: string
  readonly text: string
  /** Undefined where the text cannot be read. */
  readonly entry: Entry | undefined
}

/**
 * Notes each change at once, while the store, which takes some milliseconds, still works on it: a page
 * that is killed in between leaves it here for the next one.
 */
export interface Journal {
  write(entry: Entry): void
  /** Forgets a sheet's last change, once it is kept. */
  clear(page: string, id: string): void
  read(): readonly Unsaved[]
  /** Forgets one that was taken care of, unless its page has noted a later one since. */
  settle(unsaved: Unsaved): void
}

const prefix = 'phasogon-unsaved:'

/** A journal in the page's own small store; where the browser has none it forgets, and never throws. */
export function createJournal(store: () => globalThis.Storage): Journal {
  return {
    write: (entry) =>
      attempt(() => store().setItem(keyOf(entry.page, entry.id), JSON.stringify(entry))),
    clear: (page, id) => attempt(() => store().removeItem(keyOf(page, id))),
    read: () =>
      attempt(() =>
        Array.from({ length: store().length }, (_, index) => store().key(index) ?? '')
          .filter((key) => key.startsWith(prefix))
          .map((key) => {
            const text = store().getItem(key) ?? ''
            return { key, text, entry: parseEntry(text) }
          }),
      ) ?? [],
    settle: ({ key, text }) =>
      attempt(() => {
        if (store().getItem(key) === text) store().removeItem(key)
      }),
  }
}

function keyOf(page: string, id: string): string {
  return `${prefix}${page}:${id}`
}

function attempt<Value>(work: () => Value): Value | undefined {
  try {
    return work()
  } catch {
    return undefined
  }
}
