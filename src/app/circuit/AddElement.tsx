import { useState } from 'react'
import { flushSync } from 'react-dom'
import {
  type CircuitElement,
  type Form,
  formOf,
  isGroup,
  type Sheet,
  type WiredNode,
  wiredNodes,
} from '../../sheet'
import { usePageStore } from '../store'
import { ELEMENT_KINDS, KIND_LIST, keyOfPath, nameOfNode } from './names'

/** Adds an element where a sentence says: a coil, in parallel, with R. */
export function AddElement(properties: { readonly sheet: Sheet; readonly wiring: WiredNode }) {
  const { sheet, wiring } = properties
  const store = usePageStore()
  const [kind, setKind] = useState<CircuitElement['kind']>('resistor')
  const [pickedForm, setForm] = useState<Form>()
  const [pickedAt, setAt] = useState('')
  const nodes = [...wiredNodes(wiring)]
  const at = nodes.find(({ path }) => keyOfPath(path) === pickedAt) ?? wiring
  const form = pickedForm ?? (isGroup(wiring.node) ? formOf(wiring.node) : 'series')

  const add = () => {
    const before = new Set(sheet.elements?.map(({ id }) => id))
    // The new row must stand before the next key, which is the first digit of its value.
    flushSync(() =>
      store.getState().edit({ kind: 'add-element', element: { kind }, at: at.path, form }),
    )
    const { sheet: after } = store.getState().history
    const added = after.elements?.find(({ id }) => !before.has(id))
    const row = document.querySelector(`[data-element="${added?.id}"]`)
    row?.querySelector<HTMLInputElement>('[data-column="element-value"]')?.focus()
  }

  return (
    <fieldset className="add-element">
      <legend>Add to the circuit</legend>
      <select
        className="choice"
        aria-label="What to add"
        value={kind}
        onChange={({ target }) => setKind(KIND_LIST.find((each) => each === target.value) ?? kind)}
      >
        {KIND_LIST.map((each) => (
          <option key={each} value={each}>
            {ELEMENT_KINDS[each]}
          </option>
        ))}
      </select>
      <select
        className="choice"
        aria-label="How it is joined"
        value={form}
        onChange={({ target }) => setForm(target.value === 'parallel' ? 'parallel' : 'series')}
      >
        <option value="series">in series with</option>
        <option value="parallel">in parallel with</option>
      </select>
      <select
        className="choice"
        aria-label="With what"
        value={keyOfPath(at.path)}
        onChange={({ target }) => setAt(target.value)}
      >
        {nodes.map((node) => (
          <option key={keyOfPath(node.path)} value={keyOfPath(node.path)}>
            {nameOfNode(sheet, node)}
          </option>
        ))}
      </select>
      <button type="button" className="verb main" onClick={add}>
        Add element
      </button>
    </fieldset>
  )
}
