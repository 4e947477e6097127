import { parseNumber } from '../../core'
import {
  assumedOf,
  labelOf,
  type Phasor,
  type Sheet,
  type WiredNode,
  wiredNodes,
} from '../../sheet'
import { Field } from '../details/Field'
import { maybeNumber, tryEdit } from '../readings/commit'
import { commitValue } from '../schedule/commit'
import { usePage, usePageStore } from '../store'

/** What drives the prediction, and what it assumes where nothing is stated. */
export function CircuitSettings(properties: { readonly sheet: Sheet; readonly wiring: WiredNode }) {
  const { sheet, wiring } = properties
  const store = usePageStore()
  const { edit, setPen } = store.getState()
  const isPredictionHidden = usePage((state) => state.pen.isPredictionHidden)
  const supply = sheet.phasors.find(({ id }) => id === sheet.supply)

  const commitFrequency = (text: string): string | undefined => {
    if (text === '') return tryEdit(store, { kind: 'set-details', frequency: null })
    const parsed = parseNumber(text, { unit: 'Hz' })
    return parsed.ok
      ? tryEdit(store, { kind: 'set-details', frequency: parsed.value })
      : parsed.problem
  }

  return (
    <>
      <div className="fields">
        <Field
          caption="Frequency of the supply, in Hz"
          value={sheet.frequency?.text ?? sheet.frequency?.value.toString() ?? ''}
          placeholder="50"
          onCommit={commitFrequency}
        />
        <label className="field">
          Predict from
          <select
            value={sheet.supply ?? ''}
            onChange={({ target }) => edit({ kind: 'set-details', supply: target.value || null })}
          >
            <option value="">the first that is known</option>
            {drivers(sheet, wiring).map((id) => (
              <option key={id} value={id}>
                {labelOf(sheet, id)}
              </option>
            ))}
          </select>
        </label>
        {supply && <SupplySize supply={supply} />}
      </div>
      <label className="check-choice">
        <input
          type="checkbox"
          checked={!isPredictionHidden}
          onChange={({ target }) => setPen({ isPredictionHidden: !target.checked })}
        />
        Draw the prediction in thin broken lines under the readings
      </label>
      <Assumptions sheet={sheet} />
    </>
  )
}

/** The voltages and currents of the circuit, and the supply where it is none of them. */
function drivers({ supply }: Sheet, wiring: WiredNode): readonly string[] {
  const known = [...wiredNodes(wiring)].flatMap(({ voltage, current }) =>
    [voltage, current].filter((id) => id !== undefined),
  )
  return [...new Set(supply === undefined ? known : [supply, ...known])]
}

function SupplySize({ supply }: { readonly supply: Phasor }) {
  const store = usePageStore()
  const { magnitude, label, id } = supply
  const name = label || id
  return (
    <Field
      caption={`Magnitude of ${name}, typed`}
      value={magnitude?.text ?? magnitude?.value.toString() ?? ''}
      placeholder={supply.quantity === 'current' ? '1.5 A' : '230 V'}
      onCommit={(text) => commitValue(store, supply, 'magnitude', text)}
    />
  )
}

function Assumptions({ sheet }: { readonly sheet: Sheet }) {
  const store = usePageStore()
  const { elementPercent } = assumedOf(sheet)

  const commitPercent = (text: string): string | undefined => {
    const parsed = maybeNumber(text, '%')
    if (!parsed.ok) return parsed.problem
    const { elementPercent: _, ...others } = sheet.assumed ?? {}
    const assumed = parsed.value === null ? others : { ...others, elementPercent: parsed.value }
    return tryEdit(store, {
      kind: 'set-details',
      assumed: Object.keys(assumed).length === 0 ? null : assumed,
    })
  }
  const commitSafety = (
    part: keyof NonNullable<Sheet['safety']>,
    unit: string,
    text: string,
  ): string | undefined => {
    const parsed = maybeNumber(text, unit)
    if (!parsed.ok) return parsed.problem
    const { [part]: _, ...others } = sheet.safety ?? {}
    const safety = parsed.value === null ? others : { ...others, [part]: parsed.value }
    return tryEdit(store, {
      kind: 'set-details',
      safety: Object.keys(safety).length === 0 ? null : safety,
    })
  }

  return (
    <details>
      <summary>Assumed tolerance, wet places, discharging</summary>
      <div className="fields">
        <Field
          caption="Assumed of elements, in %"
          value={sheet.assumed?.elementPercent?.toString() ?? ''}
          placeholder={`${elementPercent}`}
          onCommit={commitPercent}
        />
        <Field
          caption="Voltage that is safe to touch here, in V ac"
          value={sheet.safety?.voltageLimit?.toString() ?? ''}
          placeholder="50, less in wet places"
          onCommit={(text) => commitSafety('voltageLimit', 'V', text)}
        />
        <Field
          caption="Resistor that discharges capacitors, in Ω"
          value={sheet.safety?.dischargeResistance?.toString() ?? ''}
          placeholder="not said"
          onCommit={(text) => commitSafety('dischargeResistance', 'Ω', text)}
        />
      </div>
    </details>
  )
}
