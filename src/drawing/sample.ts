import type { Quantity } from '../sheet'
import { addArrow } from './items/arrows'
import type { Item, LinesItem, PathItem } from './scene'
import { paletteOf, type Theme } from './theme'

/** The size of a sample in millimetres. */
export const SAMPLE_SIZE = { width: 11, height: 5 }

/** A short arrow as a quantity's phasors are drawn, pointing right, for the schedule's rows. */
export function sampleArrow(quantity: Quantity, theme: Theme): readonly (LinesItem | PathItem)[] {
  const items: Item[] = []
  const middle = SAMPLE_SIZE.height / 2
  addArrow(
    items,
    {
      key: 'sample',
      role: 'term',
      sign: 1,
      quantity,
      from: { x: 0.5, y: middle },
      to: { x: SAMPLE_SIZE.width - 0.5, y: middle },
    },
    paletteOf(theme),
  )
  return items.filter((item) => item.kind === 'lines' || item.kind === 'path')
}
