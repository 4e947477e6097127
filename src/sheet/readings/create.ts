import { type Change, withChange } from '../edits/change'
import type { Id, PhasorId, Reading } from '../types'
import type { ReadingFigures } from './text'

/** What a reading is of, before its figures are known. */
export interface ReadingSubject {
  readonly id: Id
  readonly of: PhasorId
  readonly kind: Reading['kind']
  /** What an angle, shift or ellipse was measured against. */
  readonly against?: PhasorId
  /** The current of a power or power factor. */
  readonly with?: PhasorId
}

/** A reading of its subject, its figures, and what else is known of how it was taken. */
export function createReading(
  { id, of, kind, against, with: current }: ReadingSubject,
  figures: ReadingFigures,
  taken: Change<Reading> = {},
): Reading {
  const isPower = kind === 'power' || kind === 'reactive-power' || kind === 'power-factor'
  const other = isPower
    ? { with: current ?? of }
    : kind === 'magnitude' || against === undefined
      ? {}
      : { against }
  return withChange({ id, of, kind, ...other } as Reading, { ...taken, ...figures })
}
