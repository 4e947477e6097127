import { Matrix, solve } from 'ml-matrix'
import type { Complex } from '../../../src/core'

/** A network of impedances, as the nodal solution takes it. */
export type Tree =
  | { readonly impedance: Complex }
  | { readonly series: readonly Tree[] }
  | { readonly parallel: readonly Tree[] }

/** The voltage across an impedance. */
export interface NodalVoltage {
  readonly voltage: Complex
  /** The potential of the end that is further from 0: what the voltage's rounding comes from. */
  readonly potential: number
}

interface Branch {
  readonly from: number
  readonly to: number
  readonly impedance: Complex
}

/**
 * The voltage across each impedance of a network, in order, with 1 A through the whole: by the nodal
 * method, admittance matrix times node voltages = injected currents, the complex system as a real one
 * of twice the size, solved by the linear-algebra library. It knows nothing of series and parallel.
 */
export function nodalVoltages(tree: Tree): readonly NodalVoltage[] {
  const branches: Branch[] = []
  let nodes = 2
  const lay = (part: Tree, from: number, to: number): void => {
    if ('impedance' in part) branches.push({ from, to, impedance: part.impedance })
    else if ('parallel' in part) for (const each of part.parallel) lay(each, from, to)
    else {
      let last = from
      for (const [index, each] of part.series.entries()) {
        const next = index === part.series.length - 1 ? to : nodes++
        lay(each, last, next)
        last = next
      }
    }
  }
  lay(tree, 1, 0)
  const free = nodes - 1
  const system = Matrix.zeros(2 * free, 2 * free)
  for (const { from, to, impedance } of branches) {
    const square = impedance.re ** 2 + impedance.im ** 2
    const [conductance, susceptance] = [impedance.re / square, -impedance.im / square]
    for (const [row, column, sign] of [
      [from, from, 1],
      [to, to, 1],
      [from, to, -1],
      [to, from, -1],
    ] as const) {
      if (row === 0 || column === 0) continue
      const [r, c] = [row - 1, column - 1]
      system.set(r, c, system.get(r, c) + sign * conductance)
      system.set(r + free, c + free, system.get(r + free, c + free) + sign * conductance)
      system.set(r, c + free, system.get(r, c + free) - sign * susceptance)
      system.set(r + free, c, system.get(r + free, c) + sign * susceptance)
    }
  }
  const injected = Matrix.zeros(2 * free, 1)
  injected.set(0, 0, 1)
  const answer = solve(system, injected)
  const at = (node: number): Complex =>
    node === 0
      ? { re: 0, im: 0 }
      : { re: answer.get(node - 1, 0), im: answer.get(node - 1 + free, 0) }
  return branches.map(({ from, to }) => {
    const [one, other] = [at(from), at(to)]
    const potential = Math.max(Math.hypot(one.re, one.im), Math.hypot(other.re, other.im))
    return { voltage: { re: one.re - other.re, im: one.im - other.im }, potential }
  })
}
