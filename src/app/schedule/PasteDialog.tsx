import { useState } from 'react'
import { readRows } from '../../sheet'
import { Dialog } from '../shell/Dialog'
import { usePageStore } from '../store'
import { toTable } from './table-text'

/**
 * Rows from a spreadsheet. Rows that cannot be read are named, and nothing is added until all can,
 * so that the text can be put right where it stands.
 */
export function PasteDialog({
  text,
  onClose,
}: {
  readonly text: string
  readonly onClose: () => void
}) {
  const store = usePageStore()
  const [rows, setRows] = useState(text)
  const [problems, setProblems] = useState<readonly string[]>([])

  const add = async () => {
    const found = readRows(store.getState().history.sheet, await toTable(rows))
    if (found.problems.length > 0) return setProblems(found.problems)
    if (found.phasors.length === 0) return setProblems(['There are no rows in this text.'])
    const { phasors, readings } = found
    if (store.getState().edit({ kind: 'add-rows', phasors, readings })) onClose()
  }

  return (
    <Dialog heading="Rows from a spreadsheet" onClose={onClose}>
      <form
        className="stack"
        onSubmit={(event) => {
          event.preventDefault()
          void add()
        }}
      >
        <label htmlFor="rows-to-add">
          One phasor a row: label, magnitude, angle; quantity, limit and “read” may follow. A first
          row with the names of the columns changes their order. Tabs, commas or semicolons
          separate.
        </label>
        <textarea
          id="rows-to-add"
          value={rows}
          placeholder={'V1\t24.0\t0\nV2\t48.5\t62.5'}
          aria-describedby={problems.length > 0 ? 'rows-problems' : undefined}
          onChange={(event) => {
            setRows(event.target.value)
            setProblems([])
          }}
        />
        {problems.length > 0 && (
          <div id="rows-problems" className="problem-text" role="alert">
            <p>Nothing was added yet. Put these right:</p>
            <ul>
              {problems.slice(0, 12).map((problem) => (
                <li key={problem}>{problem}</li>
              ))}
            </ul>
            {problems.length > 12 && <p>{`And ${problems.length - 12} more.`}</p>}
          </div>
        )}
        <div className="verbs">
          <button type="submit" className="verb main" disabled={rows.trim() === ''}>
            Add rows
          </button>
          <button type="button" className="verb" onClick={onClose}>
            Cancel
          </button>
        </div>
      </form>
    </Dialog>
  )
}
