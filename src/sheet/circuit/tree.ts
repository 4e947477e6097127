import type { CircuitNode } from '../types'

/** How the branches of a group are joined: end to end, or side by side. */
export type Form = 'series' | 'parallel'

/** A node with branches. */
export type CircuitGroup = Exclude<CircuitNode, { readonly element: string }>

/** Where a node stands: the index of the branch at each level, from the root; `[]` is the root itself. */
export type CircuitPath = readonly number[]

/** The other way of joining. */
export function otherForm(form: Form): Form {
  return form === 'series' ? 'parallel' : 'series'
}

/** Whether a node has branches. */
export function isGroup(node: CircuitNode): node is CircuitGroup {
  return !('element' in node)
}

/** How the branches of a group are joined. */
export function formOf(group: CircuitGroup): Form {
  return 'series' in group ? 'series' : 'parallel'
}

/** The branches of a node; an element has none. */
export function branchesOf(node: CircuitNode): readonly CircuitNode[] {
  if (!isGroup(node)) return []
  return 'series' in node ? node.series : node.parallel
}

/** A group of branches. */
export function groupOf(form: Form, branches: readonly CircuitNode[]): CircuitGroup {
  return form === 'series' ? { series: branches } : { parallel: branches }
}

/** The group with other branches; fields that nobody knows stay. */
export function withBranches(group: CircuitGroup, branches: readonly CircuitNode[]): CircuitGroup {
  return 'series' in group ? { ...group, series: branches } : { ...group, parallel: branches }
}

/** The node at a path; undefined where the circuit does not reach so far. */
export function nodeAt(root: CircuitNode, path: CircuitPath): CircuitNode | undefined {
  let node: CircuitNode | undefined = root
  for (const index of path) node = node && branchesOf(node)[index]
  return node
}

/** The circuit with the node at a path made into another; the rest is shared. */
export function withNode(
  root: CircuitNode,
  path: CircuitPath,
  change: (node: CircuitNode) => CircuitNode,
): CircuitNode {
  const [index, ...rest] = path
  if (index === undefined) return change(root)
  if (!isGroup(root)) return root
  return withBranches(
    root,
    branchesOf(root).map((branch, at) => (at === index ? withNode(branch, rest, change) : branch)),
  )
}

/** The group at a path, with other branches. */
export function withBranchesAt(
  root: CircuitNode,
  path: CircuitPath,
  change: (branches: readonly CircuitNode[]) => readonly CircuitNode[],
): CircuitNode {
  return withNode(root, path, (node) =>
    isGroup(node) ? withBranches(node, change(branchesOf(node))) : node,
  )
}

/** Where an element stands in a circuit; undefined where it does not. */
export function pathOf(node: CircuitNode, element: string): CircuitPath | undefined {
  if (!isGroup(node)) return node.element === element ? [] : undefined
  for (const [index, branch] of branchesOf(node).entries()) {
    const path = pathOf(branch, element)
    if (path !== undefined) return [index, ...path]
  }
  return undefined
}
