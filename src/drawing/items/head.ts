import type { Place } from '../../sheet'
import type { ArrowStyle } from './style'

/** The outline of a head, and the width of its shaft and how far before the tip it ends. */
export interface Head {
  readonly width: number
  /** x, y, … of a closed, filled outline whose foremost point is the tip itself. */
  readonly points: readonly number[]
  readonly shaftEnd: number
}

/** A head never takes more than this share of its arrow: a shaft is always left. */
const LARGEST_SHARE = 0.6

/**
 * The head of an arrow. Heads are filled outlines rather than strokes, so that no renderer's line
 * joins carry ink beyond the tip.
 *
 * @param tip Where the arrow ends.
 * @param direction A unit vector along the arrow.
 * @param length Of the whole arrow in millimetres.
 */
export function headOf(tip: Place, direction: Place, length: number, style: ArrowStyle): Head {
  const shrink = Math.min(1, (LARGEST_SHARE * length) / style.headLength)
  const back = style.headLength * shrink
  const reach = style.headReach * shrink
  const points: number[] = []
  const width = shaftWidthOf(style, reach)
  for (const [along, across] of outlineOf(style, back, reach, width)) {
    points.push(tip.x - direction.x * along - direction.y * across)
    points.push(tip.y - direction.y * along + direction.x * across)
  }
  return { points, width, shaftEnd: shaftEndOf(style.shape, back, reach, width) }
}

/** The shaft stays thinner than its head. */
function shaftWidthOf(style: ArrowStyle, reach: number): number {
  return Math.min(style.width, 0.9 * reach)
}

/** Points as (how far behind the tip, how far to its left). */
function outlineOf(
  { shape }: ArrowStyle,
  back: number,
  reach: number,
  width: number,
): readonly (readonly [number, number])[] {
  switch (shape) {
    case 'closed':
      return [
        [0, 0],
        [back, reach],
        [back, -reach],
      ]
    case 'open': {
      const notch = notchOf(back, reach, width)
      return [
        [0, 0],
        [back - notch / 4, reach],
        [back, reach - width * 0.8],
        [notch, 0],
        [back, width * 0.8 - reach],
        [back - notch / 4, -reach],
      ]
    }
    case 'hollow':
      return hollow(back, reach, width * 0.8)
    case 'double':
      return [
        [0, 0],
        [back / 2, reach],
        [back / 2, 0],
        [back, reach],
        [back, -reach],
        [back / 2, 0],
        [back / 2, -reach],
      ]
    case 'barb':
      return [
        [0, -width / 2],
        [0, 0],
        [back, reach],
        [back * 0.8, -width / 2],
      ]
  }
}

/** Where the inner edges of an open head meet, behind the tip. */
function notchOf(back: number, reach: number, width: number): number {
  return Math.min(back * 0.8, (width * 0.9 * Math.hypot(back, reach)) / reach)
}

/** A triangle with a triangle cut out of it, in one outline that runs back on itself at the tip. */
function hollow(back: number, reach: number, wall: number): (readonly [number, number])[] {
  const front = Math.min(back * 0.6, (wall * Math.hypot(back, reach)) / reach)
  const rear = back - Math.min(wall, back * 0.2)
  const inner = (reach * (rear - front)) / back
  return [
    [0, 0],
    [back, reach],
    [back, -reach],
    [0, 0],
    [front, 0],
    [rear, -inner],
    [rear, inner],
    [front, 0],
  ]
}

function shaftEndOf(
  shape: ArrowStyle['shape'],
  back: number,
  reach: number,
  width: number,
): number {
  switch (shape) {
    case 'open':
      return notchOf(back, reach, width) * 0.8
    case 'hollow':
      return back - Math.min(width * 0.4, back * 0.1)
    case 'barb':
      return 0
    default:
      return back * 0.7
  }
}
