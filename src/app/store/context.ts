import { createContext, useContext } from 'react'
import { useStore } from 'zustand'
import type { State } from './state'
import type { Actions, Store } from './store'

/** The store that the page's parts share. */
export const StoreContext = createContext<Store | undefined>(undefined)

/** The store itself, for event handlers. Throws outside a `StoreContext`. */
export function usePageStore(): Store {
  const store = useContext(StoreContext)
  if (!store) throw new Error('usePageStore needs a StoreContext above it')
  return store
}

/** What a selector picks from the state; it must return the same object while nothing changed. */
export function usePage<Picked>(select: (state: State & Actions) => Picked): Picked {
  return useStore(usePageStore(), select)
}
