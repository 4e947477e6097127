import { memo } from 'react'
import type { Id, Phasor, Quantity } from '../../sheet'
import { PhasorSymbol } from '../shell/PhasorSymbol'
import { usePageStore } from '../store'
import { ArrowMark } from './ArrowMark'
import { Cell } from './Cell'
import type { BestText, CellText, RowText } from './cells'
import { commitLabel, commitLimit, commitValue } from './commit'

const quantities: readonly Quantity[] = ['voltage', 'current', 'impedance', 'power', 'other']

/** What a row shows. `text` keeps its identity while nothing in it changed, so that the row rests. */
export interface PhasorRowProperties {
  readonly phasor: Phasor
  readonly text: RowText
  /** What was worked out of it; undefined until it is. */
  readonly best: BestText | undefined
  /** What was worked out is of the sheet before. */
  readonly former: boolean
  readonly selected: boolean
  readonly reference: boolean
}

/** One phasor of the schedule: every part can be typed, and the rest follows. */
export const PhasorRow = memo(function PhasorRow(properties: PhasorRowProperties) {
  const { phasor, text, best, former, selected, reference } = properties
  const store = usePageStore()
  const name = phasor.label || phasor.id

  const value = (
    part: 'magnitude' | 'angle' | 'real' | 'imaginary',
    caption: string,
    { solved, ...cell }: CellText,
  ) => (
    <td data-caption={caption} data-area={part} data-former={(solved && former) || undefined}>
      <Cell
        name={`${caption} of ${name}`}
        column={part}
        {...cell}
        onCommit={(entered) => commitValue(store, phasor, part, entered)}
      />
    </td>
  )

  return (
    <tr
      data-row={phasor.id}
      aria-selected={selected}
      onFocus={() => store.getState().select({ kind: 'phasor', id: phasor.id })}
    >
      <td data-area="label">
        <div className="mark-and-label">
          <ArrowMark quantity={phasor.quantity} />
          <LabelCell phasor={phasor} name={name} />
          {reference && (
            <abbr className="tag" title="The reference: angles count from it">
              ref.
            </abbr>
          )}
        </div>
      </td>
      <td data-area="quantity">
        <div className="cell">
          <select
            aria-label={`Quantity of ${name}`}
            value={phasor.quantity}
            onChange={(event) =>
              store.getState().edit({
                kind: 'set-phasor',
                id: phasor.id,
                change: { quantity: event.target.value as Quantity },
              })
            }
          >
            {quantities.map((quantity) => (
              <option key={quantity}>{quantity}</option>
            ))}
          </select>
        </div>
      </td>
      {value('magnitude', 'Magnitude', text.magnitude)}
      {value('angle', 'Angle', text.angle)}
      {value('real', 'Real', text.real)}
      {value('imaginary', 'Imaginary', text.imaginary)}
      <td data-caption="Limit" data-area="limit">
        <Cell
          name={`Limit of ${name}`}
          column="limit"
          {...text.limit}
          onCommit={(entered) => commitLimit(store, phasor, entered)}
        />
        {best && best.values.length > 0 && (
          <p className="best" data-former={former || undefined}>
            <span className="visually-hidden">Best values of {name}: </span>
            {best.values.map((value) => (
              <span key={value}>{value}</span>
            ))}
          </p>
        )}
      </td>
      <td data-area="known">
        <KnownChoice id={phasor.id} name={name} known={text.known} />
        {best && (
          <p className="best" data-former={former || undefined}>
            {best.states.map(({ of, state }) => (
              <span key={of}>
                {of !== '' && <span className="visually-hidden">{of} </span>}
                {state}
              </span>
            ))}
          </p>
        )}
      </td>
    </tr>
  )
})

function LabelCell({ phasor, name }: { readonly phasor: Phasor; readonly name: string }) {
  const store = usePageStore()
  return (
    <div className="label-cell cell">
      <Cell
        name={`Label of ${name}`}
        column="label"
        shown={phasor.label}
        typed={phasor.label}
        placeholder="label"
        onCommit={(entered) => commitLabel(store, phasor, entered)}
      />
      <PhasorSymbol label={phasor.label} />
    </div>
  )
}

function KnownChoice(properties: {
  readonly id: Id
  readonly name: string
  readonly known: RowText['known']
}) {
  const { id, name, known } = properties
  const store = usePageStore()
  return (
    <div className="cell">
      <select
        aria-label={`How ${name} is known`}
        value={known}
        onChange={(event) =>
          store.getState().edit({
            kind: 'set-known',
            id,
            as: event.target.value === 'read' ? 'read' : 'typed',
          })
        }
      >
        {(known === 'open' || known === 'partly') && (
          <option value={known} disabled>
            {known}
          </option>
        )}
        <option value="typed">typed</option>
        <option value="read">read</option>
      </select>
    </div>
  )
}
