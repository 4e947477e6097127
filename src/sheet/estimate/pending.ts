import type { Observable, UncertaintyPart } from '../../core/estimate'
import type { SharedLimitPart } from '../readings/limit-part'
import type { Id, PhasorId } from '../types'

/** Where an observation comes from. */
export type Source =
  | { readonly kind: 'reading'; readonly reading: Id; readonly phasor: PhasorId }
  | { readonly kind: 'typed'; readonly phasor: PhasorId }
  | { readonly kind: 'element'; readonly element: Id }

/** An observation whose shared errors are not yet counted. */
export interface PendingObservation {
  readonly of: Observable
  readonly value: number
  readonly source: Source
  /** The errors of this observation alone, in its own unit. */
  readonly own: readonly UncertaintyPart[]
  /** The errors that it may have in common with others. */
  readonly shared: readonly SharedLimitPart[]
  /** Which part of a phasor, as it is drawn, this observation gives. */
  readonly gives?: 'magnitude' | 'angle'
}
