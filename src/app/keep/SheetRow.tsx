import { useMemo, useState } from 'react'
import { usePage, usePageStore } from '../store'
import { useKeeping } from './context'
import { openKept } from './open-kept'
import type { KeptSheet } from './record'
import { SheetPicture } from './SheetPicture'
import { duplicateKept, formatSaved, maybeSheet, renameKept } from './sheet-list'

/** One kept sheet of the list, with what can be done to it. */
export function SheetRow(properties: {
  readonly record: KeptSheet
  readonly onOpened: () => void
  readonly onDelete: () => void
}) {
  const { record, onOpened, onDelete } = properties
  const store = usePageStore()
  const keeping = useKeeping()
  const isOpen = usePage((state) => state.identity.id === record.id)
  const [isRenaming, setRenaming] = useState(false)
  const sheet = useMemo(() => maybeSheet(record), [record])
  const title = record.title || 'Untitled sheet'

  const rename = (text: string) => {
    setRenaming(false)
    if (text !== record.title) void renameKept(store, keeping, record, text)
  }

  return (
    <li className="sheet-row" data-sheet={record.id}>
      <SheetPicture sheet={sheet} />
      <div className="sheet-words">
        {isRenaming ? (
          <RenameField title={record.title} onDone={rename} />
        ) : (
          <p className="sheet-title">{title}</p>
        )}
        <p className="sheet-under">
          {[
            isOpen ? 'open here' : '',
            formatSaved(record.saved),
            record.copy?.why === 'tabs' ? 'a copy: two tabs changed it at once' : '',
            record.copy?.why === 'link'
              ? `a copy of “${record.copy.of}”, which came by a link`
              : '',
          ]
            .filter((part) => part !== '')
            .join(' · ')}
        </p>
        <div className="verbs">
          <button
            type="button"
            className="verb"
            aria-label={`Open ${title}`}
            onClick={() => {
              if (openKept(store, keeping, record)) onOpened()
            }}
          >
            Open
          </button>
          <button
            type="button"
            className="verb"
            aria-label={`Rename ${title}`}
            onClick={() => setRenaming(true)}
          >
            Rename
          </button>
          <button
            type="button"
            className="verb"
            aria-label={`Duplicate ${title}`}
            onClick={() => void duplicateKept(keeping, record)}
          >
            Duplicate
          </button>
          <button type="button" className="verb" aria-label={`Delete ${title}`} onClick={onDelete}>
            Delete
          </button>
        </div>
      </div>
    </li>
  )
}

/** Takes the new title with Enter or on leaving; Escape leaves the old one. */
function RenameField(properties: {
  readonly title: string
  readonly onDone: (title: string) => void
}) {
  const { title, onDone } = properties
  return (
    <input
      className="sheet-rename"
      aria-label="New title"
      defaultValue={title}
      maxLength={200}
      ref={(field) => field?.focus()}
      onBlur={(event) => onDone(event.currentTarget.value.trim())}
      onKeyDown={(event) => {
        if (event.key === 'Enter') event.currentTarget.blur()
        if (event.key !== 'Escape') return
        event.preventDefault()
        event.currentTarget.value = title
        event.currentTarget.blur()
      }}
    />
  )
}
