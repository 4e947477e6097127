import { type Box, isOverlapping } from '../geometry'
import { boxOfText } from '../primitives/text'
import type { TextRun } from '../scene'
import { MANNERS, type Manner, quick, type Trial } from './manners'
import type { Occupancy } from './occupancy'
import { crossingCost, mistakableCost } from './rivals'
import { Room } from './room'
import type { Spot, Stand } from './spot'
import type { Wish } from './wish'

/** A label with its place. */
export interface PlacedLabel extends Stand {
  readonly wish: Wish
  readonly runs: readonly TextRun[]
}

/** What is drawn where labels look for room. */
export interface Ground {
  readonly occupancy: Occupancy
  /** Where labels may stand. */
  readonly region: Box
  /** What no leader crosses. */
  readonly fences: readonly Box[]
  /** Lines that labels had better not cover. */
  readonly soft: readonly Box[]
}

/** How many labels are tried with all means: those of forty phasors, with angles and gaps. */
const MOST_WITH_CARE = 64
/** What speaks against crowded surroundings, and against covering an axis, in the unit of the spots' costs. */
const CROWD_COST = 10
const SOFT_COST = 4

/**
 * Finds a place for each label: clear of all that is drawn and of the others, near what it names. A
 * label for which there is no room is left out.
 */
export function placeLabels(wishes: readonly Wish[], ground: Ground): readonly PlacedLabel[] {
  if (wishes.length > MOST_WITH_CARE) return attempt(wishes, ground, quick, []).placed
  let best: Attempt | undefined
  let order = wishes
  for (const { manner, upTo } of MANNERS) {
    if (best && best.leftOut.length > upTo) continue
    const tried = attempt(order, ground, manner, wishes, best?.leftOut.length)
    if (!best || tried.leftOut.length < best.leftOut.length) best = tried
    if (best.leftOut.length === 0) break
    // Those that found no room choose first the next time.
    const failed = new Set(tried.leftOut)
    order = [...tried.leftOut, ...order.filter((wish) => !failed.has(wish))]
  }
  return best?.placed ?? []
}

interface Attempt {
  readonly placed: readonly PlacedLabel[]
  readonly leftOut: readonly Wish[]
}

/**
 * Places the labels one after the other.
 *
 * @param rivals What leaders and labels may be mistaken for, or cross.
 * @param enough It is given up once so many are left out.
 */
function attempt(
  wishes: readonly Wish[],
  ground: Ground,
  manner: Manner,
  rivals: readonly Wish[],
  enough = Number.POSITIVE_INFINITY,
): Attempt {
  const room = new Room(ground.occupancy, ground.fences)
  const placed: PlacedLabel[] = []
  const leftOut: Wish[] = []
  for (const wish of wishes) {
    const label = settle(wish, manner(wish, room, ground.region), room, (spot) =>
      costOf(spot, wish, room, ground, rivals),
    )
    if (label) {
      room.take(label)
      placed.push(label)
    } else {
      leftOut.push(wish)
      if (leftOut.length >= enough) break
    }
  }
  return { placed, leftOut }
}

function settle(
  wish: Wish,
  trials: readonly Trial[],
  room: Room,
  against: (spot: Spot) => number,
): PlacedLabel | undefined {
  for (const { runs, spots, most } of trials) {
    const { right, bottom, top } = boxOfText({ at: { x: 0, y: 0 }, anchor: 'start', runs })
    const spot = cheapest(spots({ width: right, height: top - bottom }), room, against, most)
    if (!spot) continue
    const { box, leader } = spot
    return { wish, runs, box, ...(leader && { leader }) }
  }
  return undefined
}

/** The free place with the least against it. */
function cheapest(
  spots: readonly Spot[],
  room: Room,
  against: (spot: Spot) => number,
  most = Number.POSITIVE_INFINITY,
): Spot | undefined {
  let best: Spot | undefined
  let least = most
  for (const spot of spots) {
    // Looking closer only adds to the cost, and most places need no such look.
    if (spot.cost >= least || !room.isFree(spot)) continue
    const cost = spot.cost + against(spot)
    if (cost < least) [best, least] = [spot, cost]
  }
  return best
}

/** What speaks against a place besides what it costs by itself. */
function costOf(
  { box, leader }: Spot,
  wish: Wish,
  room: Room,
  { soft }: Ground,
  rivals: readonly Wish[],
): number {
  const covering = soft.some((line) => isOverlapping(line, box)) ? SOFT_COST : 0
  const doubtful = leader ? crossingCost(leader, wish, rivals) : mistakableCost(box, wish, rivals)
  return CROWD_COST * room.crowd(box) + covering + doubtful
}
