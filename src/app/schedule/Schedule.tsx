import { type ClipboardEvent, useMemo, useState } from 'react'
import { flushSync } from 'react-dom'
import { readingsByPhasor } from '../../drawing'
import { newId, type Phasor, referenceOf, type Sheet } from '../../sheet'
import { shownAnswer, shownSheet, usePage, usePageStore } from '../store'
import { type BestText, bestText, type RowText, rowText } from './cells'
import { copyRows } from './copy'
import { PasteDialog } from './PasteDialog'
import { PhasorRow } from './PhasorRow'
import { RowVerbs } from './RowVerbs'
import { useStable } from './useStable'

const columns = ['Phasor', 'Quantity', 'Magnitude', 'Angle', 'Real', 'Imaginary', 'Limit', 'Known']

/** Every phasor of the sheet in a table: all that the board shows can be read and typed here. */
export function Schedule() {
  const store = usePageStore()
  const sheet = usePage(shownSheet)
  const answer = usePage(shownAnswer)
  const { evaluation } = answer
  const whole = answer.whole ?? answer.former
  const selection = usePage((state) => state.selection)
  const [pasted, setPasted] = useState<string>()
  const selected = selection?.kind === 'phasor' ? selection.id : undefined
  const reference = referenceOf(sheet)
  const readings = useMemo(() => readingsByPhasor(sheet), [sheet])

  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain')
    if (!/[\t\n]/.test(text.trim())) return
    event.preventDefault()
    setPasted(text)
  }

  return (
    <section aria-labelledby="phasors-heading" onPaste={onPaste}>
      <h2 id="phasors-heading">Phasors</h2>
      {sheet.phasors.length > 0 && (
        <table className="schedule" aria-labelledby="phasors-heading">
          <thead>
            <tr>
              {columns.map((name) => (
                <th key={name} scope="col">
                  {name}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {sheet.phasors.map((phasor, index) => {
              const found = evaluation.phasors[index]
              return (
                found && (
                  <Row
                    key={phasor.id}
                    phasor={phasor}
                    text={rowText(sheet, phasor, found, readings)}
                    best={bestText(
                      phasor,
                      whole?.phasors.find(({ id }) => id === phasor.id),
                    )}
                    former={answer.whole === undefined}
                    selected={phasor.id === selected}
                    reference={phasor.id === reference}
                  />
                )
              )
            })}
          </tbody>
        </table>
      )}
      <div className="verbs">
        <button
          type="button"
          className="verb main"
          onClick={() => addPhasor(store.getState().edit, sheet)}
        >
          Add phasor
        </button>
        <button type="button" className="verb" onClick={() => setPasted('')}>
          Paste rows
        </button>
        <button
          type="button"
          className="verb"
          disabled={sheet.phasors.length === 0}
          onClick={() => copyRows(store)}
        >
          Copy rows
        </button>
      </div>
      {selected !== undefined && <RowVerbs sheet={sheet} id={selected} />}
      {pasted !== undefined && <PasteDialog text={pasted} onClose={() => setPasted(undefined)} />}
    </section>
  )
}

/** A row that rests while its texts say the same, however often they are worked out. */
function Row(properties: {
  readonly phasor: Phasor
  readonly text: RowText
  readonly best: BestText | undefined
  readonly former: boolean
  readonly selected: boolean
  readonly reference: boolean
}) {
  const { text, best } = properties
  return <PhasorRow {...properties} text={useStable(text)} best={useStable(best)} />
}

function addPhasor(
  edit: (edit: { kind: 'add-phasor'; phasor: Phasor }) => boolean,
  sheet: Sheet,
): void {
  const last = sheet.phasors.at(-1)
  const quantity = last?.quantity ?? 'voltage'
  const letter = { voltage: 'V', current: 'I', impedance: 'Z', power: 'S', other: 'X' }[quantity]
  const id = newId(sheet, letter)
  // The row must stand before the next key, which is the first letter of its label.
  flushSync(() => edit({ kind: 'add-phasor', phasor: { id, label: id, quantity } }))
  const row = document.querySelector(`[data-row="${id}"]`)
  row?.querySelector<HTMLInputElement>('[data-column="label"]')?.focus()
}
