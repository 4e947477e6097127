import { IDBFactory, IDBKeyRange } from 'fake-indexeddb'
import { createStore as createUse, type UseStore } from 'idb-keyval'
import type { Channel, Message } from '../../../src/app/keep/channel'
import { createFirst } from '../../../src/app/keep/first'
import { createJournal } from '../../../src/app/keep/journal'
import { createKeeper, type Keeper } from '../../../src/app/keep/keeper'
import { problemOf } from '../../../src/app/keep/problem'
import { type Recovered, recover } from '../../../src/app/keep/recover'
import { createKeepStore, type KeepStore } from '../../../src/app/keep/state'
import { type Contents, createStorage, type Storage } from '../../../src/app/keep/storage'
import type { Store } from '../../../src/app/store'

/** A page that is open in the world. */
export interface Page {
  readonly store: Store
  readonly keeper: Keeper
  readonly keep: KeepStore
  readonly storage: Storage
  readonly recovered: Recovered
  /** Ends the page at once: nothing of it runs on, and what was not written is not written any more. */
  kill(): void
}

/** A browser with its store, its small store and its channel, in which pages are opened and killed. */
export interface World {
  /** The object store itself, to be looked into and to be spoiled by hand. */
  readonly use: UseStore
  readonly small: globalThis.Storage
  readonly clock: { now: number }
  /** What the next changes to the object store meet, such as a full disk; undefined: nothing. */
  refusal: Error | undefined
  open(options?: { readonly hash?: string; readonly last?: string }): Promise<Page>
  contents(): Promise<Contents>
}

/** A browser on a fresh device. */
export function createWorld(): World {
  const factory = new IDBFactory()
  Object.assign(globalThis, { indexedDB: factory, IDBKeyRange })
  const use = createUse('phasogon', 'sheets')
  const small = createSmallStore()
  const clock = { now: Date.UTC(2026, 5, 1) }
  const pages = new Set<(message: Message) => void>()
  const storage = createStorage(use, () => clock.now)
  let opened = 0

  const world: World = {
    use,
    small,
    clock,
    refusal: undefined,
    contents: () => storage.read(),
    open: async ({ hash = '', last } = {}) => {
      opened += 1
      let isAlive = true
      const aliveUse: UseStore = (mode, callback) =>
        use(mode, async (objects) => {
          if (!isAlive) return new Promise<never>(() => undefined)
          if (mode === 'readwrite' && world.refusal) throw world.refusal
          const value = await callback(objects)
          // Whoever was killed hears no answer.
          return isAlive ? value : new Promise<never>(() => undefined)
        })
      const own = createStorage(aliveUse, () => clock.now)
      const journal = createJournal(() => {
        if (!isAlive) throw new Error('This page is dead.')
        return small
      })
      const keep = createKeepStore()
      const listeners = new Set<(message: Message) => void>()
      const hear = (message: Message) => {
        for (const listener of listeners) if (isAlive) listener(message)
      }
      pages.add(hear)
      const channel: Channel = {
        post: (message) => {
          if (!isAlive) return
          for (const other of pages) {
            if (other !== hear) setImmediate(() => other(structuredClone(message)))
          }
        },
        onMessage: (listener) => {
          listeners.add(listener)
          return () => listeners.delete(listener)
        },
      }
      let recovered: Recovered = { copies: 0, unread: 0 }
      let found: Contents = { sheets: [], broken: [], isClockBack: false }
      try {
        recovered = await recover(journal, own)
        found = await own.read()
      } catch (error) {
        keep.setState({ problem: problemOf(error) })
      }
      const { store, record } = createFirst({ hash, sheets: found.sheets, last, recovered })
      const page = `page${opened}`
      const keeper = createKeeper(store, { storage: own, journal, channel, keep, page })
      if (record) keeper.follow(record)
      const kill = () => {
        isAlive = false
        pages.delete(hear)
      }
      return { store, keeper, keep, storage: own, recovered, kill }
    },
  }
  return world
}

/** The page's small store, as browsers have it. */
function createSmallStore(): globalThis.Storage {
  const items = new Map<string, string>()
  return {
    get length() {
      return items.size
    },
    key: (index) => [...items.keys()][index] ?? null,
    getItem: (key) => items.get(key) ?? null,
    setItem: (key, value) => void items.set(key, value),
    removeItem: (key) => void items.delete(key),
    clear: () => items.clear(),
  }
}

/** Settles after so many turns of the event loop. */
export async function turns(count: number): Promise<void> {
  for (let turn = 0; turn < count; turn += 1) await new Promise((resolve) => setImmediate(resolve))
}
