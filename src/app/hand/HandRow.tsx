import { type FocusEvent, type FormEvent, type KeyboardEvent, useState } from 'react'
import { parseAngle, parseNumber, wrapDegrees } from '../../core'
import {
  handArrowAt,
  hasScale,
  measureOf,
  NO_SCALE,
  nudgeHand,
  type Position,
  pinDrawing,
  typeHandArrow,
} from '../../drawing'
import type { HandArrow, Sheet, Sum } from '../../sheet'
import { nudgeOfKey } from '../board/keys'
import { drawnScene } from '../board/scene'
import { answerOf, hiddenSums, usePage, usePageStore } from '../store'
import { nameOfPosition } from './names'
import { resultText } from './text'

/** What is typed into a row and not drawn yet. */
interface Entry {
  readonly millimetres: string
  readonly degrees: string
}

/** One arrow of the construction: its length and angle as rule and protractor say, and how good it is. */
export function HandRow(properties: {
  readonly sheet: Sheet
  readonly sum: Sum
  readonly position: Position
}) {
  const { sheet, sum, position } = properties
  const store = usePageStore()
  const pen = usePage((state) => state.pen)
  const arrow = handArrowAt(sheet, sum.id, position)
  const isPicked = usePage(
    ({ selection }) => selection?.kind === 'hand' && selection.id === arrow?.id,
  )
  const [entry, setEntry] = useState<Entry>()
  const [problem, setProblem] = useState<string>()
  const name = nameOfPosition(sheet, sum, position)
  const shown = entry ?? entryOf(arrow)
  const found = answerOf(sheet).evaluation.hand.find(({ id }) => id === arrow?.id)
  const isHidden = hiddenSums(sheet, pen, sum.id).has(sum.id)

  const drop = () => {
    setEntry(undefined)
    setProblem(undefined)
  }
  const commit = () => {
    if (!entry || (entry.millimetres.trim() === '' && entry.degrees.trim() === '')) return drop()
    // Both figures are one arrow: the other is still to come.
    if (entry.millimetres.trim() === '' || entry.degrees.trim() === '') return
    const known = entryOf(arrow)
    if (entry.millimetres === known.millimetres && entry.degrees === known.degrees) return drop()
    const length = parseNumber(entry.millimetres, { unit: 'mm' })
    if (!length.ok) return setProblem(length.problem)
    if (length.value.value < 0) return setProblem('A length has no sign: turn the angle by 180°.')
    const angle = parseAngle(entry.degrees)
    if (!angle.ok) return setProblem(angle.problem)
    const scene = drawnScene(sheet, 'light')
    if (!hasScale(sheet, scene, sum.id)) return setProblem(NO_SCALE)
    const typed = {
      millimetres: length.value.value,
      degrees: wrapDegrees(angle.value.value),
    }
    const edit = typeHandArrow(sheet, scene, sum.id, position, typed)
    if (edit && store.getState().edit(pinDrawing(sheet, scene, edit))) drop()
  }
  const change = (part: Partial<Entry>) => {
    setEntry({ ...shown, ...part })
    setProblem(undefined)
  }
  /** Up and down in a field move what it says: by 1 mm or 1°, a tenth with Shift. */
  const nudgeField = (event: KeyboardEvent, part: 'millimetres' | 'degrees') => {
    const by = event.key === 'ArrowUp' || event.key === 'ArrowDown' ? nudgeOfKey(event) : undefined
    if (!by || !arrow || entry) return
    event.preventDefault()
    const step = by.millimetres
    const nudged = { millimetres: 0, degrees: 0, [part]: step }
    store.getState().edit(nudgeHand(sheet, arrow, nudged))
  }
  const leave = (event: FocusEvent) => {
    if (!event.currentTarget.contains(event.relatedTarget)) commit()
  }
  const submit = (event: FormEvent) => {
    event.preventDefault()
    commit()
  }

  return (
    <form
      className="hand-row"
      aria-label={`${name}, drawn by hand`}
      data-picked={isPicked || undefined}
      onSubmit={submit}
      onBlur={leave}
      onFocus={() => arrow && store.getState().select({ kind: 'hand', id: arrow.id })}
      onKeyDown={(event) => {
        if (event.key === 'Escape') drop()
      }}
    >
      <span className="hand-name">{name}</span>
      <input
        aria-label={`Length of ${name}, mm`}
        placeholder="mm"
        inputMode="decimal"
        autoComplete="off"
        value={shown.millimetres}
        aria-invalid={problem !== undefined}
        onChange={({ target }) => change({ millimetres: target.value })}
        onKeyDown={(event) => nudgeField(event, 'millimetres')}
      />
      <input
        aria-label={`Angle of ${name}, degrees`}
        placeholder="angle"
        autoComplete="off"
        value={shown.degrees}
        aria-invalid={problem !== undefined}
        onChange={({ target }) => change({ degrees: target.value })}
        onKeyDown={(event) => nudgeField(event, 'degrees')}
      />
      {/* Enter in either field draws the arrow; browsers ask for a button where there are two. */}
      <button type="submit" className="visually-hidden" tabIndex={-1}>
        {`Draw ${name}`}
      </button>
      {arrow && (
        <button
          type="button"
          className="verb small"
          aria-label={`Rub out ${name}`}
          onClick={() => store.getState().edit({ kind: 'remove-hand-arrow', id: arrow.id })}
        >
          ×
        </button>
      )}
      {found && !isHidden && (
        <p className="hand-result" data-within={found.within}>
          {resultText(sheet, sum, found)}
        </p>
      )}
      {problem !== undefined && (
        <p className="problem-text" role="alert">
          {problem}
        </p>
      )}
    </form>
  )
}

function entryOf(arrow: HandArrow | undefined): Entry {
  if (!arrow) return { millimetres: '', degrees: '' }
  const { millimetres, degrees } = measureOf(arrow.from, arrow.to)
  return { millimetres: rounded(millimetres), degrees: rounded(degrees).replace('-', '−') }
}

/** Finer than any rule; what the places on paper leave of rounding is not shown. */
function rounded(value: number): string {
  return String(Number(value.toFixed(3)) + 0)
}
