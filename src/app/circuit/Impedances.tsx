import { impedanceRows } from '../../drawing/circuit'
import type { Evaluation, Sheet } from '../../sheet'

/** The impedances of the elements and of the whole: by their marks, and by the readings. */
export function Impedances(properties: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation | undefined
}) {
  const { sheet, evaluation } = properties
  const rows = evaluation ? impedanceRows(sheet, evaluation) : []
  if (rows.length === 0) return null
  return (
    <table className="compared">
      <caption>Impedances; what was found is by the best values of the readings</caption>
      <thead>
        <tr>
          <th scope="col">Impedance of</th>
          <th scope="col">Predicted</th>
          <th scope="col">Found</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ of, name, predicted, found }) => (
          <tr key={of} data-total={of === 'total' || undefined}>
            <th scope="row">{name}</th>
            <Figures caption="Predicted" figures={predicted} />
            <Figures caption="Found" figures={found} />
          </tr>
        ))}
      </tbody>
    </table>
  )
}

function Figures(properties: { readonly caption: string; readonly figures: readonly string[] }) {
  const { caption, figures } = properties
  return (
    <td data-caption={caption} data-empty={figures.length === 0 || undefined}>
      {figures.map((figure) => (
        <span key={figure}>{figure}</span>
      ))}
    </td>
  )
}
