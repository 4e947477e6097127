import { success } from '../../core'
import type { Sheet } from '../types'
import { withChange } from './change'
import type { EditKind } from './edit-kind'
import { orNone } from './lists'

/** Says which of several drawings that the readings allow is meant; an empty list leaves it open. */
export interface Choose {
  readonly kind: 'choose'
  readonly chosen: NonNullable<Sheet['chosen']>
}

/** The choice replaces the one before as a whole. */
export const choose: EditKind<Choose> = {
  apply: (sheet, { chosen }) => success(withChange<Sheet>(sheet, { chosen: orNone(chosen) })),
  describe: (_, { chosen }) =>
    chosen.length === 0 ? 'Leave the drawing open' : 'Take another drawing',
}
