import { cosDegrees, degreesFromRadians, radiansFromDegrees, sinDegrees } from '..'
import { type Layout, valueAt } from './layout'
import type { ElementIndex, Observable, PhasorIndex, PhasorProblem } from './phasor-problem'

/** Takes the derivative of a quantity by one unknown, to be added to what is there. */
export type AddSlope = (column: number | undefined, slope: number) => void

/** Values of quantities of a phasor problem, and how they depend on the unknowns. */
export class Observables {
  readonly #problem: PhasorProblem
  readonly #layout: Layout

  constructor(problem: PhasorProblem, layout: Layout) {
    this.#problem = problem
    this.#layout = layout
  }

  /** The value of an observable at x; its derivatives go to `slope`. Angles come in degrees, not wrapped. */
  valueOf(observable: Observable, x: Float64Array, slope: AddSlope): number {
    switch (observable.kind) {
      case 'magnitude':
        return this.#magnitude(observable.phasor, x, slope)
      case 'real':
        return this.#part(this.#layout.real(observable.phasor), x, slope)
      case 'imaginary':
        return this.#part(this.#layout.imaginary(observable.phasor), x, slope)
      case 'angle':
        return this.#between(observable.phasor, observable.against, x, slope)
      case 'sine':
        return this.#sine(observable, x, slope)
      case 'power':
      case 'reactive-power':
        return this.#turnedPower(observable, x, slope)
      case 'power-factor':
        return this.#powerFactor(observable, x, slope)
      case 'resistance':
        return this.#part(this.#layout.resistance(observable.element), x, slope)
      case 'reactance':
        return this.#part(this.#layout.reactance(observable.element), x, slope)
      case 'inductance':
        return this.#inductance(observable.element, x, slope)
      case 'capacitance':
        return this.#capacitance(observable.element, x, slope)
    }
  }

