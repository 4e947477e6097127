import type { Evaluation, Sheet } from '../../sheet'
import type { Box } from '../geometry'
import type { Placement } from '../placement/place'
import type { Item } from '../scene'
import { readingsByPhasor } from '../text/resolution'
import type { Palette } from '../theme'
import { openArcsOf } from './arcs'
import { boxesAlong, boxesAlongArcs, openArcItems, openArcLabels } from './items'

export { scalesWithOpen } from './arcs'

/** What is drawn of phasors whose angle is open. */
export interface OpenDrawing {
  readonly arcs: readonly Item[]
  readonly labels: readonly Item[]
  /** Boxes that other labels keep out of. */
  readonly boxes: readonly Box[]
  /** How many labels found no free place. */
  readonly leftOut: number
}

/** Where no phasor's angle is open. */
export const NOTHING_OPEN: OpenDrawing = { arcs: [], labels: [], boxes: [], leftOut: 0 }

/** Draws phasors whose magnitude is known and whose angle is open, with labels clear of what is there. */
export function createOpenDrawing(
  sheet: Sheet,
  evaluation: Evaluation,
  placement: Placement,
  paper: { readonly frame: Box; readonly edges: readonly Box[]; readonly hasLabels: boolean },
  palette: Palette,
): OpenDrawing {
  const open = openArcsOf(sheet, evaluation, placement, paper)
  if (open.length === 0) return NOTHING_OPEN
  const surroundings = {
    frame: paper.frame,
    taken: [...paper.edges, ...boxesAlong(placement.arrows), ...boxesAlongArcs(open)],
    readings: readingsByPhasor(sheet),
  }
  const { items, ...rest } = openArcLabels(paper.hasLabels ? open : [], surroundings, palette)
  return { arcs: openArcItems(open, palette), labels: items, ...rest }
}
