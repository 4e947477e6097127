import type { Place } from '../../sheet'
import type { Item, TextItem } from '../scene'

/** The part of a scene that all of a schematic belongs to. */
const part = 'schematic'

/** Straight wires or strokes, four figures each. */
export function wireItem(segments: readonly number[], stroke: string, width: number): Item {
  return { part, kind: 'lines', segments, stroke, width }
}

/** A chain of points; closed where it is an outline, filled where it has a fill. */
export function outlineItem(
  points: readonly number[],
  style: {
    readonly closed?: boolean
    readonly fill?: string
    readonly stroke?: string
    readonly width?: number
  },
): Item {
  return { part, kind: 'path', points, ...style }
}

/** A part of a circle, or all of it. */
export function arcItem(
  centre: Place,
  radius: number,
  [start, sweep]: readonly [number, number],
  style: { readonly fill?: string; readonly stroke?: string; readonly width?: number },
): Item {
  return { part, kind: 'arc', centre, radius, start, sweep, ...style }
}

/** One line of text. */
export function wordItem(
  at: Place,
  anchor: TextItem['anchor'],
  runs: TextItem['runs'],
  fill: string,
): Item {
  return { part, kind: 'text', at, anchor, runs, fill }
}

/** An item at `scale` times its size about the origin, then moved. */
export function moveItem(item: Item, { x, y }: Place, scale = 1): Item {
  const at = (place: Place): Place => ({ x: x + scale * place.x, y: y + scale * place.y })
  const along = (figures: readonly number[]) =>
    figures.map((figure, index) => (index % 2 === 0 ? x : y) + scale * figure)
  const stroked =
    'width' in item && item.width !== undefined && scale !== 1 ? { width: scale * item.width } : {}
  switch (item.kind) {
    case 'lines':
      return { ...item, ...stroked, segments: along(item.segments) }
    case 'path':
      return { ...item, ...stroked, points: along(item.points) }
    case 'arc':
      return { ...item, ...stroked, centre: at(item.centre), radius: scale * item.radius }
    case 'text':
      return scale === 1
        ? { ...item, at: at(item.at) }
        : { ...item, at: at(item.at), runs: item.runs.map((run) => scaleRun(run, scale)) }
  }
}

function scaleRun(run: TextItem['runs'][number], scale: number): TextItem['runs'][number] {
  const { rise, size } = run
  return { ...run, size: scale * size, ...(rise !== undefined && { rise: scale * rise }) }
}
