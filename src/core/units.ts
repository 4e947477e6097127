/** What kind of quantity a phasor is. */
export type Quantity = 'voltage' | 'current' | 'impedance' | 'power' | 'other'

const UNITS: { readonly [quantity in Quantity]: string } = {
  voltage: 'V',
  current: 'A',
  impedance: 'Ω',
  power: 'VA',
  other: '',
}

/** The SI unit in which phasors of a quantity are kept and shown; empty where there is none. */
export function unitOf(quantity: Quantity): string {
  return UNITS[quantity]
}
