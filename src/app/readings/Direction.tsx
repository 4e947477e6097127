import type { Phasor } from '../../sheet'
import { Field } from '../details/Field'
import { usePageStore } from '../store'
import { tryEdit } from './commit'
import './readings.css'

/** The positive direction of a phasor: from which terminal to which, and the verb that turns it round. */
export function Direction({ phasor }: { readonly phasor: Phasor }) {
  const { id, label, from, to } = phasor
  const store = usePageStore()
  const commit = (end: 'from' | 'to', text: string) =>
    tryEdit(store, { kind: 'set-phasor', id, change: { [end]: text === '' ? null : text } })
  return (
    <div className="direction">
      <Field caption="From terminal" value={from ?? ''} onCommit={(text) => commit('from', text)} />
      <Field caption="To terminal" value={to ?? ''} onCommit={(text) => commit('to', text)} />
      <button
        type="button"
        className="verb"
        onClick={() => store.getState().edit({ kind: 'reverse-phasor', id })}
      >
        {`Reverse ${label || id}`}
      </button>
    </div>
  )
}
