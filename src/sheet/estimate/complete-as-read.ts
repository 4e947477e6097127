import { differenceDegrees, wrapDegrees } from '../../core'
import type { AsRead, KnownParts } from '../as-read'
import type { PhasorId } from '../types'
import type { Names } from './names'
import type { PendingObservation } from './pending'

/** The angle that one observation gives, where that of what it was measured against is known. */
function angleFrom(
  { of, value }: PendingObservation,
  names: Names,
  values: ReadonlyMap<PhasorId, KnownParts>,
): number | undefined {
  if (of.kind !== 'angle') return undefined
  if (of.against === undefined) return value
  const against = values.get(names.phasors[of.against]?.id ?? '')?.angle
  return against === undefined ? undefined : against + value
}

/** The mean of angles, by their differences from the first. */
function meanAngle(angles: readonly number[]): number | undefined {
  const [first] = angles
  if (first === undefined) return undefined
  const sum = angles.reduce((all, angle) => all + differenceDegrees(angle, first), 0)
  return wrapDegrees(first + sum / angles.length)
}

/**
 * What was read, completed with the angles that shifts and ellipses give. They are read like any
 * angle; several count with their mean.
 */
export function completeAsRead(
  asRead: AsRead,
  sources: readonly PendingObservation[],
  names: Names,
): AsRead {
  const values = new Map(asRead.values)
  let isChanged = true
  while (isChanged) {
    isChanged = false
    for (const { id } of names.phasors) {
      const known = values.get(id) ?? {}
      if (known.angle !== undefined) continue
      const angles = sources
        .filter(({ source, gives }) => {
          return gives === 'angle' && source.kind === 'reading' && source.phasor === id
        })
        .flatMap((source) => angleFrom(source, names, values) ?? [])
      const angle = meanAngle(angles)
      if (angle === undefined) continue
      values.set(id, { ...known, angle })
      isChanged = true
    }
  }
  return { ...asRead, values }
}
