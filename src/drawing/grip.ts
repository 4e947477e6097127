import type { Id, Place, Sheet } from '../sheet'
import { arrowIndexOf } from './arrow-index'
import { whyTipIsHeld } from './drag'
import { distanceToSegment } from './geometry'
import type { PlacedArrow, Scene } from './scene'

/** Where a pointer takes hold of an arrow. */
export interface Grip {
  readonly arrow: PlacedArrow
  readonly at: 'tip' | 'body'
  /** Why the tip cannot be dragged; undefined where it can, and for a body. */
  readonly held: string | undefined
}

/** An arrow within reach: the lesser rank is picked first, then the nearer, then the earlier. */
interface Candidate {
  readonly arrow: PlacedArrow
  readonly order: number
  readonly away: number
  readonly rank: number
}

/**
 * What a pointer takes hold of at a place on the paper, within a reach in millimetres. Tips come
 * before bodies. Where several tips meet, as they do when a sum closes, the selected phasor's (or hand
 * arrow's) comes first, then one that can be dragged, then the nearest.
 */
export function gripAt(
  sheet: Sheet,
  scene: Scene,
  place: Place,
  reach: number,
  selected?: Id,
): Grip | undefined {
  return tipAt(sheet, scene, place, reach, selected) ?? bodyAt(scene, place, reach, selected)
}

function tipAt(
  sheet: Sheet,
  scene: Scene,
  place: Place,
  reach: number,
  selected: Id | undefined,
): Grip | undefined {
  const near: Candidate[] = []
  for (const { arrow, order } of arrowIndexOf(scene).tipsNear(place, reach)) {
    const away = Math.hypot(arrow.to.x - place.x, arrow.to.y - place.y)
    if (away <= reach) near.push({ arrow, order, away, rank: rankOf(arrow, selected) })
  }
  near.sort(compare)
  const [first] = near
  if (first === undefined) return undefined
  // Whether a tip is held takes longer to find out than where it lies: it is asked one by one.
  const free = near.find(
    ({ arrow, rank }) => rank === first.rank && whyTipIsHeld(sheet, arrow) === undefined,
  )
  const { arrow } = free ?? first
  return { arrow, at: 'tip', held: free ? undefined : whyTipIsHeld(sheet, arrow) }
}

function bodyAt(
  scene: Scene,
  place: Place,
  reach: number,
  selected: Id | undefined,
): Grip | undefined {
  let best: Candidate | undefined
  for (const { arrow, order } of arrowIndexOf(scene).shaftsNear(place, reach)) {
    const { from, to } = arrow
    const away = distanceToSegment(place.x, place.y, from.x, from.y, to.x, to.y)
    if (away > reach) continue
    const candidate = { arrow, order, away, rank: rankOf(arrow, selected) }
    if (best === undefined || compare(candidate, best) < 0) best = candidate
  }
  return best && { arrow: best.arrow, at: 'body', held: undefined }
}

function compare(one: Candidate, other: Candidate): number {
  return one.rank - other.rank || one.away - other.away || one.order - other.order
}

function rankOf({ phasor, hand }: PlacedArrow, selected: Id | undefined): number {
  return selected !== undefined && (phasor ?? hand) === selected ? 0 : 1
}
