import { cosDegrees, sinDegrees } from '..'
import { besides, Candidate, isSameSolution, quantitiesOf } from './candidate'
import { chiSquarePoint } from './distributions'
import { equationsOf, type PhasorEquations } from './equations'
import { feasible } from './feasible'
import { valueAt } from './layout'
import { solveLeastSquares } from './least-squares'
import { mirrorsOf } from './mirrors'
import type { Observable, PhasorProblem } from './phasor-problem'
import { sumOfSquares } from './problem'
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

/** How far, in chi-square a residual, the mirror of a solution may be from one itself. */
const MIRRORS = 25
/** By how much chi-square must fall for another drawing to fit better. */
const BETTER = 1e-6

/** Whether a resistor, coil or capacitor would have to have a negative resistance, beyond its limits. */
export function needsNegativeResistance(candidate: Candidate, problem: PhasorProblem): boolean {
  return problem.elements.some(
    ({ kind }, element) =>
      kind !== 'impedance' && candidate.isBelowZero({ kind: 'resistance', element }, 1),
  )
}

function byFit(candidates: readonly Candidate[]): readonly Candidate[] {
  return [...candidates].sort((a, b) => a.solution.chiSquare - b.solution.chiSquare)
}

/** The chi-square that the readings allow: its 95 % point, or the best one and one reading's 95 % point. */
function mostAllowed({ linearisation, solution }: Candidate): number {
  return Math.max(
    chiSquarePoint(OUTSIDE, linearisation.degreesOfFreedom),
    solution.chiSquare + chiSquarePoint(OUTSIDE, 1),
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

  /** Looks from starts, the likeliest first, then from the mirrors of what is new. True where something was. */
  add(starts: readonly Float64Array[], likely = Number.POSITIVE_INFINITY): boolean {
    let isNew = false
    for (const { x } of this.#onConditions(starts, likely)) {
      if (this.candidates.length >= MOST_CANDIDATES) break
      const found = this.#lookFrom(x)
      if (found === undefined) continue
      isNew = true
      this.candidates.push(found)
      if (found.solution.chiSquare > this.#worthwhile) continue
      if (needsNegativeResistance(found, this.#problem)) continue
      const mirrors = mirrorsOf(this.#problem, this.#equations, found.solution.x, MOST_MIRRORS)
      const likely = found.solution.chiSquare + MIRRORS * this.#equations.residuals.count
      this.add(
        mirrors.filter((mirror) => this.#chiSquareAt(mirror) <= likely),
        likely,
      )
    }
    return isNew
  }

  #chiSquareAt(x: Float64Array): number {
    return sumOfSquares(this.#equations.residuals.evaluate(x))
  }

  /** The starts brought onto the conditions, those that are likely, the best first. */
  #onConditions(starts: readonly Float64Array[], likely: number) {
    return starts
      .flatMap((start) => {
        const x = feasible(this.#equations, start, this.#mobility)
        if (x === undefined) return []
        const chiSquare = this.#chiSquareAt(x)
        return chiSquare <= likely ? [{ x, chiSquare }] : []
      })
      .sort((a, b) => a.chiSquare - b.chiSquare)
  }

  /** The chi-square above which a drawing would not be one that the readings allow. */
  get #worthwhile(): number {
    const [best] = byFit(this.candidates)
    return best ? mostAllowed(best) : Number.POSITIVE_INFINITY
  }

  #lookFrom(place: Float64Array): Candidate | undefined {
    if (this.#leadsToKnown(place)) return undefined
    const options = { worthwhile: this.#worthwhile, isOnConditions: true }
    const solution = solveLeastSquares(this.#equations, place, options)
    if (!solution.conditionsMet || !Number.isFinite(solution.chiSquare)) return undefined
    if (solution.chiSquare > options.worthwhile) return undefined
    if (this.#isBackToFront(solution.x)) return this.#lookFrom(this.#turned(solution.x))
    const candidate = this.#unfolded(new Candidate(this.#equations, solution))
    const isKnown = this.candidates.some((known) =>
      isSameSolution(known, candidate, this.#quantities),
    )
    return isKnown ? undefined : candidate
  }

  #turned(x: Float64Array): Float64Array {
    return x.map((value, column) => (column < 2 * this.#problem.phasors ? -value : value))
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
  collection.add(first.places)
  const isSure = !first.isGuessed && collection.candidates.length > 0
  let sinceNew = 0
  for (let round = 1; round <= MOST_ROUNDS && sinceNew < ENOUGH_ROUNDS && !isSure; round++) {
    const { places } = startsOf(problem, equations, round)
    sinceNew = collection.add(places) ? 0 : sinceNew + 1
  }
  return collection.candidates
}

/**
 * Those that the readings allow. A drawing that needs a negative resistance is left out where there
 * is one that does not.
 */
function allowed(candidates: readonly Candidate[], problem: PhasorProblem): readonly Candidate[] {
  const possible = candidates.filter((each) => !needsNegativeResistance(each, problem))
  const sorted = byFit(possible.length > 0 ? possible : candidates)
  const [best] = sorted
  return best ? sorted.filter(({ solution }) => solution.chiSquare <= mostAllowed(best)) : []
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
