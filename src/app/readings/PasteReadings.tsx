import { useState } from 'react'
import { readReadingRows } from '../../sheet'
import { toTable } from '../schedule/table-text'
import { Dialog } from '../shell/Dialog'
import { usePageStore } from '../store'

/**
 * Readings from a spreadsheet. Rows that cannot be read are named, and nothing is added until all can,
 * so that the text can be put right where it stands.
 */
export function PasteReadings({
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
    const found = readReadingRows(store.getState().history.sheet, await toTable(rows))
    if (found.problems.length > 0) return setProblems(found.problems)
    if (found.readings.length === 0) return setProblems(['There are no rows in this text.'])
    const { phasors, readings } = found
    if (store.getState().edit({ kind: 'add-rows', phasors, readings })) onClose()
  }

  return (
    <Dialog heading="Readings from a spreadsheet" onClose={onClose}>
      <form
        className="stack"
        onSubmit={(event) => {
          event.preventDefault()
          void add()
        }}
      >
        <label htmlFor="readings-to-add">
          One reading a row: phasor, what was shown; what it was measured against, instrument,
          range, limit and pass may follow. A first row with the names of the columns changes their
          order. A phasor that is not there yet is added.
        </label>
        <textarea
          id="readings-to-add"
          value={rows}
          placeholder={'I\t1.26, 4 turns\nVR\t24.0\nVR\t2.5 lags\tI'}
          aria-describedby={problems.length > 0 ? 'readings-problems' : undefined}
          onChange={(event) => {
            setRows(event.target.value)
            setProblems([])
          }}
        />
        {problems.length > 0 && (
          <div id="readings-problems" className="problem-text" role="alert">
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
            Add readings
          </button>
          <button type="button" className="verb" onClick={onClose}>
            Cancel
          </button>
        </div>
      </form>
    </Dialog>
  )
}
