import type { Sheet } from '../../sheet'
import type { Box } from '../geometry'
import { paperItem } from '../items/paper'
import { createGround } from '../labels/ground'
import { roomNear } from '../rooms'
import type { Item, Scene } from '../scene'
import { type Palette, paletteOf, type Theme } from '../theme'
import { describeCircuit } from './description'
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
/** What stays free round a schematic that has a paper to itself, in millimetres. */
const MARGIN = 3

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

/** The circuit of a sheet on a paper of its own, just large enough; undefined without a circuit. */
export function schematicScene(sheet: Sheet, theme: Theme): Scene | undefined {
  const palette = paletteOf(theme)
  const drawn = drawCircuit(sheet, palette)
  if (drawn === undefined) return undefined
  const { left, right, bottom, top } = drawn.box
  const place = { x: MARGIN - left, y: MARGIN - bottom }
  const size = { width: right - left + 2 * MARGIN, height: top - bottom + 2 * MARGIN }
  return {
    ...size,
    items: [paperItem(size, palette), ...drawn.items.map((item) => moveItem(item, place))],
    arrows: [],
    origin: place,
    unitsPerCentimetre: {},
    starts: new Map(),
    title: sheet.title,
    description: `Circuit: ${describeCircuit(sheet)}.`,
    labelsLeftOut: 0,
  }
}
