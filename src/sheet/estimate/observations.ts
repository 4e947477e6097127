import type { Observation, SharedError, UncertaintyPart } from '../../core/estimate'
import type { PendingObservation } from './pending'
import { correlatedSets, standardErrorOfMean } from './repeats'

/** Observations with their standard uncertainties, and the errors that they share. */
export interface CountedObservations {
  readonly observations: readonly Observation[]
  readonly sharedErrors: readonly SharedError[]
  /** The place of a shared error by its key. */
  readonly errorOf: ReadonlyMap<string, number>
}

/** The standard uncertainty of a limit that holds for certain: limit / √3 (GUM 4.3.7). */
export function standardOfLimit(limit: number): number {
  return limit / Math.sqrt(3)
}

function rectangle(limit: number): readonly UncertaintyPart[] {
  return limit > 0 ? [{ uncertainty: standardOfLimit(limit), shape: 'rectangular' }] : []
}

/**
 * Turns limits into standard uncertainties and counts who shares what. An error that only one
 * observation has is that observation's own: what a maker gives "of reading" then adds to its other
 * half-width, anything else is an independent part. `alwaysShared` names errors that something besides
 * the observations depends on.
 */
export function countObservations(
  pending: readonly PendingObservation[],
  alwaysShared: ReadonlySet<string> = new Set(),
): CountedObservations {
  const uses = new Map<string, number>()
  for (const { common } of pending) {
    for (const { key, halfWidth } of common) {
      if (halfWidth !== 0) uses.set(key, (uses.get(key) ?? 0) + 1)
    }
  }
  const isShared = (key: string) => alwaysShared.has(key) || (uses.get(key) ?? 0) > 1
  const sharedErrors: SharedError[] = []
  const errorOf = new Map<string, number>()
  const place = (key: string, error: SharedError): number => {
    const known = errorOf.get(key)
    if (known !== undefined) return known
    errorOf.set(key, sharedErrors.length)
    sharedErrors.push(error)
    return sharedErrors.length - 1
  }
  for (const key of alwaysShared) place(key, { shape: 'rectangular' })
  const sets = correlatedSets(pending)
  const observations = pending.map((each): Observation => {
    const apart = each.common.filter(({ key }) => !isShared(key))
    const joined = apart.filter(({ isOfReading }) => isOfReading === true)
    const limit = joined.reduce((sum, { halfWidth }) => sum + Math.abs(halfWidth), each.limit)
    const set = sets.get(each)
    const shared = each.common
      .filter(({ key, halfWidth }) => isShared(key) && halfWidth !== 0)
      .map(({ key, halfWidth }) => ({
        error: place(key, { shape: 'rectangular' }),
        sensitivity: standardOfLimit(halfWidth),
      }))
    const together = (set?.factors ?? []).map((sensitivity, k) => ({
      error: place(`${set?.name}#${k}`, {
        shape: 'normal',
        freedom: set?.freedom ?? 1,
        group: set?.name ?? '',
      }),
      sensitivity,
    }))
    const parts = [
      ...rectangle(limit),
      ...apart
        .filter(({ isOfReading }) => isOfReading !== true)
        .flatMap(({ halfWidth }) => rectangle(Math.abs(halfWidth))),
      ...(set === undefined ? standardErrorOfMean(each) : []),
    ]
    return { of: each.of, value: each.value, parts, shared: [...shared, ...together] }
  })
  return { observations, sharedErrors, errorOf }
}
