import { anyPlace } from './any-place'
import { ConditionsAt } from './conditions-at'
import type { PhasorEquations } from './equations'
import { feasible } from './feasible'
import { valueAt } from './layout'
import type { LeastSquaresSolution } from './least-squares'
import { Linearisation, uncertaintyOf } from './linearisation'
import type { Observable } from './phasor-problem'
import { createRandom, type Random } from './random'

/** How far a place is moved, in sizes, to see what is fixed beside it. */
const BESIDE = 0.02
/** Two values that differ by less than this share of their size are the same solution's. */
const SAME = 1e-5

/** A solution of a phasor problem, linearised. */
export class Candidate {
  readonly equations: PhasorEquations
  readonly solution: LeastSquaresSolution
  readonly linearisation: Linearisation
  /** A place beside the solution, where nothing is open: there only what is fixed everywhere is fixed. */
  readonly #beside: Beside | undefined

  constructor(equations: PhasorEquations, solution: LeastSquaresSolution) {
    this.equations = equations
    this.solution = solution
    this.linearisation = new Linearisation(equations, solution.x, solution.residuals)
    if (this.linearisation.openDirections > 0) {
      const x = besides(equations, solution.x, createRandom(1))
      if (x) this.#beside = { x, at: linearisedAt(equations, x) }
    }
  }

  /**
   * Whether the drawing has folded flat: its slopes vanish in directions that are fixed all the same,
   * so that linear limits say nothing there.
   */
  get isFolded(): boolean {
    return this.#beside !== undefined && this.#beside.at.rank > this.linearisation.rank
  }

  /** The value of an observable, with its gradient by the unknowns. */
  gradientOf(observable: Observable): { value: number; gradient: Float64Array } {
    const gradient = new Float64Array(this.equations.unknowns)
    const value = this.equations.observables.valueOf(
      observable,
      this.solution.x,
      (column, slope) => {
        if (column !== undefined) gradient[column] = (gradient[column] ?? 0) + slope
      },
    )
    return { value, gradient }
  }

  /** Whether an observable, counted with this sign, is negative by more than three standard uncertainties. */
  isBelowZero(observable: Observable, sign: 1 | -1): boolean {
    const { value, gradient } = this.gradientOf(observable)
    if (sign * value >= 0) return false
    const { isFixed, shares } = this.linearisation.spreadOf(gradient)
    return isFixed && sign * value < -3 * uncertaintyOf(shares)
  }

  /**
   * Whether the observations and conditions fix an observable. Where something is open, what happens
   * to have no slope just here (an open angle that was guessed in line, an open current that was guessed
   * as 0) does not count as fixed: it must be so beside the solution, and at any other place too.
   */
  isFixed(observable: Observable): boolean {
    const beside = this.#beside
    if (beside === undefined) return isFixedAt(this.equations, observable, this.#here)
    const elsewhere = elsewhereOn(this.equations)
    return (
      isFixedAt(this.equations, observable, beside) &&
      (elsewhere === undefined || isFixedAt(this.equations, observable, elsewhere))
    )
  }

  get #here(): Beside {
    return { x: this.solution.x, at: this.linearisation }
  }
}

interface Beside {
  readonly x: Float64Array
  readonly at: Linearisation
}

function gradientAt(equations: PhasorEquations, observable: Observable, x: Float64Array) {
  const gradient = new Float64Array(equations.unknowns)
  const value = equations.observables.valueOf(observable, x, (column, slope) => {
    if (column !== undefined) gradient[column] = (gradient[column] ?? 0) + slope
  })
  return { value, gradient }
}

function isFixedAt(equations: PhasorEquations, observable: Observable, { x, at }: Beside): boolean {
  return at.spreadOf(gradientAt(equations, observable, x).gradient).isFixed
}

/** Found once for all solutions of a problem. */
const elsewheres = new WeakMap<PhasorEquations, { readonly place: Beside | undefined }>()

function elsewhereOn(equations: PhasorEquations): Beside | undefined {
  const known = elsewheres.get(equations)
  if (known) return known.place
  const x = anyPlace(equations)
  const place = x && { x, at: linearisedAt(equations, x) }
  elsewheres.set(equations, { place })
  return place
}

function linearisedAt(equations: PhasorEquations, x: Float64Array): Linearisation {
  return new Linearisation(equations, x, equations.residuals.evaluate(x))
}

/** A place near x, moved every way at once by a fiftieth of each unknown's size, that meets the conditions. */
export function besides(
  equations: PhasorEquations,
  x: Float64Array,
  random: Random,
): Float64Array | undefined {
  const sizes = equations.sizes(x)
  const aside = x.map((value, each) => value + BESIDE * (2 * random() - 1) * (sizes[each] ?? 1))
  const conditions = new ConditionsAt(equations.conditions, x, sizes)
  return conditions.restored(aside) ?? feasible(equations, aside)
}

/** Whether two places are the same to rounding. */
export function isSamePlace(a: Float64Array, b: Float64Array, sizes: Float64Array): boolean {
  return a.every((value, each) => Math.abs(value - (b[each] ?? 0)) <= SAME * (sizes[each] ?? 1))
}

/** Every quantity in which two solutions of a problem may differ. */
export function quantitiesOf(phasors: number, elements: number): readonly Observable[] {
  const all: Observable[] = []
  for (let phasor = 0; phasor < phasors; phasor++) {
    all.push({ kind: 'magnitude', phasor }, { kind: 'angle', phasor })
  }
  for (let element = 0; element < elements; element++) {
    all.push({ kind: 'resistance', element }, { kind: 'reactance', element })
  }
  return all
}

/** Whether two solutions agree in every quantity that both of them fix. */
export function isSameSolution(
  a: Candidate,
  b: Candidate,
  quantities: readonly Observable[],
): boolean {
  const sizes = a.linearisation.sizes
  if (isSamePlace(a.solution.x, b.solution.x, sizes)) return true
  if (a.linearisation.openDirections === 0 && b.linearisation.openDirections === 0) return false
  return quantities.every((observable) => {
    if (!a.isFixed(observable) || !b.isFixed(observable)) return true
    const [one, other] = [a.gradientOf(observable), b.gradientOf(observable)]
    if (observable.kind === 'angle') {
      const apart = Math.abs(one.value - other.value) % 360
      const size = Math.hypot(
        valueAt(a.solution.x, 2 * observable.phasor),
        valueAt(a.solution.x, 2 * observable.phasor + 1),
      )
      const isNothing = size <= SAME * (sizes[2 * observable.phasor] ?? 1)
      return isNothing || Math.min(apart, 360 - apart) <= SAME * 180
    }
    const size = Math.max(Math.abs(one.value), Math.abs(other.value))
    return Math.abs(one.value - other.value) <= SAME * size || size < Number.MIN_VALUE / SAME
  })
}
