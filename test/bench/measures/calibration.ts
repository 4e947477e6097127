import { createRandom } from '../../../src/core/estimate'
import { loopKinds } from '../../core/estimate/loops'
import { recover } from '../../core/estimate/recovery'
import { mostHits } from '../estimator/binomial'
import { type Calibration, calibrate, type Share } from '../estimator/calibration'
import type { Measure } from '../measure'

const JOBS = 2000
const LOOPS = 10_000
const seed = Math.floor(Math.random() * 2 ** 31)

let calibration: Calibration | undefined

/** The one run that all measures of it share. */
function calibrated(): Calibration {
  calibration ??= calibrate(JOBS, seed)
  return calibration
}

/** Hits over the most that chance would give in ninety-nine runs of a hundred, at 5 % each. */
function overBound({ hits, of }: Share): number {
  return hits / mostHits(of, 0.05)
}

function missed({ hits, of }: Share): Share {
  return { hits: of - hits, of }
}

/** A sound job is said to disagree. */
export const falseAlarms: Measure = {
  name: `false alarms in ${JOBS} sound jobs, seed ${seed}, over the 99 % bound of 5 %`,
  goal: 1,
  measure: async () => overBound(calibrated().falseAlarms),
}

/** A solved value's limits do not hold the truth. */
export const valuesOutside: Measure = {
  name: 'solved values outside their limits, one from each job, over the 99 % bound of 5 %',
  goal: 1,
  measure: async () => overBound(missed(calibrated().coverage)),
}

/** A reading five limits off goes unnoticed: there is no goal but all of them. */
export const unnoticed: Measure = {
  name: 'share of jobs with one checked reading five limits off that are said to agree (reported)',
  goal: 1,
  measure: async () => {
    const { hits, of } = missed(calibrated().noticed)
    return hits / of
  },
}

/** Exact readings do not give the truth back. */
export const lostLoops: Measure = {
  name: `of ${LOOPS} random solvable loops, seed ${seed}: not recovered, or with too many or too few drawings`,
  goal: 0,
  unit: 'loops',
  measure: async () => {
    const random = createRandom(seed)
    const kinds = Object.values(loopKinds)
    let lost = 0
    for (let each = 0; each < LOOPS; each++) {
      const loop = kinds[each % kinds.length]?.(random)
      if (loop === undefined || loop.isTangent) continue
      const { drawings, error, conditionNumber } = recover(loop)
      const isFound = error <= 1e-9 * conditionNumber
      const isCounted = loop.solutions === undefined || loop.solutions === drawings
      if (!isFound || !isCounted) lost += 1
    }
    return lost
  },
}