  #part(column: number | undefined, x: Float64Array, slope: AddSlope): number {
    slope(column, 1)
    return valueAt(x, column)
  }

  #parts(phasor: PhasorIndex, x: Float64Array): { re: number; im: number; size: number } {
    const re = valueAt(x, this.#layout.real(phasor))
    const im = valueAt(x, this.#layout.imaginary(phasor))
    return { re, im, size: Math.hypot(re, im) }
  }

  #magnitude(phasor: PhasorIndex, x: Float64Array, slope: AddSlope): number {
    const { re, im, size } = this.#parts(phasor, x)
    if (size > 0) {
      slope(this.#layout.real(phasor), re / size)
      slope(this.#layout.imaginary(phasor), im / size)
    }
    return size
  }

  /** The angle of one phasor in radians; a phasor of no size has none, and nothing changes it. */
  #angle(phasor: PhasorIndex, x: Float64Array, slope: AddSlope): number {
    const { re, im, size } = this.#parts(phasor, x)
    if (size === 0) return 0
    slope(this.#layout.real(phasor), -im / size / size)
    slope(this.#layout.imaginary(phasor), re / size / size)
    return Math.atan2(im, re)
  }

  /** The angle between two phasors in radians. */
  #radians(
    phasor: PhasorIndex,
    against: PhasorIndex | undefined,
    x: Float64Array,
    slope: AddSlope,
  ): number {
    const own = this.#angle(phasor, x, slope)
    if (against === undefined) return own
    return own - this.#angle(against, x, (column, value) => slope(column, -value))
  }

  #between(
    phasor: PhasorIndex,
    against: PhasorIndex | undefined,
    x: Float64Array,
    slope: AddSlope,
  ): number {
    const radians = this.#radians(phasor, against, x, (column, value) =>
      slope(column, degreesFromRadians(value)),
    )
    return degreesFromRadians(radians)
  }

  #sine(of: Observable & { kind: 'sine' }, x: Float64Array, slope: AddSlope): number {
    const turn = radiansFromDegrees(of.turn ?? 0)
    const phi = this.#radians(of.phasor, of.against, x, () => undefined) + turn
    const sign = of.either === true && Math.sin(phi) < 0 ? -1 : 1
    const byAngle = sign * Math.cos(phi)
    this.#radians(of.phasor, of.against, x, (column, value) => slope(column, byAngle * value))
    return sign * Math.sin(phi)
  }

  /** Real or imaginary part of V · I* turned: the meter's channels may add an angle. */
  #turnedPower(
    of: Observable & { kind: 'power' | 'reactive-power' },
    x: Float64Array,
    slope: AddSlope,
  ): number {
    const { voltage, current, turn = 0 } = of
    const [cosine, sine] = [cosDegrees(turn), sinDegrees(turn)]
    const [p, q] = of.kind === 'power' ? [cosine, -sine] : [sine, cosine]
    const power = this.#power(voltage, current, x, (column, value) => slope(column, p * value))
    const reactive = this.#reactivePower(voltage, current, x, (column, value) =>
      slope(column, q * value),
    )
    return p * power + q * reactive
  }

  #power(voltage: PhasorIndex, current: PhasorIndex, x: Float64Array, slope: AddSlope): number {
    const v = this.#parts(voltage, x)
    const i = this.#parts(current, x)
    slope(this.#layout.real(voltage), i.re)
    slope(this.#layout.imaginary(voltage), i.im)
    slope(this.#layout.real(current), v.re)
    slope(this.#layout.imaginary(current), v.im)
    return v.re * i.re + v.im * i.im
  }

  #reactivePower(
    voltage: PhasorIndex,
    current: PhasorIndex,
    x: Float64Array,
    slope: AddSlope,
  ): number {
    const v = this.#parts(voltage, x)
    const i = this.#parts(current, x)
    slope(this.#layout.real(voltage), -i.im)
    slope(this.#layout.imaginary(voltage), i.re)
    slope(this.#layout.real(current), v.im)
    slope(this.#layout.imaginary(current), -v.re)
    return v.im * i.re - v.re * i.im
  }

  /**
   * cos φ. Where the sense was noted, the cosine of an angle on the wrong side is mirrored above 1,
   * so that the value falls all the way from one side to the other and no drawing with the wrong
   * sense can agree with the reading.
   */
  #powerFactor(
    of: Observable & { kind: 'power-factor' },
    x: Float64Array,
    slope: AddSlope,
  ): number {
    const turn = radiansFromDegrees(of.turn ?? 0)
    const phi = this.#radians(of.voltage, of.current, x, () => undefined) + turn
    const lags = Math.sin(phi) >= 0
    const isWrong = of.sense !== undefined && (of.sense === 'lags') !== lags
    const byAngle = (isWrong ? 1 : -1) * Math.sin(phi)
    this.#radians(of.voltage, of.current, x, (column, value) => slope(column, byAngle * value))
    return isWrong ? 2 - Math.cos(phi) : Math.cos(phi)
  }

  /** The angular frequency in radians a second, and its slope by the frequency's error. */
  #omega(x: Float64Array): { omega: number; column: number | undefined; byError: number } {
    const nominal = 2 * Math.PI * (this.#problem.frequency ?? Number.NaN)
    const error = this.#problem.frequencyError
    if (error === undefined) return { omega: nominal, column: undefined, byError: 0 }
    const column = this.#layout.error(error.error)
    const byError = nominal * error.sensitivity
    return { omega: nominal + byError * valueAt(x, column), column, byError }
  }

  #inductance(element: ElementIndex, x: Float64Array, slope: AddSlope): number {
    const column = this.#layout.reactance(element)
    const { omega, column: error, byError } = this.#omega(x)
    const inductance = valueAt(x, column) / omega
    slope(column, 1 / omega)
    slope(error, (-inductance * byError) / omega)
    return inductance
  }

  #capacitance(element: ElementIndex, x: Float64Array, slope: AddSlope): number {
    const column = this.#layout.reactance(element)
    const { omega, column: error, byError } = this.#omega(x)
    const reactance = valueAt(x, column)
    const capacitance = -1 / (omega * reactance)
    slope(column, -capacitance / reactance)
    slope(error, (-capacitance * byError) / omega)
    return capacitance
  }
}
