import { createStore, type StoreApi } from 'zustand/vanilla'
import type { StorageProblem } from './problem'

/** What the page says of its keeping. */
export interface KeepState {
  /** Why nothing is kept just now; undefined while all is well. */
  readonly problem: StorageProblem | undefined
  /** Whether the open sheet has a change that is neither kept nor saved to a file. */
  readonly isUnkept: boolean
  /** Whether the clock stands before the time of a change that was kept already. */
  readonly isClockBack: boolean
  /** How many records of the store cannot be read. */
  readonly brokenCount: number
  /** Rises with each change to what is kept: who lists it reads it again. */
  readonly changes: number
}

/** Where the keeper says how it fares. */
export type KeepStore = StoreApi<KeepState>

/** Nothing kept yet, and nothing wrong. */
export function createKeepStore(): KeepStore {
  return createStore<KeepState>()(() => ({
    problem: undefined,
    isUnkept: false,
    isClockBack: false,
    brokenCount: 0,
    changes: 0,
  }))
}
