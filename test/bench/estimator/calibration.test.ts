import { expect, test } from 'vitest'
import { mostHits } from './binomial'
import { calibrate } from './calibration'

/** Fresh in every run; set SEED to replay a failure. */
const seed = Number(process.env.SEED ?? Math.floor(Math.random() * 2 ** 31))

test(`random sound jobs are not said to disagree, and limits hold the truth, seed ${seed}`, {
  timeout: 120_000,
}, () => {
  const { falseAlarms, coverage } = calibrate(30, seed, { withSpoiled: false, draws: 100 })
  expect(falseAlarms.of).toBeGreaterThan(15)
  expect(falseAlarms.hits).toBeLessThanOrEqual(mostHits(falseAlarms.of, 0.05))
  expect(coverage.of).toBe(30)
  expect(coverage.of - coverage.hits).toBeLessThanOrEqual(mostHits(coverage.of, 0.05))
})
