import { angleOf, differenceDegrees } from '../angle'
import { type Complex, magnitudeOf, multiply } from '../complex'
import { expandedUncertainty, type UncertaintyPart } from '../estimate/coverage'
import { fromPolar } from '../polar'
import { type Result, success } from '../result'
import type { ElementValues } from './impedance'
import { type Drive, type Flow, flowsIn, type Network } from './network'
import { networkAt } from './resonance'

/** A value that lies within ± limit for certain; 0: exact. */
export interface Toleranced {
  readonly value: number
  readonly limit: number
}

/** An element with its values by name; undefined where one of them is not known. */
export interface PredictedElement {
  readonly kind: ElementValues['kind']
  readonly values: { readonly [name: string]: Toleranced } | undefined
}

/** The circuit that is predicted from. */
export type PredictedTree =
  | PredictedElement
  | { readonly series: readonly PredictedTree[] }
  | { readonly parallel: readonly PredictedTree[] }

/** Which voltage or current of the circuit something is. */
export type Place = Pick<Drive, 'path' | 'side'>

/** Which voltage, current or impedance of the circuit is predicted. */
export interface PredictedPlace {
  readonly path: readonly number[]
  readonly side: Place['side'] | 'impedance'
}

/** A circuit and the one value that is known of what flows in it. */
export interface PredictionProblem {
  readonly circuit: PredictedTree
  /** Hz. */
  readonly frequency: Toleranced
  readonly drive: Place & {
    readonly magnitude: number
    /** Degrees; what all angles count from where there is no `reference`. */
    readonly angle: number
    /** What makes the magnitude uncertain, in its unit. */
    readonly parts: readonly UncertaintyPart[]
    /** What makes the angle uncertain, in degrees; it counts where there is no `reference`. */
    readonly angleParts?: readonly UncertaintyPart[]
  }
  /** The place whose angle, in degrees, is given by definition. */
  readonly reference?: Place & { readonly angle: number }
}

/** A predicted voltage, current or impedance. */
export interface Predicted extends PredictedPlace {
  /** V, A or Ω. */
  readonly value: Complex
  /** Expanded, coverage 95 %; left out where it cannot be propagated. */
  readonly magnitudeLimit?: number
  /** Degrees. */
  readonly angleLimit?: number
}

/** With more tolerances than this the limits are left out: each needs the circuit solved twice. */
const MOST_TOLERANCES = 400

/**
 * Every voltage, current and impedance of a circuit, with limits from the tolerances of its elements, of the
 * frequency and of what drives it. The tolerances are taken as independent and propagated to first
 * order: what each does is half the difference between the circuit with the value one standard
 * uncertainty up and the one with it as much down (JCGM 100:2008, 5.1.3, note 2). Fails in a sentence
 * where nothing follows from what is known.
 */
export function predict(problem: PredictionProblem): Result<readonly Predicted[]> {
  const nominal = solve(problem)
  if (!nominal.ok) return nominal
  const places = placesOf(nominal.value)
  const tolerances = tolerancesOf(problem)
  if (tolerances.length > MOST_TOLERANCES) return success(places)
  const spreads = places.map((place) => startSpread(place, problem))
  for (const index of tolerances.keys()) {
    const [up, down] = [moved(problem, index, 1), moved(problem, index, -1)].map(solve)
    const [above, below] = [up, down].map((each) => (each?.ok ? placesOf(each.value) : []))
    // Where a value up or down opens a way or closes one, other places are known: nothing is linear.
    const isSame = [above, below].every((each) => each?.length === places.length)
    for (const [at, spread] of spreads.entries()) {
      widen(spread, isSame ? above?.[at] : undefined, isSame ? below?.[at] : undefined)
    }
  }
  return success(places.map((place, at) => ({ ...place, ...limitsOf(spreads[at], place.value) })))
}

interface Spread {
  readonly magnitude: UncertaintyPart[]
  readonly angle: UncertaintyPart[]
  isOpen: boolean
}

/** What drives the circuit moves all voltages and currents alike, and no impedance. */
function startSpread({ side, value }: Predicted, { drive, reference }: PredictionProblem): Spread {
  if (side === 'impedance') return { magnitude: [], angle: [], isOpen: false }
  const share = drive.magnitude > 0 ? magnitudeOf(value) / drive.magnitude : 0
  const magnitude = drive.parts.map((part) => ({ ...part, uncertainty: part.uncertainty * share }))
  const angle = reference === undefined ? [...(drive.angleParts ?? [])] : []
  return { magnitude, angle, isOpen: false }
}

function widen(spread: Spread, up: Predicted | undefined, down: Predicted | undefined): void {
  if (up === undefined || down === undefined) {
    spread.isOpen = true
    return
  }
  const size = Math.abs(magnitudeOf(up.value) - magnitudeOf(down.value)) / 2
  const turn = Math.abs(differenceDegrees(angleOf(up.value), angleOf(down.value))) / 2
  if (size > 0) spread.magnitude.push({ uncertainty: size, shape: 'rectangular' })
  if (turn > 0) spread.angle.push({ uncertainty: turn, shape: 'rectangular' })
}

