import type { Sheet } from './types'

/** Limits where none is stated. */
export interface AssumedLimits {
  /** Per cent of a value. */
  readonly percent: number
  readonly degrees: number
  /** Per cent of an element's value. */
  readonly elementPercent: number
}

/** The limits that a sheet assumes: its own, else 1 %, 1° and 5 % (common practice, no source). */
export function assumedOf({ assumed }: Sheet): AssumedLimits {
  return { percent: 1, degrees: 1, elementPercent: 5, ...assumed }
}
