import { type ReactNode, Suspense, useState } from 'react'

/** A part of the page below its heading, which opens and closes it. What is in it is drawn once it is open. */
export function Folded(properties: { readonly heading: string; readonly children: ReactNode }) {
  const { heading, children } = properties
  const [isOpen, setOpen] = useState(false)
  return (
    <details onToggle={({ currentTarget }) => setOpen(currentTarget.open)}>
      <summary>{heading}</summary>
      {isOpen && <Suspense>{children}</Suspense>}
    </details>
  )
}
