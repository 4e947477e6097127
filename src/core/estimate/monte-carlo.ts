import { Matrix } from 'ml-matrix'
import { besides, type Candidate } from './candidate'
import { ConditionsAt } from './conditions-at'
import type { UncertaintyPart } from './coverage'
import { equationsOf } from './equations'
import { solveLeastSquares } from './least-squares'
import type { PhasorProblem } from './phasor-problem'
import { createRandom, normalDeviate, type Random, rectangularDeviate } from './random'

/** How far along each independent direction the linear picture is tried: two standard uncertainties. */
const TRIED = 2
/** By how much a residual may then be off, in standard uncertainties, all residuals together. */
const TOLERATED = 0.5

/**
 * Whether linear limits are poor here. From the solution one goes two standard uncertainties along
 * each independent direction, both ways, and back onto the conditions. Limits are poor where the
 * readings to be expected there depart from the straight line by half a standard uncertainty or more
 * (root of the sum of squares over all readings), where there is no such place, or where the drawing
 * has folded flat.
 */
export function isPoorlyLinear({
  equations,
  solution,
  linearisation,
  isFolded,
}: Candidate): boolean {
  if (isFolded) return true
  const conditions = new ConditionsAt(equations.conditions, solution.x, linearisation.sizes)
  const moves = linearisation.moves()
  for (let each = 0; each < moves.rows; each++) {
    const both = [TRIED, -TRIED].map((factor) =>
      conditions.restored(
        solution.x.map((value, column) => value + factor * moves.get(each, column)),
      ),
    )
    const [ahead, behind] = both.map((place) => place && equations.residuals.evaluate(place))
    if (ahead === undefined || behind === undefined) return true
    // Half the second difference: what a straight line through both would miss.
    let square = 0
    solution.residuals.forEach((residual, row) => {
      square += (((ahead[row] ?? 0) + (behind[row] ?? 0)) / 2 - residual) ** 2
    })
    if (!(Math.sqrt(square) <= TOLERATED)) return true
  }
  return false
}

function deviateOf(
  { shape, freedom }: Omit<UncertaintyPart, 'uncertainty'>,
  random: Random,
): number {
  if (shape === 'rectangular') return rectangularDeviate(random)
  if (freedom === undefined) return normalDeviate(random)
  // Student's t, scaled by the uncertainty as it was estimated (JCGM 101, 6.4.9).
  let square = 0
  for (let each = 0; each < freedom; each++) square += normalDeviate(random) ** 2
  return normalDeviate(random) / Math.sqrt(square / freedom)
}

/** The same observations, each moved by errors drawn from its own and the shared distributions. */
function redrawn(problem: PhasorProblem, random: Random): PhasorProblem {
  const common = problem.sharedErrors.map((error) => deviateOf(error, random))
  const observations = problem.observations.map((observation) => {
    let value = observation.value
    for (const part of observation.parts) value += part.uncertainty * deviateOf(part, random)
    for (const { error, sensitivity } of observation.shared ?? []) {
      value += sensitivity * (common[error] ?? 0)
    }
    const isSize = observation.of.kind === 'magnitude' && observation.value !== 0
    return { ...observation, value: isSize ? Math.abs(value) : value }
  })
  return { ...problem, observations }
}

/**
 * Monte Carlo propagation of distributions (JCGM 101): the observations are redrawn and the problem
 * solved again, from the solution that is there, `draws` times. A row a draw, the unknowns in
 * columns. The same seed gives the same draws.
 */
export function propagateByDraws(
  problem: PhasorProblem,
  candidate: Candidate,
  draws: number,
  seed: number,
  isSoftened = false,
): Matrix {
  const random = createRandom(seed)
  const found = new Matrix(draws, candidate.equations.unknowns)
  for (let row = 0; row < draws; row++) {
    const equations = equationsOf(redrawn(problem, random), isSoftened)
    const start = candidate.isFolded
      ? besides(equations, candidate.solution.x, random)
      : candidate.solution.x
    const { x } = solveLeastSquares(equations, start ?? candidate.solution.x, { iterations: 30 })
    found.setRow(row, [...x])
  }
  return found
}
