import { type PointerEvent, useCallback, useEffect, useRef, useState } from 'react'

/** What a term's handle listens to. */
export interface TermHandle {
  readonly onPointerDown: (event: PointerEvent) => void
  readonly onPointerMove: (event: PointerEvent) => void
  readonly onPointerUp: (event: PointerEvent) => void
  readonly onPointerCancel: () => void
}

/**
 * Lets a term be dragged by its symbol to another place in its sum. Where it would go is told while the
 * drag lasts; Escape, a lost pointer and another window end it without a trace.
 *
 * @param move Puts the term at one index to another, counted in the list without it.
 */
export function useTermDrag(move: (from: number, to: number) => void): {
  readonly target: number | undefined
  readonly handleOf: (index: number) => TermHandle
} {
  const from = useRef<number>(undefined)
  const [target, setTarget] = useState<number>()

  const drop = useCallback(() => {
    from.current = undefined
    setTarget(undefined)
  }, [])
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.key === 'Escape') drop()
    }
    window.addEventListener('blur', drop)
    document.addEventListener('keydown', onKeyDown)
    return () => {
      window.removeEventListener('blur', drop)
      document.removeEventListener('keydown', onKeyDown)
    }
  }, [drop])

  const handleOf = (index: number): TermHandle => ({
    onPointerDown: (event) => {
      if (event.button !== 0) return
      event.currentTarget.setPointerCapture(event.pointerId)
      from.current = index
    },
    onPointerMove: (event) => {
      if (from.current === undefined) return
      setTarget(termAt(event))
    },
    onPointerUp: (event) => {
      const start = from.current
      const end = start === undefined ? undefined : termAt(event)
      drop()
      if (start !== undefined && end !== undefined && end !== start) move(start, end)
    },
    onPointerCancel: drop,
  })
  return { target, handleOf }
}

/** The index of the term under a pointer, among those of the same sum. */
function termAt(event: PointerEvent): number | undefined {
  const terms = event.currentTarget.closest('.equation')?.querySelectorAll('.term') ?? []
  const under = document.elementFromPoint(event.clientX, event.clientY)?.closest('.term') ?? null
  const index = Array.from<Element | null>(terms).indexOf(under)
  return under === null || index < 0 ? undefined : index
}
