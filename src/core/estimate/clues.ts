import { angleOf, cosDegrees, degreesFromRadians, magnitudeOf, sinDegrees, wrapDegrees } from '..'
import { combinedUncertainty } from './coverage'
import type { Observable, Observation, PhasorIndex, PhasorProblem } from './phasor-problem'

/** One phasor is ahead of another by so many degrees. */
export interface AngleClue {
  readonly phasor: PhasorIndex
  readonly against: PhasorIndex
  readonly degrees: number
}

/** What meters said of a voltage with a current. */
export interface PowerClue {
  readonly voltage: PhasorIndex
  readonly current: PhasorIndex
  power?: number
  reactive?: number
  factor?: number
  /** The angle of the voltage ahead of the current has this sign. */
  sign?: 1 | -1
}

/** A sine that does not say which angle it belongs to. */
export interface SineClue {
  readonly phasor: PhasorIndex
  readonly against: PhasorIndex
  readonly sine: number
  readonly either: boolean
  /** The angle was larger by this, as the meter saw it. */
  readonly turn: number
}

/** What the observations say outright, before anything is solved: the best one of each kind. */
export interface Clues {
  readonly magnitudes: readonly (number | undefined)[]
  readonly angles: readonly AngleClue[]
  readonly powers: readonly PowerClue[]
  readonly sines: readonly SineClue[]
  readonly resistances: readonly (number | undefined)[]
  readonly reactances: readonly (number | undefined)[]
}

/** A figure that stands for ±: arcs of a number that rounding may have put outside −1 … 1. */
export function clampedArc(arc: (ratio: number) => number, ratio: number): number {
  return degreesFromRadians(arc(Math.max(-1, Math.min(1, ratio))))
}

/** The relative uncertainty of an observation, by which the better of two is known. */
function coarseness({ value, parts, shared }: Observation): number {
  const common = (shared ?? []).map((part) => part.sensitivity)
  return Math.hypot(combinedUncertainty(parts), ...common) / (Math.abs(value) || 1)
}

function finestFirst(observations: readonly Observation[]): readonly Observation[] {
  return [...observations].sort((a, b) => coarseness(a) - coarseness(b))
}

function findPower(powers: PowerClue[], voltage: PhasorIndex, current: PhasorIndex): PowerClue {
  const found = powers.find((clue) => clue.voltage === voltage && clue.current === current)
  if (found) return found
  const made: PowerClue = { voltage, current }
  powers.push(made)
  return made
}

function reactanceFrom(of: Observable, value: number, frequency: number): number | undefined {
  if (of.kind === 'reactance') return value
  if (of.kind === 'inductance') return 2 * Math.PI * frequency * value
  if (of.kind === 'capacitance') return -1 / (2 * Math.PI * frequency * value)
  return undefined
}

/** Parts of phasors of which both the real and the imaginary one were observed. */
function rectangular(observations: readonly Observation[]) {
  const found = new Map<PhasorIndex, { re?: number; im?: number }>()
  for (const { of, value } of observations) {
    if (of.kind !== 'real' && of.kind !== 'imaginary') continue
    const parts = found.get(of.phasor) ?? {}
    if (of.kind === 'real') parts.re ??= value
    else parts.im ??= value
    found.set(of.phasor, parts)
  }
  return found
}

function zeroWhere(isNothing: boolean): number | undefined {
  return isNothing ? 0 : undefined
}

/** Gathers what the observations of a problem say outright. */
export function cluesOf(problem: PhasorProblem): Clues {
  const observations = finestFirst(problem.observations)
  const frequency = problem.frequency ?? Number.NaN
  const magnitudes = new Array<number | undefined>(problem.phasors).fill(undefined)
  const resistances = problem.elements.map((each) => zeroWhere(each.lossless === true))
  const reactances = problem.elements.map((each) => zeroWhere(each.kind === 'resistor'))
  const angles: AngleClue[] = []
  const powers: PowerClue[] = []
  const sines: SineClue[] = []
  /** An angle from the axis is one against the reference, whose own angle is known. */
  const fromAxis = (phasor: PhasorIndex, degrees: number) => {
    if (problem.reference === undefined || problem.reference.phasor === phasor) return
    const { phasor: against, angle } = problem.reference
    angles.push({ phasor, against, degrees: wrapDegrees(degrees - angle) })
  }
  for (const [phasor, { re, im }] of rectangular(observations)) {
    if (re === undefined || im === undefined) continue
    magnitudes[phasor] ??= magnitudeOf({ re, im })
    fromAxis(phasor, angleOf({ re, im }))
  }
  for (const { of, value } of observations) {
    switch (of.kind) {
      case 'magnitude':
        magnitudes[of.phasor] ??= Math.abs(value)
        break
      case 'angle':
        if (of.against === undefined) fromAxis(of.phasor, value)
        else angles.push({ phasor: of.phasor, against: of.against, degrees: value })
        break
      case 'sine':
        sines.push({ ...of, sine: value, either: of.either === true, turn: of.turn ?? 0 })
        break
      case 'power':
        findPower(powers, of.voltage, of.current).power ??= value
        break
      case 'reactive-power':
        findPower(powers, of.voltage, of.current).reactive ??= value
        break
      case 'power-factor': {
        const clue = findPower(powers, of.voltage, of.current)
        clue.factor ??= value
        if (of.sense !== undefined) clue.sign ??= of.sense === 'lags' ? 1 : -1
        break
      }
      case 'resistance':
        resistances[of.element] ??= value
        break
      default: {
        const reactance = reactanceFrom(of, value, frequency)
        if (reactance !== undefined && 'element' in of) reactances[of.element] ??= reactance
      }
    }
  }
  return { magnitudes, angles, powers, sines, resistances, reactances }
}

/** |V| · |I| in VA as a clue gives it, where the angle between them, in degrees, does or does not help. */
export function apparentPower(
  { power, reactive, factor }: PowerClue,
  lead: number | undefined,
): number | undefined {
  if (power !== undefined && reactive !== undefined) return Math.hypot(power, reactive)
  if (power !== undefined && factor) return power / factor
  if (lead === undefined) return undefined
  if (power !== undefined) return power / cosDegrees(lead)
  return reactive === undefined ? undefined : reactive / sinDegrees(lead)
}
