import { expect, test } from 'vitest'
import { mostHits } from './binomial'

test('the number of hits that is hardly ever exceeded is that of the summed distribution', () => {
  for (const [trials, probability] of [
    [1, 0.05],
    [20, 0.05],
    [200, 0.3],
  ] as const) {
    let term = (1 - probability) ** trials
    let sum = term
    let hits = 0
    while (sum < 0.99) {
      term *= ((trials - hits) / (hits + 1)) * (probability / (1 - probability))
      sum += term
      hits += 1
    }
    expect(mostHits(trials, probability)).toBe(hits)
  }
})
