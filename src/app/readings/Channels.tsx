import { type Channel, type Edit, newId, type Sheet } from '../../sheet'
import { Field } from '../details/Field'
import { usePageStore } from '../store'
import { maybeNumber, tryEdit } from './commit'
import { commitTyped, typedText } from './typed-field'

/** Transformers, probes and clamps that several readings share. */
export function Channels({ sheet }: { readonly sheet: Sheet }) {
  const store = usePageStore()
  const channels = sheet.channels ?? []
  const add = () => {
    const id = newId(sheet, 'ct1')
    store
      .getState()
      .edit({ kind: 'add-channel', channel: { id, label: `CT ${channels.length + 1}` } })
  }
  return (
    <details>
      <summary>{`Channels: CTs, VTs, probes, clamps${channels.length === 0 ? '' : `: ${channels.length}`}`}</summary>
      {channels.map((channel) => (
        <ChannelEditor key={channel.id} channel={channel} />
      ))}
      <div className="verbs">
        <button type="button" className="verb" onClick={add}>
          Add channel
        </button>
      </div>
    </details>
  )
}

type ChannelChange = Extract<Edit, { kind: 'set-channel' }>['change']

function ChannelEditor({ channel }: { readonly channel: Channel }) {
  const { id, label, ratio, turns, phaseError, reversed } = channel
  const store = usePageStore()
  const name = label ?? id
  const change = (fields: ChannelChange) =>
    tryEdit(store, { kind: 'set-channel', id, change: fields })
  return (
    <fieldset className="part">
      <legend>{name}</legend>
      <div className="fields">
        <Field
          caption="Label"
          value={label ?? ''}
          onCommit={(entered) => change({ label: entered === '' ? null : entered })}
        />
        <Field
          caption="Ratio, with its limit"
          value={typedText(ratio)}
          placeholder="200/5 ± 0.5 %"
          onCommit={(entered) => commitTyped(entered, '', (typed) => change({ ratio: typed }))}
        />
        <Field
          caption="Turns through it"
          value={turns?.toString() ?? ''}
          placeholder="1"
          onCommit={(entered) => {
            const parsed = maybeNumber(entered, '')
            return parsed.ok ? change({ turns: parsed.value }) : parsed.problem
          }}
        />
        <Field
          caption="Phase error in degrees, with its limit"
          value={typedText(phaseError)}
          placeholder="0.5 ± 0.2"
          onCommit={(entered) =>
            commitTyped(entered, '°', (typed) => change({ phaseError: typed }))
          }
        />
      </div>
      <label className="check-choice">
        <input
          type="checkbox"
          checked={reversed === true}
          onChange={({ target }) => change({ reversed: target.checked ? true : null })}
        />
        Connected the wrong way round
      </label>
      <div className="verbs">
        <button
          type="button"
          className="verb"
          onClick={() => store.getState().edit({ kind: 'remove-channel', id })}
        >
          {`Delete ${name}`}
        </button>
      </div>
    </fieldset>
  )
}
