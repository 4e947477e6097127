import type { Matrix } from 'ml-matrix'
import { anyPlace } from './any-place'
import { ConditionsAt, linearise } from './conditions-at'
import { equationsOf, type PhasorEquations } from './equations'
import { fixedDirections } from './fixed-directions'
import type { PhasorIndex, PhasorProblem } from './phasor-problem'
import { sumOfSquares } from './problem'
import { dot, rowLengths, times, timesTransposed } from './vectors'

/** A quantity that nothing fixes is magnitude or angle of a phasor; a reading that would fix it is, too. */
export interface Missing {
  readonly kind: 'magnitude' | 'angle'
  readonly phasor: PhasorIndex
}

/** What is open in a problem, and what would settle it. */
export interface MissingReadings {
  /** Every magnitude and angle that nothing fixes, in the phasors' order. */
  readonly open: readonly Missing[]
  /**
   * As few readings as are found that, together, fix all of these: each is the one that settles most of
   * what the ones before it leave open, a magnitude rather than an angle.
   */
  readonly plan: readonly { readonly reading: Missing; readonly fixes: readonly Missing[] }[]
}

/** How much of a gradient may point where the observations do not reach. */
const FIXED_TOLERANCE = 1e-6

/** A quantity, and the part of its gradient that points where nothing reaches. */
interface Open {
  readonly of: Missing
  readonly away: Float64Array
  readonly whole: number
}

/**
 * What the observations of a problem leave open, and which readings would fix it, decided from the rank
 * at a place where the conditions hold and no phasor stands in line with another: a reading fixes whatever
 * hangs on no other direction than its own. Where the conditions contradict each other, nothing is said.
 *
 * @param phasors Those that are asked about.
 */
export function missingReadings(
  problem: PhasorProblem,
  phasors: readonly PhasorIndex[],
): MissingReadings {
  const equations = equationsOf(problem)
  const x = anyPlace(equations)
  if (x === undefined) return { open: [], plan: [] }
  let left = openAt(equations, phasors, x)
  const open = left.map(({ of }) => of)
  const plan: { reading: Missing; fixes: readonly Missing[] }[] = []
  while (left.length > 0) {
    const { reading, after } = bestReading(left)
    const still = new Set(after.map(({ of }) => of))
    plan.push({ reading, fixes: left.flatMap(({ of }) => (still.has(of) ? [] : [of])) })
    left = after
  }
  return { open, plan }
}

function openAt(
  equations: PhasorEquations,
  phasors: readonly PhasorIndex[],
  x: Float64Array,
): readonly Open[] {
  const sizes = equations.sizes(x)
  const { free } = new ConditionsAt(equations.conditions, x, sizes).space
  const { derivatives } = linearise(equations.residuals, x, sizes)
  const fixed = fixedDirections(derivatives.mmul(free), rowLengths(derivatives)).directions
  const kinds = ['magnitude', 'angle'] as const
  return kinds
    .flatMap((kind) => phasors.map((phasor) => ({ kind, phasor })))
    .map((of) => openPart(of, scaledGradient(equations, of, x, sizes), free, fixed))
    .filter(isOpen)
    .sort((a, b) => a.of.phasor - b.of.phasor)
}

function openPart(of: Missing, gradient: Float64Array, free: Matrix, fixed: Matrix): Open {
  const reduced = timesTransposed(free, gradient)
  const reached = times(fixed, timesTransposed(fixed, reduced))
  return {
    of,
    away: reduced.map((value, each) => value - (reached[each] ?? 0)),
    whole: Math.sqrt(sumOfSquares(gradient)),
  }
}

function isOpen({ away, whole }: Open): boolean {
  return Math.sqrt(sumOfSquares(away)) > FIXED_TOLERANCE * whole
}

function scaledGradient(
  { observables, unknowns }: PhasorEquations,
  of: Missing,
  x: Float64Array,
  sizes: Float64Array,
): Float64Array {
  const gradient = new Float64Array(unknowns)
  observables.valueOf(of, x, (column, slope) => {
    if (column !== undefined) gradient[column] = (gradient[column] ?? 0) + slope
  })
  return gradient.map((slope, each) => slope * (sizes[each] ?? 1))
}

/** What is still open once one of them is read. */
function openAfter(reading: Open, all: readonly Open[]): readonly Open[] {
  const length = sumOfSquares(reading.away)
  return all
    .filter((each) => each !== reading)
    .map((each) => {
      const along = dot(each.away, reading.away) / length
      return { ...each, away: each.away.map((value, k) => value - along * (reading.away[k] ?? 0)) }
    })
    .filter(isOpen)
}

/** The reading that settles most; a magnitude where several do, for it needs but one meter. */
function bestReading(left: readonly Open[]): { reading: Missing; after: readonly Open[] } {
  const tried = left.map((each) => ({ reading: each.of, after: openAfter(each, left) }))
  const ranked = tried.sort(
    (a, b) =>
      a.after.length - b.after.length ||
      Number(a.reading.kind === 'angle') - Number(b.reading.kind === 'angle'),
  )
  return ranked[0] ?? { reading: { kind: 'magnitude', phasor: 0 }, after: [] }
}
