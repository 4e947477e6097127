import type { Evaluation, Sheet } from '../../sheet'
import { frameItem, paperItem } from '../items/paper'
import { frameOf, paperSizeOf } from '../paper'
import type { Scene } from '../scene'
import { columnsOf } from './columns-of-page'
import { drawingPage, drawnScene } from './drawing-page'
import { type FilledPage, flow } from './flow'
import { footItems } from './foot'
import { type Page, type Paper, paperOf, type ReportOptions } from './page'
import { SECTIONS } from './sections'
import { stripItems } from './strip'
import { INK } from './style'

const KIND = 'Job report'

/**
 * The job report of a sheet, page by page: the drawing at exactly the scale that it states, then all that
 * was read, worked out, judged and concluded. The same sheet, evaluation and options give the same pages.
 * What has nothing to say is left out; nothing is cut, and nothing lies on anything else.
 *
 * @param evaluation The whole one; of one that has no verdict yet, the report says so.
 */
export function reportPages(
  sheet: Sheet,
  evaluation: Evaluation,
  options: ReportOptions = {},
): readonly Page[] {
  const own = paperOf(sheet)
  const paper: Paper = { ...own, ...options.paper }
  const size = sizeOf(paper)
  const columns = columnsOf(size)
  const { unitsPerCentimetre } = drawnScene(sheet, evaluation, { labels: false })
  const width = (columns[0]?.right ?? 0) - (columns[0]?.left ?? 0)
  const report = { sheet, evaluation, options, unitsPerCentimetre, width }
  const blocks = SECTIONS.filter(({ name }) => !options.without?.has(name)).flatMap((section) =>
    section.blocks(report),
  )
  const filled = flow(blocks, columns)
  const count = filled.length + 1
  return [
    drawingPage(sheet, evaluation, { ...options, count }),
    ...filled.map((page, index) =>
      textPage(sheet, page, { paper, number: index + 2, count, fingerprint: options.fingerprint }),
    ),
  ]
}

/** The size of a paper in millimetres. */
function sizeOf({ format, orientation }: Paper): Pick<Scene, 'width' | 'height'> {
  return paperSizeOf({ paper: format, orientation })
}

function textPage(
  sheet: Sheet,
  { items }: FilledPage,
  {
    paper,
    number,
    count,
    fingerprint,
  }: { paper: Paper; number: number; count: number; fingerprint: string | undefined },
): Page {
  const size = sizeOf(paper)
  const frame = frameOf(size)
  const sheetNumber = `Sheet ${number} of ${count}`
  return {
    ...paper,
    ...size,
    items: [
      paperItem(size, INK),
      frameItem(frame, INK),
      ...stripItems(sheet, KIND, sheetNumber, frame),
      ...items,
      ...footItems(size, fingerprint),
    ],
    title: `${KIND}: ${sheet.title.trim() || 'Untitled'}, sheet ${number} of ${count}`,
    description: `Sheet ${number} of ${count} of the job report.`,
    number,
    count,
    remarks: [],
  }
}
