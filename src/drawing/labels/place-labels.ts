import { measureText } from '../font/measure'
import { type Box, isOverlapping } from '../geometry'
import { boxOfText } from '../primitives/text'
import type { TextRun } from '../scene'
import { columnSpots } from './column-spots'
import { ledSpots, spotsAllOver } from './led-spots'
import { nearSpots } from './near-spots'
import type { Occupancy } from './occupancy'
import { mistakableCost } from './rivals'
import { Room } from './room'
import type { Leader, Size, Spot } from './spot'
import type { Wish } from './wish'

/** A label with its place: the baseline's left end, and a leader where it stands far off. */
export interface PlacedLabel {
  readonly wish: Wish
  readonly runs: readonly TextRun[]
  readonly box: Box
  readonly leader?: Leader
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

/** How many labels are tried with all means; more are placed by the near places alone. */
const MOST_WITH_CARE = 100
const SMALLER = 0.75

/** What speaks against crowded surroundings, and against covering an axis, in the unit of the spots' costs. */
const CROWD_COST = 10
const SOFT_COST = 4

/**
 * Finds a place for each label: clear of all that is drawn and of the others, near what it names. A
 * label for which there is no room is left out.
 */
export function placeLabels(wishes: readonly Wish[], ground: Ground): PlacedLabel[] {
  if (wishes.length > MOST_WITH_CARE) return attempt(wishes, ground, quick)
  let best: PlacedLabel[] = []
  for (const manner of MANNERS) {
    const placed = attempt(wishes, ground, manner)
    if (placed.length > best.length) best = placed
    if (best.length === wishes.length) break
  }
  return best
}

/** A text of a label that may be tried, and the places for it. */
interface Trial {
  readonly runs: readonly TextRun[]
  readonly spots: (size: Size) => Spot[]
}

/** The order in which texts and places are tried for a label. */
type Manner = (wish: Wish, room: Room, ground: Ground) => Trial[]

const NEAR = [7, 11, 16, 22]
const FAR = [30, 40, 52, 66, 82]

/** Beside what is named as long as there is room; the value goes before the label stands far off. */
const generous: Manner = (wish, room, ground) => [
  { runs: wish.full, spots: (size) => nearSpots(wish, size) },
  { runs: wish.full, spots: (size) => ledSpots(wish, size, NEAR) },
  { runs: wish.short, spots: (size) => nearSpots(wish, size) },
  { runs: wish.short, spots: (size) => ledSpots(wish, size, NEAR) },
  { runs: wish.full, spots: (size) => ledSpots(wish, size, FAR) },
  anywhere(wish, wish.full, room, ground),
  anywhere(wish, wish.short, room, ground),
]

const brief: Manner = (wish, room, ground) => [
  { runs: wish.short, spots: (size) => nearSpots(wish, size) },
  { runs: wish.short, spots: (size) => ledSpots(wish, size, NEAR) },
  anywhere(wish, wish.short, room, ground),
]

/** In columns that many labels of one place can share. */
function columns(scale: number, ...distances: number[]): Manner {
  return (wish, room, ground) => {
    const runs = scaled(wish.short, scale)
    const { region } = ground
    return [
      { runs, spots: (size) => columnSpots(wish, size, region, distances) },
      anywhere(wish, runs, room, ground),
    ]
  }
}

const quick: Manner = (wish) => [
  { runs: wish.full, spots: (size) => nearSpots(wish, size) },
  { runs: wish.short, spots: (size) => nearSpots(wish, size) },
]

/** From the fairest to the one that finds most room. */
const MANNERS: readonly Manner[] = [
  generous,
  brief,
  columns(1, 12),
  columns(1, 24),
  columns(1, 60, 14),
  columns(SMALLER, 20),
  columns(SMALLER, 60, 14),
  columns(SMALLER, 110, 60, 30, 12),
]

function anywhere(wish: Wish, runs: readonly TextRun[], room: Room, { region }: Ground): Trial {
  return { runs, spots: (size) => spotsAllOver(wish, size, region, (box) => room.isClear(box)) }
}

function scaled(runs: readonly TextRun[], scale: number): TextRun[] {
  return runs.map((run) => ({
    ...run,
    size: scale * run.size,
    ...(run.rise !== undefined && { rise: scale * run.rise }),
  }))
}

function attempt(wishes: readonly Wish[], ground: Ground, manner: Manner): PlacedLabel[] {
  const room = new Room(ground.occupancy, ground.fences)
  const placed: PlacedLabel[] = []
  const rivals = manner === quick ? [] : wishes
  for (const wish of wishes) {
    const against = ({ box, leader }: Spot) =>
      CROWD_COST * room.crowd(box) +
      softCost(box, ground) +
      (leader ? 0 : mistakableCost(box, wish, rivals))
    const label = settle(wish, manner(wish, room, ground), room, against)
    if (!label) continue
    room.take(label)
    placed.push(label)
  }
  return placed
}

function settle(
  wish: Wish,
  trials: readonly Trial[],
  room: Room,
  against: (spot: Spot) => number,
): PlacedLabel | undefined {
  for (const { runs, spots } of trials) {
    const { bottom, top } = boxOfText({ at: { x: 0, y: 0 }, anchor: 'start', runs })
    const size = { width: measureText(runs), height: top - bottom }
    const spot = cheapest(spots(size), room, against)
    if (!spot) continue
    const { box, leader } = spot
    return { wish, runs, box, ...(leader && { leader }) }
  }
  return undefined
}

function softCost(box: Box, { soft }: Ground): number {
  return soft.some((line) => isOverlapping(line, box)) ? SOFT_COST : 0
}

/** The free place with the least against it. */
function cheapest(
  spots: readonly Spot[],
  room: Room,
  against: (spot: Spot) => number,
): Spot | undefined {
  let best: Spot | undefined
  let least = Number.POSITIVE_INFINITY
  for (const spot of spots) {
    // Looking closer only adds to the cost, and most places need no such look.
    if (spot.cost >= least || !room.isFree(spot)) continue
    const cost = spot.cost + against(spot)
    if (cost < least) [best, least] = [spot, cost]
  }
  return best
}
