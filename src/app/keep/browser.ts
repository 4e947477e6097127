import { createStore as createUse, type UseStore } from 'idb-keyval'
import { createName, type Store } from '../store'
import { createChannel } from './channel'
import { createFirst } from './first'
import { createJournal } from './journal'
import { createKeeper, type Keeper } from './keeper'
import { problemOf, StorageError } from './problem'
import { type Recovered, recover } from './recover'
import { createKeepStore, type KeepStore } from './state'
import { type Contents, createStorage, type Storage } from './storage'

/** What the page's parts need of keeping. */
export interface Keeping {
  readonly keeper: Keeper
  readonly keep: KeepStore
  readonly storage: Storage
}

/** How long a store may be silent before it counts as refused, in milliseconds. */
const patience = 8_000
const lastKey = 'phasogon-open'
const nothingRecovered: Recovered = { copies: 0, unread: 0 }
const nothingKept: Contents = { sheets: [], broken: [], isClockBack: false }

/**
 * Opens the browser's store and the first sheet: that of the fragment `hash`, or the last one. Never
 * fails: what the browser refuses is said by the keep store, and the page works without it.
 */
export async function openKeeping(hash: string): Promise<{ store: Store; keeping: Keeping }> {
  const storage = createStorage(withPatience(createUse('phasogon', 'sheets')))
  const journal = createJournal(() => window.localStorage)
  const keep = createKeepStore()
  let recovered = nothingRecovered
  let contents = nothingKept
  try {
    recovered = await recover(journal, storage)
    contents = await storage.read()
    keep.setState({ isClockBack: contents.isClockBack, brokenCount: contents.broken.length })
  } catch (error) {
    keep.setState({ problem: problemOf(error) })
  }
  const { sheets } = contents
  const { store, record } = createFirst({ hash, sheets, last: readLast(), recovered })
  const channel = createChannel('phasogon-sheets')
  const keeper = createKeeper(store, { storage, journal, channel, keep, page: createName() })
  if (record) keeper.follow(record)
  rememberLast(store)
  guardLeaving(keep)
  onReturn(() => void keeper.refresh())
  return { store, keeping: { keeper, keep, storage } }
}

/** A store that never answers, as some browsers have it after a crash, counts as one that refuses. */
function withPatience(use: UseStore): UseStore {
  return async (mode, callback) => {
    let timer: ReturnType<typeof setTimeout> | undefined
    const silence = new Promise<never>((_, reject) => {
      timer = setTimeout(() => reject(new StorageError('refused')), patience)
    })
    try {
      return await Promise.race([use(mode, callback), silence])
    } finally {
      clearTimeout(timer)
    }
  }
}

/** The tab remembers its sheet, so that loading it again shows the same one. */
function rememberLast(store: Store): void {
  const write = () => {
    try {
      window.sessionStorage.setItem(lastKey, store.getState().identity.id)
    } catch {
      // The address and the order of changes still tell which sheet is meant.
    }
  }
  write()
  store.subscribe((state, before) => {
    if (state.identity.id !== before.identity.id) write()
  })
}

function readLast(): string | undefined {
  try {
    return window.sessionStorage.getItem(lastKey) ?? undefined
  } catch {
    return undefined
  }
}

/** The browser asks before it closes a page whose last change lies nowhere else. */
function guardLeaving(keep: KeepStore): void {
  window.addEventListener('beforeunload', (event) => {
    if (keep.getState().isUnkept && keep.getState().problem) event.preventDefault()
  })
}

function onReturn(listener: () => void): void {
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible') listener()
  })
  window.addEventListener('pageshow', (event) => {
    if (event.persisted) listener()
  })
}
