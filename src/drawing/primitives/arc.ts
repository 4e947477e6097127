import { angleOf, cosDegrees, sinDegrees } from '../../core'
import type { Place } from '../../sheet'
import { boxOfPoints } from '../geometry'
import type { ArcItem } from '../scene'
import { paintAttributes } from '../svg/attributes'
import { formatMillimetres } from '../svg/number'
import type { Primitive } from './primitive'

/** A part of a circle, or all of it. */
export const arc: Primitive<ArcItem> = {
  bounds(item) {
    const ends = [pointAt(item, item.start), pointAt(item, item.start + item.sweep)]
    const axes = [0, 90, 180, 270]
      .filter((degrees) => isSwept(item, degrees))
      .map((degrees) => pointAt(item, degrees))
    return boxOfPoints([...ends, ...axes].flatMap(({ x, y }) => [x, y]))
  },
  distance(item, point) {
    const { centre, radius, fill } = item
    const direction = { re: point.x - centre.x, im: point.y - centre.y }
    const away = Math.hypot(direction.re, direction.im)
    if (fill !== undefined && isWhole(item)) return Math.max(0, away - radius)
    if (isSwept(item, angleOf(direction))) return Math.abs(away - radius)
    const ends = [pointAt(item, item.start), pointAt(item, item.start + item.sweep)]
    return Math.min(...ends.map(({ x, y }) => Math.hypot(point.x - x, point.y - y)))
  },
  svg(item, height) {
    const { centre, radius, start, sweep } = item
    const size = formatMillimetres(radius)
    if (isWhole(item)) {
      const at = `cx="${formatMillimetres(centre.x)}" cy="${formatMillimetres(height - centre.y)}"`
      return `<circle ${at} r="${size}"${paintAttributes(item)}/>`
    }
    const write = ({ x, y }: Place) => `${formatMillimetres(x)} ${formatMillimetres(height - y)}`
    const flags = `${Math.abs(sweep) > 180 ? 1 : 0} ${sweep > 0 ? 0 : 1}`
    const data = `M${write(pointAt(item, start))}A${size} ${size} 0 ${flags} `
    return `<path d="${data}${write(pointAt(item, start + sweep))}"${paintAttributes(item)}/>`
  },
}

function isWhole({ sweep }: ArcItem): boolean {
  return Math.abs(sweep) >= 360
}

function pointAt({ centre, radius }: ArcItem, degrees: number): Place {
  return { x: centre.x + radius * cosDegrees(degrees), y: centre.y + radius * sinDegrees(degrees) }
}

/** Whether a direction lies on the arc. */
function isSwept({ start, sweep }: ArcItem, degrees: number): boolean {
  const turned = sweep >= 0 ? degrees - start : start - degrees
  return ((turned % 360) + 360) % 360 <= Math.abs(sweep)
}
