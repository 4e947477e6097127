import { DrawingMenu } from '../export'
import { LinkVerbs } from '../link'
import { ReportVerb } from '../report'
import { usePage, usePageStore } from '../store'

/** The page's head: the sheet's title and the verbs for the sheet as a whole. */
export function Header() {
  const store = usePageStore()
  const undone = usePage((state) => state.history.past.at(-1)?.description)
  const redone = usePage((state) => state.history.future[0]?.description)
  const { undo, redo } = store.getState()
  return (
    <header className="header">
      <h1>Phasogon</h1>
      <TitleField />
      <div className="verbs">
        <button
          type="button"
          className="verb"
          disabled={undone === undefined}
          title={undone}
          onClick={undo}
        >
          Undo
        </button>
        <button
          type="button"
          className="verb"
          disabled={redone === undefined}
          title={redone}
          onClick={redo}
        >
          Redo
        </button>
        <LinkVerbs />
        <DrawingMenu />
        <ReportVerb />
      </div>
    </header>
  )
}

function TitleField() {
  const store = usePageStore()
  const title = usePage((state) => state.history.sheet.title)
  return (
    <input
      key={title}
      className="title-field"
      aria-label="Title of the sheet"
      placeholder="Untitled sheet"
      defaultValue={title}
      maxLength={200}
      onKeyDown={(event) => {
        if (event.key === 'Enter') event.currentTarget.blur()
        if (event.key !== 'Escape') return
        event.currentTarget.value = title
        event.currentTarget.blur()
      }}
      onBlur={(event) => {
        const text = event.currentTarget.value.trim()
        if (text !== title) store.getState().edit({ kind: 'set-details', title: text })
      }}
    />
  )
}
