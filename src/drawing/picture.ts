import type { Sheet } from '../sheet'
import type { Miss } from './hand/misses'
import { type AngleArc, angleArcsOf } from './items/angles'
import { type Gap, gapOf } from './items/gaps'
import { closingKeys, type SumFigure, sumFiguresOf } from './items/sum-figures'
import type { PlacedArrow } from './scene'

/** What is to be drawn of the placed arrows, before it is drawn. */
export interface Picture {
  readonly figures: readonly SumFigure[]
  /** The arrows in painting order: heavy ones first, so that others show on them. */
  readonly painted: readonly PlacedArrow[]
  readonly arcs: readonly AngleArc[]
  readonly gaps: readonly Gap[]
  /** How far the tips of what a hand drew are from where they should be. */
  readonly misses: readonly Miss[]
}

/** Decides what is drawn of a sheet's arrows. A sum that must close shows its gap, no resultant. */
export function createPicture(
  sheet: Sheet,
  arrows: readonly PlacedArrow[],
  misses: readonly Miss[] = [],
): Picture {
  const figures = sumFiguresOf(sheet, arrows)
  const closing = closingKeys(figures)
  const byRole: { [role in PlacedArrow['role']]: PlacedArrow[] } = {
    resultant: [],
    measured: [],
    term: [],
    loose: [],
    hand: [],
  }
  for (const arrow of arrows) if (!closing.has(arrow.key)) byRole[arrow.role].push(arrow)
  const { resultant, measured, term, loose, hand } = byRole
  return {
    figures,
    painted: [...resultant, ...measured, ...term, ...loose, ...hand],
    arcs: angleArcsOf(figures),
    gaps: figures.flatMap((figure) => gapOf(figure) ?? []),
    misses,
  }
}
