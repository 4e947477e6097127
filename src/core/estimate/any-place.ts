import type { PhasorEquations } from './equations'
import { feasible } from './feasible'
import { createRandom } from './random'

const TRIES = 8

/**
 * Somewhere on the conditions, nothing in line with anything and nothing at 0; the same place every time.
 * Undefined where the conditions contradict each other.
 */
export function anyPlace(equations: PhasorEquations): Float64Array | undefined {
  const random = createRandom(4)
  for (let each = 0; each < TRIES; each++) {
    const start = Float64Array.from({ length: equations.unknowns }, () => 2 * random() - 1)
    const found = feasible(equations, start)
    if (found) return found
  }
  return undefined
}
