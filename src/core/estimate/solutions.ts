import { cosDegrees, sinDegrees } from '..'
import { besides, Candidate, isSameSolution, quantitiesOf } from './candidate'
import { chiSquarePoint } from './distributions'
import { equationsOf, type PhasorEquations } from './equations'
import { valueAt } from './layout'
import { feasible, solveLeastSquares } from './least-squares'
import { mirrorsOf } from './mirrors'
import type { Observable, PhasorProblem } from './phasor-problem'
import { createRandom } from './random'
import { startsOf } from './starts'

/** Every solution that was found, the smallest sum of squares first. */
export interface Solutions {
  readonly candidates: readonly Candidate[]
  /** Exact values contradicted each other, and were taken as known to one part in a million. */
  readonly isSoftened: boolean
}

const OUTSIDE = 0.05
const MOST_ROUNDS = 12
/** Rounds without anything new after which guessing ends. */
const ENOUGH_ROUNDS = 4
const MOST_MIRRORS = 12
/** How many solutions are looked for. */
const MOST_CANDIDATES = 16
/** A start so near to a solution, in sizes, leads to it. */
const LEADS_TO = 1e-3

/** By how much chi-square must fall for another drawing to fit better. */
const BETTER = 1e-6

/** Whether a resistor, coil or capacitor would have to have a negative resistance, beyond its limits. */
export function needsNegativeResistance(candidate: Candidate, problem: PhasorProblem): boolean {
  return problem.elements.some(
    ({ kind }, element) =>
      kind !== 'impedance' && candidate.isBelowZero({ kind: 'resistance', element }, 1),
  )
}

/** Collects solutions, each once. */
class Collection {
  readonly candidates: Candidate[] = []
  readonly #problem: PhasorProblem
  readonly #equations: PhasorEquations
  readonly #mobility: Float64Array
  readonly #quantities: readonly Observable[]

  constructor(problem: PhasorProblem, equations: PhasorEquations, mobility: Float64Array) {
    this.#problem = problem
    this.#equations = equations
    this.#mobility = mobility
    this.#quantities = quantitiesOf(problem.phasors, problem.elements.length)
  }

  /** Looks from a start, then from the mirrors of whatever is new. True where something was. */
  add(start: Float64Array): boolean {
    if (this.candidates.length >= MOST_CANDIDATES) return false
    const found = this.#lookFrom(start)
    if (found === undefined) return false
    this.candidates.push(found)
    if (needsNegativeResistance(found, this.#problem)) return true
    const mirrors = mirrorsOf(this.#problem, this.#equations, found.solution.x, MOST_MIRRORS)
    for (const place of mirrors) this.add(place)
    return true
  }

  #lookFrom(start: Float64Array): Candidate | undefined {
    const place = feasible(this.#equations, start, this.#mobility)
    if (place === undefined || this.#leadsToKnown(place)) return undefined
    const solution = solveLeastSquares(this.#equations, place)
    if (!solution.conditionsMet || !Number.isFinite(solution.chiSquare)) return undefined
    if (this.#isBackToFront(solution.x)) {
      return this.#lookFrom(
        solution.x.map((value, k) => (k < 2 * this.#problem.phasors ? -value : value)),
      )
    }
    const candidate = this.#unfolded(new Candidate(this.#equations, solution))
    const isKnown = this.candidates.some((known) =>
      isSameSolution(known, candidate, this.#quantities),
    )
    return isKnown ? undefined : candidate
  }

  /** A flat drawing is a saddle where one that is not flat fits better: then that one. */
  #unfolded(candidate: Candidate): Candidate {
    if (!candidate.isFolded) return candidate
    const place = besides(this.#equations, candidate.solution.x, createRandom(2))
    const other = place && solveLeastSquares(this.#equations, place)
    return other?.conditionsMet && other.chiSquare < candidate.solution.chiSquare - BETTER
      ? new Candidate(this.#equations, other)
      : candidate
  }

  #leadsToKnown(place: Float64Array): boolean {
    return this.candidates.some(({ solution, linearisation }) =>
      place.every(
        (value, k) =>
          Math.abs(value - (solution.x[k] ?? 0)) <= LEADS_TO * (linearisation.sizes[k] ?? 1),
      ),
    )
  }

  /** Whether the reference points away from its own angle. */
  #isBackToFront(x: Float64Array): boolean {
    if (this.#problem.reference === undefined) return false
    const { phasor, angle } = this.#problem.reference
    const { layout } = this.#equations
    const along =
      valueAt(x, layout.real(phasor)) * cosDegrees(angle) +
      valueAt(x, layout.imaginary(phasor)) * sinDegrees(angle)
    return along < 0
  }
}

function collect(problem: PhasorProblem, equations: PhasorEquations): readonly Candidate[] {
  const first = startsOf(problem, equations)
  const collection = new Collection(problem, equations, first.mobility)
  for (const place of first.places) collection.add(place)
  const isSure = !first.isGuessed && collection.candidates.length > 0
  let sinceNew = 0
  for (let round = 1; round <= MOST_ROUNDS && sinceNew < ENOUGH_ROUNDS && !isSure; round++) {
    const { places } = startsOf(problem, equations, round)
    const news = places.filter((place) => collection.add(place))
    sinceNew = news.length > 0 ? 0 : sinceNew + 1
  }
  return collection.candidates
}

/**
 * Those that the readings allow: chi-square within its 95 % point, or no further from the smallest
 * one than one reading's 95 % point. A drawing that needs a negative resistance is left out where
 * there is one that does not.
 */
function allowed(candidates: readonly Candidate[], problem: PhasorProblem): readonly Candidate[] {
  const possible = candidates.filter((each) => !needsNegativeResistance(each, problem))
  const sorted = [...(possible.length > 0 ? possible : candidates)].sort(
    (a, b) => a.solution.chiSquare - b.solution.chiSquare,
  )
  const best = sorted[0]
  if (best === undefined) return []
  const most = Math.max(
    chiSquarePoint(OUTSIDE, best.linearisation.degreesOfFreedom),
    best.solution.chiSquare + chiSquarePoint(OUTSIDE, 1),
  )
  return sorted.filter(({ solution }) => solution.chiSquare <= most)
}

/**
 * Looks for every drawing that the observations of a problem allow: from starts that geometry gives,
 * from the mirrors of what it finds, and, where something had to be guessed, from other guesses until
 * four rounds in a row bring nothing new.
 */
export function findSolutions(problem: PhasorProblem): Solutions {
  const candidates = allowed(collect(problem, equationsOf(problem)), problem)
  if (candidates.length > 0) return { candidates, isSoftened: false }
  return {
    candidates: allowed(collect(problem, equationsOf(problem, true)), problem),
    isSoftened: true,
  }
}
