import type { Place } from '../../sheet'
import { type Box, growBox } from '../geometry'

/** A thin line from what a label names to the label. */
export interface Leader {
  readonly from: Place
  readonly to: Place
}

/** Where a label stands, and its leader where it stands far off. */
export interface Stand {
  readonly box: Box
  readonly leader?: Leader
}

/** A place that a label may take. */
export interface Spot extends Stand {
  /** What speaks against it: the lower the better. */
  readonly cost: number
}

/** Width and height of a label in millimetres. */
export interface Size {
  readonly width: number
  readonly height: number
}

/**
 * A box that lies wholly beyond a point in a direction, at a distance: with a corner next to the
 * point where the direction is oblique, centred on it where it is level or upright.
 *
 * @param direction A unit vector.
 */
export function boxToward(
  point: Place,
  direction: Place,
  distance: number,
  { width, height }: Size,
): Box {
  const [halfWidth, halfHeight] = [width / 2, height / 2]
  const aside = {
    x: limit(direction.x * OBLIQUE) * halfWidth,
    y: limit(direction.y * OBLIQUE) * halfHeight,
  }
  const support = Math.abs(direction.x) * halfWidth + Math.abs(direction.y) * halfHeight
  const further = distance + support - aside.x * direction.x - aside.y * direction.y
  const x = point.x + aside.x + direction.x * further
  const y = point.y + aside.y + direction.y * further
  return { left: x - halfWidth, right: x + halfWidth, bottom: y - halfHeight, top: y + halfHeight }
}

/** How soon an oblique direction puts a corner next to the point. */
const OBLIQUE = 1.6
/** What a leader leaves free before the text. */
const LEADER_GAP = 0.4

function limit(value: number): number {
  return Math.min(1, Math.max(-1, value))
}

/** The shortest leader from a point to a box. */
export function leaderTo(point: Place, box: Box): Leader {
  const near = growBox(box, LEADER_GAP)
  return {
    from: point,
    to: {
      x: Math.min(near.right, Math.max(near.left, point.x)),
      y: Math.min(near.top, Math.max(near.bottom, point.y)),
    },
  }
}
