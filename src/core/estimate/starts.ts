import { differenceDegrees, fromPolar } from '..'
import { choiceOf } from './choices'
import { type Clues, cluesOf } from './clues'
import { Draft } from './draft'
import type { PhasorEquations } from './equations'
import type { PhasorIndex, PhasorProblem } from './phasor-problem'
import { createRandom, type Random } from './random'

/** Where to begin looking for solutions. */
export interface Starts {
  readonly places: readonly Float64Array[]
  /** How freely each unknown may move when a place is brought onto the conditions. */
  readonly mobility: Float64Array
  /** Whether something had to be guessed: then other guesses may lead elsewhere. */
  readonly isGuessed: boolean
}

const MOST_PLACES = 16
const MOST_FRAMES = 12
/** By how much the voltage of an element is first taken to lead its current. */
const USUAL_LEAD = { resistor: 0, coil: 60, capacitor: -80, impedance: 40 } as const

/** What is still to be guessed in a draft, once everything has been followed up the first way. */
interface Leaf {
  readonly draft: Draft
  readonly guesses: number
}

/** How an unknown is guessed: at the usual place first, anywhere later. */
interface Guesser {
  readonly clues: Clues
  readonly problem: PhasorProblem
  readonly random: Random | undefined
}

function firstOpen(values: readonly (number | undefined)[]): number | undefined {
  for (let each = 0; each < values.length; each++) {
    if (values[each] === undefined) return each
  }
  return undefined
}

/** The angle that an element's other phasor suggests. */
function suggestedAngle(draft: Draft, problem: PhasorProblem, which: PhasorIndex) {
  for (const { voltage, current, kind } of problem.elements) {
    const [v, i] = [draft.angles[voltage], draft.angles[current]]
    if (which === voltage && i !== undefined) return i + USUAL_LEAD[kind]
    if (which === current && v !== undefined) return v - USUAL_LEAD[kind]
  }
  return undefined
}

/** The open angle that is best guessed next: one that something suggests, of a known magnitude. */
function angleToGuess(draft: Draft, problem: PhasorProblem): PhasorIndex | undefined {
  let best: PhasorIndex | undefined
  let most = -1
  for (let each = 0; each < problem.phasors; each++) {
    if (draft.angles[each] !== undefined) continue
    const worth =
      (draft.magnitudes[each] === undefined ? 0 : 2) +
      (suggestedAngle(draft, problem, each) === undefined ? 0 : 1)
    if (worth > most) {
      most = worth
      best = each
    }
  }
  return best
}

function usualMagnitude(draft: Draft): number {
  const known = draft.magnitudes.filter((value) => value !== undefined && value > 0)
  return known.length === 0
    ? 1
    : known.reduce<number>((sum, value) => sum + (value ?? 0), 0) / known.length
}

/** Guesses one thing; false where nothing is open. */
function guess(draft: Draft, { problem, random }: Guesser): boolean {
  const angle = angleToGuess(draft, problem)
  if (angle !== undefined) {
    const usual = suggestedAngle(draft, problem, angle) ?? 0
    draft.setAngle(angle, random ? 360 * random() - 180 : usual)
    return true
  }
  const magnitude = firstOpen(draft.magnitudes)
  if (magnitude === undefined) return false
  draft.setMagnitude(magnitude, usualMagnitude(draft) * (random ? Math.exp(2 * random() - 1) : 1))
  return true
}

/** Beyond this share of an impedance a value is on the wrong side of nothing, whatever the limits. */
const CLEARLY = 0.1

/** Whether no resistor, coil or capacitor of a draft clearly feeds power, or has the other's reactance. */
function isPassive(draft: Draft, problem: PhasorProblem): boolean {
  return problem.elements.every(({ kind }, each) => {
    if (kind === 'impedance') return true
    const [resistance, reactance] = [draft.resistances[each] ?? 0, draft.reactances[each] ?? 0]
    const least = -CLEARLY * Math.hypot(resistance, reactance)
    const inductive = kind === 'capacitor' ? -reactance : reactance
    return resistance >= least && inductive >= least
  })
}

/** Completes a draft in every way that its choices offer, guessing where there is none. */
function complete(draft: Draft, guesser: Guesser, most: number, guesses = 0): readonly Leaf[] {
  draft.follow()
  const choice = choiceOf(draft, guesser.problem, guesser.clues)
  if (choice === undefined) {
    return guess(draft, guesser)
      ? complete(draft, guesser, most, guesses + 1)
      : [{ draft, guesses }]
  }
  const ways = choice.map((take) => {
    const copy = draft.copy()
    take(copy)
    copy.follow()
    return copy
  })
  const possible = ways.filter((way) => isPassive(way, guesser.problem))
  const leaves: Leaf[] = []
  for (const way of possible.length > 0 ? possible : ways) {
    if (leaves.length >= most) break
    leaves.push(...complete(way, guesser, most - leaves.length, guesses))
  }
  return leaves
}

