import { usePage } from '../store'

/** Tells a screen reader what an edit did and what the check line now says. */
export function Announcer() {
  const announcement = usePage((state) => state.announcement)
  return (
    <div className="visually-hidden" role="status" aria-live="polite" data-announcer>
      {announcement}
    </div>
  )
}
