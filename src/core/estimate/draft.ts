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
import { type AngleClue, type Clues, clampedArc, type PowerClue, type SineClue } from './clues'
import { circlesMeet, lineMeetsCircle, linesMeet } from './geometry'
import { solveNetwork } from './network'
import type { ClosedSum, ElementModel, PhasorIndex, PhasorProblem } from './phasor-problem'

/** Several ways to go on; each changes the draft that it is given. */
export type Choice = readonly ((draft: Draft) => void)[]

/**
 * A drawing in the making: magnitudes and angles (degrees, in a frame that may yet be turned), and
 * elements' values, as far as they are known. It follows up everything that has but one consequence,
 * and offers a choice where there are two.
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
      this.#setPhasor(phasor, value)
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

  #relate(phasor: PhasorIndex, against: PhasorIndex, degrees: number): void {
    const clue = { phasor, against, degrees: wrapDegrees(degrees) }
    this.#found.push(clue)
    this.#followAngle(clue)
  }

  #followAngle({ phasor, against, degrees }: AngleClue): void {
    const [one, other] = [this.angles[phasor], this.angles[against]]
    if (one !== undefined) this.setAngle(against, one - degrees)
    if (other !== undefined) this.setAngle(phasor, other + degrees)
  }

  #setPhasor(which: PhasorIndex, value: Complex): void {
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
    const apparent = this.#apparent(clue)
    if (apparent === undefined) return
    const [v, i] = [this.magnitudes[voltage], this.magnitudes[current]]
    if (v !== undefined) this.setMagnitude(current, apparent / v)
    if (i !== undefined) this.setMagnitude(voltage, apparent / i)
  }

  #apparent({ voltage, current, power, reactive, factor }: PowerClue): number | undefined {
    if (power !== undefined && reactive !== undefined) return Math.hypot(power, reactive)
    if (power !== undefined && factor) return power / factor
    const lead = this.#lead(voltage, current)
    if (lead === undefined) return undefined
    if (power !== undefined) return power / cosDegrees(lead)
    return reactive === undefined ? undefined : reactive / sinDegrees(lead)
  }

  /** What the other terms leave for these. */
  #gap(sum: ClosedSum, except: readonly PhasorIndex[]): Complex {
    let gap = ZERO
    for (const { phasor, sign } of sum) {
      const value = this.phasor(phasor)
      if (except.includes(phasor) || value === undefined) continue
      gap = subtract(gap, { re: sign * value.re, im: sign * value.im })
    }
    return gap
  }

  #openTerms(sum: ClosedSum): ClosedSum {
    return sum.filter(({ phasor }) => this.phasor(phasor) === undefined)
  }

  #followSum(sum: ClosedSum): void {
    const [term, another] = this.#openTerms(sum)
    if (term === undefined || another !== undefined) return
    const gap = this.#gap(sum, [term.phasor])
    this.#setPhasor(term.phasor, { re: term.sign * gap.re, im: term.sign * gap.im })
  }

  /** The next question that has a few answers; nothing where only a guess helps. */
  choice(): Choice | undefined {
    return this.#choiceOfSums() ?? this.#choiceOfPowers() ?? this.#choiceOfSines()
  }

  #choiceOfSums(): Choice | undefined {
    for (const sum of this.#problem.sums) {
      const open = this.#openTerms(sum)
      const [first, second] = open
      if (open.length !== 2 || first === undefined || second === undefined) continue
      const choice = this.#twoTerms(sum, first, second) ?? this.#twoTerms(sum, second, first)
      if (choice !== undefined && choice.length > 0) return choice
    }
    return undefined
  }

  #twoTerms(
    sum: ClosedSum,
    first: ClosedSum[number],
    second: ClosedSum[number],
  ): Choice | undefined {
    const gap = this.#gap(sum, [first.phasor, second.phasor])
    const [a, b] = [this.magnitudes[first.phasor], this.magnitudes[second.phasor]]
    const [alpha, beta] = [this.angles[first.phasor], this.angles[second.phasor]]
    if (a !== undefined && b !== undefined) {
      return circlesMeet(a, b, gap).map((tip) => (draft) => {
        draft.#setPhasor(first.phasor, { re: first.sign * tip.re, im: first.sign * tip.im })
      })
    }
    if (alpha !== undefined && b !== undefined) {
      const lengths = lineMeetsCircle(fromPolar(first.sign, alpha), gap, b)
      return lengths.map((length) => (draft) => draft.setMagnitude(first.phasor, length))
    }
    if (alpha === undefined || beta === undefined) return undefined
    const factors = linesMeet(fromPolar(first.sign, alpha), fromPolar(second.sign, beta), gap)
    if (factors === undefined) return undefined
    return [
      (draft) => {
        draft.setMagnitude(first.phasor, factors[0])
        draft.setMagnitude(second.phasor, factors[1])
      },
    ]
  }

  #choiceOfPowers(): Choice | undefined {
    for (const { voltage, current, power, reactive, factor } of this.#clues.powers) {
      if (this.#isRelated(voltage, current)) continue
      const [v, i] = [this.magnitudes[voltage], this.magnitudes[current]]
      const apparent = v === undefined || i === undefined ? undefined : v * i
      const cosine = factor ?? (power !== undefined && apparent ? power / apparent : undefined)
      if (cosine !== undefined) {
        const lead = clampedArc(Math.acos, cosine)
        return this.#eitherAngle(voltage, current, [lead, -lead])
      }
      if (reactive === undefined || !apparent) continue
      const lead = clampedArc(Math.asin, reactive / apparent)
      return this.#eitherAngle(voltage, current, [lead, 180 - lead])
    }
    return undefined
  }

  #choiceOfSines(): Choice | undefined {
    for (const { phasor, against, sine, either, turn } of this.#clues.sines) {
      if (this.#isRelated(phasor, against)) continue
      const lead = clampedArc(Math.asin, sine)
      const angles = either ? [lead, -lead, 180 - lead, lead - 180] : [lead, 180 - lead]
      return this.#eitherAngle(
        phasor,
        against,
        angles.map((angle) => angle - turn),
      )
    }
    return undefined
  }

  #isRelated(phasor: PhasorIndex, against: PhasorIndex): boolean {
    if (this.angles[phasor] !== undefined && this.angles[against] !== undefined) return true
    return this.#found.some((clue: SineClue | AngleClue) => {
      const pair = [clue.phasor, clue.against]
      return pair.includes(phasor) && pair.includes(against)
    })
  }

  #eitherAngle(phasor: PhasorIndex, against: PhasorIndex, degrees: readonly number[]): Choice {
    return degrees.map((lead) => (draft) => draft.#relate(phasor, against, lead))
  }
}
