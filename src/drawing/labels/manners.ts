import type { Box } from '../geometry'
import type { TextRun } from '../scene'
import { columnSpots } from './column-spots'
import { ledSpots, spotsAllOver } from './led-spots'
import { nearSpots } from './near-spots'
import type { Room } from './room'
import type { Size, Spot } from './spot'
import type { Wish } from './wish'

/** A text of a label that may be tried, and the places for it. */
export interface Trial {
  readonly runs: readonly TextRun[]
  readonly spots: (size: Size) => Spot[]
  /** What may speak against a place at most: a poor one is left to a shorter text. */
  readonly most?: number
}

/** The order in which texts and places are tried for a label. */
export type Manner = (wish: Wish, room: Room, region: Box) => readonly Trial[]

/** How far off labels with leaders stand, in millimetres. */
const NEAR = [7, 11, 16, 22]
const FAR = [30, 40, 52, 66, 82]
const SMALLER = 0.75
/** A leader of 30 mm across nothing, or of 10 mm across two arrows. */
const FAIR = 18
/** Beside an arrow, not on its best side, and no other arrow much nearer. */
const CLEAR = 12

const near = (wish: Wish, runs: readonly TextRun[], most = Number.POSITIVE_INFINITY): Trial => ({
  runs,
  spots: (size) => nearSpots(wish, size),
  most,
})

const led = (
  wish: Wish,
  runs: readonly TextRun[],
  distances: readonly number[],
  most = Number.POSITIVE_INFINITY,
): Trial => ({ runs, spots: (size) => ledSpots(wish, size, distances), most })

const anywhere = (wish: Wish, runs: readonly TextRun[], room: Room, region: Box): Trial => ({
  runs,
  spots: (size) => spotsAllOver(wish, size, region, (box) => room.isClear(box)),
})

/** Beside what is named as long as there is room; a value is dropped before its label stands far off. */
const generous: Manner = (wish, room, region) => [
  near(wish, wish.full, CLEAR),
  led(wish, wish.full, NEAR, FAIR),
  near(wish, wish.short, CLEAR),
  led(wish, wish.short, NEAR, FAIR),
  led(wish, wish.full, FAR, FAIR),
  near(wish, wish.short),
  led(wish, wish.short, NEAR),
  anywhere(wish, wish.short, room, region),
]

/** Values only where they need no leader. */
const sparing: Manner = (wish, room, region) => [
  near(wish, wish.full),
  near(wish, wish.short),
  led(wish, wish.short, NEAR),
  anywhere(wish, wish.short, room, region),
]

/** Symbols alone. */
const brief: Manner = (wish, room, region) => [
  near(wish, wish.short),
  led(wish, wish.short, NEAR),
  anywhere(wish, wish.short, room, region),
]

/** Symbols in columns that many labels of one place can share. */
function columns(scale: number, ...distances: number[]): Manner {
  return (wish, room, region) => {
    const runs = scaled(wish.short, scale)
    return [
      { runs, spots: (size) => columnSpots(wish, size, region, distances) },
      anywhere(wish, runs, room, region),
    ]
  }
}

/** A manner, and up to how many labels left out so far it may make good. */
interface Attemptable {
  readonly manner: Manner
  readonly upTo: number
}

/** From the fairest to the one that finds most room; each is tried where those before left labels out. */
export const MANNERS: readonly Attemptable[] = [
  { manner: generous, upTo: Number.POSITIVE_INFINITY },
  // What found no room chooses first the next time.
  { manner: generous, upTo: 6 },
  { manner: sparing, upTo: 12 },
  ...[
    brief,
    columns(1, 12),
    columns(1, 24),
    columns(1, 60, 14),
    columns(SMALLER, 20),
    columns(SMALLER, 60, 14),
    columns(SMALLER, 110, 60, 30, 12),
  ].map((manner) => ({ manner, upTo: Number.POSITIVE_INFINITY })),
]

/** For very many labels: a few places for each. */
export const quick: Manner = (wish) =>
  [wish.full, wish.short].map((runs) => ({ runs, spots: (size) => nearSpots(wish, size, true) }))

function scaled(runs: readonly TextRun[], scale: number): TextRun[] {
  return runs.map((run) => ({
    ...run,
    size: scale * run.size,
    ...(run.rise !== undefined && { rise: scale * run.rise }),
  }))
}
