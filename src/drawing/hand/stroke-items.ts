import type { Quantity } from '../../sheet'
import { addArrow } from '../items/arrows'
import type { Item } from '../scene'
import { paletteOf, type Theme } from '../theme'
import { protractorItems, ruleItems } from './aids'
import type { DrawingMode, Stroke } from './snap'

/**
 * A stroke that is being drawn, with the rule along it and the protractor about its tail.
 *
 * @param radius Of the protractor, in millimetres.
 */
export function strokeItems(
  { tail, tip }: Stroke,
  mode: DrawingMode,
  quantity: Quantity,
  radius: number,
  theme: Theme,
): readonly Item[] {
  const palette = paletteOf(theme)
  const items = [...protractorItems(tail.at, radius, palette), ...ruleItems(tail.at, tip, palette)]
  const role = mode === 'hand' ? 'hand' : 'loose'
  addArrow(items, { key: 'stroke', role, sign: 1, quantity, from: tail.at, to: tip }, palette)
  return items
}
