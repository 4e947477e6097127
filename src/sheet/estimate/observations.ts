import type { Observation, SharedError } from '../../core/estimate'
import type { SharedLimitPart } from '../readings/limit-part'
import type { PendingObservation } from './pending'

/** Observations with the errors that they share. */
export interface CountedObservations {
  readonly observations: readonly Observation[]
  readonly sharedErrors: readonly SharedError[]
  /** The place of a shared error by its name. */
  readonly errorOf: ReadonlyMap<string, number>
}

/** How many observations each error, or each group of errors, moves. */
function countUses(pending: readonly PendingObservation[]): ReadonlyMap<string, number> {
  const uses = new Map<string, number>()
  for (const { shared } of pending) {
    const names = new Set(
      shared.flatMap(({ error, group, sensitivity }) =>
        sensitivity === 0 ? [] : [group ?? error],
      ),
    )
    for (const name of names) uses.set(name, (uses.get(name) ?? 0) + 1)
  }
  return uses
}

/** Errors of one group, of one observation alone, are one cause. */
function asOwn(parts: readonly SharedLimitPart[]): PendingObservation['own'] {
  const causes = new Map<string, PendingObservation['own'][number]>()
  for (const { error, group, uncertainty, shape, freedom } of parts) {
    const before = causes.get(group ?? error)?.uncertainty ?? 0
    const own = { uncertainty: Math.hypot(before, uncertainty), shape }
    causes.set(group ?? error, freedom === undefined ? own : { ...own, freedom })
  }
  return [...causes.values()]
}

/**
 * Counts who shares what: an error that only one observation has is that observation's own.
 * `alwaysShared` names errors that something besides the observations depends on.
 */
export function countObservations(
  pending: readonly PendingObservation[],
  alwaysShared: readonly string[] = [],
): CountedObservations {
  const uses = countUses(pending)
  const isShared = ({ error, group }: SharedLimitPart) => (uses.get(group ?? error) ?? 0) > 1
  const sharedErrors: SharedError[] = []
  const errorOf = new Map<string, number>()
  const place = (name: string, error: SharedError): number => {
    const known = errorOf.get(name)
    if (known !== undefined) return known
    errorOf.set(name, sharedErrors.length)
    sharedErrors.push(error)
    return sharedErrors.length - 1
  }
  for (const name of alwaysShared) place(name, { shape: 'rectangular' })
  const observations = pending.map(({ of, value, own, shared }): Observation => {
    const moving = shared.filter(({ sensitivity }) => sensitivity !== 0)
    return {
      of,
      value,
      parts: [...own, ...asOwn(moving.filter((part) => !isShared(part)))],
      shared: moving.filter(isShared).map(({ error, sensitivity, shape, freedom, group }) => ({
        error: place(error, {
          shape,
          ...(freedom === undefined ? {} : { freedom }),
          ...(group === undefined ? {} : { group }),
        }),
        sensitivity,
      })),
    }
  })
  return { observations, sharedErrors, errorOf }
}
