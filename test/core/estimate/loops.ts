import { add, angleOf, type Complex, magnitudeOf, multiply, subtract } from '../../../src/core'
import type { Observation, PhasorProblem, Random } from '../../../src/core/estimate'
import { angle, at, element, magnitude, problemWith, read, total } from './job'

/** A problem made from a truth, with readings taken exactly. */
export interface Loop {
  readonly problem: PhasorProblem
  readonly truth: readonly Complex[]
  /** How many drawings geometry gives; omitted where it is no single loop. */
  readonly solutions?: number
  /** Within the stated band of a tangent, or of a drawing that falls together: not to be judged. */
  readonly isTangent: boolean
}

/** A drawing this near to flat, or a length this near to nothing, is left out: a share of the largest. */
export const TANGENT_BAND = 0.02

function between(random: Random, low: number, high: number): number {
  return low + (high - low) * random()
}

function randomPhasor(random: Random): Complex {
  return at(10 ** between(random, 0, 2), between(random, -180, 180))
}

/** A whole that some terms make up; the whole is the reference. */
function loopOf(random: Random): readonly Complex[] {
  const count = 2 + Math.floor(3 * random())
  const terms = Array.from({ length: count }, () => randomPhasor(random))
  const whole = terms.reduce(add, { re: 0, im: 0 })
  const size = magnitudeOf(whole)
  const turn = { re: whole.re / size, im: -whole.im / size }
  return [whole, ...terms].map((each) => multiply(each, turn))
}

/** Everything of the phasors but what is named. */
function readAllBut(
  truth: readonly Complex[],
  magnitudes: readonly number[],
  angles: readonly number[],
): readonly Observation[] {
  return truth.flatMap((value, phasor) => [
    ...(magnitudes.includes(phasor) ? [] : [magnitude(phasor, magnitudeOf(value))]),
    ...(angles.includes(phasor) || phasor === 0 ? [] : [angle(phasor, angleOf(value))]),
  ])
}

function singleLoop(
  truth: readonly Complex[],
  magnitudes: readonly number[],
  angles: readonly number[],
): PhasorProblem {
  return problemWith({
    phasors: truth.length,
    sums: [total(0, ...truth.slice(1).map((_, each) => each + 1))],
    observations: readAllBut(truth, magnitudes, angles),
  })
}

function largest(truth: readonly Complex[]): number {
  return Math.max(...truth.map(magnitudeOf))
}

function smallest(truth: readonly Complex[]): number {
  return Math.min(...truth.map(magnitudeOf))
}

/** How far apart two directions are, as the sine between them. */
function sineBetween(a: Complex, b: Complex): number {
  return (a.re * b.im - a.im * b.re) / (magnitudeOf(a) * magnitudeOf(b))
}

const nothing: Complex = { re: 0, im: 0 }

/** One phasor of a sum unknown altogether. */
export function oneUnknownPhasor(random: Random): Loop {
  const truth = loopOf(random)
  const isTangent = smallest(truth) < TANGENT_BAND * largest(truth)
  return { problem: singleLoop(truth, [1], [1]), truth, solutions: 1, isTangent }
}

/** Two unknown magnitudes. */
export function twoUnknownMagnitudes(random: Random): Loop {
  const truth = loopOf(random)
  const [, first = nothing, second = nothing] = truth
  const isTangent =
    Math.abs(sineBetween(first, second)) < TANGENT_BAND ||
    smallest(truth) < TANGENT_BAND * largest(truth)
  return { problem: singleLoop(truth, [1, 2], []), truth, solutions: 1, isTangent }
}

/** The magnitude of one and the angle of another unknown: one or two drawings. */
export function magnitudeAndAngle(random: Random): Loop {
  const truth = loopOf(random)
  const [, first = nothing, second = nothing] = truth
  // Where the line along the first passes the circle of the second: at the truth, and mirrored
  // about the foot of the perpendicular from the second's centre.
  const sum = add(first, second)
  const size = magnitudeOf(first)
  const foot = (sum.re * first.re + sum.im * first.im) / size
  const other = 2 * foot - size
  const band = TANGENT_BAND * largest(truth)
  const isTangent =
    Math.abs(size - other) < band || Math.abs(other) < band || smallest(truth) < band
  const problem = singleLoop(truth, [1], [2])
  return { problem, truth, solutions: other > 0 ? 2 : 1, isTangent }
}

