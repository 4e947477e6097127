import { boxOfPoints, distanceToSegment } from '../geometry'
import type { LinesItem } from '../scene'
import { paintAttributes } from '../svg/attributes'
import { formatMillimetres } from '../svg/number'
import type { Primitive } from './primitive'

/** Straight strokes. */
export const lines: Primitive<LinesItem> = {
  bounds({ segments }) {
    return boxOfPoints(segments)
  },
  distance({ segments }, { x, y }) {
    let nearest = Number.POSITIVE_INFINITY
    for (let index = 0; index + 3 < segments.length; index += 4) {
      const [x1, y1, x2, y2] = segments.slice(index, index + 4) as [number, number, number, number]
      nearest = Math.min(nearest, distanceToSegment(x, y, x1, y1, x2, y2))
    }
    return nearest
  },
  svg(item, height) {
    const { segments } = item
    let path = ''
    for (let index = 0; index + 3 < segments.length; index += 4) {
      path += `M${formatMillimetres(segments[index] as number)} `
      path += `${formatMillimetres(height - (segments[index + 1] as number))}L`
      path += `${formatMillimetres(segments[index + 2] as number)} `
      path += formatMillimetres(height - (segments[index + 3] as number))
    }
    return `<path d="${path}"${paintAttributes(item)}/>`
  },
}
