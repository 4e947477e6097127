import type { Place } from '../sheet'
import type { PlacedArrow, Scene } from './scene'

/** The side of a cell in millimetres. */
const CELL = 8
/** Shafts are entered at points so far apart: every point of one is within half of it of such a point. */
const STEP = CELL / 2
/** So long an arrow is looked at each time rather than entered in all the cells that it crosses. */
const LONGEST = 2_000
const ROW = 2 ** 20

/** An arrow, and where in the scene's order it comes. */
export interface Indexed {
  readonly arrow: PlacedArrow
  readonly order: number
}

/** The arrows of a scene by where they lie, so that a pointer need not look at all of them. */
export interface ArrowIndex {
  /** All arrows whose tip may be within reach of a place, and perhaps others. Millimetres. */
  tipsNear(place: Place, reach: number): Iterable<Indexed>
  /** All arrows whose shaft may be within reach of a place, and perhaps others; some more than once. */
  shaftsNear(place: Place, reach: number): Iterable<Indexed>
}

const indexes = new WeakMap<readonly PlacedArrow[], ArrowIndex>()

/** The index of a scene's arrows, made at the first question: a scene never changes. */
export function arrowIndexOf({ arrows }: Pick<Scene, 'arrows'>): ArrowIndex {
  const known = indexes.get(arrows)
  if (known !== undefined) return known
  const index = createIndex(arrows)
  indexes.set(arrows, index)
  return index
}

function createIndex(arrows: readonly PlacedArrow[]): ArrowIndex {
  const tips = new Map<number, Indexed[]>()
  const shafts = new Map<number, Indexed[]>()
  const long: Indexed[] = []
  arrows.forEach((arrow, order) => {
    const entry = { arrow, order }
    const { from, to } = arrow
    const length = Math.hypot(to.x - from.x, to.y - from.y)
    if (!Number.isFinite(length) || !Number.isFinite(from.x + from.y)) return
    enter(tips, keyAt(to.x, to.y), entry)
    if (length > LONGEST) long.push(entry)
    else enterShaft(shafts, entry, length)
  })
  return {
    tipsNear: (place, reach) => cellsNear(tips, place, reach, []),
    shaftsNear: (place, reach) => cellsNear(shafts, place, reach + STEP / 2, long),
  }
}

function enterShaft(cells: Map<number, Indexed[]>, entry: Indexed, length: number): void {
  const { from, to } = entry.arrow
  const steps = Math.ceil(length / STEP)
  for (let step = 0; step <= steps; step += 1) {
    const part = steps === 0 ? 0 : step / steps
    enter(cells, keyAt(from.x + part * (to.x - from.x), from.y + part * (to.y - from.y)), entry)
  }
}

function enter(cells: Map<number, Indexed[]>, key: number, entry: Indexed): void {
  const cell = cells.get(key)
  if (cell === undefined) cells.set(key, [entry])
  else if (cell.at(-1) !== entry) cell.push(entry)
}

function cellsNear(
  cells: ReadonlyMap<number, readonly Indexed[]>,
  { x, y }: Place,
  reach: number,
  others: readonly Indexed[],
): Indexed[] {
  const found = [...others]
  for (let column = cellOf(x - reach); column <= cellOf(x + reach); column += 1) {
    for (let row = cellOf(y - reach); row <= cellOf(y + reach); row += 1) {
      const cell = cells.get(column * ROW + row)
      if (cell !== undefined) for (const entry of cell) found.push(entry)
    }
  }
  return found
}

function keyAt(x: number, y: number): number {
  return cellOf(x) * ROW + cellOf(y)
}

function cellOf(millimetres: number): number {
  return Math.floor(millimetres / CELL)
}
