import { type Edit, type HandArrow, type Place, type Sheet, seatsOf } from '../../sheet'

/** Two ends that are nearer than this were drawn as one point, in millimetres. */
const TOGETHER = 1e-6

/** An edit that puts a hand arrow somewhere else. */
export function redrawn({ id, sum, stands }: HandArrow, from: Place, to: Place): Edit {
  return { kind: 'set-hand-arrow', id, ...(sum !== undefined && { sum }), stands, from, to }
}

/**
 * The edits that move along, by a distance in millimetres, what hangs on a point of a construction: the
 * arrows that begin there, what hangs on their tips in turn, and the tip of the closing arrow where it
 * joins one that moves.
 *
 * @param but Arrows that stay as they are.
 */
export function movedAlong(
  sheet: Sheet,
  sum: string | undefined,
  point: Place,
  by: Place,
  but: ReadonlySet<string>,
): readonly Edit[] {
  if (sum === undefined || (by.x === 0 && by.y === 0)) return []
  const others = seatsOf(sheet).filter(
    ({ arrow, sum: own }) => own?.id === sum && !but.has(arrow.id),
  )
  const moved = new Map<string, Edit>()
  const points = [point]
  for (const at of points) {
    for (const { arrow, position } of others) {
      if (moved.has(arrow.id)) continue
      if (position === 'closing') {
        if (isTogether(arrow.to, at)) {
          moved.set(arrow.id, redrawn(arrow, arrow.from, shifted(arrow.to, by)))
        }
      } else if (isTogether(arrow.from, at)) {
        moved.set(arrow.id, redrawn(arrow, shifted(arrow.from, by), shifted(arrow.to, by)))
        points.push(arrow.to)
      }
    }
  }
  return [...moved.values()]
}

/** Whether two ends were drawn as one point. */
export function isTogether(one: Place, other: Place): boolean {
  return Math.hypot(one.x - other.x, one.y - other.y) <= TOGETHER
}

/** A place moved by a distance in millimetres. */
export function shifted(place: Place, by: Place): Place {
  return { x: place.x + by.x, y: place.y + by.y }
}
