import type { Keeping } from '../keep'
import type { Store } from '../store'
import { openFiles, openLink } from './open'

/** Opens the files or the link that are dropped anywhere on the page. Returns what stops it. */
export function acceptDrops(store: Store, keeping: Keeping): () => void {
  const onDragOver = (event: DragEvent) => {
    if (event.target instanceof HTMLInputElement || event.target instanceof HTMLTextAreaElement)
      return
    event.preventDefault()
  }
  const onDrop = (event: DragEvent) => {
    const files = [...(event.dataTransfer?.files ?? [])]
    const text = event.dataTransfer?.getData('text/uri-list')
    if (files.length === 0 && !text) return
    event.preventDefault()
    if (files.length > 0) void openFiles(store, keeping, files)
    else if (text) void openLink(store, keeping, text)
  }
  document.addEventListener('dragover', onDragOver)
  document.addEventListener('drop', onDrop)
  return () => {
    document.removeEventListener('dragover', onDragOver)
    document.removeEventListener('drop', onDrop)
  }
}
