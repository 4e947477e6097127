import { parseNumber, unitOf } from '../../core'
import { type Sheet, type Sum, toleranceOf } from '../../sheet'
import { drawnScene } from '../board/scene'
import { Field } from '../details/Field'
import { checkedSum, nameOfSum, quantityOfSum, usePage, usePageStore } from '../store'
import { HandRow } from './HandRow'
import { positionsOf } from './names'

/**
 * The construction of the checked sum in figures: what rule and protractor say of each arrow, drawn
 * here or on paper, and how far each is from what it stands for.
 */
export function HandPanel() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const chosen = usePage((state) => state.chosenSum)
  const isDrawing = usePage((state) => state.pen.mode === 'hand')
  const sum = checkedSum(sheet, chosen)
  const isOpen = isDrawing || sheet.hand !== undefined
  return (
    <details className="hand-panel" open={isOpen || undefined}>
      <summary>Drawn by hand</summary>
      {sum ? (
        <>
          <p className="hand-lead">
            {`Construct ${nameOfSum(sheet, sum)} on the board, or on paper: then type the length and the protractor angle of each arrow as drawn.`}
          </p>
          <Scale sheet={sheet} sum={sum} />
          <div className="hand-rows">
            {positionsOf(sum).map((position) => (
              <HandRow key={position} sheet={sheet} sum={sum} position={position} />
            ))}
          </div>
          {sheet.hand?.some((arrow) => arrow.sum === sum.id) && (
            <button
              type="button"
              className="verb"
              onClick={() => store.getState().edit({ kind: 'clear-hand', sum: sum.id })}
            >
              Rub out all
            </button>
          )}
        </>
      ) : (
        <p>Add a sum: its terms and its closing arrow are what a hand constructs.</p>
      )}
      <ConstructionChoice />
    </details>
  )
}

/** The scale of the construction, and how well it is to be drawn. */
function Scale({ sheet, sum }: { readonly sheet: Sheet; readonly sum: Sum }) {
  const store = usePageStore()
  const { edit } = store.getState()
  const quantity = quantityOfSum(sheet, sum)
  const unit = unitOf(quantity)
  const scale =
    sheet.drawing?.unitsPerCentimetre?.[quantity] ??
    drawnScene(sheet, 'light').unitsPerCentimetre[quantity]
  const { millimetres, degrees } = toleranceOf(sheet)

  const commitScale = (text: string): string | undefined => {
    const parsed = parseNumber(text, { unit })
    if (!parsed.ok) return parsed.problem
    const { value } = parsed.value
    if (value <= 0) return 'A scale is more than nothing: type what 10 mm of paper stand for.'
    const unitsPerCentimetre = { ...sheet.drawing?.unitsPerCentimetre, [quantity]: value }
    edit({ kind: 'set-drawing', drawing: { unitsPerCentimetre } })
    return undefined
  }
  const commitTolerance = (part: 'millimetres' | 'degrees', text: string): string | undefined => {
    const parsed = parseNumber(text, { unit: part === 'millimetres' ? 'mm' : '°' })
    if (!parsed.ok) return parsed.problem
    if (parsed.value.value < 0) return 'A tolerance is a size: type it without a sign.'
    const tolerance = { ...sheet.drawing?.tolerance, [part]: parsed.value.value }
    edit({ kind: 'set-drawing', drawing: { tolerance } })
    return undefined
  }

  return (
    <div className="fields">
      <Field
        caption={`10 mm on paper, in ${unit || 'units'}`}
        value={scale?.toString() ?? ''}
        onCommit={commitScale}
      />
      <Field
        caption="Tolerance of length, ± mm"
        value={String(millimetres)}
        onCommit={(text) => commitTolerance('millimetres', text)}
      />
      <Field
        caption="Tolerance of angle, ± degrees"
        value={String(degrees)}
        onCommit={(text) => commitTolerance('degrees', text)}
      />
    </div>
  )
}

/** Which lines of the construction are shown, and whether they are saved. */
function ConstructionChoice() {
  const store = usePageStore()
  const { construction, isConstructionSaved } = usePage((state) => state.pen)
  const { setPen } = store.getState()
  const set = (change: typeof construction) =>
    setPen({ construction: { ...construction, ...change } })
  return (
    <fieldset className="construction">
      <legend>Construction lines</legend>
      <label>
        <input
          type="checkbox"
          checked={construction.parallels ?? false}
          onChange={({ target }) => set({ parallels: target.checked })}
        />
        Parallels of the parallelogram
      </label>
      <label>
        <input
          type="checkbox"
          checked={construction.arcs ?? false}
          onChange={({ target }) => set({ arcs: target.checked })}
        />
        Arcs of the compasses
      </label>
      <label>
        <input
          type="checkbox"
          checked={isConstructionSaved}
          onChange={({ target }) => setPen({ isConstructionSaved: target.checked })}
        />
        Also in the saved drawing
      </label>
    </fieldset>
  )
}
