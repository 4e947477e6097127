import { createContext, useContext } from 'react'
import { useStore } from 'zustand'
import type { Keeping } from './browser'
import type { KeepState } from './state'

/** The keeping that the page's parts share. */
export const KeepingContext = createContext<Keeping | undefined>(undefined)

/** The keeping itself, for event handlers. Throws outside a `KeepingContext`. */
export function useKeeping(): Keeping {
  const keeping = useContext(KeepingContext)
  if (!keeping) throw new Error('useKeeping needs a KeepingContext above it')
  return keeping
}

/** What a selector picks from what the page says of its keeping. */
export function useKeep<Picked>(select: (state: KeepState) => Picked): Picked {
  return useStore(useKeeping().keep, select)
}
