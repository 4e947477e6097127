import type { Observable } from '../../core/estimate'
import type { Id, PhasorId } from '../types'

/** An error that several observations may have in common, as a half-width in this observation's unit. */
export interface CommonError {
  /** Observations with the same key have the same error. */
  readonly key: string
  /** Signed: which way the error moves this observation. */
  readonly halfWidth: number
  /** A maker's "of reading": alone, it adds to the observation's own half-width (JCGM 100, 4.3.7). */
  readonly isOfReading?: boolean
}

/** Where an observation comes from. */
export type Source =
  | { readonly kind: 'reading'; readonly reading: Id; readonly phasor: PhasorId }
  | { readonly kind: 'typed'; readonly phasor: PhasorId }
  | { readonly kind: 'element'; readonly element: Id }

/** An observation whose shared errors are not yet counted. Limits are half-widths, in its own unit. */
export interface PendingObservation {
  readonly of: Observable
  readonly value: number
  readonly source: Source
  /** Half-width of what is this observation's own. */
  readonly limit: number
  readonly common: readonly CommonError[]
  /** The indications behind the value, in its own unit, and the set to which they belong. */
  readonly repeats?: { readonly values: readonly number[]; readonly set?: string }
  /** Which part of a phasor, as it is drawn, this observation gives. */
  readonly gives?: 'magnitude' | 'angle'
}
