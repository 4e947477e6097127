import { type ElementValues, type Impedance, impedanceOf } from './impedance'
import { type Flow, flowsIn, impedanceOfNetwork, type Network } from './network'

/** Elements in series and in parallel, to any depth. */
export type ElementTree =
  | { readonly element: ElementValues }
  | { readonly series: readonly ElementTree[] }
  | { readonly parallel: readonly ElementTree[] }

/** Where a circuit is purely resistive as seen from its terminals. */
export interface Resonance {
  /** Hz. */
  readonly frequency: number
  /** Of a circuit in which something takes up power. */
  readonly quality?: number
  /** Hz: frequency / quality. */
  readonly bandwidth?: number
}

/** The network of a tree of elements at a frequency in Hz. */
export function networkAt(tree: ElementTree, frequency: number): Network {
  if ('element' in tree) return { impedance: impedanceOf(tree.element, frequency) }
  const at = (branch: ElementTree) => networkAt(branch, frequency)
  return 'series' in tree ? { series: tree.series.map(at) } : { parallel: tree.parallel.map(at) }
}

/** The elements of a tree, in order. */
export function elementsOf(tree: ElementTree): readonly ElementValues[] {
  if ('element' in tree) return [tree.element]
  return ('series' in tree ? tree.series : tree.parallel).flatMap(elementsOf)
}

/**
 * The resonance nearest to a frequency in Hz (of those without one, the lowest): where the current turns
 * from leading to lagging or the reverse, found to a rounding by halving. The quality factor is
 * 2π f · energy stored / power taken up, as of the circuit's own values; for R, L and C in series it is
 * 2π f L / R, for a coil beside a capacitor 2π f L / R of the coil, for R, L and C in parallel 2π f C R.
 * Undefined where there is none, or where an impedance's reactance could do anything with the frequency.
 */
export function resonanceOf(tree: ElementTree, near?: number): Resonance | undefined {
  const elements = elementsOf(tree)
  if (elements.some((each) => each.kind === 'impedance' && each.reactance !== 0)) return undefined
  const grid = gridOf(elements)
  let best: number | undefined
  for (const [index, low] of grid.entries()) {
    const high = grid[index + 1]
    if (high === undefined || turnAt(tree, low) * turnAt(tree, high) > 0) continue
    const found = turnBetween(tree, low, high)
    if (found === undefined) continue
    if (best === undefined || (near !== undefined && isNearer(found, best, near))) best = found
  }
  return best === undefined ? undefined : { frequency: best, ...qualityAt(tree, best) }
}

function isNearer(one: number, other: number, to: number): boolean {
  return Math.abs(Math.log(one / to)) < Math.abs(Math.log(other / to))
}

const POINTS_PER_DECADE = 120
const MOST_POINTS = 4_800
/** How far beyond what its coils and capacitors make together a circuit may resonate. */
const BEYOND = 100

/** Frequencies from well below the lowest to well above the highest resonance that there could be. */
function gridOf(elements: readonly ElementValues[]): readonly number[] {
  const coils = elements.flatMap((each) =>
    each.kind === 'coil' && each.inductance > 0 ? [each.inductance] : [],
  )
  const capacitors = elements.flatMap((each) =>
    each.kind === 'capacitor' && each.capacitance > 0 ? [each.capacitance] : [],
  )
  if (coils.length === 0 || capacitors.length === 0) return []
  const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)
  const least = (values: readonly number[]) => 1 / sum(values.map((value) => 1 / value))
  const lowest = frequencyOf(sum(coils), sum(capacitors)) / BEYOND
  const highest = frequencyOf(least(coils), least(capacitors)) * BEYOND
  if (!(lowest > 0 && Number.isFinite(highest))) return []
  const wanted = Math.ceil(Math.log10(highest / lowest) * POINTS_PER_DECADE)
  const points = Math.min(wanted, MOST_POINTS)
  return Array.from({ length: points + 1 }, (_, at) => lowest * (highest / lowest) ** (at / points))
}

/** f = 1 / (2π √(LC)). */
function frequencyOf(inductance: number, capacitance: number): number {
  return 1 / (2 * Math.PI * Math.sqrt(inductance) * Math.sqrt(capacitance))
}

/** The sign of the angle of the whole impedance; 0 where it is purely resistive, nothing or open. */
function turnAt(tree: ElementTree, frequency: number): number {
  const impedance = impedanceOfNetwork(networkAt(tree, frequency))
  return impedance === undefined || impedance === 'open' ? 0 : Math.sign(impedance.im)
}

const MOST_HALVINGS = 200

function turnBetween(tree: ElementTree, low: number, high: number): number | undefined {
  const below = turnAt(tree, low)
  const above = turnAt(tree, high)
  if (below === 0) return above === 0 ? undefined : low
  if (above === 0) return undefined
  let [from, to] = [low, high]
  for (let halving = 0; halving < MOST_HALVINGS; halving += 1) {
    const middle = (from + to) / 2
    if (middle <= from || middle >= to) break
    const turn = turnAt(tree, middle)
    if (turn === 0) return middle
    if (turn === below) from = middle
    else to = middle
  }
  return (from + to) / 2
}

function qualityAt(tree: ElementTree, frequency: number): Pick<Resonance, 'quality' | 'bandwidth'> {
  const network = networkAt(tree, frequency)
  const impedance: Impedance | undefined = impedanceOfNetwork(network)
  const side = impedance === 'open' ? 'voltage' : 'current'
  const flow = flowsIn(network, { path: [], side, value: { re: 1, im: 0 } })
  if (!flow.ok) return {}
  const { stored, taken } = energyIn(tree, flow.value)
  const quality = (2 * Math.PI * frequency * stored) / taken
  if (!(quality > 0 && Number.isFinite(quality))) return {}
  return { quality, bandwidth: frequency / quality }
}

/** The mean energy stored in J, half L · I² and half C · V² of rms values, and the power taken up in W. */
function energyIn(tree: ElementTree, flow: Flow): { stored: number; taken: number } {
  if (!('element' in tree)) {
    const branches = 'series' in tree ? tree.series : tree.parallel
    const parts = branches.flatMap((branch, at) => {
      const below = flow.branches[at]
      return below ? [energyIn(branch, below)] : []
    })
    return {
      stored: parts.reduce((total, { stored }) => total + stored, 0),
      taken: parts.reduce((total, { taken }) => total + taken, 0),
    }
  }
  const { element } = tree
  const square = flow.current ? flow.current.re ** 2 + flow.current.im ** 2 : 0
  const reactance = flow.impedance && flow.impedance !== 'open' ? Math.abs(flow.impedance.im) : 0
  const taken = square * element.resistance
  if (element.kind === 'coil') return { stored: (element.inductance * square) / 2, taken }
  if (element.kind !== 'capacitor') return { stored: 0, taken }
  return { stored: (element.capacitance * square * reactance ** 2) / 2, taken }
}
