import type { Matrix } from 'ml-matrix'
import { wrapDegrees } from '..'
import type { Candidate } from './candidate'
import { combinedUncertainty, coverageFactor, type UncertaintyPart } from './coverage'
import { valueAt } from './layout'
import { uncertaintyOf } from './linearisation'
import type { Observable, PhasorProblem } from './phasor-problem'

/** A quantity's best value, its standard and its expanded uncertainty (95 %), in its own unit. */
export interface Found {
  readonly value: number
  readonly uncertainty: number
  readonly expanded: number
}

/** How an observation came out. */
export interface ObservationOutcome {
  /** Best value less the observed one, in the observation's unit: how far it was moved. */
  readonly moved: number
  /** 0: nothing checks it; 1: it is checked entirely by others. */
  readonly redundancy: number
  /** The size of its normalised residual; 0 where nothing checks it. */
  readonly score: number
}

/** Covariance of a phasor's real and imaginary part, in its unit squared. */
export interface TipCovariance {
  readonly real: number
  readonly imaginary: number
  readonly both: number
}

/** Parts below this share of the whole do not count. */
const NEGLIGIBLE = 1e-9
const COVERAGE = 0.95
const HALF_TURN = 180
const ROUNDING = 1e-14

/** One drawing that the observations allow: its best values and their uncertainties. */
export class Drawing {
  readonly #problem: PhasorProblem
  readonly #candidate: Candidate
  /** Unknowns of each draw of a Monte Carlo propagation, a row a draw; undefined: linear limits. */
  readonly #draws: Matrix | undefined

  constructor(problem: PhasorProblem, candidate: Candidate, draws?: Matrix) {
    this.#problem = problem
    this.#candidate = candidate
    this.#draws = draws
  }

  /** The solution behind the drawing. */
  get candidate(): Candidate {
    return this.#candidate
  }

  /** Sum of the squares of all residuals, each over its standard uncertainty. */
  get chiSquare(): number {
    return this.#candidate.solution.chiSquare
  }

  /** How often one observation checks others. */
  get degreesOfFreedom(): number {
    return this.#candidate.linearisation.degreesOfFreedom
  }

  /** Whether limits come from a Monte Carlo propagation. */
  get isPropagatedByDraws(): boolean {
    return this.#draws !== undefined
  }

  /** The value of an observable here, fixed or not. Angles in (−180°, 180°]. */
  valueOf(observable: Observable): number {
    const { value } = this.#candidate.gradientOf(observable)
    return observable.kind === 'angle' ? wrapDegrees(value) : value
  }

