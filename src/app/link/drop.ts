import type { Store } from '../store'
import { openFile, openLink } from './open'

/** Opens a file or a link that is dropped anywhere on the page. Returns what stops it. */
export function acceptDrops(store: Store): () => void {
  const onDragOver = (event: DragEvent) => {
    if (event.target instanceof HTMLInputElement || event.target instanceof HTMLTextAreaElement)
      return
    event.preventDefault()
  }
  const onDrop = (event: DragEvent) => {
    const [file] = event.dataTransfer?.files ?? []
    const text = event.dataTransfer?.getData('text/uri-list')
    if (!file && !text) return
    event.preventDefault()
    if (file) void openFile(store, file)
    else if (text) openLink(store, text)
  }
  document.addEventListener('dragover', onDragOver)
  document.addEventListener('drop', onDrop)
  return () => {
    document.removeEventListener('dragover', onDragOver)
    document.removeEventListener('drop', onDrop)
  }
}
