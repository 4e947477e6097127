import type { ReadingLimit } from './limit'

/** How far off a result may be that readings add up to. */
export interface LimitedTerm {
  readonly limit: ReadingLimit
  /** By how much the result moves for a unit of what this reading comes to; 1 where left out. */
  readonly sensitivity?: number
}

/**
 * The combined standard uncertainty of a result of several readings (JCGM 100:2008, 5.1.2 and 5.2.2):
 * the readings' own errors by the root of the sum of squares; of an error that several have in common,
 * their shares are added up first, with their signs.
 */
export function standardUncertaintyOf(terms: readonly LimitedTerm[]): number {
  const shares = new Map<string, number>()
  let squares = 0
  for (const { limit, sensitivity: slope = 1 } of terms) {
    for (const { uncertainty } of limit.own) squares += (slope * uncertainty) ** 2
    for (const { error, sensitivity } of limit.shared) {
      shares.set(error, (shares.get(error) ?? 0) + slope * sensitivity)
    }
  }
  for (const share of shares.values()) squares += share ** 2
  return Math.sqrt(squares)
}
