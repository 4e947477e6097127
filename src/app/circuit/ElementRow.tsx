import {
  type CircuitElement,
  countsInCheck,
  type Evaluation,
  foundBesideMark,
  nameOfElement,
  type Sheet,
} from '../../sheet'
import { Cell } from '../schedule/Cell'
import { usePageStore } from '../store'
import { changeElement } from './commit'
import { ElementMore } from './ElementMore'
import { ElementValues } from './ElementValues'
import { ELEMENT_KINDS } from './names'

/** An element: what it is called and marked with, and what the readings found of it. */
export function ElementRow(properties: {
  readonly sheet: Sheet
  readonly element: CircuitElement
  readonly evaluation: Evaluation | undefined
}) {
  const { sheet, element, evaluation } = properties
  const store = usePageStore()
  const name = nameOfElement(sheet, element.id)
  const counts = countsInCheck(element)
  const isOpen = !counts && element.marked === undefined
  return (
    <fieldset
      className="element"
      aria-label={name}
      data-element={element.id}
      onFocus={() => store.getState().select({ kind: 'phasor', id: element.voltage })}
    >
      <div className="element-head">
        <Cell
          name={`Name of ${name}`}
          column="element-label"
          shown={name}
          typed={element.label ?? ''}
          placeholder={element.id}
          onCommit={(text) => changeElement(store, element, { label: text === '' ? null : text })}
        />
        <span className="element-kind">{ELEMENT_KINDS[element.kind]}</span>
        <label className="check-choice">
          <input
            type="checkbox"
            aria-label={`${name} counts in the check`}
            checked={counts}
            disabled={isOpen}
            onChange={({ target }) =>
              store
                .getState()
                .edit({ kind: 'count-element', id: element.id, counts: target.checked })
            }
          />
          counts in the check
        </label>
      </div>
      <ElementValues element={element} name={name} sheet={sheet} />
      <Found sheet={sheet} element={element} evaluation={evaluation} />
      <ElementCautions element={element} evaluation={evaluation} />
      <ElementMore sheet={sheet} element={element} name={name} />
    </fieldset>
  )
}

/** What the figures of an element call for; all cautions of the sheet stand with its best values. */
function ElementCautions(properties: {
  readonly element: CircuitElement
  readonly evaluation: Evaluation | undefined
}) {
  const { element, evaluation } = properties
  const own = (evaluation?.cautions ?? []).filter(({ about }) => about === element.id)
  if (own.length === 0) return null
  return (
    <ul className="cautions">
      {own.map(({ text }) => (
        <li key={text}>{text}</li>
      ))}
    </ul>
  )
}

/** What was found beside the mark, a sentence for each value. */
function Found(properties: {
  readonly sheet: Sheet
  readonly element: CircuitElement
  readonly evaluation: Evaluation | undefined
}) {
  const { sheet, element, evaluation } = properties
  const found = evaluation?.elements?.find(({ id }) => id === element.id)
  const values = found ? foundBesideMark(sheet, element, found) : []
  if (values.length === 0) return null
  return (
    <ul className="found">
      {values.map(({ value, text, verdict }) => (
        <li key={value} data-verdict={verdict}>
          {text}
        </li>
      ))}
    </ul>
  )
}
