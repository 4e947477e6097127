import { cosDegrees, fromPolar, sinDegrees } from '../../core'
import type {
  Evaluation,
  PhasorEvaluation,
  Place,
  TipRegion,
  UnitsPerCentimetre,
} from '../../sheet'
import { measureText } from '../font/measure'
import { type Box, turnPoints } from '../geometry'
import type { Item, PlacedArrow, TextRun } from '../scene'
import type { Palette } from '../theme'
import { barPlace, SCALE_TEXT_SIZE } from './scale-bars'
import { WIDTHS } from './style'

/** How many corners stand for an ellipse: even a large one looks round. */
const CORNERS = 72
/** Thinner than the hand's arrows, broader than an axis. */
const WIDTH = (WIDTHS.thin + WIDTHS.arrow) / 2

const CAPTION = 'Ellipses: 95 % regions, 2.45 standard uncertainties'

/** Regions as they lie on the paper. */
export interface Regions {
  readonly items: readonly Item[]
  /** What the caption takes up. */
  readonly boxes: readonly Box[]
}

interface Inks {
  readonly palette: Palette
  readonly isFormer: boolean
}

/** Where no regions are asked for. */
export const NO_REGIONS: Regions = { items: [], boxes: [] }

/**
 * The 95 % regions of the best values, to scale: each about the tip of the best value, drawn from the
 * tail of its own arrow. A caption above the scale bars says what they are.
 *
 * @param best The evaluation that the best values and their regions are taken from.
 * @param isFormer It is of an older sheet: drawn in grey.
 */
export function createRegions(
  arrows: readonly PlacedArrow[],
  best: Evaluation,
  unitsPerCentimetre: UnitsPerCentimetre,
  frame: Box,
  { palette, isFormer }: Inks,
): Regions {
  const phasors = new Map(best.phasors.map((phasor) => [phasor.id, phasor]))
  const ellipses = arrows.flatMap((arrow): Item[] => {
    const found = arrow.role === 'hand' ? undefined : phasors.get(arrow.phasor ?? '')
    const scale = unitsPerCentimetre[arrow.quantity]
    if (found?.region === undefined || scale === undefined) return []
    return [
      {
        part: 'region',
        arrow: arrow.key,
        kind: 'path',
        points: outlineOf(found.region, tipOf(arrow, found, 10 / scale), 10 / scale),
        closed: true,
        stroke: isFormer ? palette.thin : palette.quantities[arrow.quantity],
        width: WIDTH,
      },
    ]
  })
  if (ellipses.length === 0) return NO_REGIONS
  const { item, box } = createCaption(Object.keys(unitsPerCentimetre).length, frame, palette)
  return { items: [...ellipses, item], boxes: [box] }
}

function createCaption(row: number, frame: Box, palette: Palette): { item: Item; box: Box } {
  const { x, y } = barPlace(row, frame)
  const run: TextRun = { text: CAPTION, face: 'sans', size: SCALE_TEXT_SIZE }
  return {
    item: {
      part: 'region',
      kind: 'text',
      at: { x, y: y - 0.36 * SCALE_TEXT_SIZE },
      anchor: 'start',
      runs: [run],
      fill: palette.quiet,
    },
    box: { left: x, right: x + measureText([run]), bottom: y - 2.5, top: y + 2.5 },
  }
}

/** Where the tip of the best value lies, drawn from the tail of its arrow. */
function tipOf(
  { from, sign }: PlacedArrow,
  { magnitude = 0, angle = 0 }: PhasorEvaluation,
  scale: number,
): Place {
  const { re, im } = fromPolar(sign * magnitude * scale, angle)
  return { x: from.x + re, y: from.y + im }
}

/** The outline of a region about a place, as points x, y, … */
function outlineOf({ major, minor, turn }: TipRegion, centre: Place, scale: number): number[] {
  const points = Array.from({ length: CORNERS }, (_, each) => {
    const degrees = (360 * each) / CORNERS
    const along = major * scale * cosDegrees(degrees)
    const across = minor * scale * sinDegrees(degrees)
    return [centre.x + along, centre.y + across]
  })
  return turnPoints(points.flat(), centre, turn)
}
