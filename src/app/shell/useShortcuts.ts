import { useEffect } from 'react'
import { usePageStore } from '../store'

/** Undo and redo from the keyboard, except while a text field has its own. */
export function useShortcuts(): void {
  const store = usePageStore()
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || isEditing(event.target)) return
      const key = event.key.toLowerCase()
      const { undo, redo } = store.getState()
      if (key === 'y' || (key === 'z' && event.shiftKey)) redo()
      else if (key === 'z') undo()
      else return
      event.preventDefault()
    }
    document.addEventListener('keydown', onKeyDown)
    return () => document.removeEventListener('keydown', onKeyDown)
  }, [store])
}

/** Whether the target is a text field with changes of its own to undo. */
function isEditing(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLInputElement || target instanceof HTMLTextAreaElement)) return false
  return target.dataset.column === undefined || target.dataset.changed !== undefined
}
