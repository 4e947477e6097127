import type { Id, Reading, Sheet } from './types'

/** How a phasor is called in a sentence: its label, or its id where it has none or is not there. */
export function labelOf(sheet: Sheet, id: Id): string {
  return sheet.phasors.find((phasor) => phasor.id === id)?.label || id
}

/** How a sum is called in a sentence: its label, else the phasor it must equal, else its id. */
export function nameOfSum(sheet: Sheet, id: Id): string {
  const sum = (sheet.sums ?? []).find((other) => other.id === id)
  if (sum?.label !== undefined) return sum.label
  return typeof sum?.equals === 'string' ? labelOf(sheet, sum.equals) : id
}

/** The kinds of readings in words. */
export const NAMES_OF_KINDS: { readonly [kind in Reading['kind']]: string } = {
  magnitude: 'magnitude',
  angle: 'angle',
  shift: 'shift',
  ellipse: 'ellipse',
  power: 'power',
  'reactive-power': 'reactive power',
  'power-factor': 'power factor',
}

/** How a reading is called: its number and what it is of, as `3: Vcoil, magnitude`. */
export function nameOfReading(sheet: Sheet, id: Id): string {
  const at = (sheet.readings ?? []).findIndex((reading) => reading.id === id)
  const reading = sheet.readings?.[at]
  if (reading === undefined) return id
  return `${at + 1}: ${labelOf(sheet, reading.of)}, ${NAMES_OF_KINDS[reading.kind]}`
}
