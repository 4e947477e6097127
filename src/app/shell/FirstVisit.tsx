import { emptySheet } from '../../sheet'
import { usePage, usePageStore } from '../store'

/** What to do, for someone who sees the page for the first time, or an empty sheet. */
export function FirstVisit() {
  const store = usePageStore()
  const isExample = usePage((state) => state.origin === 'example')
  const isEmpty = usePage((state) => state.history.sheet.phasors.length === 0)
  const isUntouched = usePage((state) => state.history.past.length === 0)
  if (isExample && isUntouched) {
    return (
      <section className="first-visit" aria-label="First visit">
        <p>
          This is an example sheet with invented readings. Type over any cell, or drag an arrow's
          tip on the drawing, and everything else follows. The line under the drawing says whether
          the sum agrees with what was measured.
        </p>
        <div className="verbs">
          <button
            type="button"
            className="verb main"
            onClick={() => store.getState().open(emptySheet(), 'new', 'New sheet.')}
          >
            Start a sheet of your own
          </button>
        </div>
      </section>
    )
  }
  if (!isEmpty) return null
  return (
    <section className="first-visit" aria-label="Empty sheet">
      <p>
        Add the phasors of the job one by one, or paste rows from a spreadsheet: label, magnitude,
        angle. Then add a sum to see them tip to tail.
      </p>
    </section>
  )
}
