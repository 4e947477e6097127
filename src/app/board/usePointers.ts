import { type RefObject, useEffect } from 'react'
import type { Gestures, PointerInput } from './gestures'

/**
 * Feeds the board's pointer, wheel and key events to its gestures. A pointer that is lost, another
 * window or Escape ends a drag without a trace.
 */
export function usePointers(root: RefObject<HTMLElement | null>, gestures: Gestures): void {
  useEffect(() => {
    const board = root.current
    if (!board) return
    const stop = new AbortController()
    const { signal } = stop
    const inputOf = (event: PointerEvent): PointerInput => {
      const corner = board.getBoundingClientRect()
      return {
        pointer: event.pointerId,
        point: { x: event.clientX - corner.left, y: event.clientY - corner.top },
        touch: event.pointerType === 'touch',
        button: event.button,
        free: event.shiftKey,
      }
    }

    board.addEventListener(
      'pointerdown',
      (event) => {
        if ((event.target as Element).closest('.board-verbs, .over-board')) return
        board.setPointerCapture(event.pointerId)
        gestures.down(inputOf(event))
      },
      { signal },
    )
    board.addEventListener('pointermove', (event) => gestures.move(inputOf(event)), { signal })
    board.addEventListener('pointerup', (event) => gestures.up(inputOf(event)), { signal })
    board.addEventListener('pointercancel', gestures.cancel, { signal })
    window.addEventListener('blur', gestures.cancel, { signal })
    document.addEventListener(
      'keydown',
      (event) => {
        if (event.key === 'Escape') gestures.cancel()
      },
      { signal },
    )
    board.addEventListener(
      'wheel',
      (event) => {
        event.preventDefault()
        const corner = board.getBoundingClientRect()
        const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 16 : 1
        const point = { x: event.clientX - corner.left, y: event.clientY - corner.top }
        gestures.wheel(point, event.deltaY * lines)
      },
      { signal, passive: false },
    )
    return () => stop.abort()
  }, [root, gestures])
}
