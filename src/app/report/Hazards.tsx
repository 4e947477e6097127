import { type Hazard, hazardsFrom, missingHazards } from '../../sheet'
import { answerOf, usePage, usePageStore } from '../store'
import { HazardEditor } from './HazardEditor'
import './hazards.css'

const blank: Hazard = { hazard: '', control: '', risk: 'high' }

/** The record of hazards: what there is, what is done about it, how bad it is, and who must be there. */
export function Hazards() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const { evaluation } = usePage((state) => answerOf(state.history.sheet))
  const hazards = sheet.report?.hazards ?? []
  const usual = missingHazards(sheet)
  const cautions = hazardsFrom(sheet, evaluation.cautions ?? [])

  const add = (added: readonly Hazard[]) => {
    const edits = added.map((hazard) => ({ kind: 'add-hazard', hazard }) as const)
    store.getState().edit({ kind: 'several', edits })
  }

  return (
    <div className="hazards">
      <p>
        A record for a competent person to complete at the place of work. It replaces no local rule
        and no permit to work: those have the last word.
      </p>
      {hazards.map((hazard, at) => (
        // A hazard has no name of its own: it is known by its place.
        <HazardEditor key={keyAt(at)} hazard={hazard} at={at} />
      ))}
      <div className="verbs">
        <button type="button" className="verb" onClick={() => add([blank])}>
          Add a hazard
        </button>
        <button
          type="button"
          className="verb"
          disabled={usual.length === 0}
          onClick={() => add(usual)}
        >
          Add the usual ones
        </button>
      </div>
      {cautions.length > 0 && (
        <>
          <h3>What the numbers give to take care of</h3>
          <ul className="hazard-cautions">
            {cautions.map((caution) => (
              <li key={caution.hazard}>
                <span>{caution.hazard}</span>
                <button
                  type="button"
                  className="verb"
                  aria-label={`Add to the hazards: ${caution.hazard}`}
                  onClick={() => add([caution])}
                >
                  Add
                </button>
              </li>
            ))}
          </ul>
        </>
      )}
    </div>
  )
}

function keyAt(at: number): string {
  return `hazard-${at}`
}
