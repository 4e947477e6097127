import type { Place } from '../sheet'
import { distanceToSegment } from './geometry'
import type { PlacedArrow, Scene } from './scene'

/** The arrow at a point, and whether it is met by its tip. */
export interface ArrowAt {
  readonly arrow: PlacedArrow
  readonly at: 'tip' | 'body'
}

/** A short arrow keeps so much of itself as its body. */
const BODY_SHARE = 0.5
/** How much nearer a resultant, which cannot be dragged, must be than what can. */
const RESULTANT_HANDICAP = 1e-6

/**
 * The arrow that lies nearest to a point within a reach, all in millimetres. A tip within reach comes
 * before any body; of equally near ones a phasor's before a resultant, and what is drawn later first.
 */
export function arrowAt(scene: Scene, point: Place, reach: number): ArrowAt | undefined {
  let best: ArrowAt | undefined
  let nearest = Number.POSITIVE_INFINITY
  for (const arrow of scene.arrows) {
    const met = meet(arrow, point, reach)
    if (met === undefined) continue
    const tips = met.at === 'tip' ? 0 : 2 * reach + 1
    const away = met.away + tips + (arrow.role === 'resultant' ? RESULTANT_HANDICAP : 0)
    if (away <= nearest) [best, nearest] = [{ arrow, at: met.at }, away]
  }
  return best
}

function meet(
  { from, to }: PlacedArrow,
  { x, y }: Place,
  reach: number,
): { at: 'tip' | 'body'; away: number } | undefined {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const toTip = Math.hypot(to.x - x, to.y - y)
  const tipReach = length === 0 ? reach : Math.min(reach, BODY_SHARE * length + reach / 4)
  if (toTip <= tipReach) return { at: 'tip', away: toTip }
  const away = distanceToSegment(x, y, from.x, from.y, to.x, to.y)
  return away <= reach ? { at: 'body', away } : undefined
}
