import { type Complex, divide, isFiniteComplex, magnitudeOf, multiply, ZERO } from '../complex'
import { failure, type Result, success } from '../result'
import { type Impedance, inParallel, inSeries, isShort } from './impedance'

/** Impedances in series and in parallel, to any depth; undefined is one that is not known. */
export type Network =
  | { readonly impedance: Impedance | undefined }
  | { readonly series: readonly Network[] }
  | { readonly parallel: readonly Network[] }

/** What flows in a network, node by node; what does not follow from what is known is left out. */
export interface Flow {
  readonly impedance?: Impedance
  readonly voltage?: Complex
  readonly current?: Complex
  readonly branches: readonly Flow[]
}

/** One known voltage in V, or current in A, at the node that a path of branches leads to. */
export interface Drive {
  readonly path: readonly number[]
  readonly side: 'voltage' | 'current'
  readonly value: Complex
}

interface Reduced {
  readonly impedance: Impedance | undefined
  readonly form?: 'series' | 'parallel'
  readonly branches: readonly Reduced[]
}

/** The impedance of a whole network; undefined where it is not known. A group without branches is none. */
export function impedanceOfNetwork(network: Network): Impedance | undefined {
  return reduce(network).impedance
}

/**
 * Every voltage and current of a network that follow from one of them. Fails, in a sentence, where the
 * known one says nothing of the rest: it is the voltage of a short circuit, or the current of an open one.
 */
export function flowsIn(network: Network, drive: Drive): Result<Flow> {
  const reduced = reduce(network)
  if (drive.path.length === 0) return driven(reduced, drive)
  if (reduced.impedance === undefined) {
    return failure('The impedance of the whole circuit is not known: give each element its values.')
  }
  // With 1 A, or across an open circuit 1 V, at the whole, all is in the proportion that the circuit sets.
  const unit = reduced.impedance === 'open' ? 'voltage' : 'current'
  const flow = flowOf(reduced, { [unit]: { re: 1, im: 0 } })
  const relative = drive.path.reduce<Flow | undefined>((at, index) => at?.branches[index], flow)
  const share = relative?.[drive.side]
  if (share === undefined || magnitudeOf(share) === 0) return failure(saysNothing(drive.side))
  const factor = divide(drive.value, share)
  return isFiniteComplex(factor) ? success(scaled(flow, factor)) : failure(saysNothing(drive.side))
}

function driven(reduced: Reduced, { side, value }: Drive): Result<Flow> {
  const { impedance } = reduced
  const isDead =
    impedance !== undefined && (side === 'voltage' ? isShort(impedance) : impedance === 'open')
  if (isDead && magnitudeOf(value) > 0) {
    return failure(
      side === 'voltage'
        ? 'The supply feeds a short circuit: nothing in the circuit limits the current.'
        : 'The circuit is open: no current can flow through it.',
    )
  }
  return success(flowOf(reduced, { [side]: value }))
}

function saysNothing(side: Drive['side']): string {
  return `The ${side} that is known says nothing of the others: the circuit leaves it at 0.`
}

function reduce(network: Network): Reduced {
  if ('impedance' in network) return { impedance: network.impedance, branches: [] }
  const form = 'series' in network ? 'series' : 'parallel'
  const nodes = 'series' in network ? network.series : network.parallel
  const branches = nodes.map(reduce)
  const impedances = branches.map(({ impedance }) => impedance)
  if (impedances.length === 0) return { impedance: undefined, form, branches }
  const impedance = form === 'series' ? inSeries(impedances) : inParallel(impedances)
  return { impedance, form, branches }
}

type Pair = { readonly voltage?: Complex; readonly current?: Complex }

/** What is known at a node, completed by V = Z · I and handed on to its branches. */
function flowOf(node: Reduced, given: Pair): Flow {
  const { impedance, branches } = node
  const pair = complete(impedance, given)
  return {
    ...(impedance === undefined ? {} : { impedance }),
    ...pair,
    branches: branches.map((branch) => flowOf(branch, handedOn(node, branch, pair))),
  }
}

function complete(impedance: Impedance | undefined, given: Pair): Pair {
  const { voltage, current } = given
  if (impedance === undefined) return given
  if (impedance === 'open') return { ...(voltage && { voltage }), current: ZERO }
  if (isShort(impedance)) return { voltage: ZERO, ...(current && { current }) }
  if (voltage !== undefined)
    return current ? given : finitePair(voltage, divide(voltage, impedance))
  return current === undefined ? {} : finitePair(multiply(current, impedance), current)
}

function finitePair(voltage: Complex, current: Complex): Pair {
  return {
    ...(isFiniteComplex(voltage) ? { voltage } : {}),
    ...(isFiniteComplex(current) ? { current } : {}),
  }
}

/** In series all have the current, and the only open branch all of the voltage; in parallel the reverse. */
function handedOn({ form, branches }: Reduced, branch: Reduced, { voltage, current }: Pair): Pair {
  const isEnd = (each: Reduced) =>
    each.impedance === undefined ||
    (form === 'series' ? each.impedance === 'open' : isShort(each.impedance))
  const takesAll =
    branch.impedance !== undefined && isEnd(branch) && branches.filter(isEnd).length === 1
  if (form === 'series') {
    return { ...(current && { current }), ...(takesAll && voltage ? { voltage } : {}) }
  }
  return { ...(voltage && { voltage }), ...(takesAll && current ? { current } : {}) }
}

function scaled(flow: Flow, factor: Complex): Flow {
  const { impedance, voltage, current, branches } = flow
  const times = (value: Complex) => multiply(value, factor)
  return {
    ...(impedance === undefined ? {} : { impedance }),
    ...finitePair(voltage ? times(voltage) : NOT_KNOWN, current ? times(current) : NOT_KNOWN),
    branches: branches.map((branch) => scaled(branch, factor)),
  }
}

const NOT_KNOWN: Complex = { re: Number.NaN, im: Number.NaN }
