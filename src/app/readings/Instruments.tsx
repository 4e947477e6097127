import { type Edit, type Instrument, newId, type Remark, type Sheet } from '../../sheet'
import { Field } from '../details/Field'
import { Folded } from '../shell/Folded'
import { usePageStore } from '../store'
import { AccuracyList } from './AccuracyList'
import { ChoiceField } from './ChoiceField'
import { tryEdit } from './commit'
import { EarlierInstruments } from './EarlierInstruments'
import { commitTyped } from './typed-field'

/** The meters that were used, with what their makers promise of them. */
export function Instruments(properties: {
  readonly sheet: Sheet
  readonly remarks: ReadonlyMap<string, readonly Remark[]>
}) {
  const { sheet, remarks } = properties
  const store = usePageStore()
  const instruments = sheet.instruments ?? []
  const add = () => {
    const id = newId(sheet, 'm1')
    const name = `Meter ${instruments.length + 1}`
    store.getState().edit({ kind: 'add-instrument', instrument: { id, name } })
  }
  return (
    <Folded heading={`Instruments${instruments.length === 0 ? '' : `: ${instruments.length}`}`}>
      {instruments.map((instrument) => (
        <InstrumentEditor
          key={instrument.id}
          instrument={instrument}
          remarks={remarks.get(instrument.id) ?? []}
        />
      ))}
      <div className="verbs">
        <button type="button" className="verb" onClick={add}>
          Add instrument
        </button>
        <EarlierInstruments sheet={sheet} />
      </div>
    </Folded>
  )
}

type InstrumentChange = Extract<Edit, { kind: 'set-instrument' }>['change']

function InstrumentEditor(properties: {
  readonly instrument: Instrument
  readonly remarks: readonly Remark[]
}) {
  const { instrument, remarks } = properties
  const { id, name } = instrument
  const store = usePageStore()
  const change = (fields: InstrumentChange) =>
    tryEdit(store, { kind: 'set-instrument', id, change: fields })
  const text = (field: 'serial' | 'category' | 'calibrationDue', caption: string, example = '') => (
    <Field
      caption={caption}
      type={field === 'calibrationDue' ? 'date' : 'text'}
      value={instrument[field] ?? ''}
      placeholder={example}
      onCommit={(entered) => change({ [field]: entered === '' ? null : entered })}
    />
  )
  return (
    <fieldset className="part">
      <legend>{name}</legend>
      <div className="fields">
        <Field
          caption="Name"
          value={name}
          onCommit={(entered) =>
            entered === ''
              ? 'An instrument needs a name, such as Clamp meter.'
              : change({ name: entered })
          }
        />
        {text('serial', 'Serial number')}
        {text('calibrationDue', 'Calibration due')}
        {text('category', 'Category', 'CAT III 600 V')}
        <ChoiceField
          caption="Responds to"
          value={instrument.responding}
          choices={{ 'true-rms': 'true rms', average: 'the average, marked in rms' }}
          onChoose={(responding) => change({ responding: responding ?? null })}
        />
        <ChoiceField
          caption="Counts angles"
          value={instrument.angles}
          choices={{
            'lead-positive': 'lead as positive',
            'lag-positive': 'lag as positive, to 360°',
          }}
          onChoose={(angles) => change({ angles: angles ?? null })}
        />
        <Field
          caption="Input resistance in Ω"
          value={
            instrument.inputResistance?.text ?? instrument.inputResistance?.value.toString() ?? ''
          }
          placeholder="10M"
          onCommit={(entered) =>
            commitTyped(entered, 'Ω', (inputResistance) => change({ inputResistance }))
          }
        />
      </div>
      <AccuracyList instrument={instrument} />
      {remarks.map((remark) => (
        <p key={remark.text} className="reading-remark">
          {remark.text}
        </p>
      ))}
      <div className="verbs">
        <button
          type="button"
          className="verb"
          onClick={() => store.getState().edit({ kind: 'remove-instrument', id })}
        >
          {`Delete ${name}`}
        </button>
      </div>
    </fieldset>
  )
}
