import { cosDegrees, sinDegrees } from '../../core'
import { type Box, growBox } from '../geometry'
import { boundsOf } from '../primitives'
import type { ArcItem, Item } from '../scene'
import { Occupancy } from './occupancy'
import type { Ground } from './place-labels'

/** What stays free between a label and any ink: more than the halo, which would rub it out. */
const CLEAR = 0.7
/** An arc is taken as chords of at most so many degrees. */
const CHORD_DEGREES = 8
/** What is drawn: all but the sheet itself, and what is fenced in as a whole. */
const DRAWN: ReadonlySet<Item['part']> = new Set(['arrow', 'gap', 'angle', 'predicted'])
/** What stays free inside the frame. */
const INSIDE_FRAME = 1

/**
 * The ground on which labels are placed: everything that the items draw is taken but paper, grid and
 * axis.
 *
 * @param fences The boxes of title block and scale bars, taken as a whole.
 */
export function createGround(items: readonly Item[], frame: Box, fences: readonly Box[]): Ground {
  const region = growBox(frame, -INSIDE_FRAME)
  const occupancy = new Occupancy(region)
  for (const item of items) takeItem(occupancy, item)
  for (const fence of fences) occupancy.addBox(growBox(fence, CLEAR))
  occupancy.seal()
  const soft = items
    .filter(({ part }) => part === 'axis')
    .map((axis) => growBox(boundsOf(axis), 0.3))
  return { occupancy, region, fences, soft }
}

function takeItem(occupancy: Occupancy, item: Item): void {
  if (!DRAWN.has(item.part)) return
  switch (item.kind) {
    case 'lines':
      takeStrokes(occupancy, item.segments, (item.width ?? 0) / 2 + CLEAR)
      break
    case 'path':
      takeOutline(occupancy, item.points)
      break
    case 'arc':
      takeArc(occupancy, item)
      break
    case 'text':
      occupancy.addBox(growBox(boundsOf(item), CLEAR))
  }
}

function takeStrokes(occupancy: Occupancy, segments: readonly number[], reach: number): void {
  for (let at = 0; at + 3 < segments.length; at += 4) {
    occupancy.addSegment(
      segments[at] as number,
      segments[at + 1] as number,
      segments[at + 2] as number,
      segments[at + 3] as number,
      reach,
    )
  }
}

/** Heads are so small that no label fits inside their outline. */
function takeOutline(occupancy: Occupancy, points: readonly number[]): void {
  const closed = [...points, ...points.slice(0, 2)]
  for (let at = 0; at + 3 < closed.length; at += 2) {
    takeStrokes(occupancy, closed.slice(at, at + 4), CLEAR)
  }
}

function takeArc(occupancy: Occupancy, item: ArcItem): void {
  const { centre, radius, start, sweep, fill } = item
  if (fill !== undefined) {
    occupancy.addBox(growBox(boundsOf(item), CLEAR))
    return
  }
  const chords = Math.max(1, Math.ceil(Math.abs(sweep) / CHORD_DEGREES))
  const at = (part: number) => {
    const degrees = start + (sweep * part) / chords
    return [centre.x + radius * cosDegrees(degrees), centre.y + radius * sinDegrees(degrees)]
  }
  for (let part = 0; part < chords; part += 1) {
    takeStrokes(occupancy, [...at(part), ...at(part + 1)], CLEAR)
  }
}
