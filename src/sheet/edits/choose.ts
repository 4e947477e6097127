import { type Result, success } from '../../core'
import type { Sheet } from '../types'
import { withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, orNone } from './lists'

/**
 * Says which of several drawings that the readings allow is meant; an empty list leaves it open. Refused
 * where it names a phasor that is not there.
 */
export interface Choose {
  readonly kind: 'choose'
  readonly chosen: NonNullable<Sheet['chosen']>
}

/** The choice replaces the one before as a whole. */
export const choose: EditKind<Choose> = {
  apply: (sheet, { chosen }): Result<Sheet> => {
    for (const { phasor } of chosen) {
      const found = entryOf(sheet, 'phasors', phasor)
      if (!found.ok) return found
    }
    return success(withChange<Sheet>(sheet, { chosen: orNone(chosen) }))
  },
  describe: (_, { chosen }) =>
    chosen.length === 0 ? 'Leave the drawing open' : 'Take another drawing',
}
