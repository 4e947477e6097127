import { type Complex, differenceDegrees, fromPolar, magnitudeOf, subtract } from '..'
import { chiSquarePoint, chiSquareTail } from './distributions'
import { Drawing } from './drawing'
import { isPoorlyLinear, propagateByDraws } from './monte-carlo'
import type { PhasorIndex, PhasorProblem } from './phasor-problem'
import { findSolutions } from './solutions'

/** Which of several drawings is meant. */
export interface Wanted {
  readonly phasor: PhasorIndex
  readonly value: Complex
}

/** How an estimate is made. */
export interface EstimateOptions {
  /** Phasors of the drawing that is meant: the nearest one comes first. */
  readonly wanted?: readonly Wanted[]
  /** Draws of a Monte Carlo propagation where linear limits are poor; 1,000 where omitted, 0: never. */
  readonly draws?: number
  /** What settles the draws. */
  readonly seed?: number
}

/** What the observations of a phasor problem come to. */
export interface PhasorEstimate {
  /** Every drawing that the observations allow, the one that is meant first; none where no start led to any. */
  readonly drawings: readonly Drawing[]
  /** Of the first drawing: 1 where nothing is checked. */
  readonly probability: number
  /** Whether chi-square of the first drawing is within its 95 % point. */
  readonly agrees: boolean
  /** Exact values contradict each other. */
  readonly isSoftened: boolean
}

const OUTSIDE = 0.05
const DRAWS = 1000
const SEED = 20_250_101
/** Chi-squares that differ by less are as good as each other. */
const AS_GOOD = 1e-6

function distanceTo(drawing: Drawing, wanted: readonly Wanted[]): number {
  let sum = 0
  for (const { phasor, value } of wanted) {
    const own = fromPolar(
      drawing.valueOf({ kind: 'magnitude', phasor }),
      drawing.valueOf({ kind: 'angle', phasor }),
    )
    sum += (magnitudeOf(subtract(own, value)) / (magnitudeOf(value) || 1)) ** 2
  }
  return sum
}

/** How many impedances are inductive: most loads are. */
function inductive(drawing: Drawing, problem: PhasorProblem): number {
  return problem.elements.filter(
    ({ kind }, element) =>
      kind === 'impedance' && drawing.valueOf({ kind: 'reactance', element }) > 0,
  ).length
}

function byFirstLead(a: Drawing, b: Drawing, problem: PhasorProblem): number {
  for (let phasor = 0; phasor < problem.phasors; phasor++) {
    const observable = { kind: 'angle', phasor } as const
    const apart = differenceDegrees(b.valueOf(observable), a.valueOf(observable))
    if (Math.abs(apart) > 1e-6) return apart
  }
  return 0
}

/**
 * Passive drawings first, then the better fit, then the one with more inductive impedances, then the
 * one in which the first phasor that differs leads.
 */
function inOrder(drawings: readonly Drawing[], problem: PhasorProblem): readonly Drawing[] {
  const passive = new Map(drawings.map((each) => [each, each.isPassive]))
  return [...drawings].sort((a, b) => {
    const byPassive = Number(passive.get(b)) - Number(passive.get(a))
    if (byPassive !== 0) return byPassive
    const byFit = a.chiSquare - b.chiSquare
    if (Math.abs(byFit) > AS_GOOD) return byFit
    return inductive(b, problem) - inductive(a, problem) || byFirstLead(a, b, problem)
  })
}

function nearestFirst(drawings: readonly Drawing[], wanted: readonly Wanted[]): readonly Drawing[] {
  if (wanted.length === 0) return drawings
  const nearest = [...drawings].sort((a, b) => distanceTo(a, wanted) - distanceTo(b, wanted))[0]
  return nearest ? [nearest, ...drawings.filter((each) => each !== nearest)] : drawings
}

/**
 * Solves a phasor problem: every drawing that the observations allow, best values with expanded
 * uncertainties (95 %), and whether the observations can all be true together. Where linear limits
 * are poor (`isPoorlyLinear`) and the observations agree, those of the first drawing come from a Monte Carlo propagation.
 */
export function estimatePhasors(
  problem: PhasorProblem,
  options: EstimateOptions = {},
): PhasorEstimate {
  const { candidates, isSoftened } = findSolutions(problem)
  const all = candidates.map((candidate) => new Drawing(problem, candidate))
  const sorted = nearestFirst(inOrder(all, problem), options.wanted ?? [])
  const [first, ...rest] = sorted
  if (first === undefined) return { drawings: [], probability: 1, agrees: false, isSoftened }
  const { chiSquare, degreesOfFreedom } = first
  const agrees = degreesOfFreedom <= 0 || chiSquare <= chiSquarePoint(OUTSIDE, degreesOfFreedom)
  const draws = agrees ? (options.draws ?? DRAWS) : 0
  const best =
    draws > 0 && isPoorlyLinear(first.candidate)
      ? new Drawing(
          problem,
          first.candidate,
          propagateByDraws(problem, first.candidate, draws, options.seed ?? SEED, isSoftened),
        )
      : first
  return {
    drawings: [best, ...rest],
    probability: chiSquareTail(chiSquare, degreesOfFreedom),
    agrees,
    isSoftened,
  }
}