function limitsOf(
  spread: Spread | undefined,
  value: Complex,
): Pick<Predicted, 'magnitudeLimit' | 'angleLimit'> {
  if (spread === undefined || spread.isOpen) return {}
  const magnitudeLimit = spread.magnitude.length > 0 ? expandedUncertainty(spread.magnitude) : 0
  if (magnitudeOf(value) <= magnitudeLimit) return { magnitudeLimit }
  const angleLimit = spread.angle.length > 0 ? expandedUncertainty(spread.angle) : 0
  return { magnitudeLimit, angleLimit }
}

/** Every value that has a tolerance, in the order in which `moved` counts them. */
function tolerancesOf({ circuit, frequency }: PredictionProblem): readonly Toleranced[] {
  return [frequency, ...valuesIn(circuit)].filter(({ limit }) => limit > 0)
}

function valuesIn(tree: PredictedTree): readonly Toleranced[] {
  if ('kind' in tree) return Object.values(tree.values ?? {})
  return ('series' in tree ? tree.series : tree.parallel).flatMap(valuesIn)
}

/** The problem with one of its tolerances taken up: its value one standard uncertainty, limit / √3, away. */
function moved(problem: PredictionProblem, index: number, sign: 1 | -1): PredictionProblem {
  let left = index
  const move = (each: Toleranced): Toleranced => {
    if (!(each.limit > 0)) return each
    left -= 1
    return left === -1 ? { ...each, value: each.value + (sign * each.limit) / Math.sqrt(3) } : each
  }
  const frequency = move(problem.frequency)
  return { ...problem, frequency, circuit: withValues(problem.circuit, move) }
}

function withValues(tree: PredictedTree, change: (value: Toleranced) => Toleranced): PredictedTree {
  if ('kind' in tree) {
    const entries = Object.entries(tree.values ?? {}).map(([name, each]) => [name, change(each)])
    return tree.values === undefined ? tree : { ...tree, values: Object.fromEntries(entries) }
  }
  const below = (branch: PredictedTree) => withValues(branch, change)
  return 'series' in tree
    ? { series: tree.series.map(below) }
    : { parallel: tree.parallel.map(below) }
}

/** The network of the values as they are, without their tolerances. */
export function networkOf(tree: PredictedTree, frequency: number): Network {
  if ('kind' in tree) {
    const element = elementValuesOf(tree)
    return element ? networkAt({ element }, frequency) : { impedance: undefined }
  }
  const below = (branch: PredictedTree) => networkOf(branch, frequency)
  return 'series' in tree
    ? { series: tree.series.map(below) }
    : { parallel: tree.parallel.map(below) }
}

/** An element's values without their tolerances; undefined where they are not known. */
export function elementValuesOf({ kind, values }: PredictedElement): ElementValues | undefined {
  if (values === undefined) return undefined
  const value = (name: string) => values[name]?.value ?? 0
  const resistance = value('resistance')
  switch (kind) {
    case 'resistor':
      return { kind, resistance }
    case 'coil':
      return { kind, resistance, inductance: value('inductance') }
    case 'capacitor':
      return { kind, resistance, capacitance: value('capacitance') }
    case 'impedance':
      return { kind, resistance, reactance: value('reactance') }
  }
}

function solve(problem: PredictionProblem): Result<Flow> {
  const { circuit, frequency, drive, reference } = problem
  const value = fromPolar(drive.magnitude, drive.angle)
  const flow = flowsIn(networkOf(circuit, frequency.value), { ...drive, value })
  if (!flow.ok || reference === undefined) return flow
  const from = reference.path.reduce<Flow | undefined>(
    (at, index) => at?.branches[index],
    flow.value,
  )
  const direction = from?.[reference.side]
  if (direction === undefined || magnitudeOf(direction) === 0) return flow
  return success(turned(flow.value, fromPolar(1, reference.angle - angleOf(direction))))
}

function turned(flow: Flow, factor: Complex): Flow {
  return {
    ...flow,
    ...(flow.voltage && { voltage: multiply(flow.voltage, factor) }),
    ...(flow.current && { current: multiply(flow.current, factor) }),
    branches: flow.branches.map((branch) => turned(branch, factor)),
  }
}

function placesOf(flow: Flow, path: readonly number[] = []): readonly Predicted[] {
  const own = (['voltage', 'current', 'impedance'] as const).flatMap((side) => {
    const value = flow[side]
    return value === undefined || value === 'open' ? [] : [{ path, side, value }]
  })
  return [...own, ...flow.branches.flatMap((branch, at) => placesOf(branch, [...path, at]))]
}