/** Two unknown angles: the triangle and its mirror. */
export function twoUnknownAngles(random: Random): Loop {
  const truth = loopOf(random)
  const [, first = nothing, second = nothing] = truth
  const band = TANGENT_BAND * largest(truth)
  const isTangent =
    Math.abs(sineBetween(first, second)) < TANGENT_BAND ||
    magnitudeOf(add(first, second)) < band ||
    smallest(truth) < band
  return { problem: singleLoop(truth, [], [1, 2]), truth, solutions: 2, isTangent }
}

/** Values of a series circuit that is neither all resistance nor all reactance. */
function seriesValues(random: Random) {
  return {
    current: between(random, 0.1, 10),
    resistance: between(random, 5, 50),
    winding: between(random, 2, 20),
    coil: between(random, 10, 80),
    capacitor: -between(random, 10, 80),
  }
}

/**
 * A resistor, a coil with its own resistance and a capacitor in series, from voltmeter readings over
 * each, over all and over the first two, and the current: element values unknown.
 */
export function elementsFromVoltmeters(random: Random): Loop {
  const { current, resistance, winding, coil, capacitor } = seriesValues(random)
  const i = at(current, 0)
  const r = multiply(i, { re: resistance, im: 0 })
  const l = multiply(i, { re: winding, im: coil })
  const c = multiply(i, { re: 0, im: capacitor })
  const truth = [i, r, l, c, add(add(r, l), c), add(r, l)]
  const problem = problemWith({
    phasors: 6,
    sums: [total(4, 1, 2, 3), total(5, 1, 2)],
    elements: [element('resistor', 1, 0), element('coil', 2, 0), element('capacitor', 3, 0)],
    observations: truth.map((value, phasor) => magnitude(phasor, magnitudeOf(value))),
  })
  const volts = truth.slice(1)
  return { problem, truth, isTangent: smallest(volts) < TANGENT_BAND * largest(volts) }
}

/** Three voltmeters: a resistor in series with an unknown impedance, no angle read. */
export function threeVoltmeters(random: Random): Loop {
  const { current, resistance, winding, coil } = seriesValues(random)
  const i = at(current, 0)
  const r = multiply(i, { re: resistance, im: 0 })
  const z = multiply(i, { re: winding, im: random() < 0.5 ? coil : -coil })
  const truth = [i, r, z, add(r, z)]
  const problem = problemWith({
    phasors: 4,
    sums: [total(3, 1, 2)],
    elements: [element('resistor', 1, 0), element('impedance', 2, 0)],
    observations: truth.map((value, phasor) => magnitude(phasor, magnitudeOf(value))),
  })
  return { problem, truth, solutions: 2, isTangent: false }
}

/** Three ammeters: a resistor beside an unknown impedance, no angle read. */
export function threeAmmeters(random: Random): Loop {
  const { current, resistance, winding, coil } = seriesValues(random)
  const v = at(current * resistance, 0)
  const r = at(current, 0)
  const square = winding ** 2 + coil ** 2
  const z = multiply(v, { re: winding / square, im: -coil / square })
  const truth = [v, r, z, add(r, z)]
  const problem = problemWith({
    phasors: 4,
    sums: [total(3, 1, 2)],
    elements: [element('resistor', 0, 1), element('impedance', 0, 2)],
    observations: truth.map((value, phasor) => magnitude(phasor, magnitudeOf(value))),
  })
  return { problem, truth, solutions: 2, isTangent: false }
}

