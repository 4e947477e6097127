import { type Evaluation, type Sheet, type WiredNode, wiredNodes } from '../../sheet'

/** What the figures of the circuit call for: the cautions about its elements and phasors. */
export function CircuitCautions(properties: {
  readonly sheet: Sheet
  readonly wiring: WiredNode
  readonly evaluation: Evaluation | undefined
}) {
  const { sheet, wiring, evaluation } = properties
  const own = new Set([
    ...(sheet.elements ?? []).map(({ id }) => id),
    ...[...wiredNodes(wiring)].flatMap(({ voltage, current }) => [voltage, current]),
    sheet.supply,
    'sheet',
  ])
  const cautions = (evaluation?.cautions ?? []).filter(({ about }) => own.has(about))
  if (cautions.length === 0) return null
  return (
    <>
      <h3>Cautions</h3>
      <ul className="cautions">
        {cautions.map(({ about, text }) => (
          <li key={`${about} ${text}`}>{text}</li>
        ))}
      </ul>
    </>
  )
}
