import { type ComparedPart, type ComparedRow, comparisonRows } from '../../drawing/circuit'
import { type Evaluation, labelOf, type Sheet, type WiredNode, wiredNodes } from '../../sheet'
import { PhasorSymbol } from '../shell/PhasorSymbol'

const COLUMNS: readonly (readonly [keyof ComparedPart, string])[] = [
  ['predicted', 'Predicted'],
  ['measured', 'Measured'],
  ['difference', 'Difference'],
  ['allowed', 'Allowed'],
]

/** Predicted and measured side by side, with a verdict for each quantity. */
export function Comparison(properties: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation | undefined
  readonly wiring: WiredNode
}) {
  const { sheet, evaluation, wiring } = properties
  const rows = evaluation ? comparisonRows(sheet, evaluation) : expectedRows(sheet, wiring)
  if (rows.length === 0) {
    return (
      <p className="circuit-lead">
        Nothing is predicted yet. It takes the supply’s magnitude, the frequency, and what each
        element is marked with.
      </p>
    )
  }
  return (
    <table className="compared comparison">
      <caption>Predicted and measured; differences are measured less predicted</caption>
      <thead>
        <tr>
          <th scope="col">Quantity</th>
          {COLUMNS.map(([key, name]) => (
            <th key={key} scope="col">
              {name}
            </th>
          ))}
          <th scope="col">Verdict</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <Row key={row.phasor} row={row} />
        ))}
      </tbody>
    </table>
  )
}

function Row({ row }: { readonly row: ComparedRow }) {
  const { label, parts, agrees, verdict } = row
  return (
    <tr data-agrees={agrees}>
      <th scope="row">
        <PhasorSymbol label={label} />
      </th>
      {COLUMNS.map(([key, name]) => (
        <td
          key={key}
          data-caption={name}
          data-empty={parts.every((part) => part[key] === '') || undefined}
        >
          {parts.map((part) => (
            <span key={part.part}>
              {part[key]}
              {key === 'difference' && part.percent !== '' && ` (${part.percent})`}
            </span>
          ))}
        </td>
      ))}
      <td data-caption="Verdict">
        <span className="compared-verdict">{verdict}</span>
      </td>
    </tr>
  )
}

/** The rows that will come, without their figures, so that nothing moves when these do. */
function expectedRows(sheet: Sheet, wiring: WiredNode): readonly ComparedRow[] {
  const own = new Set([...wiredNodes(wiring)].flatMap(({ voltage, current }) => [voltage, current]))
  const blank = { predicted: '', measured: '', difference: '', percent: '', allowed: '' }
  return sheet.phasors
    .filter(({ id }) => own.has(id))
    .map(({ id }) => ({
      phasor: id,
      label: labelOf(sheet, id),
      parts: [
        { part: 'magnitude', ...blank },
        { part: 'angle', ...blank },
      ],
      verdict: '',
    }))
}
