import { drawingPage, type Page } from '../../drawing/report'
import { fingerprintOf, quick, type Sheet, serializeSheet } from '../../sheet'
import { download } from '../export/download'
import { fileNameOf } from '../export/file-name'
import { loadFonts } from '../fonts'
import { type Answer, answerOf, type Store } from '../store'
import { settledAnswer } from '../worker'
import { type Choice, pagesOf } from './pages'
import { paintText } from './paint-text'
import { loadPrintFonts } from './print-fonts'

/** How long a PDF waits for the verdict, in milliseconds. */
const PATIENCE_OF_PDF = 10_000

/** Saves the pages of a choice as a PDF, which carries the sheet. */
export function savePdf(store: Store, choice: Choice): Promise<void> {
  const ending = choice.kind === 'report' ? 'pdf' : 'construction.pdf'
  return save(store, ending, (answer, terminals) => pagesOf(answer, choice, terminals))
}

/** Saves the drawing alone as a PDF, which carries the sheet. */
export function saveDrawingPdf(store: Store): Promise<void> {
  return save(store, 'drawing.pdf', ({ sheet, whole }, terminals) => [
    drawingPage(sheet, whole ?? quick(sheet), {
      count: 1,
      terminals,
      fingerprint: fingerprintOf(sheet),
    }),
  ])
}

async function save(
  store: Store,
  ending: string,
  pagesOfAnswer: (answer: Answer, terminals: boolean) => readonly Page[],
): Promise<void> {
  const isSettled = await settledAnswer(store, PATIENCE_OF_PDF)
  const { history, pen, notify } = store.getState()
  const { sheet } = history
  try {
    const pages = pagesOfAnswer(answerOf(sheet), pen.areTerminalsShown)
    const name = fileNameOf(sheet, ending)
    download(await toPdf(sheet, pages), name)
    const verdict = isSettled
      ? ''
      : ' It has no verdict: whether the readings agree is not worked out yet.'
    notify({
      tone: 'news',
      text: `Saved “${name}”. It carries its sheet: drop it on this page to open that again.${verdict}`,
    })
  } catch (error) {
    const reason = error instanceof Error ? error.message : 'something went wrong.'
    notify({
      tone: 'problem',
      text: `No PDF was saved: ${reason} Print instead, and choose PDF there.`,
    })
  }
}

/** Pages as a PDF; fails where its typefaces cannot be had. */
async function toPdf(sheet: Sheet, pages: readonly Page[]): Promise<Blob> {
  const [{ createPdf }, fonts] = await Promise.all([
    import('../../drawing/pdf'),
    loadPrintFonts(),
    loadFonts(),
  ])
  const author = sheet.job?.testedBy
  const bytes = createPdf(pages, {
    fonts,
    sheetText: serializeSheet(sheet),
    paintText,
    ...(author !== undefined && { author }),
  })
  return new Blob([bytes.slice().buffer], { type: 'application/pdf' })
}
