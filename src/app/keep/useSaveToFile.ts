import { saveSheet } from '../export'
import { usePageStore } from '../store'
import { useKeeping } from './context'

/** Saves the open sheet to a file, and says so. */
export function useSaveToFile(): () => void {
  const store = usePageStore()
  const { keeper } = useKeeping()
  return () => {
    const name = saveSheet(store.getState().history.sheet)
    keeper.noteFile()
    store.getState().notify({
      tone: 'news',
      text: `Saved “${name}”. It opens here again, and anywhere else that Phasogon runs.`,
    })
  }
}
