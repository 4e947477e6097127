import type { Form } from '../../sheet'
import { usePageStore } from '../store'

/** What to do first: how the parts of the circuit hang together. */
export function StartCircuit() {
  const store = usePageStore()
  const start = (form: Form) => store.getState().edit({ kind: 'start-circuit', form })
  return (
    <>
      <p className="circuit-lead">
        Say which circuit is behind the readings, and the page works out what the meters should
        show. Start with how its parts hang together; groups can stand inside it later.
      </p>
      <div className="verbs">
        <button type="button" className="verb" onClick={() => start('series')}>
          Start in series
        </button>
        <button type="button" className="verb" onClick={() => start('parallel')}>
          Start in parallel
        </button>
      </div>
    </>
  )
}
