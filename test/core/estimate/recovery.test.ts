import { describe, expect, test } from 'vitest'
import { createRandom } from '../../../src/core/estimate'
import { loopKinds, TANGENT_BAND } from './loops'
import { recover } from './recovery'

const LOOPS = 40
/** The same in every run; the bench takes fresh ones. SEED names another. */
const seed = Number(process.env.SEED ?? 712_004_933)

describe(`random solvable loops, seed ${seed}`, () => {
  test.each(Object.entries(loopKinds))(
    '%s: the truth is recovered from exact readings',
    (name, make) => {
      const random = createRandom(seed)
      let judged = 0
      for (let each = 0; each < LOOPS; each++) {
        const loop = make(random)
        if (loop.isTangent) continue
        judged++
        const { drawings, error, conditionNumber } = recover(loop)
        const which = `${name}, loop ${each} of seed ${seed}`
        expect(error, which).toBeLessThanOrEqual(1e-9 * conditionNumber)
        if (loop.solutions !== undefined) expect(drawings, which).toBe(loop.solutions)
      }
      expect(judged, `outside a tangent band of ${TANGENT_BAND}`).toBeGreaterThan(LOOPS / 4)
    },
  )
})
