import { Matrix, QrDecomposition } from 'ml-matrix'
import { ConditionsAt, linearise, moved } from './conditions-at'
import { fixedDirections } from './fixed-directions'
import { type LeastSquaresProblem, largestOf, sumOfSquares } from './problem'
import { dot, rowLengths, times } from './vectors'

/** How long a descent may go on. */
export interface DescentOptions {
  /** Steps that lower the sum of squares; 200 where omitted. */
  readonly iterations?: number
  /**
   * A sum of squares above which a place is worth no more work: the descent leaves it, not converged,
   * where it falls by less than a tenth in a step.
   */
  readonly worthwhile?: number
}

const MOST_STEPS = 200
const LONGEST_STEP = 1
const SMALLEST_STEP = 1e-12
const CONVERGED_STEP = 1e-8
const NOTHING_LEFT = 1e-14
const POLISHING_STEPS = 100
const SLOW = 0.9
const STILL_SHORTER = 0.95
/** A predicted gain below this share of the sum of squares drowns in its rounding. */
const FLAT = 1e-12
const FIRST_DAMPING = 1e-3
/** Below this, damping no longer holds a step back. */
const GAUSS_NEWTON = 1e-8
/** Enough to keep what no observation fixes from drifting on rounding. */
const LEAST_DAMPING = 1e-12
const MOST_DAMPING = 1e12

/** The damped Gauss–Newton step in the free directions: least |A p + r|² + damping · |p|². */
function dampedStep(slopes: Matrix, residuals: Float64Array, damping: number): Float64Array {
  const size = slopes.columns
  const stacked = new Matrix(slopes.rows + size, size)
  stacked.setSubMatrix(slopes, 0, 0)
  for (let each = 0; each < size; each++) stacked.set(slopes.rows + each, each, Math.sqrt(damping))
  const right = new Matrix(slopes.rows + size, 1)
  for (let row = 0; row < slopes.rows; row++) right.set(row, 0, -(residuals[row] ?? 0))
  return Float64Array.from(new QrDecomposition(stacked).solve(right).to1DArray())
}

/** What one place offers: the conditions there, and the residuals' slopes in the free directions. */
interface Local {
  readonly conditions: ConditionsAt
  readonly sizes: Float64Array
  readonly slopes: Matrix
  /** The lengths of the slopes' rows before the conditions took their part. */
  readonly lengths: Float64Array
}

function localAt(problem: LeastSquaresProblem, { x }: Place): Local {
  const sizes = problem.sizes(x)
  const conditions = new ConditionsAt(problem.conditions, x, sizes)
  const { derivatives } = linearise(problem.residuals, x, sizes)
  const slopes = derivatives.mmul(conditions.space.free)
  return { conditions, sizes, slopes, lengths: rowLengths(derivatives) }
}

function largestSquare(slopes: Matrix): number {
  return Math.max(...rowLengths(slopes.transpose()), 0) ** 2 || 1
}

/** A place that meets the conditions, with what was found there. */
export interface Place {
  readonly x: Float64Array
  readonly residuals: Float64Array
  readonly chiSquare: number
}

/** A place, with what is found there. */
export function placeAt(problem: LeastSquaresProblem, x: Float64Array): Place {
  const residuals = problem.residuals.evaluate(x)
  return { x, residuals, chiSquare: sumOfSquares(residuals) }
}

/** A step from a place, and what the linear model says of it. */
interface Step {
  readonly next: Place | undefined
  /** The most by which an unknown moves, in its own size. */
  readonly length: number
  /** By how much the sum of squares should fall. */
  readonly predicted: number
}

/** The whole Gauss–Newton step: none where the residuals do not depend on the unknowns. */
function gaussNewtonStep(local: Local, residuals: Float64Array): Float64Array {
  const fixed = fixedDirections(local.slopes, local.lengths).directions
  if (fixed.columns === 0) return new Float64Array(local.slopes.columns)
  const right = Matrix.columnVector([...residuals]).neg()
  const solved = new QrDecomposition(local.slopes.mmul(fixed)).solve(right)
  return times(fixed, Float64Array.from(solved.to1DArray()))
}

/** Takes a step, given in the free directions, and goes back onto the conditions. */
function stepBy(
  problem: LeastSquaresProblem,
  place: Place,
  local: Local,
  reduced: Float64Array,
): Step {
  const step = times(local.conditions.space.free, reduced)
  const change = times(local.slopes, reduced)
  const length = largestOf(step)
  const onto =
    length <= LONGEST_STEP
      ? local.conditions.restored(moved(place.x, step, 1, local.sizes))
      : undefined
  return {
    next: onto && placeAt(problem, onto),
    length,
    predicted: -(2 * dot(change, place.residuals) + sumOfSquares(change)),
  }
}

/** How a descent ended: at rest, where the sum of squares is too flat to tell, or for good. */
export interface Descent {
  readonly place: Place
  readonly iterations: number
  readonly end: 'at rest' | 'flat' | 'given up'
}

/** Goes downhill until the sum of squares is too flat to tell one place from the next. */
export function descend(
  problem: LeastSquaresProblem,
  from: Place,
  { iterations: most = MOST_STEPS, worthwhile = Number.POSITIVE_INFINITY }: DescentOptions,
): Descent {
  let place = from
  let damping = FIRST_DAMPING
  let growth = 2
  for (let iterations = 0; iterations < most; iterations++) {
    const local = localAt(problem, place)
    if (local.slopes.columns === 0) return { place, iterations, end: 'at rest' }
    const unit = largestSquare(local.slopes)
    for (;;) {
      const reduced = dampedStep(local.slopes, place.residuals, damping * unit)
      const step = stepBy(problem, place, local, reduced)
      const isStill = step.length <= SMALLEST_STEP
      const isFlat = isStill || step.predicted <= FLAT * place.chiSquare
      if (isFlat && damping <= GAUSS_NEWTON) {
        return { place, iterations, end: isStill ? 'at rest' : 'flat' }
      }
      const gain = step.next ? (place.chiSquare - step.next.chiSquare) / step.predicted : -1
      if (step.next && gain > 0 && !isFlat) {
        const isSlow = step.next.chiSquare > SLOW * place.chiSquare
        place = step.next
        if (isSlow && place.chiSquare > worthwhile) return { place, iterations, end: 'given up' }
        damping = Math.max(LEAST_DAMPING, damping * Math.max(1e-3, 1 - (2 * gain - 1) ** 3))
        growth = 2
        break
      }
      if (damping > MOST_DAMPING) return { place, iterations, end: 'given up' }
      damping = isFlat ? GAUSS_NEWTON : damping * growth
      growth *= 2
    }
  }
  return { place, iterations: most, end: 'given up' }
}

/** Gauss–Newton steps where the sum of squares no longer tells: they go on while they shorten. */
export function polish(
  problem: LeastSquaresProblem,
  from: Place,
): { readonly place: Place; readonly converged: boolean } {
  let place = from
  let shortest = Number.POSITIVE_INFINITY
  for (let step = 0; step < POLISHING_STEPS; step++) {
    const local = localAt(problem, place)
    if (local.slopes.columns === 0) return { place, converged: true }
    const reduced = gaussNewtonStep(local, place.residuals)
    const { next, length } = stepBy(problem, place, local, reduced)
    if (!next || length > STILL_SHORTER * shortest) break
    // What the steps to come would add up to, each shorter than the last by the same share.
    const left = shortest < 1 ? (length * length) / (shortest - length) : length
    place = next
    shortest = length
    if (left <= NOTHING_LEFT) break
  }
  return { place, converged: shortest <= CONVERGED_STEP }
}
