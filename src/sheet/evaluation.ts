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

/**
 * What a hand drew, read off through the scale, beside what it stands for: a phasor, or for the closing
 * arrow the exact resultant. Errors are drawn − exact. Values are those of the phasor, so an arrow that
 * was drawn reversed for a negative term counts turned round; the error vectors are as they lie on the
 * paper. What is open is left out: all of it where no scale is stated, the errors where what the arrow
 * stands for has no value yet.
 */
export interface HandEvaluation {
  readonly id: Id
  readonly magnitude?: number
  /** Left out of an arrow without length. */
  readonly angle?: number
  /** In the unit; positive: drawn too long. */
  readonly magnitudeError?: number
  /** Degrees in (−180°, 180°]; positive: drawn too far anticlockwise. */
  readonly angleError?: number
  /** How far the vector as drawn is from the exact one, in the unit. */
  readonly vectorError?: number
  /** What the hand did wrong in this arrow alone: of a closing arrow, how it misses what it joins. */
  readonly ownError?: PolarValue
  /**
   * How far its tail is off because of the arrows before it; of a closing arrow, how far what it joins
   * is off. Own and inherited error add up to that of its tip (of a closing arrow, of its vector).
   */
  readonly inheritedError?: PolarValue
  /** The vector error on the paper. */
  readonly millimetres?: number
  /** The most that the vector error may be on the paper, in millimetres, by the drawing's tolerance. */
  readonly allowed?: number
  readonly within?: boolean
}

/** What the program says of a sheet. A part that the program cannot compute is left out altogether. */
export interface Evaluation {
  readonly phasors: readonly PhasorEvaluation[]
  readonly sums: readonly SumEvaluation[]
  readonly hand: readonly HandEvaluation[]
}
