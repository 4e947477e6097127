import type { CircuitElement, Typed } from '../types'

/** A value that an element may have on its nameplate. */
export type MarkedValue = 'resistance' | 'inductance' | 'capacitance' | 'reactance'

/** A value that an element may have: `dcResistance` is measured, never marked. */
export type ElementValue = MarkedValue | 'dcResistance'

const VALUES_OF_KIND = {
  resistor: ['resistance'],
  coil: ['resistance', 'inductance'],
  capacitor: ['capacitance', 'resistance'],
  impedance: ['resistance', 'reactance'],
} as const satisfies { readonly [kind in CircuitElement['kind']]: readonly MarkedValue[] }

/** The values that make the impedance of an element of this kind. */
export function valuesOfKind(kind: CircuitElement['kind']): readonly MarkedValue[] {
  return VALUES_OF_KIND[kind]
}

/** Whether an element of this kind can have a value. */
export function hasValue(kind: CircuitElement['kind'], value: ElementValue): boolean {
  if (value === 'dcResistance') return kind === 'coil'
  return valuesOfKind(kind).includes(value)
}

const UNITS: { readonly [value in ElementValue]: string } = {
  resistance: 'Ω',
  dcResistance: 'Ω',
  inductance: 'H',
  capacitance: 'F',
  reactance: 'Ω',
}

/** The SI unit of a value. */
export function unitOfElementValue(value: ElementValue): string {
  return UNITS[value]
}

/** How a value is called in a sentence. */
export function nameOfElementValue(value: ElementValue): string {
  return value === 'dcResistance' ? 'dc resistance' : value
}

/** A value outside the nameplate: one that counts as an observation with its limit. */
export function countedValue(element: CircuitElement, value: ElementValue): Typed | undefined {
  const values: { readonly [name in ElementValue]?: Typed } = element
  return values[value]
}

/** A value on the nameplate. */
export function markedValue(element: CircuitElement, value: ElementValue): Typed | undefined {
  return value === 'dcResistance' ? undefined : element.marked?.[value]
}

/**
 * What the prediction takes for a value: the mark where there is one, else what counts, else, of a
 * coil's resistance, what was measured with direct current. Undefined where nothing is known.
 */
export function predictingValue(element: CircuitElement, value: MarkedValue): Typed | undefined {
  const stated = markedValue(element, value) ?? countedValue(element, value)
  if (stated !== undefined || value !== 'resistance') return stated
  return countedValue(element, 'dcResistance')
}

/** Whether a value of an element counts in the check: as an observation, not as the mark alone. */
export function countsInCheck(element: CircuitElement): boolean {
  return valuesOfKind(element.kind).some((value) => countedValue(element, value) !== undefined)
}
