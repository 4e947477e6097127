import { type Edit, labelOf, type Sheet, type Sum, type Term } from '../../sheet'
import { PhasorSymbol } from '../shell/PhasorSymbol'
import { nameOfSum, quantityOfSum, usePageStore } from '../store'
import { type TermHandle, useTermDrag } from './useTermDrag'

type SumChange = Extract<Edit, { kind: 'set-sum' }>['change']
type Equals = NonNullable<Sum['equals']>

/** One sum as an equation: what it must equal, its terms with their signs, and how it is drawn. */
export function SumEditor(properties: {
  readonly sheet: Sheet
  readonly sum: Sum
  readonly chosen: boolean
}) {
  const { sheet, sum, chosen } = properties
  const store = usePageStore()
  const name = nameOfSum(sheet, sum)
  const keys = keysOf(sum.terms)
  const change = (next: SumChange) =>
    store.getState().edit({ kind: 'set-sum', id: sum.id, change: next })

  const { target, handleOf } = useTermDrag((from, to) => {
    change({ terms: moved(sum.terms, from, to) })
  })

  return (
    <fieldset
      className="sum"
      data-chosen={chosen || undefined}
      onFocus={() => store.getState().chooseSum(sum.id)}
    >
      <legend className="visually-hidden">{`Sum: ${name}`}</legend>
      <div className="equation">
        <EqualsChoice sheet={sheet} sum={sum} onChoose={(equals) => change({ equals })} />
        <span aria-hidden="true">=</span>
        {sum.terms.map((term, index) => (
          <TermChip
            key={keys[index]}
            term={term}
            label={labelOf(sheet, term.phasor)}
            first={index === 0}
            last={index === sum.terms.length - 1}
            isTarget={index === target}
            handle={handleOf(index)}
            onChange={(next) =>
              change({ terms: sum.terms.map((old, at) => (at === index ? next : old)) })
            }
            onMove={(step) => change({ terms: moved(sum.terms, index, index + step) })}
            onRemove={() => change({ terms: sum.terms.filter((_, at) => at !== index) })}
          />
        ))}
        <AddTerm
          sheet={sheet}
          sum={sum}
          onAdd={(phasor) => change({ terms: [...sum.terms, { phasor }] })}
        />
      </div>
      <div className="verbs">
        <select
          className="choice"
          aria-label={`How ${name} is drawn`}
          value={sum.arrangement ?? 'tip-to-tail'}
          onChange={(event) =>
            change({ arrangement: event.target.value as 'tip-to-tail' | 'from-origin' })
          }
        >
          <option value="tip-to-tail">drawn tip to tail</option>
          <option value="from-origin">drawn from one origin</option>
        </select>
        <button
          type="button"
          className="verb"
          aria-label={`Delete sum ${name}`}
          onClick={() => store.getState().edit({ kind: 'remove-sum', id: sum.id })}
        >
          Delete sum
        </button>
      </div>
    </fieldset>
  )
}

function EqualsChoice(properties: {
  readonly sheet: Sheet
  readonly sum: Sum
  readonly onChoose: (equals: Equals | null) => void
}) {
  const { sheet, sum, onChoose } = properties
  const candidates = candidatesFor(sheet, sum).filter(
    ({ id }) => !sum.terms.some((term) => term.phasor === id),
  )
  return (
    <select
      className="choice"
      aria-label="What the sum must equal"
      value={sum.equals === undefined ? '' : String(sum.equals)}
      onChange={({ target }) => {
        if (target.value === '') onChoose(null)
        else onChoose(target.value === '0' ? 0 : target.value)
      }}
    >
      <option value="">resultant</option>
      <option value="0">0 (must close)</option>
      {candidates.map(({ id, label }) => (
        <option key={id} value={id}>
          {label || id}
        </option>
      ))}
    </select>
  )
}

function AddTerm(properties: {
  readonly sheet: Sheet
  readonly sum: Sum
  readonly onAdd: (phasor: string) => void
}) {
  const { sheet, sum, onAdd } = properties
  const candidates = candidatesFor(sheet, sum).filter(({ id }) => id !== sum.equals)
  return (
    <select
      className="choice"
      aria-label="Add a term to the sum"
      value=""
      onChange={({ target }) => onAdd(target.value)}
    >
      <option value="" disabled>
        add a term
      </option>
      {candidates.map(({ id, label }) => (
        <option key={id} value={id}>
          {label || id}
        </option>
      ))}
    </select>
  )
}

function TermChip(properties: {
  readonly term: Term
  readonly label: string
  readonly first: boolean
  readonly last: boolean
  /** A term that is being dragged would take this place. */
  readonly isTarget: boolean
  readonly handle: TermHandle
  readonly onChange: (term: Term) => void
  readonly onMove: (step: 1 | -1) => void
  readonly onRemove: () => void
}) {
  const { term, label, first, last, isTarget, handle, onChange, onMove, onRemove } = properties
  const negative = term.sign === -1
  return (
    <span className="term" data-target={isTarget || undefined}>
      <button
        type="button"
        aria-label={`Sign of ${label}: ${negative ? 'minus' : 'plus'}`}
        onClick={() => onChange({ ...term, sign: negative ? 1 : -1 })}
      >
        {negative ? '−' : '+'}
      </button>
      <span className="term-handle" {...handle}>
        <PhasorSymbol label={label} />
      </span>
      <button
        type="button"
        aria-label={`Move ${label} earlier`}
        disabled={first}
        onClick={() => onMove(-1)}
      >
        ←
      </button>
      <button
        type="button"
        aria-label={`Move ${label} later`}
        disabled={last}
        onClick={() => onMove(1)}
      >
        →
      </button>
      <button type="button" aria-label={`Take ${label} out of the sum`} onClick={onRemove}>
        ×
      </button>
    </span>
  )
}

/** The phasors that may stand in a sum: all where it is empty, else those of its quantity. */
function candidatesFor(sheet: Sheet, sum: Sum): Sheet['phasors'] {
  if (sum.terms.length === 0) return sheet.phasors
  const quantity = quantityOfSum(sheet, sum)
  return sheet.phasors.filter((phasor) => phasor.quantity === quantity)
}

function moved<Entry>(list: readonly Entry[], from: number, to: number): readonly Entry[] {
  const rest = list.filter((_, at) => at !== from)
  return [...rest.slice(0, to), list[from] as Entry, ...rest.slice(to)]
}

/** A key for each term that outlives reordering; a phasor may stand in a sum twice. */
function keysOf(terms: readonly Term[]): readonly string[] {
  const seen = new Map<string, number>()
  return terms.map(({ phasor }) => {
    const count = (seen.get(phasor) ?? 0) + 1
    seen.set(phasor, count)
    return `${phasor}:${count}`
  })
}
