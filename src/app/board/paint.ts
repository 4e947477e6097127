import {
  type ArcItem,
  HALO_WIDTH,
  type Item,
  type LinesItem,
  measureText,
  type PathItem,
  type TextItem,
} from '../../drawing'
import { fontOf } from '../fonts'

/** The part of a 2D canvas context that painting needs. */
export type Pen = Pick<
  CanvasRenderingContext2D,
  | 'beginPath'
  | 'moveTo'
  | 'lineTo'
  | 'closePath'
  | 'arc'
  | 'stroke'
  | 'fill'
  | 'fillText'
  | 'strokeText'
  | 'setLineDash'
  | 'save'
  | 'restore'
  | 'translate'
  | 'rotate'
  | 'font'
  | 'textAlign'
  | 'textBaseline'
  | 'lineWidth'
  | 'lineCap'
  | 'lineJoin'
  | 'strokeStyle'
  | 'fillStyle'
>

const radiansPerDegree = Math.PI / 180
const solid: number[] = []

/**
 * Paints items in their order, in a context whose unit is the millimetre with y down: `height` is
 * the paper's, from which the scene's y, which points up, is turned round.
 */
export function paintItems(pen: Pen, items: readonly Item[], height: number): void {
  pen.lineCap = 'butt'
  pen.lineJoin = 'miter'
  for (const item of items) paintItem(pen, item, height)
}

function paintItem(pen: Pen, item: Item, height: number): void {
  switch (item.kind) {
    case 'lines':
      paintLines(pen, item, height)
      break
    case 'path':
      paintPath(pen, item, height)
      break
    case 'arc':
      paintArc(pen, item, height)
      break
    case 'text':
      paintText(pen, item, height)
      break
  }
}

function paintLines(pen: Pen, item: LinesItem, height: number): void {
  const { segments } = item
  pen.beginPath()
  for (let at = 0; at + 3 < segments.length; at += 4) {
    pen.moveTo(segments[at] as number, height - (segments[at + 1] as number))
    pen.lineTo(segments[at + 2] as number, height - (segments[at + 3] as number))
  }
  finish(pen, item)
}

function paintPath(pen: Pen, item: PathItem, height: number): void {
  const { points } = item
  pen.beginPath()
  pen.moveTo(points[0] as number, height - (points[1] as number))
  for (let at = 2; at + 1 < points.length; at += 2) {
    pen.lineTo(points[at] as number, height - (points[at + 1] as number))
  }
  if (item.closed) pen.closePath()
  finish(pen, item)
}

function paintArc(pen: Pen, item: ArcItem, height: number): void {
  const start = -item.start * radiansPerDegree
  const end = -(item.start + item.sweep) * radiansPerDegree
  pen.beginPath()
  pen.arc(item.centre.x, height - item.centre.y, item.radius, start, end, item.sweep > 0)
  finish(pen, item)
}

function finish(pen: Pen, item: LinesItem | PathItem | ArcItem): void {
  if ('fill' in item && item.fill !== undefined) {
    pen.fillStyle = item.fill
    pen.fill()
  }
  if (item.stroke === undefined || item.width === undefined) return
  pen.strokeStyle = item.stroke
  pen.lineWidth = item.width
  if (item.dash) pen.setLineDash([...item.dash])
  pen.stroke()
  if (item.dash) pen.setLineDash(solid)
}

function paintText(pen: Pen, item: TextItem, height: number): void {
  const { turn = 0, at } = item
  if (turn === 0) {
    paintLevelText(pen, item, height)
    return
  }
  pen.save()
  pen.translate(at.x, height - at.y)
  pen.rotate(-turn * radiansPerDegree)
  paintLevelText(pen, { ...item, at: { x: 0, y: height } }, height)
  pen.restore()
}

function paintLevelText(pen: Pen, item: TextItem, height: number): void {
  const { runs, at, anchor, halo, fill } = item
  pen.textAlign = 'left'
  pen.textBaseline = 'alphabetic'
  const width = anchor === 'start' ? 0 : measureText(runs)
  const left = at.x - (anchor === 'middle' ? width / 2 : width)
  if (halo !== undefined) {
    pen.strokeStyle = halo
    pen.lineWidth = HALO_WIDTH
    pen.lineJoin = 'round'
    eachRun(pen, item, left, height, (text, x, y) => pen.strokeText(text, x, y))
    pen.lineJoin = 'miter'
  }
  pen.fillStyle = fill
  eachRun(pen, item, left, height, (text, x, y) => pen.fillText(text, x, y))
}

/** Hands out the runs of a text, each with its face set and its place, one after the other. */
function eachRun(
  pen: Pen,
  { runs, at }: TextItem,
  left: number,
  height: number,
  put: (text: string, x: number, y: number) => void,
): void {
  let x = left
  for (const run of runs) {
    pen.font = fontOf(run)
    put(run.text, x, height - at.y - (run.rise ?? 0))
    x += measureText([run])
  }
}
