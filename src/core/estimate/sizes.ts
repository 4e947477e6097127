import { type Layout, valueAt } from './layout'
import type { PhasorProblem } from './phasor-problem'

/** No unknown is taken to be smaller than this share of the largest of its kind. */
const SMALLEST_SHARE = 1e-3

/** For each phasor, a list of all those that sums tie it to, itself among them. */
function tiedPhasors(problem: PhasorProblem): readonly (readonly number[])[] {
  const group = Array.from({ length: problem.phasors }, (_, each) => [each])
  for (const terms of problem.sums) {
    const all = [...new Set(terms.flatMap(({ phasor }) => group[phasor] ?? []))]
    for (const phasor of all) group[phasor] = all
  }
  return group
}

/**
 * How large each unknown is, in its own unit: a phasor's parts by its length, an element's values by its
 * impedance, a shared error by its standard uncertainty.
 */
export function sizesOf(problem: PhasorProblem, layout: Layout): (x: Float64Array) => Float64Array {
  const ties = tiedPhasors(problem)
  return (x: Float64Array): Float64Array => {
    const lengths = ties.map((_, each) =>
      Math.hypot(valueAt(x, layout.real(each)), valueAt(x, layout.imaginary(each))),
    )
    const sizes = new Float64Array(layout.unknowns).fill(1)
    ties.forEach((group, each) => {
      const largest = Math.max(...group.map((other) => lengths[other] ?? 0))
      const size = Math.max(lengths[each] ?? 0, SMALLEST_SHARE * largest) || 1
      sizes[layout.real(each)] = size
      sizes[layout.imaginary(each)] = size
    })
    problem.elements.forEach(({ voltage, current }, each) => {
      const impedance = (sizes[layout.real(voltage)] ?? 1) / (sizes[layout.real(current)] ?? 1)
      const [r, s] = [layout.resistance(each), layout.reactance(each)]
      const own = Math.hypot(valueAt(x, r), valueAt(x, s))
      const size = Math.max(own, SMALLEST_SHARE * impedance)
      if (r !== undefined) sizes[r] = size
      if (s !== undefined) sizes[s] = size
    })
    return sizes
  }
}
