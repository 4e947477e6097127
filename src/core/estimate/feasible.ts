import { CONDITIONS_MET, ConditionsAt, moved } from './conditions-at'
import { type LeastSquaresProblem, largestOf, sumOfSquares } from './problem'

const FEASIBLE_START_STEPS = 40

/** The nearest place to a start that meets the conditions (Newton, halved where it overshoots). */
export function feasible(
  problem: LeastSquaresProblem,
  start: Float64Array,
  mobility?: Float64Array,
): Float64Array | undefined {
  let x = start
  for (let step = 0; step < FEASIBLE_START_STEPS; step++) {
    const sizes = problem.sizes(x).map((size, each) => size * (mobility?.[each] ?? 1))
    const conditions = new ConditionsAt(problem.conditions, x, sizes)
    // Near the conditions, the slopes at the start serve for all the way.
    const near = conditions.restored(x)
    if (near !== undefined || largestOf(conditions.values) <= CONDITIONS_MET) return near
    const full = conditions.space.stepFor(conditions.values)
    let next: Float64Array | undefined
    for (let share = 1; share > 1e-4 && next === undefined; share /= 2) {
      const tried = moved(x, full, -share, sizes)
      if (sumOfSquares(conditions.missAt(tried)) < sumOfSquares(conditions.values)) next = tried
    }
    if (next === undefined) return undefined
    x = next
  }
  return undefined
}
