import type { Id, Place, Sheet } from '../sheet'
import { whyTipIsHeld } from './drag'
import type { PlacedArrow, Scene } from './scene'

/** Where a pointer takes hold of an arrow. */
export interface Grip {
  readonly arrow: PlacedArrow
  readonly at: 'tip' | 'body'
  /** Why the tip cannot be dragged; undefined where it can, and for a body. */
  readonly held: string | undefined
}

/**
 * What a pointer takes hold of at a place on the paper, within a reach in millimetres. Tips come
 * before bodies. Where several tips meet, as they do when a sum closes, the selected phasor's comes
 * first, then one that can be dragged, then the nearest.
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
  const near = scene.arrows
    .map((arrow) => ({ arrow, away: Math.hypot(arrow.to.x - place.x, arrow.to.y - place.y) }))
    .filter(({ away }) => away <= reach)
    .map((found) => ({ ...found, held: whyTipIsHeld(sheet, found.arrow) }))
    .sort(
      (one, other) =>
        rank(one.arrow, selected) - rank(other.arrow, selected) ||
        Number(one.held !== undefined) - Number(other.held !== undefined) ||
        one.away - other.away,
    )
  const [best] = near
  return best && { arrow: best.arrow, at: 'tip', held: best.held }
}

function bodyAt(
  scene: Scene,
  place: Place,
  reach: number,
  selected: Id | undefined,
): Grip | undefined {
  let best: { arrow: PlacedArrow; away: number } | undefined
  for (const arrow of scene.arrows) {
    const away = distanceToShaft(arrow, place)
    if (away > reach) continue
    const better =
      best === undefined ||
      rank(arrow, selected) < rank(best.arrow, selected) ||
      (rank(arrow, selected) === rank(best.arrow, selected) && away < best.away)
    if (better) best = { arrow, away }
  }
  return best && { arrow: best.arrow, at: 'body', held: undefined }
}

function rank(arrow: PlacedArrow, selected: Id | undefined): number {
  return arrow.phasor !== undefined && arrow.phasor === selected ? 0 : 1
}

function distanceToShaft({ from, to }: PlacedArrow, place: Place): number {
  const dx = to.x - from.x
  const dy = to.y - from.y
  const squared = dx * dx + dy * dy
  const along = squared === 0 ? 0 : ((place.x - from.x) * dx + (place.y - from.y) * dy) / squared
  const clamped = Math.min(1, Math.max(0, along))
  return Math.hypot(from.x + clamped * dx - place.x, from.y + clamped * dy - place.y)
}