/** Power and reactive power, power and power factor with its sense, or power alone, for an angle. */
export function powerForAngle(random: Random): Loop {
  const lead = between(random, 15, 75) * (random() < 0.5 ? 1 : -1)
  const v = at(between(random, 50, 400), 0)
  const i = at(between(random, 0.5, 20), -lead)
  const apparent = magnitudeOf(v) * magnitudeOf(i)
  const power = apparent * Math.cos((lead * Math.PI) / 180)
  const pair = { voltage: 0, current: 1 }
  const truth = [v, i]
  const way = Math.floor(3 * random())
  const observations = [
    magnitude(0, magnitudeOf(v)),
    read({ kind: 'power', ...pair }, power),
    ...(way === 0
      ? [read({ kind: 'reactive-power', ...pair }, apparent * Math.sin((lead * Math.PI) / 180))]
      : way === 1
        ? [
            read(
              { kind: 'power-factor', ...pair, sense: lead > 0 ? 'lags' : 'leads' },
              power / apparent,
              0.005,
            ),
          ]
        : [magnitude(1, magnitudeOf(i))]),
  ]
  const problem = problemWith({
    phasors: 2,
    elements: [element('impedance', 0, 1)],
    observations,
  })
  return { problem, truth, solutions: way === 2 ? 2 : 1, isTangent: false }
}

/** Two loops and a node at once: a coil before a resistor beside a capacitor, values unknown. */
export function loopsAndNodes(random: Random): Loop {
  const { resistance, winding, coil, capacitor } = seriesValues(random)
  const across = at(between(random, 50, 200), 0)
  const ir = { re: across.re / resistance, im: 0 }
  const ic = { re: 0, im: across.re / -capacitor }
  const i = add(ir, ic)
  const before = multiply(i, { re: winding, im: coil })
  const truth = [across, ir, ic, i, before, add(across, before)]
  const problem = problemWith({
    phasors: 6,
    sums: [total(3, 1, 2), total(5, 0, 4)],
    elements: [element('resistor', 0, 1), element('capacitor', 0, 2), element('coil', 4, 3)],
    observations: truth.map((value, phasor) => magnitude(phasor, magnitudeOf(value))),
  })
  return { problem, truth, isTangent: smallest(truth) < 1e-3 }
}

/** Three loads in a star whose point floats, from the supply and the loads' values. */
export function floatingStar(random: Random): Loop {
  const supply = [0, -120, 120].map((degrees) => at(230, degrees + between(random, -2, 2)))
  supply[0] = at(230, 0)
  const loads = supply.map(() => ({
    re: between(random, 5, 50),
    im: between(random, -40, 40),
  }))
  const admittances = loads.map(({ re, im }) => {
    const square = re * re + im * im
    return { re: re / square, im: -im / square }
  })
  const currents = supply.map((v, k) => multiply(v, admittances[k] ?? nothing))
  const whole = admittances.reduce(add, nothing)
  const square = whole.re ** 2 + whole.im ** 2
  const star = multiply(currents.reduce(add, nothing), {
    re: whole.re / square,
    im: -whole.im / square,
  })
  const voltages = supply.map((v) => subtract(v, star))
  const flows = voltages.map((v, k) => multiply(v, admittances[k] ?? nothing))
  const truth = [...supply, ...voltages, ...flows, star]
  const phases = [0, 1, 2]
  const problem = problemWith({
    phasors: 10,
    sums: [
      ...phases.map((phase) => total(phase, 3 + phase, 9)),
      [6, 7, 8].map((phasor) => ({ phasor, sign: 1 }) as const),
    ],
    elements: phases.map((phase) => element('impedance', 3 + phase, 6 + phase)),
    observations: [
      ...supply.map((v, phase) => magnitude(phase, magnitudeOf(v))),
      ...supply.slice(1).map((v, phase) => angle(phase + 1, angleOf(v))),
      ...loads.flatMap(({ re, im }, which) => [
        read({ kind: 'resistance', element: which }, re),
        read({ kind: 'reactance', element: which }, im, 0.5),
      ]),
    ],
  })
  const isTangent = smallest(truth) < TANGENT_BAND
  return { problem, truth, solutions: 1, isTangent }
}

/** Every kind of loop, by its name. */
export const loopKinds = {
  'one unknown phasor': oneUnknownPhasor,
  'two unknown magnitudes': twoUnknownMagnitudes,
  'one magnitude and one angle': magnitudeAndAngle,
  'two unknown angles': twoUnknownAngles,
  'three voltmeters': threeVoltmeters,
  'three ammeters': threeAmmeters,
  'power for an angle': powerForAngle,
  'loops and nodes at once': loopsAndNodes,
  'element values from voltmeters': elementsFromVoltmeters,
  'a floating star point': floatingStar,
} as const satisfies { readonly [name: string]: (random: Random) => Loop }
