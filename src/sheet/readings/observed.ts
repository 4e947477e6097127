import type { Accuracy, PhasorId, Sense } from '../types'

/**
 * What a reading says of phasors, in SI units and degrees. `turn` is what the channels' phase errors
 * make of it: the angle between the two as the meter saw it was that much larger.
 */
export type Observed =
  | { readonly kind: 'magnitude'; readonly value: number }
  /** By how many degrees, in (−180, 180], the phasor leads another, the reference where none is named. */
  | { readonly kind: 'angle'; readonly value: number; readonly against?: PhasorId }
  /** The sine of that angle, where its quadrant is open; `either`: also which of the two leads. */
  | {
      readonly kind: 'sine'
      readonly value: number
      readonly against?: PhasorId
      readonly either: boolean
      readonly turn: number
    }
  /** Real or imaginary part of V · I*, of the phasor as V with another as I. */
  | {
      readonly kind: 'power' | 'reactive-power'
      readonly value: number
      readonly with: PhasorId
      readonly turn: number
    }
  /** The cosine of the angle from the current to the voltage; the sense is the current's. */
  | {
      readonly kind: 'power-factor'
      readonly value: number
      readonly with: PhasorId
      readonly sense?: Sense
      readonly turn: number
    }

/** A figure on a display, and what an error of it does. */
export interface Figure {
  readonly value: number
  /** The step of its last digit; undefined where it shows none. */
  readonly resolution?: number
  /** By how much an error of the figure moves what the reading comes to; never past what can be. */
  readonly moves: (error: number) => number
}

/** A reading, understood: its main figure, and what it comes to. */
export interface Indication extends Figure {
  readonly observed: Observed
  /** The function of the meter that was used, as its accuracy statements name them. */
  readonly of?: Accuracy['of']
  /** A second figure that the same function showed: the period of a shift. */
  readonly beside?: Figure
  /** How the limit is assumed where nobody stated one. */
  readonly assumed: 'percent' | 'degrees'
}
