import { type ReactNode, useEffect, useId, useRef } from 'react'

/** A window over the page with a heading; Escape and its own verb close it, and the focus returns. */
export function Dialog(properties: {
  readonly heading: string
  readonly onClose: () => void
  readonly children: ReactNode
}) {
  const { heading, onClose, children } = properties
  const dialog = useRef<HTMLDialogElement>(null)
  const id = useId()
  useEffect(() => {
    dialog.current?.showModal()
  }, [])
  return (
    <dialog ref={dialog} aria-labelledby={id} onClose={onClose}>
      <h2 id={id} className="dialog-heading">
        {heading}
      </h2>
      {children}
    </dialog>
  )
}
