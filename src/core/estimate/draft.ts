import {
  type Complex,
  cosDegrees,
  degreesFromRadians,
  differenceDegrees,
  divide,
  fromPolar,
  sinDegrees,
  subtract,
  toPolar,
  wrapDegrees,
  ZERO,
} from '..'
import {
  type AngleClue,
  apparentPower,
  type Clues,
  clampedArc,
  type PowerClue,
  type SineClue,
} from './clues'
import { solveNetwork } from './network'
import type { ClosedSum, ElementModel, PhasorIndex, PhasorProblem } from './phasor-problem'

/**
 * A drawing in the making: magnitudes and angles (degrees, in a frame that may yet be turned), and
 * elements' values, as far as they are known. It follows up everything that has but one consequence.
 */
export class Draft {
  readonly #problem: PhasorProblem
  readonly #clues: Clues
  readonly magnitudes: (number | undefined)[]
  readonly angles: (number | undefined)[]
  readonly resistances: (number | undefined)[]
  readonly reactances: (number | undefined)[]
  readonly #found: AngleClue[]
  #changed = false

  constructor(problem: PhasorProblem, clues: Clues, from?: Draft) {
    this.#problem = problem
    this.#clues = clues
    this.magnitudes = [...(from?.magnitudes ?? clues.magnitudes)]
    this.angles = [...(from?.angles ?? new Array<number | undefined>(problem.phasors))]
    this.resistances = [...(from?.resistances ?? clues.resistances)]
    this.reactances = [...(from?.reactances ?? clues.reactances)]
    this.#found = from ? [...from.#found] : [...clues.angles]
  }

  /** A draft to try a choice on. */
  copy(): Draft {
    return new Draft(this.#problem, this.#clues, this)
  }

  /** Sets a magnitude that is not known yet. */
  setMagnitude(phasor: PhasorIndex, value: number): void {
    if (this.magnitudes[phasor] !== undefined || !Number.isFinite(value)) return
    this.magnitudes[phasor] = Math.abs(value)
    this.#changed = true
  }

  /** Sets an angle that is not known yet. */
  setAngle(phasor: PhasorIndex, degrees: number): void {
    if (this.angles[phasor] !== undefined || !Number.isFinite(degrees)) return
    this.angles[phasor] = wrapDegrees(degrees)
    this.#changed = true
  }

  /** The phasor, where both its parts are known. */
  phasor(which: PhasorIndex): Complex | undefined {
    const [magnitude, angle] = [this.magnitudes[which], this.angles[which]]
    return magnitude === undefined || angle === undefined ? undefined : fromPolar(magnitude, angle)
  }

  /** Follows up everything that has but one consequence, first alone, then taken together. */
  follow(): void {
    do {
      this.#followEach()
      this.#followNetwork()
    } while (this.#changed)
  }

  #followNetwork(): void {
    this.#changed = false
    const known = this.magnitudes.map((_, each) => this.phasor(each))
    if (!known.includes(undefined)) return
    const impedances = this.#problem.elements.map((_, each) => this.#impedance(each))
    for (const [phasor, value] of solveNetwork(this.#problem, known, impedances)) {
      this.setPhasor(phasor, value)
    }
  }

  #impedance(element: number): Complex | undefined {
    const [re, im] = [this.resistances[element], this.reactances[element]]
    return re === undefined || im === undefined ? undefined : { re, im }
  }

  #followEach(): void {
    do {
      this.#changed = false
      for (const clue of this.#found) this.#followAngle(clue)
      this.#problem.elements.forEach((element, each) => {
        this.#followElement(element, each)
      })
      for (const clue of this.#clues.powers) this.#followPower(clue)
      for (const sum of this.#problem.sums) this.#followSum(sum)
    } while (this.#changed)
  }

  /** Notes how far a phasor is ahead of another, in degrees. */
  relate(phasor: PhasorIndex, against: PhasorIndex, degrees: number): void {
    const clue = { phasor, against, degrees: wrapDegrees(degrees) }
    this.#found.push(clue)
    this.#followAngle(clue)
  }

  #followAngle({ phasor, against, degrees }: AngleClue): void {
    const [one, other] = [this.angles[phasor], this.angles[against]]
    if (one !== undefined) this.setAngle(against, one - degrees)
    if (other !== undefined) this.setAngle(phasor, other + degrees)
  }

  /** Sets what is not known yet of a phasor. */
  setPhasor(which: PhasorIndex, value: Complex): void {
    const { magnitude, angle } = toPolar(value)
    this.setMagnitude(which, magnitude)
    this.setAngle(which, angle)
  }

  #setValues(element: number, resistance: number, reactance: number): void {
    for (const [values, value] of [
      [this.resistances, resistance],
      [this.reactances, reactance],
    ] as const) {
      if (values[element] !== undefined || !Number.isFinite(value)) continue
      values[element] = value
      this.#changed = true
    }
  }

