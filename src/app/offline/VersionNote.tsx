import { createContext, useContext } from 'react'
import { useStore } from 'zustand'
import { createOfflineStore, type OfflineStore } from './state'

/** Where the page's parts learn of newer versions. */
export const OfflineContext = createContext<OfflineStore>(createOfflineStore())

/** Says that there is a newer version of the page, and takes it only when told to. */
export function VersionNote() {
  const store = useContext(OfflineContext)
  const newer = useStore(store, (state) => state.newer)
  const takeOver = useStore(store, (state) => state.takeOver)
  if (newer === 'none') return null
  return (
    <div className="notice" data-tone="news" role="status">
      <p>
        {newer === 'waiting'
          ? 'A newer version of Phasogon is ready. It comes when you say so, or when the page is opened next.'
          : 'A newer version of Phasogon was started in another tab. This one goes on as it is until you load it again.'}
      </p>
      {newer === 'waiting' && (
        <div className="verbs">
          <button type="button" className="verb" onClick={takeOver}>
            Use the new version
          </button>
        </div>
      )}
    </div>
  )
}
