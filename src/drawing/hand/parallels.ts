import type { Place } from '../../sheet'
import type { PlacedArrow } from '../scene'

/** More terms than this make a net of lines in which nobody finds anything. */
const MOST_TERMS = 12

/**
 * The sides of the parallelograms by which a sum is constructed from one point: the first two terms
 * make one, its diagonal and the next term another, and so on. Segments x1, y1, x2, y2, …, in
 * millimetres; none for a single term.
 */
export function parallelsOf(terms: readonly PlacedArrow[]): number[] {
  const [first, ...others] = terms
  if (!first || others.length === 0 || terms.length > MOST_TERMS) return []
  const start = first.from
  const segments: number[] = []
  let diagonal: Place = first.to
  for (const { from, to } of others) {
    const side = { x: start.x + to.x - from.x, y: start.y + to.y - from.y }
    const corner = { x: diagonal.x + to.x - from.x, y: diagonal.y + to.y - from.y }
    addSegment(segments, start, side)
    addSegment(segments, side, corner)
    addSegment(segments, diagonal, corner)
    diagonal = corner
  }
  return segments
}

function addSegment(segments: number[], from: Place, to: Place): void {
  segments.push(from.x, from.y, to.x, to.y)
}
