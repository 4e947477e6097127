import { useEffect, useState } from 'react'
import { usePageStore } from '../store'
import { useKeeping } from './context'
import { type Earlier, earlierIn, NOTHING_EARLIER } from './earlier'

/** What earlier sheets offer, read when the part that offers it is opened; nothing until then. */
export function useEarlier(): Earlier {
  const store = usePageStore()
  const { storage } = useKeeping()
  const [earlier, setEarlier] = useState(NOTHING_EARLIER)
  useEffect(() => {
    let isWanted = true
    const look = async () => {
      const { sheets } = await storage.read()
      if (isWanted) setEarlier(earlierIn(sheets, store.getState().identity.id))
    }
    // Offers are a help and no more: where nothing can be read, none are made, and that is said elsewhere.
    look().catch(() => undefined)
    return () => {
      isWanted = false
    }
  }, [store, storage])
  return earlier
}
