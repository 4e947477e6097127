import { useRef } from 'react'
import { usePage } from '../store'

/** Tells a screen reader what an edit did and what the check line now says. */
export function Announcer() {
  const announcement = usePage((state) => state.announcement)
  const sheet = usePage((state) => state.history.sheet)
  const told = useRef({ sheet, count: 0 })
  if (told.current.sheet !== sheet) told.current = { sheet, count: told.current.count + 1 }
  // Two steps may be told in the same words: a text that is put in anew is heard again.
  return (
    <div className="visually-hidden" role="status" aria-live="polite" data-announcer>
      <span key={told.current.count}>{announcement}</span>
    </div>
  )
}
