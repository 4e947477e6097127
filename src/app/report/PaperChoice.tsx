import { type Paper, paperOf } from '../../drawing/report'
import { usePage, usePageStore } from '../store'
import type { Choice, Kind } from './pages'

const kinds: readonly Kind[] = ['report', 'construction']
const kindNames: { readonly [kind in Kind]: string } = {
  report: 'job report',
  construction: 'construction sheets',
}
const formats: readonly Paper['format'][] = ['A4', 'A3', 'Letter']
const orientations: readonly Paper['orientation'][] = ['landscape', 'portrait']

/** What is printed, and on which paper: that of the drawing is the sheet's own. */
export function PaperChoice(properties: {
  readonly choice: Choice
  readonly onChoose: (choice: Choice) => void
}) {
  const { choice, onChoose } = properties
  const store = usePageStore()
  const own = usePage((state) => state.history.sheet.drawing)
  const drawing = paperOf({ ...(own && { drawing: own }) })
  const setDrawing = (change: { paper: Paper['format'] } | { orientation: Paper['orientation'] }) =>
    store.getState().edit({ kind: 'set-drawing', drawing: { ...change, origin: null } })
  const setPaper = (change: Partial<Paper>) =>
    onChoose({ ...choice, paper: { ...choice.paper, ...change } })
  const { format, orientation } = choice.paper
  return (
    <div className="fields">
      <Select
        caption="What is printed"
        value={choice.kind}
        choices={kinds}
        names={kindNames}
        onChoose={(kind) => onChoose({ ...choice, kind })}
      />
      <Select
        caption="Paper of the drawing"
        value={drawing.format}
        choices={formats}
        onChoose={(paper) => setDrawing({ paper })}
      />
      <Select
        caption="The drawing lies"
        value={drawing.orientation}
        choices={orientations}
        onChoose={(lies) => setDrawing({ orientation: lies })}
      />
      <Select
        caption="Paper of the others"
        value={format ?? drawing.format}
        choices={formats}
        onChoose={(chosen) => setPaper({ format: chosen })}
      />
      <Select
        caption="The others lie"
        value={orientation ?? drawing.orientation}
        choices={orientations}
        onChoose={(lies) => setPaper({ orientation: lies })}
      />
    </div>
  )
}

function Select<Value extends string>(properties: {
  readonly caption: string
  readonly value: Value
  readonly choices: readonly Value[]
  /** What they are called; themselves where nothing is said. */
  readonly names?: { readonly [value in Value]: string }
  readonly onChoose: (value: Value) => void
}) {
  const { caption, value, choices, names, onChoose } = properties
  return (
    <label className="field">
      {caption}
      <select
        value={value}
        onChange={({ target }) => {
          const chosen = choices.find((each) => each === target.value)
          if (chosen !== undefined) onChoose(chosen)
        }}
      >
        {choices.map((each) => (
          <option key={each} value={each}>
            {names ? names[each] : each}
          </option>
        ))}
      </select>
    </label>
  )
}
