import type { CircuitElement, CircuitNode, Id, PhasorId, Sheet, Sum } from '../types'
import { branchesOf, type CircuitPath, type Form, formOf, isGroup } from './tree'

/** The two phasors of whatever has two terminals. */
export type Side = 'voltage' | 'current'

/** What all branches of a group have in common. */
export const SHARED: { readonly [form in Form]: Side } = { series: 'current', parallel: 'voltage' }

/** What the branches of a group add up. */
export const ADDED: { readonly [form in Form]: Side } = { series: 'voltage', parallel: 'current' }

/** A node of the circuit with the phasors that stand for it. */
export interface WiredNode {
  readonly node: CircuitNode
  readonly path: CircuitPath
  /** Undefined where no sum gives it: the group is empty, or was parted by hand from its phasors. */
  readonly voltage: PhasorId | undefined
  readonly current: PhasorId | undefined
  /** The element, where the node is one. */
  readonly element?: CircuitElement
  /** Of a group: the sum that adds its branches up. */
  readonly sum?: Sum
  readonly branches: readonly WiredNode[]
}

/**
 * The circuit of a sheet with the phasors that stand for each node; undefined where the sheet has none.
 * An element names its own. What the branches of a group share is that of the first of them; what they
 * add up to is what the sum that holds them must equal: the sum of just these where there is one, else
 * the one that holds the most of them.
 */
export function wiringOf(sheet: Sheet): WiredNode | undefined {
  if (sheet.circuit === undefined) return undefined
  const elements = new Map((sheet.elements ?? []).map((element) => [element.id, element]))
  return wire(sheet.circuit, [], elements, sumsByTerm(sheet.sums ?? []))
}

function wire(
  node: CircuitNode,
  path: CircuitPath,
  elements: ReadonlyMap<Id, CircuitElement>,
  sums: ReadonlyMap<PhasorId, readonly Sum[]>,
): WiredNode {
  if (!isGroup(node)) {
    const element = elements.get(node.element)
    const { voltage, current } = element ?? {}
    return { node, path, voltage, current, ...(element && { element }), branches: [] }
  }
  const branches = branchesOf(node).map((branch, index) =>
    wire(branch, [...path, index], elements, sums),
  )
  const form = formOf(node)
  const shared = branches.map((branch) => branch[SHARED[form]]).find((id) => id !== undefined)
  const added = branches.flatMap((branch) => branch[ADDED[form]] ?? [])
  const sum = sumOf(added, sums)
  const total = typeof sum?.equals === 'string' ? sum.equals : undefined
  const [voltage, current] = form === 'series' ? [total, shared] : [shared, total]
  return { node, path, voltage, current, ...(sum && { sum }), branches }
}

function sumsByTerm(sums: readonly Sum[]): ReadonlyMap<PhasorId, readonly Sum[]> {
  const byTerm = new Map<PhasorId, Sum[]>()
  for (const sum of sums) {
    for (const id of new Set(sum.terms.map(({ phasor }) => phasor))) {
      byTerm.set(id, [...(byTerm.get(id) ?? []), sum])
    }
  }
  return byTerm
}

/** The sum that holds the most of some phasors, and the fewest others. */
function sumOf(
  phasors: readonly PhasorId[],
  sums: ReadonlyMap<PhasorId, readonly Sum[]>,
): Sum | undefined {
  const wanted = new Set(phasors)
  let best: Sum | undefined
  let bestScore = 0
  for (const sum of new Set(phasors.flatMap((id) => sums.get(id) ?? []))) {
    if (typeof sum.equals !== 'string' || wanted.has(sum.equals)) continue
    const held = sum.terms.filter(({ phasor, sign = 1 }) => sign === 1 && wanted.has(phasor)).length
    const score = held - (sum.terms.length - held) / (sum.terms.length + 1)
    if (score > bestScore) [best, bestScore] = [sum, score]
  }
  return best
}

/** A node of the wiring by its path; undefined where there is none. */
export function wiredAt(root: WiredNode | undefined, path: CircuitPath): WiredNode | undefined {
  let node = root
  for (const index of path) node = node?.branches[index]
  return node
}

/** Every node of the wiring, each before its branches. */
export function* wiredNodes(root: WiredNode): Generator<WiredNode> {
  yield root
  for (const branch of root.branches) yield* wiredNodes(branch)
}
