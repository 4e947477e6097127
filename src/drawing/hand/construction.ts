import type { Evaluation, Place, Sheet, Sum } from '../../sheet'
import { WIDTHS } from '../items/style'
import type { Item, PlacedArrow } from '../scene'
import type { Palette } from '../theme'
import { compassesOf, type Swing } from './compasses'
import { parallelsOf } from './parallels'

/** Which lines of the construction are drawn. */
export interface ConstructionLines {
  /** The parallels that complete the parallelograms of a sum. */
  readonly parallels?: boolean
  /** The arcs of the compasses with which two known lengths find a triangle's corner. */
  readonly arcs?: boolean
}

/** Millimetres on, off. */
const DASH = [2.2, 1.4]

/**
 * The lines with which the sums are constructed on paper: of what the hand drew where it drew at least
 * two terms, else of the exact drawing.
 */
export function constructionItems(
  sheet: Sheet,
  evaluation: Evaluation,
  arrows: readonly PlacedArrow[],
  lines: ConstructionLines,
  palette: Palette,
): readonly { readonly key: string; readonly item: Item }[] {
  return (sheet.sums ?? []).flatMap((sum) => {
    const own = arrows.filter((arrow) => arrow.sum === sum.id)
    const terms = termsOf(own)
    const key = terms[0]?.role === 'hand' ? terms[0].key : `resultant:${sum.id}`
    const segments = lines.parallels ? parallelsOf(terms) : []
    const swings = lines.arcs ? compassesOf(sheet, evaluation, sum, own, terms) : []
    return [
      ...(segments.length > 0 ? [{ key, item: parallelItem(key, segments, palette) }] : []),
      ...swings.map((swing) => ({ key, item: swingItem(key, swing, palette) })),
    ]
  })
}

/** The terms that are constructed, each from its tail to its tip. */
function termsOf(own: readonly PlacedArrow[]): readonly PlacedArrow[] {
  const drawn = own.filter(({ role, isClosing }) => role === 'hand' && isClosing !== true)
  return drawn.length >= 2 ? drawn : own.filter(({ role }) => role === 'term')
}

function parallelItem(key: string, segments: readonly number[], palette: Palette): Item {
  return {
    part: 'construction',
    arrow: key,
    kind: 'lines',
    segments,
    stroke: palette.thin,
    width: WIDTHS.thin,
    dash: DASH,
  }
}

function swingItem(key: string, { centre, radius, start, sweep }: Swing, palette: Palette): Item {
  return {
    part: 'construction',
    arrow: key,
    kind: 'arc',
    centre,
    radius,
    start,
    sweep,
    stroke: palette.thin,
    width: WIDTHS.thin,
  }
}

/** Where a sum's figure begins on the paper. */
export function startOfSum(
  scene: { readonly starts: ReadonlyMap<string, Place>; readonly origin: Place },
  sum: Sum,
): Place {
  return sum.start ?? scene.starts.get(`sum:${sum.id}`) ?? scene.origin
}
