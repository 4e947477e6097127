import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { type AddressBar, keepAddress } from '../../../src/app/link/address'
import { createStore, type Store } from '../../../src/app/store'
import { exampleSheet, parseLink } from '../../../src/sheet'

/** An address bar that keeps what it is told and can refuse it. */
function createBar() {
  const listeners = { hash: (_: string) => {}, leave: () => {} }
  const bar = {
    hash: '',
    writes: 0,
    refuses: false,
    readHash: () => bar.hash,
    replaceHash: (hash: string) => {
      bar.writes += 1
      if (bar.refuses) throw new Error('Too many calls.')
      bar.hash = hash
    },
    onHash: (listener: (hash: string) => void) => {
      listeners.hash = listener
      return () => {}
    },
    onLeave: (listener: () => void) => {
      listeners.leave = listener
      return () => {}
    },
    paste: (hash: string) => {
      bar.hash = hash
      listeners.hash(hash)
    },
    /** Pastes, and lets time pass before the page hears of it. */
    pasteLate: (hash: string, milliseconds: number) => {
      bar.hash = hash
      vi.advanceTimersByTime(milliseconds)
      listeners.hash(hash)
    },
    leave: () => listeners.leave(),
  }
  return bar satisfies AddressBar
}

function rename(store: Store, title: string): void {
  store.getState().edit({ kind: 'set-details', title })
}

function titleIn(hash: string): string | undefined {
  const result = parseLink(hash)
  return result.ok ? result.sheet.title : undefined
}

describe('keeping the address in step', () => {
  beforeEach(() => {
    vi.useFakeTimers()
  })
  afterEach(() => {
    vi.useRealTimers()
  })

  it('writes once for a burst of edits, and the last of them', () => {
    const bar = createBar()
    const store = createStore(exampleSheet, 'example')
    keepAddress(store, bar, () => {})
    for (let edit = 0; edit < 50; edit += 1) rename(store, `Title ${edit}`)
    vi.advanceTimersByTime(2_000)
    expect(bar.writes).toBe(1)
    expect(titleIn(bar.hash)).toBe('Title 49')
  })

  it('leaves the address of an untouched sheet alone', () => {
    const bar = createBar()
    keepAddress(createStore(exampleSheet, 'example'), bar, () => {})
    vi.advanceTimersByTime(2_000)
    expect(bar.writes).toBe(0)
  })

  it('writes what is pending when the page is left', () => {
    const bar = createBar()
    const store = createStore(exampleSheet, 'example')
    keepAddress(store, bar, () => {})
    rename(store, 'Left at once')
    bar.leave()
    expect(titleIn(bar.hash)).toBe('Left at once')
  })

  it('tries again when the page is left what the browser refused', () => {
    const bar = createBar()
    const store = createStore(exampleSheet, 'example')
    keepAddress(store, bar, () => {})
    bar.refuses = true
    rename(store, 'Refused at first')
    vi.advanceTimersByTime(2_000)
    expect(bar.hash).toBe('')
    bar.refuses = false
    bar.leave()
    expect(titleIn(bar.hash)).toBe('Refused at first')
  })

  it('hears of a link that was pasted while a write of its own was due', () => {
    const bar = createBar()
    const store = createStore(exampleSheet, 'example')
    const pasted: string[] = []
    keepAddress(store, bar, (hash) => pasted.push(hash))
    rename(store, 'Just typed')
    bar.pasteLate('#sheet=1.somebody-else', 2_000)
    expect(titleIn(bar.hash)).toBe('Just typed')
    expect(pasted).toEqual(['#sheet=1.somebody-else'])
  })

  it('tells a pasted link from one of its own', () => {
    const bar = createBar()
    const store = createStore(exampleSheet, 'example')
    const pasted: string[] = []
    keepAddress(store, bar, (hash) => pasted.push(hash))
    rename(store, 'Mine')
    vi.advanceTimersByTime(2_000)
    bar.paste(bar.hash)
    expect(pasted).toEqual([])
    bar.paste('#sheet=1.somebody-else')
    expect(pasted).toEqual(['#sheet=1.somebody-else'])
  })
})
