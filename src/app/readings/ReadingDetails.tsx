import { formulasOf, type Id, limitOf, type Reading, type Sheet } from '../../sheet'
import { Field } from '../details/Field'
import { usePageStore } from '../store'
import { changeReading, commitRange, commitRepeats } from './commit'

/** How a reading was taken, by which formula it is converted, and what can be done to it. */
export function ReadingDetails(properties: {
  readonly sheet: Sheet
  readonly reading: Reading
  readonly number: number
}) {
  const { sheet, reading, number } = properties
  const store = usePageStore()
  return (
    <details className="reading-more">
      <summary aria-label={`More of reading ${number}`}>more</summary>
      <div className="fields">
        <PartSelect
          caption="Instrument"
          parts={(sheet.instruments ?? []).map(({ id, name }) => ({ id, name: name || id }))}
          value={reading.instrument}
          onChoose={(id) => changeReading(store, reading, { instrument: id ?? null })}
        />
        <Field
          caption="Range"
          value={reading.range?.toString() ?? ''}
          onCommit={(text) => commitRange(store, sheet, reading, text)}
        />
        <ChannelSelects sheet={sheet} reading={reading} />
        <Field
          caption="Pass"
          value={reading.pass ?? ''}
          placeholder="readings taken at one time"
          onCommit={(text) => changeReading(store, reading, { pass: text === '' ? null : text })}
        />
        <Field
          caption="Repeats"
          value={reading.repeats?.join(' ') ?? ''}
          placeholder="one for each pass, with spaces"
          onCommit={(text) => commitRepeats(store, reading, text)}
        />
      </div>
      <Reckoning sheet={sheet} reading={reading} />
      <div className="verbs">
        <button
          type="button"
          className="verb"
          onClick={() => changeReading(store, reading, { struck: reading.struck ? null : true })}
        >
          {reading.struck ? 'Use it again' : 'Strike it out'}
        </button>
        <button
          type="button"
          className="verb"
          onClick={() => store.getState().edit({ kind: 'remove-reading', id: reading.id })}
        >
          Delete reading
        </button>
      </div>
    </details>
  )
}

/** The formulas by which the reading is converted, and the parts that its limit is made of. */
function Reckoning({ sheet, reading }: { readonly sheet: Sheet; readonly reading: Reading }) {
  const formulas = formulasOf(sheet, reading)
  const limit = limitOf(sheet, reading)
  const parts = limit === undefined ? [] : [...limit.own, ...limit.shared]
  const names = [...new Set(parts.map(({ name }) => name))]
  return (
    <ul className="reckoning">
      {formulas.map((formula) => (
        <li key={formula}>{formula}</li>
      ))}
      {names.length > 0 && <li>{`The limit: ${names.join('; ')}.`}</li>}
    </ul>
  )
}

function ChannelSelects({ sheet, reading }: { readonly sheet: Sheet; readonly reading: Reading }) {
  const store = usePageStore()
  const parts = (sheet.channels ?? []).map(({ id, label }) => ({ id, name: label || id }))
  const isPower = reading.kind === 'power' || reading.kind === 'reactive-power'
  return (
    <>
      <PartSelect
        caption={isPower ? 'Channel of the voltage' : 'Channel'}
        parts={parts}
        value={reading.channel}
        onChoose={(id) => changeReading(store, reading, { channel: id ?? null })}
      />
      {isPower && (
        <PartSelect
          caption="Channel of the current"
          parts={parts}
          value={reading.currentChannel}
          onChoose={(id) => changeReading(store, reading, { currentChannel: id ?? null })}
        />
      )}
    </>
  )
}

function PartSelect(properties: {
  readonly caption: string
  readonly parts: readonly { readonly id: Id; readonly name: string }[]
  readonly value: Id | undefined
  readonly onChoose: (id: Id | undefined) => void
}) {
  const { caption, parts, value, onChoose } = properties
  return (
    <label className="field">
      {caption}
      <select value={value ?? ''} onChange={({ target }) => onChoose(target.value || undefined)}>
        <option value="">not said</option>
        {parts.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </select>
    </label>
  )
}
