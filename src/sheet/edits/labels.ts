import type { Id, Sheet } from '../types'

/** How a phasor is called in a sentence: its label, or its id where there is no such phasor. */
export function labelOf(sheet: Sheet, id: Id): string {
  return sheet.phasors.find((phasor) => phasor.id === id)?.label ?? id
}

/** How a sum is called in a sentence: its label, else the phasor it must equal, else its id. */
export function nameOfSum(sheet: Sheet, id: Id): string {
  const sum = (sheet.sums ?? []).find((other) => other.id === id)
  if (sum?.label !== undefined) return sum.label
  return typeof sum?.equals === 'string' ? labelOf(sheet, sum.equals) : id
}
