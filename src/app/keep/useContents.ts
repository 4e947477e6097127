import { useEffect, useState } from 'react'
import { useKeep, useKeeping } from './context'
import { problemOf } from './problem'
import type { Contents } from './storage'

/** What is kept, read anew whenever it changes; undefined until it was read. */
export function useContents(): Contents | undefined {
  const { storage, keep } = useKeeping()
  const changes = useKeep((state) => state.changes)
  const [contents, setContents] = useState<{ readonly of: number; readonly found: Contents }>()

  useEffect(() => {
    let isWanted = true
    storage.read().then(
      (found) => {
        if (isWanted) setContents({ of: changes, found })
      },
      (error: unknown) => keep.setState({ problem: problemOf(error) }),
    )
    return () => {
      isWanted = false
    }
  }, [storage, keep, changes])
  return contents?.found
}
