import { jsPDF } from 'jspdf'
import type { Page } from '../report'
import { attachSheet } from './attach-sheet'
import { drawShape, isShape } from './draw-shape'
import { drawText } from './draw-text'
import { addFaces, type PdfFonts } from './faces'
import type { Lettering } from './lettering'
import { createMissing, type PaintText } from './missing'

/** What goes into a PDF besides its pages. */
export interface PdfOptions {
  readonly fonts: PdfFonts
  /** The sheet as JSON, which the PDF carries as an attached file. */
  readonly sheetText?: string
  /** Paints what the typefaces lack; without it a note stands in its place. */
  readonly paintText?: PaintText
  readonly author?: string
  /** When it is made; now where nothing is said. */
  readonly date?: Date
}

/**
 * Pages as the bytes of a PDF: true to scale, every line a line and every text a text that can be found
 * and copied, its typefaces embedded. A reader that heeds it prints without scaling.
 */
export function createPdf(pages: readonly Page[], options: PdfOptions): Uint8Array {
  const { fonts, sheetText, paintText, author, date } = options
  const [first] = pages
  if (first === undefined) throw new Error('A PDF has at least one page.')
  const document = new jsPDF({
    unit: 'mm',
    format: [first.width, first.height],
    orientation: orientationOf(first),
    compress: true,
    putOnlyUsedFonts: true,
    floatPrecision: 4,
  })
  document.setDocumentProperties({
    title: first.title.replace(/, sheet \d+ of \d+$/, ''),
    creator: 'Phasogon',
    ...(author !== undefined && { author }),
  })
  if (date) document.setCreationDate(date)
  document.setLanguage('en-GB')
  document.viewerPreferences({ PrintScaling: 'None', DisplayDocTitle: true })
  if (sheetText !== undefined) attachSheet(document, sheetText)
  const lettering: Lettering = {
    document,
    faces: addFaces(document, fonts),
    missing: createMissing(paintText),
  }
  pages.forEach((page, index) => {
    if (index > 0) document.addPage([page.width, page.height], orientationOf(page))
    drawPage(lettering, page)
  })
  return new Uint8Array(document.output('arraybuffer'))
}

function drawPage(lettering: Lettering, { items, height }: Page): void {
  for (const item of items) {
    if (isShape(item)) drawShape(lettering.document, item, height)
    else drawText(lettering, item, height)
  }
}

function orientationOf({ width, height }: Page): 'portrait' | 'landscape' {
  return width > height ? 'landscape' : 'portrait'
}
