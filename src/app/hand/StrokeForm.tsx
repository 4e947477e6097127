import { type FormEvent, useEffect, useRef, useState } from 'react'
import { formatPolar, unitOf } from '../../core'
import {
  handArrowAt,
  type Meaning,
  type Position,
  placeStroke,
  type Scene,
  type Stroke,
  valueOfStroke,
} from '../../drawing'
import { newId, type Quantity, type Sheet, type Sum } from '../../sheet'
import { checkedSum, nameOfSum, quantityOfSum, usePage, usePageStore } from '../store'
import { nameOfPosition, nextPosition, positionsOf } from './names'

const quantities: readonly Quantity[] = ['voltage', 'current', 'impedance', 'power', 'other']
const letters = { voltage: 'V', current: 'I', impedance: 'Z', power: 'S', other: 'X' } as const

/** Asks what a new arrow is, once it is let go. Escape drops it without a trace. */
export function StrokeForm(properties: {
  readonly stroke: Stroke
  readonly scene: Scene
  readonly onDone: () => void
}) {
  const { stroke, scene, onDone } = properties
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const mode = usePage((state) => state.pen.mode)
  const chosen = usePage((state) => state.chosenSum)
  const sum = mode === 'hand' ? checkedSum(sheet, chosen) : undefined
  const [problem, setProblem] = useState<string>()
  const root = useRef<HTMLDivElement>(null)
  useEffect(() => {
    root.current?.querySelector<HTMLElement>('select, input')?.focus({ preventScroll: true })
  }, [])

  const place = (meaning: Meaning) => {
    const { edit, select } = store.getState()
    const result = placeStroke(sheet, scene, stroke, meaning)
    if (!result.ok) return setProblem(result.problem)
    if (edit(result.value)) select(newest(sheet, store.getState().history.sheet))
    onDone()
  }

  return (
    <div
      className="stroke-form over-board"
      ref={root}
      role="dialog"
      aria-label="What did you draw?"
      onKeyDown={(event) => {
        if (event.key === 'Escape') onDone()
      }}
    >
      {sum ? (
        <HandFields sheet={sheet} sum={sum} stroke={stroke} onPlace={place} />
      ) : (
        <PhasorFields sheet={sheet} scene={scene} stroke={stroke} onPlace={place} />
      )}
      <button type="button" className="verb" onClick={onDone}>
        Drop it
      </button>
      {problem !== undefined && (
        <p className="problem-text" role="alert">
          {problem}
        </p>
      )}
    </div>
  )
}

/** What an edit has added: it is picked, so that keys can set it right at once. */
function newest(before: Sheet, after: Sheet) {
  const hand = after.hand?.find((arrow) => !before.hand?.includes(arrow))
  if (hand) return { kind: 'hand', id: hand.id } as const
  const phasor = after.phasors.find(({ id }) => !before.phasors.some((old) => old.id === id))
  return phasor && ({ kind: 'phasor', id: phasor.id } as const)
}

function HandFields(properties: {
  readonly sheet: Sheet
  readonly sum: Sum
  readonly stroke: Stroke
  readonly onPlace: (meaning: Meaning) => void
}) {
  const { sheet, sum, stroke, onPlace } = properties
  const [position, setPosition] = useState<Position>(() => nextPosition(sheet, sum))
  const submit = (event: FormEvent) => {
    event.preventDefault()
    onPlace({ kind: 'hand', sum: sum.id, position })
  }
  return (
    <form onSubmit={submit}>
      <label className="field">
        {`${stroke.millimetres.toFixed(1)} mm at ${stroke.degrees.toFixed(1)}° stands for`}
        <select
          aria-label="It stands for"
          value={String(position)}
          onChange={({ target: { value } }) =>
            setPosition(value === 'closing' ? value : Number(value))
          }
        >
          {positionsOf(sum).map((each) => (
            <option key={each} value={each}>
              {nameOfPosition(sheet, sum, each)}
              {handArrowAt(sheet, sum.id, each) ? ', drawn anew' : ''}
            </option>
          ))}
        </select>
      </label>
      <button type="submit" className="verb main">
        Draw it
      </button>
    </form>
  )
}

function PhasorFields(properties: {
  readonly sheet: Sheet
  readonly scene: Scene
  readonly stroke: Stroke
  readonly onPlace: (meaning: Meaning) => void
}) {
  const { sheet, scene, stroke, onPlace } = properties
  const [quantity, setQuantity] = useState<Quantity>(
    () => sheet.phasors.at(-1)?.quantity ?? 'voltage',
  )
  const [label, setLabel] = useState<string>()
  const [sum, setSum] = useState(() => sumEndingAt(sheet, scene, stroke)?.id ?? '')
  const suggested = newId(sheet, `${letters[quantity]}1`)
  const sums = (sheet.sums ?? []).filter(
    (each) => each.terms.length === 0 || quantityOfSum(sheet, each) === quantity,
  )
  const isTerm = sums.some(({ id }) => id === sum)
  const submit = (event: FormEvent) => {
    event.preventDefault()
    const name = label ?? suggested
    onPlace({ kind: 'phasor', label: name, quantity, ...(isTerm && { sum }) })
  }
  return (
    <form onSubmit={submit}>
      <p className="stroke-value">
        {`${stroke.millimetres.toFixed(1)} mm · ${formatPolar(valueOfStroke(scene, stroke, quantity), unitOf(quantity))}`}
      </p>
      <label className="field">
        Label
        <input
          value={label ?? suggested}
          maxLength={100}
          autoComplete="off"
          onFocus={(event) => event.currentTarget.select()}
          onChange={({ target }) => setLabel(target.value)}
        />
      </label>
      <label className="field">
        Quantity
        <select value={quantity} onChange={({ target }) => setQuantity(target.value as Quantity)}>
          {quantities.map((each) => (
            <option key={each}>{each}</option>
          ))}
        </select>
      </label>
      {sums.length > 0 && (
        <label className="field">
          Stands
          <select
            aria-label="Stands"
            value={isTerm ? sum : ''}
            onChange={({ target }) => setSum(target.value)}
          >
            <option value="">by itself</option>
            {sums.map((each) => (
              <option key={each.id} value={each.id}>
                {`as the last term of ${nameOfSum(sheet, each)}`}
              </option>
            ))}
          </select>
        </label>
      )}
      <button type="submit" className="verb main">
        Draw it
      </button>
    </form>
  )
}

/** The sum on whose last tip a stroke begins. */
function sumEndingAt(sheet: Sheet, scene: Scene, { tail }: Stroke): Sum | undefined {
  return sheet.sums?.find(({ id, terms }) =>
    scene.arrows.some(
      ({ key, to }) =>
        key === `term:${id}:${terms.length - 1}` && to.x === tail.at.x && to.y === tail.at.y,
    ),
  )
}
