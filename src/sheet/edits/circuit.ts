import type { CircuitNode, Id } from '../types'

/**
 * The circuit with only the elements that are left: branches that come out empty go, a branch of one
 * is that one. Undefined where nothing is left.
 */
export function prunedCircuit(
  node: CircuitNode | undefined,
  left: ReadonlySet<Id>,
): CircuitNode | undefined {
  if (node === undefined) return undefined
  if ('element' in node) return left.has(node.element) ? node : undefined
  const nodes = 'series' in node ? node.series : node.parallel
  const kept = nodes.flatMap((child) => prunedCircuit(child, left) ?? [])
  const isWhole = kept.length === nodes.length && kept.every((child, at) => child === nodes[at])
  if (isWhole) return node
  if (kept.length < 2) return kept[0]
  return 'series' in node ? { ...node, series: kept } : { ...node, parallel: kept }
}
