import { success, type Typed } from '../../core'
import { readingsOf } from '../as-read'
import { labelOf } from '../names'
import type { Phasor, PhasorId, Reading, Sheet } from '../types'
import { withChange, without } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, withReplaced } from './lists'

/** Takes back every limit that was stated for a phasor, typed or read: what is assumed serves again. */
export interface ClearLimits {
  readonly kind: 'clear-limits'
  readonly id: PhasorId
}

/** Takes back the limits of a phasor's parts and of the readings that settle them. */
export const clearLimits: EditKind<ClearLimits> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'phasors', id)
    if (!found.ok) return found
    const cleared = withReplaced(sheet, 'phasors', withoutLimits(found.value))
    const { magnitude, angle } = readingsOf(sheet, id)
    return success(
      [...magnitude, ...angle].reduce<Sheet>(
        (changed, reading) =>
          withReplaced(changed, 'readings', withChange<Reading>(reading, { limit: null })),
        cleared,
      ),
    )
  },
  describe: (sheet, { id }) => `Clear the limits of ${labelOf(sheet, id)}`,
}

function withoutLimits(phasor: Phasor): Phasor {
  const cleared: { -readonly [part in keyof Phasor]: Phasor[part] } = { ...phasor }
  for (const part of ['magnitude', 'angle', 'real', 'imaginary'] as const) {
    const typed: Typed | undefined = phasor[part]
    if (typed) cleared[part] = without(typed, 'limit')
  }
  return cleared
}
