import { useState } from 'react'
import { emptySheet } from '../../sheet'
import { Dialog } from '../shell/Dialog'
import { usePageStore } from '../store'
import { BrokenRow } from './BrokenRow'
import { useKeeping } from './context'
import { RemovedRow } from './RemovedRow'
import type { BrokenRecord, KeptSheet } from './record'
import { SheetRow } from './SheetRow'
import { isFound } from './sheet-list'
import { useContents } from './useContents'

/** The verb that opens the list of kept sheets. */
export function MySheetsVerb() {
  const [isOpen, setOpen] = useState(false)
  return (
    <>
      <button type="button" className="verb" onClick={() => setOpen(true)}>
        My sheets
      </button>
      {isOpen && <MySheets onClose={() => setOpen(false)} />}
    </>
  )
}

/** The kept sheets, the latest change on top, to be found, opened, named, doubled and deleted. */
function MySheets({ onClose }: { readonly onClose: () => void }) {
  const store = usePageStore()
  const { storage, keep } = useKeeping()
  const contents = useContents()
  const [search, setSearch] = useState('')
  const [removed, setRemoved] = useState<readonly (KeptSheet | BrokenRecord)[]>([])

  const tellChange = () => keep.setState(({ changes }) => ({ changes: changes + 1 }))
  const remove = async (record: KeptSheet | BrokenRecord) => {
    await storage.remove(record.id)
    setRemoved((others) => [record, ...others])
    tellChange()
  }
  const putBack = async (record: KeptSheet | BrokenRecord) => {
    await storage.restore(record)
    setRemoved((others) => others.filter((other) => other !== record))
    tellChange()
  }
  const close = () => {
    const { identity, open } = store.getState()
    if (removed.some(({ id }) => id === identity.id)) {
      open(emptySheet(), 'new', 'The open sheet was deleted. This is a new one.')
    }
    onClose()
  }

  const found = contents?.sheets.filter((record) => isFound(record, search)) ?? []
  return (
    <Dialog heading="My sheets" onClose={close}>
      <div className="stack">
        <p>Kept in this browser, on this device, the latest change on top.</p>
        <div className="field">
          <label htmlFor="sheet-search">Search title, job, site and circuit</label>
          <input
            id="sheet-search"
            type="search"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
        </div>
        <ul className="sheet-list" aria-label="Kept sheets">
          {removed.map((record) => (
            <RemovedRow
              key={record.id}
              title={'title' in record ? record.title || 'Untitled sheet' : 'Unreadable sheet'}
              onPutBack={() => void putBack(record)}
            />
          ))}
          {found.map((record) => (
            <SheetRow
              key={record.id}
              record={record}
              onOpened={onClose}
              onDelete={() => void remove(record)}
            />
          ))}
          {contents?.broken.map((record) => (
            <BrokenRow key={record.id} record={record} onDelete={() => void remove(record)} />
          ))}
        </ul>
        {contents && found.length === 0 && (
          <p>
            {search === ''
              ? 'Nothing is kept yet: a sheet is kept from its first change on.'
              : 'No kept sheet has these words.'}
          </p>
        )}
        <form method="dialog" className="verbs">
          <button type="submit" className="verb main">
            Done
          </button>
        </form>
      </div>
    </Dialog>
  )
}