function framed(problem: PhasorProblem, clues: Clues, frame: PhasorIndex): Draft {
  const draft = new Draft(problem, clues)
  draft.setAngle(frame, 0)
  return draft
}

function relationsOf(problem: PhasorProblem, which: PhasorIndex): number {
  const inElements = problem.elements.filter(
    ({ voltage, current }) => voltage === which || current === which,
  )
  return (
    inElements.length + problem.sums.filter((sum) => sum.some((t) => t.phasor === which)).length
  )
}

/**
 * The phasor from which the rest is worked out with the fewest guesses. It need not be the reference:
 * a series circuit follows from its current, whatever is called 0°.
 */
function bestFrame(problem: PhasorProblem, clues: Clues): PhasorIndex {
  const byRelations = Array.from({ length: problem.phasors }, (_, each) => each).sort(
    (a, b) => relationsOf(problem, b) - relationsOf(problem, a),
  )
  const reference = problem.reference?.phasor ?? byRelations[0] ?? 0
  let best = reference
  let fewest = Number.POSITIVE_INFINITY
  for (const frame of [reference, ...byRelations].slice(0, MOST_FRAMES)) {
    const [leaf] = complete(framed(problem, clues, frame), { problem, clues, random: undefined }, 1)
    if (leaf !== undefined && leaf.guesses < fewest) {
      fewest = leaf.guesses
      best = frame
    }
    if (fewest === 0) break
  }
  return best
}

/** A draft as values of the unknowns, turned so that the reference has its angle. */
function placeOf(draft: Draft, problem: PhasorProblem, { layout }: PhasorEquations): Float64Array {
  const x = new Float64Array(layout.unknowns)
  const { phasor, angle } = problem.reference ?? { phasor: 0, angle: draft.angles[0] ?? 0 }
  const turn = differenceDegrees(angle, draft.angles[phasor] ?? 0)
  for (let each = 0; each < problem.phasors; each++) {
    const value = fromPolar(draft.magnitudes[each] ?? 0, (draft.angles[each] ?? 0) + turn)
    x[layout.real(each)] = value.re
    x[layout.imaginary(each)] = value.im
  }
  problem.elements.forEach((_, each) => {
    const [resistance, reactance] = [layout.resistance(each), layout.reactance(each)]
    if (resistance !== undefined) x[resistance] = draft.resistances[each] ?? 0
    if (reactance !== undefined) x[reactance] = draft.reactances[each] ?? 0
  })
  return x
}

/** What was observed outright moves little. */
const HELD = 1e-3

function mobilityOf(
  problem: PhasorProblem,
  clues: Clues,
  { layout }: PhasorEquations,
): Float64Array {
  const mobility = new Float64Array(layout.unknowns).fill(1)
  const hold = (column: number | undefined) => {
    if (column !== undefined) mobility[column] = HELD
  }
  const read = new Draft(problem, clues)
  if (problem.reference) read.setAngle(problem.reference.phasor, problem.reference.angle)
  read.follow()
  for (let each = 0; each < problem.phasors; each++) {
    if (read.phasor(each) === undefined) continue
    hold(layout.real(each))
    hold(layout.imaginary(each))
  }
  problem.elements.forEach((_, each) => {
    if (clues.resistances[each] !== undefined) hold(layout.resistance(each))
    if (clues.reactances[each] !== undefined) hold(layout.reactance(each))
  })
  problem.sharedErrors.forEach((_, each) => {
    hold(layout.error(each))
  })
  return mobility
}

/**
 * Places from which to look for every solution of a problem: all that the geometry of single loops,
 * the elements' kinds and the meters' indications give, one after the other. `round` 0 guesses what
 * they leave open at its usual place, later rounds anywhere.
 */
export function startsOf(problem: PhasorProblem, equations: PhasorEquations, round = 0): Starts {
  const clues = cluesOf(problem)
  const frame = bestFrame(problem, clues)
  const random = round === 0 ? undefined : createRandom(round)
  const leaves = complete(framed(problem, clues, frame), { problem, clues, random }, MOST_PLACES)
  return {
    mobility: mobilityOf(problem, clues, equations),
    places: leaves.map(({ draft }) => placeOf(draft, problem, equations)),
    isGuessed: leaves.some(({ guesses }) => guesses > 0),
  }
}
