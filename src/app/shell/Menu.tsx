import { useEffect, useId, useRef, useState } from 'react'

/** One verb of a menu. */
export interface MenuEntry {
  readonly verb: string
  readonly onChoose: () => void
}

/** A verb that opens a short list of verbs. Escape, a click elsewhere or a choice closes it. */
export function Menu({
  verb,
  entries,
}: {
  readonly verb: string
  readonly entries: readonly MenuEntry[]
}) {
  const [open, setOpen] = useState(false)
  const list = useId()
  const root = useRef<HTMLDivElement>(null)
  const button = useRef<HTMLButtonElement>(null)

  useEffect(() => {
    if (!open) return
    const onPointerDown = (event: PointerEvent) => {
      if (!root.current?.contains(event.target as Node)) setOpen(false)
    }
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return
      // Of a menu in a window, Escape closes the menu and not the window.
      event.preventDefault()
      setOpen(false)
      button.current?.focus()
    }
    document.addEventListener('pointerdown', onPointerDown)
    document.addEventListener('keydown', onKeyDown)
    return () => {
      document.removeEventListener('pointerdown', onPointerDown)
      document.removeEventListener('keydown', onKeyDown)
    }
  }, [open])

  return (
    <div className="menu" ref={root}>
      <button
        type="button"
        className="verb"
        ref={button}
        aria-expanded={open}
        aria-controls={list}
        onClick={() => setOpen(!open)}
      >
        {verb}
      </button>
      {open && (
        <ul id={list}>
          {entries.map((entry) => (
            <li key={entry.verb}>
              <button
                type="button"
                className="verb"
                onClick={() => {
                  setOpen(false)
                  entry.onChoose()
                }}
              >
                {entry.verb}
              </button>
            </li>
          ))}
        </ul>
      )}
    </div>
  )
}
