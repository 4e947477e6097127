import { useEffect } from 'react'
import { nudge, pinDrawing, type Scene } from '../../drawing'
import { answerOf, usePageStore } from '../store'
import { ADJUSTED_IS_HELD } from './gestures'
import { nudgeOfKey } from './keys'
import { selectedArrow } from './selected'

/**
 * Lets the arrow keys move the arrow that is picked, while nothing has the focus (as after a press on
 * the paper) or one of the drawing verbs has it. Each press is one step of undo.
 */
export function useNudgeKeys(scene: Scene): void {
  const store = usePageStore()
  useEffect(() => {
    const onKeyDown = (event: globalThis.KeyboardEvent) => {
      const target = event.target as Element
      if (target !== document.body && !target.closest('.hand-verbs')) return
      const { history, selection, edit, notify, values } = store.getState()
      const by = nudgeOfKey(event)
      const arrow = selection && selectedArrow(scene, selection)
      if (!by || !arrow) return
      event.preventDefault()
      if (values === 'adjusted') {
        notify({ tone: 'news', text: ADJUSTED_IS_HELD })
        return
      }
      const { sheet } = history
      const result = nudge(sheet, answerOf(sheet).evaluation, scene, arrow, by)
      if (result.ok) edit(pinDrawing(sheet, scene, result.value))
      else notify({ tone: 'news', text: result.problem })
    }
    document.addEventListener('keydown', onKeyDown)
    return () => document.removeEventListener('keydown', onKeyDown)
  }, [store, scene])
}
