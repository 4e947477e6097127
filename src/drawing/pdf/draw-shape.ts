import type { jsPDF } from 'jspdf'
import { cosDegrees, sinDegrees } from '../../core'
import type { ArcItem, Item, LinesItem, PathItem } from '../scene'

type Shape = LinesItem | PathItem | ArcItem

/** Draws an item that is no text on the current page; `height` is the page's, since y counts downwards. */
export function drawShape(document: jsPDF, item: Shape, height: number): void {
  const isFilled = item.kind !== 'lines' && item.fill !== undefined
  const isStroked = item.stroke !== undefined
  if (!isFilled && !isStroked) return
  setPaint(document, item)
  trace(document, item, height)
  if (isFilled && isStroked) document.fillStroke()
  else if (isFilled) document.fill()
  else document.stroke()
}

function setPaint(document: jsPDF, item: Shape): void {
  if (item.kind !== 'lines' && item.fill !== undefined) document.setFillColor(item.fill)
  if (item.stroke === undefined) return
  document.setDrawColor(item.stroke)
  document.setLineWidth(item.width ?? 0)
  document.setLineDashPattern(item.dash ? [...item.dash] : [], 0)
}

function trace(document: jsPDF, item: Shape, height: number): void {
  switch (item.kind) {
    case 'lines': {
      const { segments } = item
      for (let at = 0; at + 3 < segments.length; at += 4) {
        document.moveTo(segments[at] as number, height - (segments[at + 1] as number))
        document.lineTo(segments[at + 2] as number, height - (segments[at + 3] as number))
      }
      return
    }
    case 'path': {
      const { points, closed } = item
      for (let at = 0; at + 1 < points.length; at += 2) {
        const [x, y] = [points[at] as number, height - (points[at + 1] as number)]
        if (at === 0) document.moveTo(x, y)
        else document.lineTo(x, y)
      }
      if (closed) document.close()
      return
    }
    case 'arc':
      traceArc(document, item, height)
  }
}

/** The widest stretch of a circle that one curve follows to within 0.03 % of its radius, in degrees. */
const WIDEST = 90

/** An arc as cubic curves; control points at 4/3 · tan(φ/4) of the radius, the usual construction. */
function traceArc(
  document: jsPDF,
  { centre, radius, start, sweep }: ArcItem,
  height: number,
): void {
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / WIDEST - 1e-9))
  const step = sweep / count
  const reach = (4 / 3) * Math.tan((step * Math.PI) / 180 / 4) * radius
  const at = (degrees: number, along: number): readonly [number, number] => [
    centre.x + radius * cosDegrees(degrees) - along * sinDegrees(degrees),
    height - (centre.y + radius * sinDegrees(degrees) + along * cosDegrees(degrees)),
  ]
  document.moveTo(...at(start, 0))
  for (let part = 0; part < count; part += 1) {
    const [from, to] = [start + part * step, start + (part + 1) * step]
    document.curveTo(...at(from, reach), ...at(to, -reach), ...at(to, 0))
  }
  if (Math.abs(sweep) >= 360) document.close()
}

/** Whether an item is drawn by `drawShape`. */
export function isShape(item: Item): item is Shape {
  return item.kind !== 'text'
}
