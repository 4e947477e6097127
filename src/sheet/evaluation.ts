import type { Id } from './types'

/** A value in both forms: magnitude and degrees, real and imaginary part. */
export interface PolarValue {
  readonly magnitude: number
  readonly angle: number
  readonly real: number
  readonly imaginary: number
}

/** The 95 % region of a phasor's tip, 2.45 standard uncertainties each way: an ellipse, in the phasor's unit. */
export interface TipRegion {
  /** Half its length. */
  readonly major: number
  /** Half its breadth. */
  readonly minor: number
  /** Degrees in (−90°, 90°], anticlockwise, by which its length is turned from the real axis. */
  readonly turn: number
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
  /** Where the true tip lies, about that of the best value; left out where a part is open. */
  readonly region?: TipRegion
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
  /** The impedance in Ω that its marks, or what else is predicted from, come to; left out where it is open. */
  readonly predicted?: Limited
}

/**
 * A value with its expanded uncertainties, coverage 95 %; what is open is left out: the angle of what
 * is nothing, a limit that no propagation gives.
 */
export interface Limited {
  readonly magnitude?: number
  readonly angle?: number
  readonly real?: number
  readonly imaginary?: number
  readonly magnitudeLimit?: number
  /** Degrees. */
  readonly angleLimit?: number
}

/**
 * A voltage or current that the circuit predicts, beside what was typed or read of it. Differences are
 * measured − predicted. `allowed` and `allowedAngle` are both limits together, as the root of the sum of
 * their squares; `agrees` where every part that was measured lies within its own. The magnitude that
 * drives the prediction says nothing of it, and has no verdict.
 */
export interface ComparisonEvaluation {
  readonly phasor: Id
  readonly predicted: Limited
  readonly measured?: Limited
  readonly difference?: {
    /** Of the magnitudes, in the phasor's unit. */
    readonly magnitude?: number
    /** Of the predicted magnitude; left out where that is nothing. */
    readonly percent?: number
    /** Degrees in (−180°, 180°]. */
    readonly angle?: number
  }
  readonly allowed?: number
  /** Degrees. */
  readonly allowedAngle?: number
  readonly agrees?: boolean
}

/**
 * Power by V · I* of the best values, of an element or of all of the circuit. Active power is in W and
 * negative where it is given back; reactive in var, positive where the current lags; apparent in VA. The
 * factor is active / apparent, and left out, like the sense, where there is no power.
 */
export interface PowerEvaluation {
  readonly of: Id | 'total'
  readonly active: number
  readonly reactive: number
  readonly apparent: number
  readonly factor?: number
  /** What the current does to the voltage. */
  readonly sense?: 'leads' | 'lags' | 'in phase'
  /** Set where it is of predicted values, as before a job, when best ones are open. */
  readonly predicted?: true
}

/**
 * Where the circuit as a whole is purely resistive: the frequency in Hz, the quality factor there and
 * the bandwidth in Hz. The last two are left out where nothing takes up power.
 */
export interface ResonanceEvaluation {
  readonly frequency: number
  readonly quality?: number
  readonly bandwidth?: number
}

/** Something that whoever reads the answer should know. */
export interface Caution {
  /** The id of what it is about, or `sheet`. */
  readonly about: string
  readonly text: string
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
  /** Every drawing that the readings allow, the one that is meant first. */
  readonly alternatives?: readonly Alternative[]
  readonly agreement?: Agreement
  /** Readings by how far they are from the others, in standard deviations, largest first. */
  readonly suspects?: readonly { readonly reading: Id; readonly score: number }[]
  readonly elements?: readonly ElementEvaluation[]
  /** One a voltage and current of the circuit; left out on a sheet without a circuit. */
  readonly comparison?: readonly ComparisonEvaluation[]
  /** The impedance of the circuit as a whole in Ω, as predicted; left out where it is open. */
  readonly impedance?: Limited
  /** One an element of which both voltage and current are known; last the total. */
  readonly power?: readonly PowerEvaluation[]
  readonly resonance?: ResonanceEvaluation
  readonly cautions?: readonly Caution[]
  readonly hand: readonly HandEvaluation[]
}
