import type { Evaluation, Sheet } from '../../sheet'
import { readingLines } from './text'

/** How far each reading moved to its best value, in its own unit and as a share of its limit. */
export function ReadingMoves(properties: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation
}) {
  const { sheet, evaluation } = properties
  const lines = readingLines(sheet, evaluation)
  if (lines.length === 0) return null
  const hasSuspects = lines.some(({ score }) => score !== '')
  return (
    <table className="moves">
      <caption>
        {hasSuspects
          ? 'How far each reading had to move; the likeliest to be wrong first'
          : 'How far each reading moved'}
      </caption>
      <thead>
        <tr>
          <th scope="col">Reading</th>
          <th scope="col">Moved</th>
          <th scope="col">Of its limit</th>
          {hasSuspects && <th scope="col">Suspect by</th>}
        </tr>
      </thead>
      <tbody>
        {lines.map(({ id, name, moved, share, score }) => (
          <tr key={id}>
            <th scope="row">{name}</th>
            <td>{moved}</td>
            <td>{share}</td>
            {hasSuspects && <td>{score}</td>}
          </tr>
        ))}
      </tbody>
    </table>
  )
}
