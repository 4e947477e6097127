import { parseNumber, unitOf } from '../../core'
import { type Drawing, type Quantity, referenceOf, type UnitsPerCentimetre } from '../../sheet'
import { usePage, usePageStore } from '../store'
import { Field } from './Field'

/** The paper, the scales and the reference: chosen here, or left to the page. */
export function DrawingFields() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const { edit } = store.getState()
  const drawing = sheet.drawing ?? {}
  const quantities = [...new Set(sheet.phasors.map(({ quantity }) => quantity))]
  const reference = referenceOf(sheet)
  const areTerminalsShown = usePage((state) => state.pen.areTerminalsShown)

  const commitScale = (quantity: Quantity, text: string): string | undefined => {
    const { [quantity]: _, ...others } = drawing.unitsPerCentimetre ?? {}
    if (text === '') {
      setScales(others)
      return undefined
    }
    const parsed = parseNumber(text, { unit: unitOf(quantity) })
    if (!parsed.ok) return parsed.problem
    if (parsed.value.value <= 0)
      return 'A scale is more than nothing: type what 10 mm of paper stand for.'
    setScales({ ...others, [quantity]: parsed.value.value })
    return undefined
  }
  const setScales = (scales: UnitsPerCentimetre) =>
    edit({
      kind: 'set-drawing',
      drawing: { unitsPerCentimetre: Object.keys(scales).length === 0 ? null : scales },
    })

  return (
    <div className="fields">
      <label className="field">
        Paper
        <select
          value={drawing.paper ?? 'A4'}
          onChange={({ target }) =>
            edit({
              kind: 'set-drawing',
              drawing: { paper: target.value as NonNullable<Drawing['paper']>, origin: null },
            })
          }
        >
          <option>A4</option>
          <option>A3</option>
          <option>Letter</option>
        </select>
      </label>
      <label className="field">
        Orientation
        <select
          value={drawing.orientation ?? 'landscape'}
          onChange={({ target }) =>
            edit({
              kind: 'set-drawing',
              drawing: {
                orientation: target.value as NonNullable<Drawing['orientation']>,
                origin: null,
              },
            })
          }
        >
          <option>landscape</option>
          <option>portrait</option>
        </select>
      </label>
      <label className="field">
        Angles count from
        <select
          value={sheet.reference ?? ''}
          onChange={({ target }) => edit({ kind: 'set-details', reference: target.value || null })}
        >
          <option value="">
            {reference === undefined
              ? 'the first phasor'
              : `${labelOrId(sheet.phasors, reference)}, chosen by the page`}
          </option>
          {sheet.phasors.map(({ id, label }) => (
            <option key={id} value={id}>
              {label || id}
            </option>
          ))}
        </select>
      </label>
      <label className="field">
        Terminals
        <select
          value={areTerminalsShown ? 'shown' : 'left out'}
          onChange={({ target }) =>
            store.getState().setPen({ areTerminalsShown: target.value === 'shown' })
          }
        >
          <option>left out</option>
          <option value="shown">shown as subscripts, from–to</option>
        </select>
      </label>
      {quantities.map((quantity) => (
        <Field
          key={quantity}
          caption={`10 mm of ${quantity}, in ${unitOf(quantity) || 'units'}`}
          value={drawing.unitsPerCentimetre?.[quantity]?.toString() ?? ''}
          placeholder="chosen to fit"
          onCommit={(text) => commitScale(quantity, text)}
        />
      ))}
    </div>
  )
}

function labelOrId(phasors: readonly { id: string; label: string }[], id: string): string {
  return phasors.find((phasor) => phasor.id === id)?.label || id
}
