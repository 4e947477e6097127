import { formatAngle, formatQuantity, unitOf } from '../../core'
import { type Id, labelOf, type Quantity, type Sheet, type Sum } from '../../sheet'
import { checkedSum } from './selectors'
import type { Answer } from './state'

/** The quantity that a sum adds: that of its first term that stands in the sheet. */
export function quantityOfSum(sheet: Sheet, sum: Sum): Quantity {
  for (const term of sum.terms) {
    const phasor = sheet.phasors.find(({ id }) => id === term.phasor)
    if (phasor) return phasor.quantity
  }
  return 'other'
}

/** How a sum is called: its own label, else what it equals, else that it is a sum. */
export function nameOfSum(sheet: Sheet, sum: Sum): string {
  if (sum.label) return sum.label
  if (sum.equals === 0) return 'Closed loop'
  return sum.equals === undefined ? 'Resultant' : labelOf(sheet, sum.equals)
}

/** What the check line says, as one sentence for a screen reader; empty where the sheet has no sum. */
export function describeAnswer({ sheet, evaluation }: Answer, chosen: Id | undefined): string {
  const sum = checkedSum(sheet, chosen)
  if (!sum) return ''
  const found = evaluation.sums.find(({ id }) => id === sum.id)
  const name = nameOfSum(sheet, sum)
  if (!found?.resultant) return `${name}: no resultant yet, a term is open.`
  const unit = unitOf(quantityOfSum(sheet, sum))
  const { magnitude, angle } = found.resultant
  const calculated = `${name}: calculated ${formatQuantity(magnitude, unit)} at ${formatAngle(angle)}`
  if (!found.closingError) return `${calculated}.`
  return `${calculated}, gap ${formatQuantity(found.closingError.magnitude, unit)}.`
}
