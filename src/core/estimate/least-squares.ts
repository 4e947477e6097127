import { Matrix, QrDecomposition } from 'ml-matrix'
import { CONDITIONS_MET, ConditionsAt, linearise, moved } from './conditions-at'
import { fixedDirections } from './fixed-directions'
import { type LeastSquaresProblem, largestOf, sumOfSquares } from './problem'
import { dot, rowLengths, times } from './vectors'

/** Where a solver stopped. */
export interface LeastSquaresSolution {
  readonly x: Float64Array
  /** (model − observed) / standard uncertainty, at x. */
  readonly residuals: Float64Array
  /** The sum of their squares. */
  readonly chiSquare: number
  readonly iterations: number
  /** Whether a smallest sum of squares was reached, by the criteria of `solveLeastSquares`. */
  readonly converged: boolean
  /** Whether every condition is met to rounding. Where they contradict each other, they are not. */
  readonly conditionsMet: boolean
}

/** How long a solver may try. */
export interface SolverOptions {
  /** Steps that lower the sum of squares; 200 where omitted. */
  readonly iterations?: number
  /** The start meets the conditions. */
  readonly isOnConditions?: boolean
  /**
   * How freely each unknown moves, 0 … 1, when the start is first brought onto the conditions: little
   * for one that is known, so that those that were guessed give way. 1 where omitted.
   */
  readonly mobility?: Float64Array
  /**
   * A sum of squares above which a place is worth no more work: the solver leaves it, not converged,
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
const FEASIBLE_START_STEPS = 40
const FIRST_DAMPING = 1e-3
/** Below this, damping no longer holds a step back. */
const GAUSS_NEWTON = 1e-8
/** Enough to keep what no observation fixes from drifting on rounding. */
const LEAST_DAMPING = 1e-12
const MOST_DAMPING = 1e12

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
interface Place {
  readonly x: Float64Array
  readonly residuals: Float64Array
  readonly chiSquare: number
}

function placeAt(problem: LeastSquaresProblem, x: Float64Array): Place {
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
interface Descent {
  readonly place: Place
  readonly iterations: number
  readonly end: 'at rest' | 'flat' | 'given up'
}

/** Goes downhill until the sum of squares is too flat to tell one place from the next. */
function descend(
  problem: LeastSquaresProblem,
  from: Place,
  { iterations: most = MOST_STEPS, worthwhile = Number.POSITIVE_INFINITY }: SolverOptions,
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
function polish(problem: LeastSquaresProblem, from: Place) {
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

/**
 * Equality-constrained weighted nonlinear least squares: Levenberg–Marquardt steps in the null space
 * of the linearised conditions, each step followed by Newton steps back onto the conditions, so that
 * every place it compares meets them. Every unknown is scaled by its own size and moves by no more
 * than that in one step. Damping follows the ratio of the actual to the predicted gain (Nielsen 1999,
 * from memory) and falls to nothing, so that the last steps are Gauss–Newton's.
 *
 * When the predicted gain is below 10⁻¹² of the sum of squares, its rounding hides which place is
 * better. From there Gauss–Newton steps go on while each is at least a twentieth shorter than the one before,
 * until those to come would add up to less than 10⁻¹⁴ of any unknown's size. It has converged where
 * the last of them was below 10⁻⁸.
 * From a start from which the conditions cannot be met, the start itself comes back,
 * `conditionsMet` false.
 */
export function solveLeastSquares(
  problem: LeastSquaresProblem,
  start: Float64Array,
  options: SolverOptions = {},
): LeastSquaresSolution {
  const found = options.isOnConditions ? start : feasible(problem, start, options.mobility)
  const first = placeAt(problem, found ?? start)
  if (found === undefined || !Number.isFinite(first.chiSquare)) {
    return { ...first, iterations: 0, converged: false, conditionsMet: false }
  }
  const { place, iterations, end } = descend(problem, first, options)
  if (end !== 'flat') {
    return { ...place, iterations, converged: end === 'at rest', conditionsMet: true }
  }
  const polished = polish(problem, place)
  return {
    ...polished.place,
    iterations,
    converged: polished.converged,
    conditionsMet: true,
  }
}
