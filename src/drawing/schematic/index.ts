import type { Sheet } from '../../sheet'
import type { Box } from '../geometry'
import { createGround } from '../labels/ground'
import { roomNear } from '../rooms'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { drawCircuit } from './drawn-circuit'
import { moveItem } from './items'

/** A schematic as it stands on the sheet, and the boxes that others keep out of. */
export interface Schematic {
  readonly items: readonly Item[]
  readonly boxes: readonly Box[]
  readonly isLeftOut: boolean
}

/** Where there is no circuit. */
export const NO_SCHEMATIC: Schematic = { items: [], boxes: [], isLeftOut: false }

/** How large a schematic is tried, as shares of its full size: a crowded sheet takes a smaller one. */
const SCALES = [1, 0.85, 0.7, 0.6]

/**
 * The circuit of a sheet as a schematic, where the drawing leaves room; left out where it leaves none.
 *
 * @param items What is drawn so far.
 * @param fences Boxes that the schematic keeps out of.
 */
export function createSchematic(
  sheet: Sheet,
  { items, frame, fences }: { items: readonly Item[]; frame: Box; fences: readonly Box[] },
  palette: Palette,
): Schematic {
  const drawn = drawCircuit(sheet, palette)
  if (drawn === undefined) return NO_SCHEMATIC
  const { left, right, bottom, top } = drawn.box
  const { occupancy, region } = createGround(items, frame, fences)
  for (const scale of SCALES) {
    const size = { width: scale * (right - left), height: scale * (top - bottom) }
    const room = roomNear('left', occupancy, region, size)
    if (room === undefined) continue
    const place = { x: room.left - scale * left, y: room.bottom - scale * bottom }
    return {
      items: drawn.items.map((item) => moveItem(item, place, scale)),
      boxes: [room],
      isLeftOut: false,
    }
  }
  return { ...NO_SCHEMATIC, isLeftOut: true }
}
