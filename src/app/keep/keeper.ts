import { parseSheetText, type Sheet } from '../../sheet'
import type { Copy, State, Store } from '../store'
import type { Channel } from './channel'
import { createEntry, type Entry, toCopy } from './entry'
import type { Journal } from './journal'
import { problemOf } from './problem'
import type { KeptSheet } from './record'
import type { KeepStore } from './state'
import type { Storage } from './storage'

/** What a keeper works with. `page` is a name that no other page has. */
export interface KeeperServices {
  readonly storage: Storage
  readonly journal: Journal
  readonly channel: Channel
  readonly keep: KeepStore
  readonly page: string
}

/** Keeps what is open, and brings in what other tabs make of it. */
export interface Keeper {
  /** Keeps the sheet that is open as it is, though nothing on it was changed. */
  keepOpen(): void
  /** Keeps a state of a sheet that need not be open; `base` is the revision it was made upon. */
  keepAside(id: string, sheet: Sheet, base: number, copy?: Copy): Promise<void>
  /** Says that a sheet is open as it is kept. */
  follow(record: KeptSheet): void
  /** Looks whether another tab changed the open sheet unheard, and tries again what was not kept. */
  refresh(): Promise<void>
  /** Settles when nothing is on its way into the store any longer. */
  settled(): Promise<void>
  /** Says that the open sheet, as it is, lies in a file. */
  noteFile(): void
}

/**
 * Keeps each committed change of the page's store: the journal notes it at once, the store follows, one
 * change after the other, and other tabs are told. A change that another tab crossed becomes a copy.
 */
export function createKeeper(store: Store, services: KeeperServices): Keeper {
  const { storage, journal, channel, keep, page } = services
  const bases = new Map<string, number>()
  const waiting = new Map<string, Entry>()
  let underWay: Entry | undefined
  let work: Promise<void> | undefined
  let count = 0
  let isOwnDoing = false

  const enter = (id: string, sheet: Sheet, copy: Copy | undefined) => {
    count += 1
    const details = { id, base: bases.get(id) ?? 0, page, count, ...(copy && { copy }) }
    hold(createEntry(sheet, details))
  }

  const hold = (entry: Entry) => {
    journal.write(entry)
    waiting.set(entry.id, entry)
    begin()
  }

  const begin = () => {
    work ??= keepAll().finally(() => {
      work = undefined
    })
  }

  const keepAll = async () => {
    for (let entry = next(); entry; entry = next()) {
      underWay = entry
      try {
        await keepOne(entry)
      } catch (error) {
        // It stays in the journal, and is tried again with the next change.
        if (!waiting.has(entry.id)) waiting.set(entry.id, entry)
        keep.setState({ problem: problemOf(error), isUnkept: true })
        return
      } finally {
        underWay = undefined
      }
    }
    keep.setState({ problem: undefined, isUnkept: false })
  }

  const next = (): Entry | undefined => {
    const [entry] = waiting.values()
    if (entry) waiting.delete(entry.id)
    return entry
  }

  const keepOne = async (entry: Entry) => {
    const { id, count: own } = entry
    const saved = await storage.save({ ...entry, base: bases.get(id) ?? entry.base })
    if (saved.kind === 'conflict') {
      setAside(waiting.get(id) ?? entry)
      return
    }
    const { revision, text } = saved.record
    bases.set(id, revision)
    if ((waiting.get(id)?.count ?? own) === own) journal.clear(page, id)
    channel.post({ kind: 'saved', id, revision, text })
    tellChange()
  }

  /** Both changes are kept: the other tab's as it is, this one as a copy, on which the page goes on. */
  const setAside = (entry: Entry) => {
    const copy = toCopy(entry)
    waiting.delete(entry.id)
    bases.delete(entry.id)
    const identity = { id: copy.id, ...(copy.copy && { copy: copy.copy }) }
    const isOpen = store.getState().identity.id === entry.id
    hold(copy)
    journal.clear(page, entry.id)
    withoutKeeping(() => store.getState().identify(entry.id, identity))
    if (!isOpen) return
    store.getState().notify({
      tone: 'problem',
      text: `“${entry.title || 'Untitled sheet'}” was changed in another tab at the same time. Both are kept: this is your version, now a copy, and the other one is in My sheets.`,
    })
  }

  const tellChange = () => keep.setState(({ changes }) => ({ changes: changes + 1 }))

  const isBusyWith = (id: string) => waiting.has(id) || underWay?.id === id

  const receive = (id: string, revision: number, text: string) => {
    const base = bases.get(id)
    if (base === undefined || revision <= base || isBusyWith(id)) return
    const result = parseSheetText(text)
    if (!result.ok) return
    bases.set(id, revision)
    withoutKeeping(() => store.getState().receive(id, result.sheet))
  }

  /** What the keeper itself does to the page's store is no change to be kept. */
  const withoutKeeping = (act: () => void) => {
    isOwnDoing = true
    try {
      act()
    } finally {
      isOwnDoing = false
    }
  }

  store.subscribe((state, before) => {
    const isKnown = bases.has(state.identity.id)
    if (isOwnDoing || !isWorthKeeping(state, before, isKnown)) return
    enter(state.identity.id, state.history.sheet, state.identity.copy)
  })

  channel.onMessage((message) => {
    if (message.kind === 'saved') receive(message.id, message.revision, message.text)
    tellChange()
  })

  return {
    keepOpen: () => {
      const { identity, history } = store.getState()
      enter(identity.id, history.sheet, identity.copy)
    },
    keepAside: async (id, sheet, base, copy) => {
      if (!bases.has(id)) bases.set(id, base)
      withoutKeeping(() => store.getState().receive(id, sheet))
      enter(id, sheet, copy)
      await work
    },
    follow: ({ id, revision }) => {
      if (!isBusyWith(id)) bases.set(id, revision)
    },
    refresh: async () => {
      const { id } = store.getState().identity
      if (waiting.size > 0) begin()
      await work
      if (!bases.has(id)) return
      try {
        const record = await storage.load(id)
        if (record) receive(id, record.revision, record.text)
      } catch (error) {
        keep.setState({ problem: problemOf(error) })
      }
    },
    settled: async () => {
      while (work) await work
    },
    noteFile: () => keep.setState({ isUnkept: false }),
  }
}

/** A change to the sheet that stays open, or the first opening of a file, which is kept at once. */
function isWorthKeeping(state: State, before: State, isKnown: boolean): boolean {
  if (state.identity.id !== before.identity.id) return state.origin === 'file' && !isKnown
  return state.history.sheet !== before.history.sheet || state.identity !== before.identity
}
