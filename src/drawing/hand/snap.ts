import { wrapDegrees } from '../../core'
import { type Id, type Place, type Sheet, seatsOf } from '../../sheet'
import { arrowIndexOf } from '../arrow-index'
import type { PlacedArrow, Scene } from '../scene'
import { startOfSum } from './construction'
import { measureOf, type RuleAndProtractor, tipOf } from './redraw'

/** Where an arrow that is being drawn begins. */
export interface Tail {
  readonly at: Place
  /** The phasor on whose tip it hangs. */
  readonly tipOf?: Id
}

/** Whether arrows are drawn to verify a construction, or placed as new phasors. */
export type DrawingMode = 'hand' | 'phasor'

/** A stroke that is being drawn: rule and protractor say the same as its two ends. */
export interface Stroke extends RuleAndProtractor {
  readonly tail: Tail
  readonly tip: Place
}

/**
 * Where a stroke begins that is pressed down at a place: at the nearest tip within reach, at an origin,
 * else at the place itself. A construction hangs on what the hand drew, a new phasor on a phasor.
 *
 * @param reach Millimetres.
 */
export function snapTail(
  sheet: Sheet,
  scene: Scene,
  place: Place,
  reach: number,
  mode: DrawingMode,
): Tail {
  let best: { tail: Tail; away: number } | undefined
  const offer = (tail: Tail) => {
    const away = Math.hypot(tail.at.x - place.x, tail.at.y - place.y)
    if (away <= reach && (best === undefined || away < best.away)) best = { tail, away }
  }
  for (const { arrow } of arrowIndexOf(scene).tipsNear(place, reach)) {
    const tail = tailOn(arrow, mode)
    if (tail) offer(tail)
  }
  for (const at of beginnings(sheet, scene, mode)) offer({ at })
  return best?.tail ?? { at: place }
}

function tailOn({ role, phasor, to }: PlacedArrow, mode: DrawingMode): Tail | undefined {
  if (mode === 'hand') return role === 'hand' ? { at: to } : undefined
  return phasor === undefined ? undefined : { at: to, tipOf: phasor }
}

/** The points where figures begin. */
function beginnings(sheet: Sheet, scene: Scene, mode: DrawingMode): readonly Place[] {
  const sums = (sheet.sums ?? []).map((sum) => startOfSum(scene, sum))
  const drawn = mode === 'hand' ? (sheet.hand ?? []).map(({ from }) => from) : []
  return [scene.origin, ...sums, ...drawn]
}

/** How near a hand must come to a tip to end its stroke there, in millimetres. */
const JOIN = 2

/**
 * The stroke from a tail to a place: to whole millimetres and degrees, tenths of both where `fine`. A
 * construction is drawn finely, and ends at a hand arrow's tip or where it began, where it comes near.
 */
export function strokeTo(
  sheet: Sheet,
  tail: Tail,
  place: Place,
  mode: DrawingMode,
  fine: boolean,
): Stroke {
  const joined = mode === 'hand' && !fine ? joinedAt(sheet, tail, place) : undefined
  if (joined) return { tail, tip: joined, ...measureOf(tail.at, joined) }
  const step = mode === 'hand' || fine ? 10 : 1
  const aim = measureOf(tail.at, place)
  const snapped = {
    millimetres: Math.round(aim.millimetres * step) / step,
    degrees: wrapDegrees(Math.round(aim.degrees * step) / step),
  }
  return { tail, tip: tipOf(tail.at, snapped), ...snapped }
}

function joinedAt(sheet: Sheet, tail: Tail, place: Place): Place | undefined {
  const ends = seatsOf(sheet).flatMap(({ arrow }) => [arrow.to, arrow.from])
  return ends.find(
    (end) =>
      Math.hypot(end.x - place.x, end.y - place.y) <= JOIN &&
      Math.hypot(end.x - tail.at.x, end.y - tail.at.y) > JOIN,
  )
}