  /** Best value and uncertainty; nothing where the observations leave the quantity open. */
  find(observable: Observable): Found | undefined {
    const { value, gradient } = this.#candidate.gradientOf(observable)
    if (!Number.isFinite(value) || !this.#candidate.isFixed(observable)) return undefined
    if (observable.kind === 'angle' && !this.#hasAngle(observable.phasor)) return undefined
    const best = observable.kind === 'angle' ? wrapDegrees(value) : value
    if (this.#draws) return this.#foundByDraws(observable, best, this.#draws)
    const parts = this.partsOf(this.sharesOf(gradient))
    const uncertainty = combinedUncertainty(parts)
    const size = observable.kind === 'angle' ? HALF_TURN : Math.abs(value)
    // What the conditions alone fix is exact: what is left is the solver's rounding.
    if (uncertainty <= ROUNDING * size) {
      const isNothing = observable.kind === 'angle' && Math.abs(best) <= ROUNDING * size
      return { value: isNothing ? 0 : best, uncertainty: 0, expanded: 0 }
    }
    return { value: best, uncertainty, expanded: uncertainty * coverageFactor(parts) }
  }

  /** A phasor that may be nothing has no angle. */
  #hasAngle(phasor: number): boolean {
    const observable = { kind: 'magnitude', phasor } as const
    const { value, gradient } = this.#candidate.gradientOf(observable)
    if (value === 0) return false
    if (!this.#candidate.isFixed(observable)) return true
    const parts = this.partsOf(this.sharesOf(gradient))
    return value > combinedUncertainty(parts) * coverageFactor(parts)
  }

  /** By how much a quantity with this gradient moves where each residual moves by 1. */
  sharesOf(gradient: Float64Array): Float64Array {
    return this.#candidate.linearisation.spreadOf(gradient).shares
  }

  /** The independent causes behind shares, errors of one group counted as one. */
  partsOf(shares: Float64Array): readonly UncertaintyPart[] {
    const whole = uncertaintyOf(shares)
    const parts: UncertaintyPart[] = []
    this.#candidate.equations.rows.forEach((row, each) => {
      const share = Math.abs(shares[each] ?? 0)
      if (share <= NEGLIGIBLE * whole) return
      const own = this.#problem.observations[row.observation]?.parts ?? []
      if (own.length === 0) parts.push({ uncertainty: share, shape: 'normal' })
      for (const part of own) {
        parts.push({ ...part, uncertainty: (share * part.uncertainty) / row.uncertainty })
      }
    })
    return [...parts, ...this.#sharedParts(shares, whole)]
  }

  #sharedParts(shares: Float64Array, whole: number): readonly UncertaintyPart[] {
    const first = this.#candidate.equations.rows.length
    const groups = new Map<string, UncertaintyPart>()
    this.#problem.sharedErrors.forEach(({ shape, freedom, group }, each) => {
      const share = Math.abs(shares[first + each] ?? 0)
      if (share <= NEGLIGIBLE * whole) return
      const key = group ?? `${each}`
      const uncertainty = Math.hypot(share, groups.get(key)?.uncertainty ?? 0)
      groups.set(key, { uncertainty, shape, ...(freedom === undefined ? {} : { freedom }) })
    })
    return [...groups.values()]
  }

  /** Covariance of a phasor's two parts, about its best value; nothing where one of them is open. */
  tipCovariance(phasor: number): TipCovariance | undefined {
    const parts = [
      { kind: 'real', phasor },
      { kind: 'imaginary', phasor },
    ] as const
    if (parts.some((part) => !this.#candidate.isFixed(part))) return undefined
    if (this.#draws) return this.#covarianceByDraws(phasor, this.#draws)
    const [a, b] = parts.map((part) => this.sharesOf(this.#candidate.gradientOf(part).gradient))
    if (a === undefined || b === undefined) return undefined
    let both = 0
    for (let each = 0; each < a.length; each++) both += (a[each] ?? 0) * (b[each] ?? 0)
    return { real: uncertaintyOf(a) ** 2, imaginary: uncertaintyOf(b) ** 2, both }
  }

  /** How an observation came out. */
  outcomeOf(observation: number): ObservationOutcome {
    const { equations, linearisation, solution } = this.#candidate
    const of = this.#problem.observations[observation]
    let redundancy = 0
    let score = 0
    equations.rows.forEach((row, each) => {
      if (row.observation !== observation) return
      redundancy = Math.max(redundancy, linearisation.redundancies[each] ?? 0)
      score = Math.max(score, Math.abs(linearisation.normalised[each] ?? 0))
    })
    if (of === undefined) return { moved: 0, redundancy, score }
    const value = equations.observables.valueOf(of.of, solution.x, () => undefined)
    const apart = value - of.value
    return { moved: of.of.kind === 'angle' ? wrapDegrees(apart) : apart, redundancy, score }
  }

  /** Whether every resistor, coil and capacitor is passive, within three standard uncertainties. */
  get isPassive(): boolean {
    return this.#problem.elements.every(({ kind }, element) => {
      if (kind === 'impedance') return true
      const sign = kind === 'capacitor' ? -1 : 1
      return (
        !this.#candidate.isBelowZero({ kind: 'resistance', element }, 1) &&
        !this.#candidate.isBelowZero({ kind: 'reactance', element }, sign)
      )
    })
  }

  #covarianceByDraws(phasor: number, draws: Matrix): TipCovariance {
    const { layout } = this.#candidate.equations
    const best = this.#candidate.solution.x
    let [real, imaginary, both] = [0, 0, 0]
    for (let row = 0; row < draws.rows; row++) {
      const re = draws.get(row, layout.real(phasor)) - valueAt(best, layout.real(phasor))
      const im = draws.get(row, layout.imaginary(phasor)) - valueAt(best, layout.imaginary(phasor))
      real += (re * re) / draws.rows
      imaginary += (im * im) / draws.rows
      both += (re * im) / draws.rows
    }
    return { real, imaginary, both }
  }

  #foundByDraws(observable: Observable, best: number, draws: Matrix): Found {
    const { observables } = this.#candidate.equations
    const away = Float64Array.from({ length: draws.rows }, (_, row) => {
      const x = Float64Array.from(draws.getRow(row))
      const value = observables.valueOf(observable, x, () => undefined) - best
      return Math.abs(observable.kind === 'angle' ? wrapDegrees(value) : value)
    }).sort()
    const square = away.reduce((sum, value) => sum + value * value, 0) / away.length
    const expanded = away[Math.ceil(COVERAGE * away.length) - 1] ?? 0
    return { value: best, uncertainty: Math.sqrt(square), expanded }
  }

  /** A shared error's best value, in its own standard uncertainties. */
  sharedError(error: number): number {
    return valueAt(this.#candidate.solution.x, this.#candidate.equations.layout.error(error))
  }
}
