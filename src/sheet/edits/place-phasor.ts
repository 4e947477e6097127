import { failure, type Result, success } from '../../core'
import { labelOf } from '../names'
import type { PhasorId, Sheet, Tail } from '../types'
import { without } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, withReplaced } from './lists'

/** Places a loose phasor: its tail at a place or on another phasor's tip; null: where there is room. */
export interface PlacePhasor {
  readonly kind: 'place-phasor'
  readonly id: PhasorId
  readonly tail: Tail | null
}

/** Places a loose phasor. */
export const placePhasor: EditKind<PlacePhasor> = {
  apply: (sheet, { id, tail }) => {
    const found = entryOf(sheet, 'phasors', id)
    if (!found.ok) return found
    if (tail === null) return success(withReplaced(sheet, 'phasors', without(found.value, 'tail')))
    const free = checkTail(sheet, id, tail)
    if (!free.ok) return free
    return success(withReplaced(sheet, 'phasors', { ...found.value, tail }))
  },
  describe: (sheet, { id, tail }) => {
    const label = labelOf(sheet, id)
    if (tail === null) return `Let ${label} find its own place`
    return 'tipOf' in tail
      ? `Hang ${label} on the tip of ${labelOf(sheet, tail.tipOf)}`
      : `Place ${label}`
  },
  isLight: true,
}

function checkTail(sheet: Sheet, id: PhasorId, tail: Tail): Result<Tail> {
  if (!('tipOf' in tail)) {
    return Number.isFinite(tail.x) && Number.isFinite(tail.y)
      ? success(tail)
      : failure('That place is not on the paper.')
  }
  const tails = new Map(sheet.phasors.map((phasor) => [phasor.id, phasor.tail]))
  if (!tails.has(tail.tipOf)) return failure(`There is no phasor "${tail.tipOf}" on this sheet.`)
  let next: Tail | undefined = tail
  while (next !== undefined && 'tipOf' in next) {
    if (next.tipOf === id) {
      const label = labelOf(sheet, id)
      return failure(`${label} would hang on its own tip: hang it on another phasor.`)
    }
    next = tails.get(next.tipOf)
  }
  return success(tail)
}
