import { download } from '../export'
import type { BrokenRecord } from './record'
import { textOfBroken } from './sheet-list'

/** What lies in the store and is no sheet: it can be saved as it is, or deleted. */
export function BrokenRow(properties: {
  readonly record: BrokenRecord
  readonly onDelete: () => void
}) {
  const { record, onDelete } = properties
  return (
    <li className="sheet-row broken">
      <div className="sheet-words">
        <p className="sheet-title">A sheet that cannot be read</p>
        <p className="sheet-under">It was left as it is. Save what there is, and look into it.</p>
        <div className="verbs">
          <button
            type="button"
            className="verb"
            onClick={() =>
              download(
                new Blob([textOfBroken(record)], { type: 'application/json' }),
                `Unreadable sheet ${record.id}.json`,
              )
            }
          >
            Save what there is
          </button>
          <button type="button" className="verb" onClick={onDelete}>
            Delete
          </button>
        </div>
      </div>
    </li>
  )
}
