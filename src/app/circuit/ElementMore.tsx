import {
  type CircuitElement,
  type CircuitPath,
  formOf,
  isGroup,
  nodeAt,
  pathOf,
  type Sheet,
} from '../../sheet'
import { Field } from '../details/Field'
import { maybeNumber } from '../readings/commit'
import { PhasorSelect } from '../readings/PhasorSelect'
import { usePageStore } from '../store'
import { changeElement } from './commit'

/** What is seldom needed of an element: its phasors, its rating, and the verbs that change its place. */
export function ElementMore(properties: {
  readonly sheet: Sheet
  readonly element: CircuitElement
  readonly name: string
}) {
  const { sheet, element, name } = properties
  const store = usePageStore()
  const { rating = {} } = element

  const commitRating = (part: 'voltage' | 'current', unit: string, text: string) => {
    const parsed = maybeNumber(text, unit)
    if (!parsed.ok) return parsed.problem
    const { [part]: _, ...others } = rating
    const changed = parsed.value === null ? others : { ...others, [part]: parsed.value }
    return changeElement(store, element, {
      rating: Object.keys(changed).length === 0 ? null : changed,
    })
  }

  return (
    <details className="element-more">
      <summary aria-label={`More of ${name}`}>More</summary>
      <div className="fields">
        <Field
          caption="Rated voltage, in V"
          value={rating.voltage?.toString() ?? ''}
          placeholder="not said"
          onCommit={(text) => commitRating('voltage', 'V', text)}
        />
        <Field
          caption="Rated current, in A"
          value={rating.current?.toString() ?? ''}
          placeholder="not said"
          onCommit={(text) => commitRating('current', 'A', text)}
        />
        {(['voltage', 'current'] as const).map((side) => (
          <div key={side} className="field">
            <span>{side === 'voltage' ? 'Voltage across it' : 'Current through it'}</span>
            <PhasorSelect
              sheet={sheet}
              name={`${side === 'voltage' ? 'Voltage across' : 'Current through'} ${name}`}
              value={element[side]}
              onChoose={(id) =>
                id !== undefined &&
                store.getState().edit({
                  kind: 'set-element',
                  id: element.id,
                  change: { [side]: id },
                })
              }
            />
          </div>
        ))}
      </div>
      <div className="verbs">
        <GroupVerb sheet={sheet} element={element} />
        <button
          type="button"
          className="verb"
          onClick={() => store.getState().edit({ kind: 'remove-element', id: element.id })}
        >
          {`Remove ${name}`}
        </button>
      </div>
    </details>
  )
}

/** Puts an element and the branch after it into a group of the other form. */
function GroupVerb(properties: { readonly sheet: Sheet; readonly element: CircuitElement }) {
  const { sheet, element } = properties
  const store = usePageStore()
  const path = sheet.circuit && pathOf(sheet.circuit, element.id)
  const from = path?.at(-1)
  if (sheet.circuit === undefined || path === undefined || from === undefined) return null
  const at: CircuitPath = path.slice(0, -1)
  const group = nodeAt(sheet.circuit, at)
  const hasNext = nodeAt(sheet.circuit, [...at, from + 1]) !== undefined
  if (group === undefined || !isGroup(group) || !hasNext) return null
  const other = formOf(group) === 'series' ? 'parallel' : 'series'
  return (
    <button
      type="button"
      className="verb"
      onClick={() => store.getState().edit({ kind: 'group-branches', at, from, count: 2 })}
    >
      {`Put it in ${other} with the next`}
    </button>
  )
}
