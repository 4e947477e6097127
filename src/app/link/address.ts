import { type Sheet, serializeLink } from '../../sheet'
import type { Store } from '../store'

/** The part of the browser that the link needs, so that a test can stand in for it. */
export interface AddressBar {
  readHash(): string
  /** Writes the fragment without a step in the browser's history; throws where the browser refuses. */
  replaceHash(hash: string): void
  /** Calls back with a fragment that someone pastes, whatever has been written over it since. */
  onHash(listener: (hash: string) => void): () => void
  /** Calls back when the page is about to go. */
  onLeave(listener: () => void): () => void
}

const pause = 400

/** A link longer than this is cut by some mail programs and refused by some address bars. */
export const longestAddress = 65_536

/**
 * Keeps the address in step with the sheet: one write for each committed edit, trailing, so that a
 * browser that limits writes is never overrun. What the browser refuses is tried again at the next
 * edit and when the page is left. Returns what stops it.
 */
export function keepAddress(
  store: Store,
  bar: AddressBar,
  onForeign: (hash: string) => void,
): () => void {
  let written: string | undefined = bar.readHash() || undefined
  let timer: ReturnType<typeof setTimeout> | undefined
  let pending: Sheet | undefined

  const flush = () => {
    clearTimeout(timer)
    timer = undefined
    if (!pending) return
    const link = serializeLink(pending)
    pending = undefined
    if (link.length > longestAddress) return
    written = link
    try {
      bar.replaceHash(link)
    } catch {
      pending = store.getState().history.sheet
    }
  }

  const schedule = (sheet: Sheet) => {
    pending = sheet
    clearTimeout(timer)
    timer = setTimeout(flush, pause)
  }

  // What was kept may be newer than what the address shows.
  if (store.getState().origin === 'kept') schedule(store.getState().history.sheet)
  const stopStore = store.subscribe((state, before) => {
    if (state.history.sheet !== before.history.sheet) schedule(state.history.sheet)
  })
  const stopHash = bar.onHash((hash) => {
    if (hash !== '' && hash !== written) {
      written = hash
      onForeign(hash)
    }
  })
  const stopLeave = bar.onLeave(flush)
  return () => {
    clearTimeout(timer)
    stopStore()
    stopHash()
    stopLeave()
  }
}

/** The browser's own address bar. */
export const browserAddress: AddressBar = {
  readHash: () => window.location.hash,
  replaceHash: (hash) => window.history.replaceState(window.history.state, '', hash),
  onHash: (listener) => {
    const tell = ({ newURL }: HashChangeEvent) => listener(new URL(newURL).hash)
    window.addEventListener('hashchange', tell)
    return () => window.removeEventListener('hashchange', tell)
  },
  onLeave: (listener) => {
    window.addEventListener('pagehide', listener)
    return () => window.removeEventListener('pagehide', listener)
  },
}
