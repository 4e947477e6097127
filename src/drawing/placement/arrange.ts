import type { Place, Quantity } from '../../sheet'
import { type Box, joinBoxes, moveBox, NO_BOX } from '../geometry'
import { boxOfFigure, type Scales } from './extent'
import type { Figure } from './figure'
import { snap, snapDown, snapUp } from './grid-step'
import { startsInRows } from './rows'
import { setOffs } from './set-off'

/** Where the figures of a sheet start, at one choice of scales. */
export interface Arrangement {
  readonly origin: Place
  /** The figures that start neither at the origin nor where the sheet says, by key. */
  readonly starts: Map<string, Place>
  /** The figures that the sheet does not place, together, on the paper. */
  readonly together: Box
}

/**
 * Arranges what the sheet does not place: the first figure of each quantity and the loose arrows at
 * the origin, further figures beside and below. An origin that is not given is chosen on whole 10 mm
 * so that all of it lies in the middle of the area.
 */
export function arrange(
  figures: readonly Figure[],
  scales: Scales,
  area: Box,
  origin: Place | undefined,
): Arrangement {
  const { central, further } = split(figures)
  const steps = setOffs(central, scales)
  const first = central.reduce((box, figure) => {
    const own = boxOfFigure(figure, scales)
    return joinBoxes(box, moveBox(own, steps.get(figure.key) ?? ZERO_PLACE))
  }, NO_BOX)
  const boxes = further.map((figure) => boxOfFigure(figure, scales))
  const places = startsInRows(first, boxes, roomFor(first, area, origin))
  const together = boxes.reduce(
    (box, own, index) => joinBoxes(box, moveBox(own, places[index] ?? ZERO_PLACE)),
    first,
  )
  const at = origin ?? centredOrigin(together, area)
  const starts = new Map<string, Place>()
  for (const [key, step] of steps) starts.set(key, shift(step, at))
  further.forEach(({ key }, index) => {
    starts.set(key, shift(places[index] ?? ZERO_PLACE, at))
  })
  return { origin: at, starts, together: moveBox(together, at) }
}

const ZERO_PLACE: Place = { x: 0, y: 0 }

function shift(place: Place, by: Place): Place {
  return { x: place.x + by.x, y: place.y + by.y }
}

/** What starts at the origin, and the sums that go beside it. */
function split(figures: readonly Figure[]): { central: Figure[]; further: Figure[] } {
  const seen = new Set<Quantity>()
  const central: Figure[] = []
  const further: Figure[] = []
  for (const figure of figures) {
    if (figure.start) continue
    const isFirst = !figure.isSum || !seen.has(figure.quantity)
    if (figure.isSum) seen.add(figure.quantity)
    ;(isFirst ? central : further).push(figure)
  }
  return { central, further }
}

/** The area as seen from the origin; as wide as the area from the first box on, while there is none. */
function roomFor(first: Box, area: Box, origin: Place | undefined): Box {
  if (origin) return moveBox(area, { x: -origin.x, y: -origin.y })
  return {
    left: first.left,
    right: first.left + area.right - area.left,
    top: first.top,
    bottom: Number.NEGATIVE_INFINITY,
  }
}

function centredOrigin(together: Box, area: Box): Place {
  const box = together === NO_BOX ? { left: 0, right: 0, bottom: 0, top: 0 } : together
  return {
    x: centred(box.left, box.right, area.left, area.right),
    y: centred(box.bottom, box.top, area.bottom, area.top),
  }
}

/** On whole 10 mm, as near the middle as keeps both ends inside; the middle where nothing does. */
function centred(low: number, high: number, from: number, to: number): number {
  const middle = snap((from + to - low - high) / 2)
  const [least, most] = [snapUp(from - low), snapDown(to - high)]
  return least > most ? middle : Math.min(most, Math.max(least, middle))
}
