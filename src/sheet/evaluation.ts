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
  }
}

/** What the program says of a sheet. A part that the program cannot compute is left out altogether. */
export interface Evaluation {
  readonly phasors: readonly PhasorEvaluation[]
  readonly sums: readonly SumEvaluation[]
}