  #followElement(element: ElementModel, each: number): void {
    const { voltage, current, kind } = element
    const [v, i] = [this.phasor(voltage), this.phasor(current)]
    if (v && i) {
      const impedance = divide(v, i)
      this.#setValues(each, impedance.re, impedance.im)
    }
    const [resistance, reactance] = [this.resistances[each], this.reactances[each]]
    const impedance = this.#impedance(each)
    if (impedance) {
      this.#followImpedance(element, impedance)
    } else if (reactance === 0) {
      this.#followAngle({ phasor: voltage, against: current, degrees: 0 })
    } else if (resistance === 0 && kind !== 'impedance') {
      const degrees = kind === 'coil' ? 90 : -90
      this.#followAngle({ phasor: voltage, against: current, degrees })
    }
    this.#followPartOfImpedance(element, each)
  }

  #followImpedance({ voltage, current }: ElementModel, impedance: Complex): void {
    const { magnitude, angle } = toPolar(impedance)
    const [v, i] = [this.magnitudes[voltage], this.magnitudes[current]]
    if (i !== undefined) this.setMagnitude(voltage, i * magnitude)
    if (v !== undefined) this.setMagnitude(current, v / magnitude)
    if (magnitude > 0) this.#followAngle({ phasor: voltage, against: current, degrees: angle })
  }

  /** One value of an element from the other and from the ratio of, or the angle between, V and I. */
  #followPartOfImpedance({ voltage, current, kind }: ElementModel, each: number): void {
    const [resistance, reactance] = [this.resistances[each], this.reactances[each]]
    if ((resistance === undefined) === (reactance === undefined)) return
    const lead = this.#lead(voltage, current)
    if (lead !== undefined) {
      const slope = sinDegrees(lead) / cosDegrees(lead)
      this.#setValues(each, (reactance ?? 0) / slope, (resistance ?? 0) * slope)
      return
    }
    const size = this.#ratio(voltage, current)
    if (size === undefined) return
    const other = Math.sqrt(Math.max(0, size ** 2 - (resistance ?? reactance ?? 0) ** 2))
    if (resistance === undefined) this.#setValues(each, other, 0)
    else if (kind !== 'impedance') this.#setValues(each, 0, kind === 'coil' ? other : -other)
  }

  #ratio(voltage: PhasorIndex, current: PhasorIndex): number | undefined {
    const [v, i] = [this.magnitudes[voltage], this.magnitudes[current]]
    return v === undefined || i === undefined ? undefined : v / i
  }

  #lead(voltage: PhasorIndex, current: PhasorIndex): number | undefined {
    const [v, i] = [this.angles[voltage], this.angles[current]]
    return v === undefined || i === undefined ? undefined : differenceDegrees(v, i)
  }

  #followPower(clue: PowerClue): void {
    const { voltage, current, power, reactive, factor, sign } = clue
    if (this.#lead(voltage, current) === undefined) {
      if (power !== undefined && reactive !== undefined) {
        const degrees = degreesFromRadians(Math.atan2(reactive, power))
        this.#followAngle({ phasor: voltage, against: current, degrees })
      } else if (factor !== undefined && sign !== undefined) {
        const degrees = sign * clampedArc(Math.acos, factor)
        this.#followAngle({ phasor: voltage, against: current, degrees })
      }
    }
    const apparent = apparentPower(clue, this.#lead(voltage, current))
    if (apparent === undefined) return
    const [v, i] = [this.magnitudes[voltage], this.magnitudes[current]]
    if (v !== undefined) this.setMagnitude(current, apparent / v)
    if (i !== undefined) this.setMagnitude(voltage, apparent / i)
  }

  /** What the other terms leave for these. */
  gap(sum: ClosedSum, except: readonly PhasorIndex[]): Complex {
    let gap = ZERO
    for (const { phasor, sign } of sum) {
      const value = this.phasor(phasor)
      if (except.includes(phasor) || value === undefined) continue
      gap = subtract(gap, { re: sign * value.re, im: sign * value.im })
    }
    return gap
  }

  /** The terms of a sum that are not known whole. */
  openTerms(sum: ClosedSum): ClosedSum {
    return sum.filter(({ phasor }) => this.phasor(phasor) === undefined)
  }

  #followSum(sum: ClosedSum): void {
    const [term, another] = this.openTerms(sum)
    if (term === undefined || another !== undefined) return
    const gap = this.gap(sum, [term.phasor])
    this.setPhasor(term.phasor, { re: term.sign * gap.re, im: term.sign * gap.im })
  }

  /** Whether the angle between two phasors is known. */
  isRelated(phasor: PhasorIndex, against: PhasorIndex): boolean {
    if (this.angles[phasor] !== undefined && this.angles[against] !== undefined) return true
    return this.#found.some((clue: SineClue | AngleClue) => {
      const pair = [clue.phasor, clue.against]
      return pair.includes(phasor) && pair.includes(against)
    })
  }
}
