import { incompleteBeta } from '../../../src/core/estimate/beta'

/**
 * The number of hits in so many trials that is exceeded in no more than one run of a hundred where
 * each trial hits with this probability: I(1 − p; n − k, k + 1) is the probability of k hits or fewer.
 */
export function mostHits(trials: number, probability: number): number {
  let hits = 0
  while (hits < trials && incompleteBeta(trials - hits, hits + 1, 1 - probability) < 0.99) hits += 1
  return hits
}
