import { createStore, type StoreApi } from 'zustand/vanilla'

/** How the page stands to its versions. */
export interface OfflineState {
  /** A newer version: none, one that waits for leave, or one that another tab has let in. */
  readonly newer: 'none' | 'waiting' | 'elsewhere'
  /** Lets the waiting version in. */
  readonly takeOver: () => void
}

/** Where the page learns of newer versions. */
export type OfflineStore = StoreApi<OfflineState>

/** Knows of no newer version. */
export function createOfflineStore(): OfflineStore {
  return createStore<OfflineState>()(() => ({ newer: 'none', takeOver: () => undefined }))
}
