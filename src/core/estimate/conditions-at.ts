import { Matrix } from 'ml-matrix'
import { type ConditionSpace, conditionSpace } from './condition-space'
import { type Equations, largestOf } from './problem'
import { rowLengths, scaleColumns } from './vectors'

/** Conditions count as met below this share of an unknown's size. */
export const CONDITIONS_MET = 1e-11
const RESTORING_STEPS = 12

/** Equations at one place, in units of the unknowns' sizes. */
export interface Linearised {
  readonly values: Float64Array
  readonly derivatives: Matrix
}

/** The values and scaled derivatives of equations at x. */
export function linearise(equations: Equations, x: Float64Array, sizes: Float64Array): Linearised {
  const derivatives = Matrix.zeros(equations.count, x.length)
  const values = equations.evaluate(x, derivatives)
  return { values, derivatives: scaleColumns(derivatives, sizes) }
}

/** The linearised conditions at a place, their rows scaled to length 1, and how to meet them. */
export class ConditionsAt {
  readonly space: ConditionSpace
  readonly #equations: Equations
  readonly #sizes: Float64Array
  readonly #lengths: Float64Array
  readonly values: Float64Array

  /** Linearises the conditions at x, in units of the sizes. */
  constructor(equations: Equations, x: Float64Array, sizes: Float64Array) {
    const { values, derivatives } = linearise(equations, x, sizes)
    const lengths = rowLengths(derivatives).map((length) => (length > 0 ? length : 1))
    for (let row = 0; row < derivatives.rows; row++) {
      derivatives.mulRow(row, 1 / (lengths[row] ?? 1))
    }
    this.#equations = equations
    this.#sizes = sizes
    this.#lengths = lengths
    this.values = this.#scaled(values)
    this.space = conditionSpace(derivatives)
  }

  #scaled(values: Float64Array): Float64Array {
    return values.map((value, row) => value / (this.#lengths[row] ?? 1))
  }

  /** How far off the conditions are at x: about the share of an unknown's size by which it is wrong. */
  missAt(x: Float64Array): Float64Array {
    return this.#scaled(this.#equations.evaluate(x))
  }

  /** x, moved by one step towards meeting conditions that are off by this much. */
  stepped(x: Float64Array, miss: Float64Array): Float64Array {
    return moved(x, this.space.stepFor(miss), -1, this.#sizes)
  }

  /** x moved until the conditions are met, with these derivatives throughout; nothing where that fails. */
  restored(x: Float64Array): Float64Array | undefined {
    let place = x
    let miss = this.missAt(place)
    let worst = largestOf(miss)
    for (let step = 0; step < RESTORING_STEPS && worst > CONDITIONS_MET * 1e-3; step++) {
      const next = this.stepped(place, miss)
      miss = this.missAt(next)
      const now = largestOf(miss)
      if (!(now < worst)) break
      place = next
      worst = now
    }
    return worst <= CONDITIONS_MET ? place : undefined
  }
}

/** x + factor · step, the step being in units of the sizes. */
export function moved(
  x: Float64Array,
  step: Float64Array,
  factor: number,
  sizes: Float64Array,
): Float64Array {
  return x.map((value, each) => value + factor * (step[each] ?? 0) * (sizes[each] ?? 1))
}
