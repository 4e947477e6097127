import type { Place } from '../../sheet'
import { boxOfPoints, distanceToSegment } from '../geometry'
import type { PathItem } from '../scene'
import { paintAttributes } from '../svg/attributes'
import { formatMillimetres } from '../svg/number'
import type { Primitive } from './primitive'

/** A chain of points, open or closed. */
export const path: Primitive<PathItem> = {
  bounds({ points }) {
    return boxOfPoints(points)
  },
  distance(item, point) {
    if (item.closed && item.fill !== undefined && isEnclosed(item.points, point)) return 0
    let nearest = Number.POSITIVE_INFINITY
    forEachEdge(item, (x1, y1, x2, y2) => {
      nearest = Math.min(nearest, distanceToSegment(point.x, point.y, x1, y1, x2, y2))
    })
    return nearest
  },
  svg(item, height) {
    const { points, closed } = item
    let data = ''
    for (let index = 0; index + 1 < points.length; index += 2) {
      data += index === 0 ? 'M' : 'L'
      data += `${formatMillimetres(points[index] as number)} `
      data += formatMillimetres(height - (points[index + 1] as number))
    }
    return `<path d="${data}${closed ? 'Z' : ''}"${paintAttributes(item)}/>`
  },
}

function forEachEdge(
  { points, closed }: PathItem,
  visit: (x1: number, y1: number, x2: number, y2: number) => void,
): void {
  const count = points.length / 2
  for (let index = 0; index < (closed ? count : count - 1); index += 1) {
    const next = (index + 1) % count
    visit(
      points[2 * index] as number,
      points[2 * index + 1] as number,
      points[2 * next] as number,
      points[2 * next + 1] as number,
    )
  }
}

/** Whether a point lies inside a closed chain, by how often the chain winds round it. */
function isEnclosed(points: readonly number[], { x, y }: Place): boolean {
  let winding = 0
  forEachEdge({ part: 'arrow', kind: 'path', points, closed: true }, (x1, y1, x2, y2) => {
    const side = (x2 - x1) * (y - y1) - (x - x1) * (y2 - y1)
    if (y1 <= y && y2 > y && side > 0) winding += 1
    if (y1 > y && y2 <= y && side < 0) winding -= 1
  })
  return winding !== 0
}
