import type { Evaluation, Place, Sheet } from '../../sheet'
import { boxOfPoints, growBox } from '../geometry'
import { WIDTHS } from '../items/style'
import { createGround } from '../labels/ground'
import { frameOf } from '../paper'
import { boundsOf } from '../primitives'
import { roomNear } from '../rooms'
import type { Item, Scene } from '../scene'
import { gap, textItem } from './blocks'
import { columnsOf } from './columns-of-page'
import { constructionList } from './construction-list'
import { drawingPage, drawnScene } from './drawing-page'
import { type Block, flow, heightOf } from './flow'
import { footItems } from './foot'
import { type Page, paperOf, type ReportOptions } from './page'
import { INK } from './style'
import { sizeOf, textPage } from './text-page'

const KIND = 'Construction sheet'
/** How wide the list is on the frame, and how far its text lies inside its border, in millimetres. */
const LIST = { width: 76, padding: 3 }
/** Half the length of the cross that marks a place to begin at, and how far its name lies from it. */
const CROSS = 3
const NAME = { face: 'sans', size: 3 } as const
const DASH = [6, 1.4, 0.7, 1.4]
/** What stands on an empty frame of what the drawing shows. */
const KEPT: ReadonlySet<Item['part']> = new Set([
  'paper',
  'grid',
  'frame',
  'scale-bar',
  'title-block',
])

/**
 * Sheets to construct a drawing on with ruler and protractor: the empty frame with its scales, its axes and
 * the places to begin at, with the list of phasors, on a page of its own where the frame has no room for
 * it; and last the same drawing exactly, to lay over what was drawn.
 */
export function constructionPages(
  sheet: Sheet,
  evaluation: Evaluation,
  options: ReportOptions = {},
): readonly Page[] {
  const exact = drawnScene(sheet, evaluation, { theme: 'print' })
  const list = constructionList(sheet, evaluation, exact, LIST.width - 2 * LIST.padding)
  const placed = placeList(exact, list)
  const paper = { ...paperOf(sheet), ...options.paper }
  const columns = columnsOf(sizeOf(paper))
  const width = (columns[0]?.right ?? 0) - (columns[0]?.left ?? 0)
  const further = placed ? [] : flow(constructionList(sheet, evaluation, exact, width), columns)
  const count = further.length + 2
  const common = { kind: KIND, paper, count, fingerprint: options.fingerprint }
  const scene = drawnScene(sheet, evaluation, {
    theme: 'print',
    labels: false,
    sheetNumber: `Sheet 1 of ${count}`,
  })
  return [
    emptyPage(sheet, scene, placed ?? [], count, options.fingerprint),
    ...further.map((page, index) => textPage(sheet, page, { ...common, number: index + 2 })),
    answerPage(sheet, evaluation, options, count),
  ]
}

function emptyPage(
  sheet: Sheet,
  scene: Scene,
  list: readonly Item[],
  count: number,
  fingerprint: string | undefined,
): Page {
  return {
    ...paperOf(sheet),
    width: scene.width,
    height: scene.height,
    items: [
      ...scene.items.filter(({ part }) => KEPT.has(part)),
      axesItem(scene),
      ...marks(sheet, scene),
      ...list,
      ...footItems(scene, fingerprint),
    ],
    title: `${KIND}: ${sheet.title.trim() || 'Untitled'}, sheet 1 of ${count}`,
    description: 'The empty frame with its scales, axes and places to begin at.',
    number: 1,
    count,
    remarks: [],
  }
}

function answerPage(
  sheet: Sheet,
  evaluation: Evaluation,
  options: ReportOptions,
  count: number,
): Page {
  const page = drawingPage(sheet, evaluation, { ...options, count, number: count })
  return { ...page, title: page.title.replace(/^Drawing:/, 'Answer sheet:') }
}

/** The level and the upright axis through the origin, across the frame above what stands at its foot. */
function axesItem(scene: Scene): Item {
  const frame = frameOf(scene)
  const { x, y } = scene.origin
  const foot = scene.items
    .filter(({ part }) => part === 'scale-bar' || part === 'title-block')
    .map(boundsOf)
    .filter(({ left, right }) => left < x + 1 && right > x - 1)
    .reduce((top, box) => Math.max(top, box.top + 2), frame.bottom)
  return {
    part: 'axis',
    kind: 'lines',
    segments: [frame.left, y, frame.right, y, x, Math.min(foot, y), x, frame.top],
    stroke: INK.thin,
    width: WIDTHS.thin,
    dash: DASH,
  }
}

/** A cross where each figure begins, with the name of what begins there. */
function marks(sheet: Sheet, { origin, starts, arrows }: Scene): readonly Item[] {
  const places = new Map<string, Place>([['origin', origin]])
  for (const [key, place] of starts) places.set(key, place)
  const begun = new Map(
    arrows.flatMap((arrow) => (arrow.sum ? ([[arrow.sum, arrow]] as const) : [])),
  )
  return [...places].flatMap(([key, { x, y }]): readonly Item[] => {
    const id = key.replace(/^sum:/, '')
    const sum = sheet.sums?.find((own) => own.id === id)
    const text =
      sum && begun.has(sum.id) ? (sum.label ?? `Sum ${(sheet.sums ?? []).indexOf(sum) + 1}`) : ''
    const cross: Item = {
      part: 'axis',
      kind: 'lines',
      segments: [x - CROSS, y, x + CROSS, y, x, y - CROSS, x, y + CROSS],
      stroke: INK.ink,
      width: 0.3,
    }
    const name = textItem({ x: x - 1.5, y: y - 4.5 }, [{ ...NAME, text }], INK.quiet, 'end')
    return text === '' ? [cross] : [cross, name]
  })
}

/** The list in a free corner of the exact drawing, so that nothing is drawn over it; undefined where none is. */
function placeList(exact: Scene, list: readonly Block[]): readonly Item[] | undefined {
  const pieces = list.flatMap(({ pieces: own, space = 0 }, index) =>
    index === 0 ? own : [gap(space), ...own],
  )
  const height = heightOf(pieces) + 2 * LIST.padding
  const frame = frameOf(exact)
  const { origin } = exact
  const fences = [
    ...exact.items
      .filter(({ part }) => part === 'title-block' || part === 'scale-bar')
      .map(boundsOf),
    growBox(boxOfPoints([origin.x, origin.y]), CROSS),
  ]
  const { occupancy, region } = createGround(exact.items, frame, fences)
  const room = roomNear('right', occupancy, region, { width: LIST.width, height })
  if (!room) return undefined
  const { left, bottom, right, top } = room
  const items: Item[] = [
    {
      part: 'report',
      kind: 'path',
      points: [left, bottom, right, bottom, right, top, left, top],
      closed: true,
      fill: INK.paper,
      stroke: INK.thin,
      width: WIDTHS.thin,
    },
  ]
  let y = top - LIST.padding
  for (const piece of pieces) {
    items.push(...piece.draw({ x: left + LIST.padding, y }))
    y -= piece.height
  }
  return items
}
