import { type Complex, divide, isFiniteComplex, magnitudeOf } from '../complex'

/**
 * What stands between two terminals, in Ω: a short circuit is 0, and `open` lets no current through.
 */
export type Impedance = Complex | 'open'

/** The values of an element: Ω, H and F. */
export type ElementValues =
  | { readonly kind: 'resistor'; readonly resistance: number }
  | { readonly kind: 'coil'; readonly resistance: number; readonly inductance: number }
  | { readonly kind: 'capacitor'; readonly resistance: number; readonly capacitance: number }
  | { readonly kind: 'impedance'; readonly resistance: number; readonly reactance: number }

/**
 * The impedance of an element at a frequency in Hz, R + jX with X = 2πfL or −1 / 2πfC. With direct
 * current, a frequency of 0, a coil is its resistance and a capacitor open; so is one of no capacitance.
 * Undefined where a value is not finite, or too large to be reckoned with.
 */
export function impedanceOf(element: ElementValues, frequency: number): Impedance | undefined {
  const { resistance } = element
  const reactance = reactanceOf(element, 2 * Math.PI * frequency)
  if (reactance === 'open') return Number.isFinite(resistance) ? 'open' : undefined
  return finite({ re: resistance, im: reactance })
}

function reactanceOf(element: ElementValues, angular: number): number | 'open' {
  switch (element.kind) {
    case 'resistor':
      return 0
    case 'coil':
      return angular * element.inductance
    case 'capacitor': {
      const susceptance = angular * element.capacitance
      return susceptance === 0 ? 'open' : -1 / susceptance
    }
    case 'impedance':
      return element.reactance
  }
}

/** Parts below this share of what cancelled in them are rounding. */
const ROUNDING = 16 * Number.EPSILON

/**
 * Impedances in series: their sum. A part that cancels but for rounding is 0, so that a circuit without
 * resistance is a short circuit at resonance. Undefined where one of them is not known, unless another
 * is open.
 */
export function inSeries(all: readonly (Impedance | undefined)[]): Impedance | undefined {
  if (all.includes('open')) return 'open'
  const known = all.filter(isClosed)
  return known.length === all.length ? sumOf(known) : undefined
}

/**
 * Impedances in parallel: the reciprocal of the sum of the reciprocals. One short circuit makes all of
 * them one; admittances that cancel but for rounding leave an open circuit. Undefined where one of them
 * is not known, unless another is a short circuit.
 */
export function inParallel(all: readonly (Impedance | undefined)[]): Impedance | undefined {
  if (all.some((each) => each !== undefined && isShort(each))) return { re: 0, im: 0 }
  if (all.includes(undefined)) return undefined
  const closed = all.filter(isClosed)
  if (closed.length === 0) return 'open'
  const [only] = closed
  if (closed.length === 1) return only
  const admittance = sumOf(closed.map(reciprocal))
  if (admittance === undefined) return undefined
  return isShort(admittance) ? 'open' : finite(reciprocal(admittance))
}

/** Whether an impedance is a short circuit. */
export function isShort(impedance: Impedance): boolean {
  return impedance !== 'open' && impedance.re === 0 && impedance.im === 0
}

function isClosed(impedance: Impedance | undefined): impedance is Complex {
  return impedance !== undefined && impedance !== 'open'
}

function reciprocal(z: Complex): Complex {
  return divide({ re: 1, im: 0 }, z)
}

function sumOf(values: readonly Complex[]): Complex | undefined {
  let [re, im, size] = [0, 0, 0]
  for (const value of values) {
    re += value.re
    im += value.im
    size += magnitudeOf(value)
  }
  if (!Number.isFinite(size)) return undefined
  const least = values.length > 1 ? ROUNDING * size : 0
  return finite({ re: Math.abs(re) <= least ? 0 : re, im: Math.abs(im) <= least ? 0 : im })
}

function finite(z: Complex): Complex | undefined {
  return isFiniteComplex(z) ? { re: z.re + 0, im: z.im + 0 } : undefined
}
