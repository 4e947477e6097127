import type { Sheet } from '../../sheet'
import { paperItem } from '../items/paper'
import type { Scene } from '../scene'
import { paletteOf, type Theme } from '../theme'
import { describeCircuit } from './description'
import { drawCircuit } from './drawn-circuit'
import { moveItem } from './items'

/** What stays free round a schematic that has a paper to itself, in millimetres. */
const MARGIN = 3

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
