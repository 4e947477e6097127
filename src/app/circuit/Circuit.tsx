import { partedFrom, type Sheet, wiringOf } from '../../sheet'
import { answerOf, usePage, usePageStore } from '../store'
import { AddElement } from './AddElement'
import { Branches } from './Branches'
import { CircuitSettings } from './CircuitSettings'
import './circuit.css'
import { Comparison } from './Comparison'
import { Diagrams } from './Diagrams'
import { Impedances } from './Impedances'
import { Powers } from './Powers'
import { StartCircuit } from './StartCircuit'

/** The circuit behind the readings: building it, and what it says of them. */
export function Circuit() {
  // The committed sheet: a drag changes no element, and is not to wait for their words in each frame.
  const sheet = usePage((state) => state.history.sheet)
  return (
    <section aria-labelledby="circuit-heading" className="circuit">
      <h2 id="circuit-heading">Circuit</h2>
      {sheet.circuit === undefined ? <StartCircuit /> : <Built sheet={sheet} />}
    </section>
  )
}

function Built({ sheet }: { readonly sheet: Sheet }) {
  const answer = usePage((state) => answerOf(state.history.sheet))
  const wiring = wiringOf(sheet)
  const evaluation = answer.whole ?? answer.former
  if (wiring === undefined) return null
  const isEmpty = (sheet.elements ?? []).length === 0
  return (
    <>
      <Branches sheet={sheet} wired={wiring} evaluation={evaluation} />
      <AddElement sheet={sheet} wiring={wiring} />
      <Parted sheet={sheet} />
      <CircuitSettings sheet={sheet} wiring={wiring} />
      {!isEmpty && (
        <div data-former={answer.whole === undefined || undefined}>
          <Comparison sheet={sheet} evaluation={evaluation} wiring={wiring} />
          <Impedances sheet={sheet} evaluation={evaluation} />
          <Powers sheet={sheet} evaluation={evaluation} />
          <Diagrams sheet={sheet} evaluation={evaluation ?? answer.evaluation} />
        </div>
      )}
      <DeleteCircuit />
    </>
  )
}

/** Where edits by hand have parted the sheet from its circuit. */
function Parted({ sheet }: { readonly sheet: Sheet }) {
  const sentences = partedFrom(sheet)
  if (sentences.length === 0) return null
  return (
    <div className="parted">
      <p>The sheet was edited by hand, and is no longer as its circuit has it:</p>
      <ul>
        {sentences.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </div>
  )
}

function DeleteCircuit() {
  const store = usePageStore()
  return (
    <div className="verbs">
      <button
        type="button"
        className="verb"
        onClick={() => store.getState().edit({ kind: 'remove-circuit' })}
      >
        Delete the circuit
      </button>
    </div>
  )
}
