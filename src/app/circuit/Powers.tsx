import { powerRows, resonanceText } from '../../drawing/circuit'
import type { Evaluation, Sheet } from '../../sheet'

const COLUMNS: readonly (readonly ['active' | 'reactive' | 'apparent' | 'factor', string])[] = [
  ['active', 'Active'],
  ['reactive', 'Reactive'],
  ['apparent', 'Apparent'],
  ['factor', 'Power factor, current'],
]

/** The powers of each element and of the whole, and where the circuit would be at resonance. */
export function Powers(properties: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation | undefined
}) {
  const { sheet, evaluation } = properties
  const rows = evaluation ? powerRows(sheet, evaluation) : []
  const resonance = evaluation && resonanceText(evaluation)
  return (
    <>
      {rows.length > 0 && (
        <table className="compared">
          <caption>
            {rows.some(({ isPredicted }) => isPredicted)
              ? 'Powers as predicted'
              : 'Powers by the best values of the readings'}
          </caption>
          <thead>
            <tr>
              <th scope="col">Element</th>
              {COLUMNS.map(([key, name]) => (
                <th key={key} scope="col">
                  {name}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr key={row.of} data-total={row.of === 'total' || undefined}>
                <th scope="row">{row.name}</th>
                {COLUMNS.map(([key, name]) => (
                  <td key={key} data-caption={name}>
                    {row[key]}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      )}
      {resonance !== undefined && <p className="resonance">{resonance}</p>}
    </>
  )
}
