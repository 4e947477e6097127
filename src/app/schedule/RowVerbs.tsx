import { describeRemoval, type Id, labelOf, newId, type Sheet } from '../../sheet'
import { Direction } from '../readings'
import { usePageStore } from '../store'

/** What can be done to the picked row as a whole. */
export function RowVerbs({ sheet, id }: { readonly sheet: Sheet; readonly id: Id }) {
  const store = usePageStore()
  const { edit } = store.getState()
  const at = sheet.phasors.findIndex((phasor) => phasor.id === id)
  const phasor = sheet.phasors[at]
  if (!phasor) return null
  const name = labelOf(sheet, id)
  const along = describeRemoval(sheet, id)

  return (
    <fieldset className="row-verbs">
      <legend className="visually-hidden">{`The row of ${name}`}</legend>
      <div className="verbs">
        <span>{`${name}:`}</span>
        <button
          type="button"
          className="verb"
          onClick={() => edit({ kind: 'duplicate-phasor', id, as: newId(sheet, id) })}
        >
          Duplicate
        </button>
        <button
          type="button"
          className="verb"
          disabled={at === 0}
          onClick={() => edit({ kind: 'move-phasor', id, to: at - 1 })}
        >
          Move up
        </button>
        <button
          type="button"
          className="verb"
          disabled={at === sheet.phasors.length - 1}
          onClick={() => edit({ kind: 'move-phasor', id, to: at + 1 })}
        >
          Move down
        </button>
        <button
          type="button"
          className="verb"
          disabled={sheet.reference === id}
          onClick={() => edit({ kind: 'set-details', reference: id })}
        >
          Make reference
        </button>
        <button type="button" className="verb" onClick={() => edit({ kind: 'remove-phasor', id })}>
          Delete
        </button>
      </div>
      <Direction phasor={phasor} />
      {along.length > 0 && <p>{`Deleting it takes along: ${along.join(', ')}.`}</p>}
    </fieldset>
  )
}
