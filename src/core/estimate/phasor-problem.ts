import type { UncertaintyPart } from './coverage'

/** The place of a phasor in `PhasorProblem.phasors`. */
export type PhasorIndex = number
/** The place of an element in `PhasorProblem.elements`. */
export type ElementIndex = number
/** The place of a shared error in `PhasorProblem.sharedErrors`. */
export type SharedErrorIndex = number

/**
 * What kind of thing was observed. Angles are in degrees, anticlockwise positive; the rest in SI units.
 * `turn`: by how many degrees the angle between the two was larger as the meter saw it.
 */
export type Observable =
  | { readonly kind: 'magnitude' | 'real' | 'imaginary'; readonly phasor: PhasorIndex }
  /** How far a phasor is ahead of another, or of the real axis where there is no other. */
  | { readonly kind: 'angle'; readonly phasor: PhasorIndex; readonly against?: PhasorIndex }
  /** The sine of that angle: an ellipse that does not say which way it leans. `either`: nor which one leads. */
  | {
      readonly kind: 'sine'
      readonly phasor: PhasorIndex
      readonly against: PhasorIndex
      readonly either?: boolean
      readonly turn?: number
    }
  /** Real and imaginary part of V · I*: positive reactive power where the current lags. */
  | {
      readonly kind: 'power' | 'reactive-power'
      readonly voltage: PhasorIndex
      readonly current: PhasorIndex
      readonly turn?: number
    }
  /** cos φ between the two; `sense` is the current's, where it was noted. */
  | {
      readonly kind: 'power-factor'
      readonly voltage: PhasorIndex
      readonly current: PhasorIndex
      readonly sense?: 'leads' | 'lags'
      readonly turn?: number
    }
  | {
      readonly kind: 'resistance' | 'reactance' | 'inductance' | 'capacitance'
      readonly element: ElementIndex
    }

/** A share of an error that several observations have in common. */
export interface SharedPart {
  readonly error: SharedErrorIndex
  /** By how much the error's standard uncertainty moves this observation, in its unit, signed. */
  readonly sensitivity: number
}

/** Something that was seen, and how well. */
export interface Observation {
  readonly of: Observable
  readonly value: number
  /** Independent causes of error of this observation alone. None, and none shared: it is exact. */
  readonly parts: readonly UncertaintyPart[]
  readonly shared?: readonly SharedPart[]
}

/** An error common to several observations. Its size is in the observations' sensitivities. */
export interface SharedError {
  readonly shape: UncertaintyPart['shape']
  readonly freedom?: number
  /** Errors of one group come from one set of repeats: they count as one cause. */
  readonly group?: string
}

/** A two-terminal element: V = (R + jX) · I, values unknown unless they are nothing by its kind. */
export interface ElementModel {
  readonly voltage: PhasorIndex
  readonly current: PhasorIndex
  /**
   * A resistor has no reactance. Resistor, coil and capacitor are passive, and a coil's reactance is
   * positive, a capacitor's negative; an impedance may be anything.
   */
  readonly kind: 'resistor' | 'coil' | 'capacitor' | 'impedance'
  /** A capacitor without losses has no resistance. */
  readonly lossless?: boolean
}

/** Phasors, signed, whose sum is nothing. */
export type ClosedSum = readonly { readonly phasor: PhasorIndex; readonly sign: 1 | -1 }[]

/** A set of phasors, what must hold between them, and what was observed of them. */
export interface PhasorProblem {
  /** How many phasors there are. */
  readonly phasors: number
  /** The phasor whose angle is this by definition, in degrees. */
  readonly reference?: { readonly phasor: PhasorIndex; readonly angle: number }
  readonly sums: readonly ClosedSum[]
  readonly elements: readonly ElementModel[]
  /** Hz; needed where inductances or capacitances are observed or wanted. */
  readonly frequency?: number
  /** The relative error of the frequency, where it is not exact. */
  readonly frequencyError?: SharedPart
  readonly sharedErrors: readonly SharedError[]
  readonly observations: readonly Observation[]
}
