import type { Quantity } from '../../sheet'
import { type Box, NO_BOX } from '../geometry'
import type { Figure } from './figure'

/** How much 10 mm of paper stand for, for every quantity that is drawn. */
export type Scales = Map<Quantity, number>

/** How far a figure reaches from its start, in millimetres. */
export function boxOfFigure(figure: Figure, scales: Scales): Box {
  return reach(figure, (quantity) => 10 / (scales.get(quantity) ?? 1))
}

/** How far the arrows of one quantity reach in a figure, in its unit, the others taken as points. */
export function boxInUnits(figure: Figure, of: Quantity): Box {
  return reach(figure, (quantity) => (quantity === of ? 1 : 0))
}

function reach({ members }: Figure, factorOf: (quantity: Quantity) => number): Box {
  if (members.length === 0) return NO_BOX
  const tips = new Float64Array(2 * members.length)
  let [left, bottom, right, top] = [0, 0, 0, 0]
  members.forEach(({ quantity, vector, after }, index) => {
    const factor = factorOf(quantity)
    const x = (after < 0 ? 0 : (tips[2 * after] as number)) + vector.re * factor
    const y = (after < 0 ? 0 : (tips[2 * after + 1] as number)) + vector.im * factor
    tips[2 * index] = x
    tips[2 * index + 1] = y
    if (x < left) left = x
    if (x > right) right = x
    if (y < bottom) bottom = y
    if (y > top) top = y
  })
  return { left, bottom, right, top }
}
