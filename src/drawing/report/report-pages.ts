import type { Evaluation, Sheet } from '../../sheet'
import { columnsOf } from './columns-of-page'
import { drawingPage, drawnScene } from './drawing-page'
import { flow } from './flow'
import { type Page, type Paper, paperOf, type ReportOptions } from './page'
import { SECTIONS } from './sections'
import { sizeOf, textPage } from './text-page'

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
  const common = { kind: KIND, paper, count, fingerprint: options.fingerprint }
  return [
    drawingPage(sheet, evaluation, { ...options, count }),
    ...filled.map((page, index) => textPage(sheet, page, { ...common, number: index + 2 })),
  ]
}
