import { failure, type Result, success, wrapDegrees } from '../../core'
import { asReadOf, readingsOf } from '../as-read'
import { labelOf } from '../names'
import { newId } from '../new-id'
import { referenceOf } from '../reference'
import type { Id, Phasor, PhasorId, Reading, Sheet } from '../types'
import { without } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, withAdded, withReplaced } from './lists'
import { isRead } from './parts'
import { isDirect, onlyReading, type PolarPart, refuseIndirect, toTyped } from './read-parts'
import { withoutReadings } from './readings'
import { asTypedPolar } from './typed-parts'

/** Says how a phasor is known: its magnitude and angle typed, or read on a meter. */
export interface SetKnown {
  readonly kind: 'set-known'
  readonly id: PhasorId
  readonly as: 'typed' | 'read'
}

const PARTS: readonly PolarPart[] = ['magnitude', 'angle']

/**
 * Makes readings of what was typed, or the reverse; digits and limits are kept. The angle of the
 * reference stays typed, since it is 0 by definition and no meter shows it.
 */
export const setKnown: EditKind<SetKnown> = {
  apply: (sheet, { id, as }) => {
    const found = entryOf(sheet, 'phasors', id)
    if (!found.ok) return found
    return as === 'read' ? withReadings(sheet, found.value) : withTyped(sheet, found.value)
  },
  describe: (sheet, { id, as }) =>
    as === 'read'
      ? `Make the value of ${labelOf(sheet, id)} a reading`
      : `Make the value of ${labelOf(sheet, id)} a typed one`,
}

function withReadings(sheet: Sheet, phasor: Phasor): Result<Sheet> {
  if ([phasor.real, phasor.imaginary].some((typed) => typed?.limit !== undefined)) {
    return failure(
      `The limits of ${phasor.label} are those of a real and imaginary part, which no meter shows: type its magnitude and angle first.`,
    )
  }
  const polar = asTypedPolar(phasor)
  const parts = PARTS.filter(
    (part) =>
      polar[part] !== undefined &&
      !isRead(sheet, phasor, part) &&
      (part === 'magnitude' || referenceOf(sheet) !== phasor.id),
  )
  if (parts.length === 0) {
    return failure(`Type the value of ${phasor.label} first, then say that it was read.`)
  }
  let changed = withReplaced(sheet, 'phasors', without(polar, ...parts))
  for (const part of parts) {
    const reading = toReading(sheet, polar, part, newId(changed, 'r1'))
    changed = withAdded(changed, 'readings', [reading])
  }
  return success(changed)
}

function toReading(sheet: Sheet, phasor: Phasor, part: PolarPart, id: Id): Reading {
  const { value, text, limit } = phasor[part] ?? { value: 0 }
  const { reference, values } = asReadOf(sheet)
  const from = part === 'magnitude' ? 0 : (values.get(reference ?? '')?.angle ?? 0)
  const shown = from === 0 ? (text ?? value) : wrapDegrees(value - from)
  return { id, of: phasor.id, kind: part, shown, ...(limit === undefined ? {} : { limit }) }
}

function withTyped(sheet: Sheet, phasor: Phasor): Result<Sheet> {
  const parts = PARTS.filter((part) => isRead(sheet, phasor, part))
  if (parts.length === 0) return failure(`${phasor.label} was not read: it is typed already.`)
  const values = asReadOf(sheet).values.get(phasor.id) ?? {}
  let typed = asTypedPolar(phasor)
  const readings = new Set<Id>()
  for (const part of parts) {
    const reading = onlyReading(readingsOf(sheet, phasor.id), part, phasor)
    if (!reading.ok) return reading
    if (!isDirect(reading.value)) return refuseIndirect(sheet, reading.value)
    const value = values[part]
    if (value === undefined) {
      return failure(
        `The ${part} of ${phasor.label} is not known yet: settle what it was read against.`,
      )
    }
    typed = { ...typed, [part]: toTyped(sheet, phasor, reading.value, value) }
    readings.add(reading.value.id)
  }
  return success(withReplaced(withoutReadings(sheet, readings), 'phasors', typed))
}
