import { handArrowAt, type Position } from '../../drawing'
import { labelOf, type Sheet, type Sum } from '../../sheet'
import { nameOfSum } from '../store'

/** How an arrow of a construction is called: a term by its label, the last one by what it closes. */
export function nameOfPosition(sheet: Sheet, sum: Sum, position: Position): string {
  if (position === 'closing') return `closing arrow of ${nameOfSum(sheet, sum)}`
  const term = sum.terms[position]
  const label = labelOf(sheet, term?.phasor ?? '')
  return term?.sign === -1 ? `−${label}, drawn reversed` : label
}

/** The arrows of a sum's construction, in the order in which they are drawn. */
export function positionsOf(sum: Sum): readonly Position[] {
  return [...sum.terms.keys(), 'closing']
}

/** The first arrow of a construction that is not drawn yet; the first where all are. */
export function nextPosition(sheet: Sheet, sum: Sum): Position {
  const open = positionsOf(sum).find((position) => !handArrowAt(sheet, sum.id, position))
  return open ?? 0
}
