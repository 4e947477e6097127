import type { Complex } from '../../../src/core'
import type { Flow } from '../../../src/core/circuit'
import type { Tree } from './nodal'

/** A network of up to some hundred impedances of ordinary sizes, groups inside groups. */
export function randomTree(random: () => number, depth = 4): Tree {
  if (depth === 0 || random() < 0.3) return { impedance: randomImpedance(random) }
  const count = 2 + Math.floor(random() * 3)
  const branches = Array.from({ length: count }, () => randomTree(random, depth - 1))
  return random() < 0.5 ? { series: branches } : { parallel: branches }
}

/** Passive: 1 Ω to 1 kΩ, with a reactance up to ten times the resistance either way. */
function randomImpedance(random: () => number): Complex {
  const resistance = 10 ** (3 * random())
  return { re: resistance, im: resistance * (20 * random() - 10) }
}

/** The flows of the impedances of a network, in order. */
export function leavesOf(flow: Flow): readonly Flow[] {
  return flow.branches.length === 0 ? [flow] : flow.branches.flatMap(leavesOf)
}
