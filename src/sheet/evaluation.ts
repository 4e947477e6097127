import type { Id } from './types'

/** A value in both forms: magnitude and degrees, real and imaginary part. */
export interface PolarValue {
  readonly magnitude: number
  readonly angle: number
  readonly real: number
  readonly imaginary: number
}

/** What is known of a phasor's part. */
export type PartState = 'given' | 'solved' | 'adjusted' | 'open'

/** A phasor's values; what is open is left out, part by part. */
export interface PhasorEvaluation {
  readonly id: Id
  readonly magnitude?: number
  readonly angle?: number
  readonly real?: number
  readonly imaginary?: number
  /** Expanded uncertainty of the magnitude, coverage 95 %. */
  readonly magnitudeLimit?: number
  /** Expanded uncertainty of the angle in degrees, coverage 95 %. */
  readonly angleLimit?: number
  /** Before any adjustment. */
  readonly asRead: { readonly magnitude?: number; readonly angle?: number }
  readonly magnitudeState: PartState
  readonly angleState: PartState
}

/**
 * A sum's exact resultant of its terms as read, beside what was measured. The closing error is
 * measured − resultant, and its percentage is of the measured magnitude (of the largest term's,
 * where the sum must close on itself).
 */
export interface SumEvaluation {
  readonly id: Id
  readonly resultant?: PolarValue
  readonly measured?: { readonly magnitude?: number; readonly angle?: number }
  readonly closingError?: {
    readonly magnitude: number
    readonly angle: number
    readonly percent: number
    /** How far the 95 % region of the gap reaches in the gap's own direction. */
    readonly allowed?: number
  }
  /** Whether the gap is within `allowed`. Left out, with the gap, where nothing checks the sum. */
  readonly closes?: boolean
}

/** A value and its expanded uncertainty, coverage 95 %. */
export interface Estimate {
  readonly value: number
  readonly expanded: number
}

/** One drawing that the readings allow: the phasors of which it fixes both parts. */
export interface Alternative {
  readonly phasors: readonly {
    readonly id: Id
    readonly magnitude: number
    readonly angle: number
  }[]
}

/** Whether all readings can be true together. */
export interface Agreement {
  readonly verdict: 'agree' | 'disagree' | 'nothing-to-check' | 'not-enough' | 'agree-on-correction'
  readonly chiSquare: number
  readonly degreesOfFreedom: number
  /** How often readings that are as good as their limits say would disagree at least so much. */
  readonly probability: number
  /** Readings that nothing checks. */
  readonly unchecked: readonly Id[]
}

/** What was found of an element; what is open is left out. */
export interface ElementEvaluation {
  readonly id: Id
  readonly impedance?: PolarValue
  readonly found?: {
    readonly resistance?: Estimate
    readonly inductance?: Estimate
    readonly capacitance?: Estimate
    readonly reactance?: Estimate
  }
}

/** Something that whoever reads the answer should know. */
export interface Caution {
  /** The id of what it is about, or `sheet`. */
  readonly about: string
  readonly text: string
}

/** What the program says of a sheet. A part that the program cannot compute is left out altogether. */
export interface Evaluation {
  readonly phasors: readonly PhasorEvaluation[]
  readonly sums: readonly SumEvaluation[]
  /** Every drawing that the readings allow, the one that is meant first. */
  readonly alternatives?: readonly Alternative[]
  readonly agreement?: Agreement
  /** Readings by how far they are from the others, in standard deviations, largest first. */
  readonly suspects?: readonly { readonly reading: Id; readonly score: number }[]
  readonly elements?: readonly ElementEvaluation[]
  readonly cautions?: readonly Caution[]
}
