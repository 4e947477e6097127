import type { Edit, Hazard } from '../../sheet'
import { Field } from '../details/Field'
import { LongField } from '../details/LongField'
import { tryEdit } from '../readings/commit'
import { usePageStore } from '../store'

type HazardChange = Extract<Edit, { kind: 'set-hazard' }>['change']

const risks = ['low', 'medium', 'high'] as const

/** One hazard of the record, with its number from 1. */
export function HazardEditor({ hazard, at }: { readonly hazard: Hazard; readonly at: number }) {
  const store = usePageStore()
  const number = at + 1
  const change = (fields: HazardChange) =>
    tryEdit(store, { kind: 'set-hazard', at, change: fields })
  return (
    <fieldset className="part">
      <legend>{`Hazard ${number}`}</legend>
      <LongField
        caption="Hazard"
        value={hazard.hazard}
        placeholder="What can hurt someone here"
        onCommit={(text) => change({ hazard: text })}
      />
      <LongField
        caption="Control"
        value={hazard.control}
        placeholder="What is done about it: still to be written"
        onCommit={(text) => change({ control: text })}
      />
      <div className="fields">
        <label className="field">
          Risk class
          <select
            value={hazard.risk}
            onChange={({ target }) => {
              const risk = risks.find((each) => each === target.value)
              if (risk) change({ risk })
            }}
          >
            {risks.map((risk) => (
              <option key={risk}>{risk}</option>
            ))}
          </select>
        </label>
        <Field
          caption="Supervision needed"
          value={hazard.supervision ?? ''}
          placeholder="Who must be there"
          onCommit={(text) => change({ supervision: text === '' ? null : text })}
        />
      </div>
      <div className="verbs">
        <button
          type="button"
          className="verb"
          onClick={() => store.getState().edit({ kind: 'remove-hazard', at })}
        >
          {`Delete hazard ${number}`}
        </button>
      </div>
    </fieldset>
  )
}
