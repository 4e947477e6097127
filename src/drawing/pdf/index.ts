export { createPdf, type PdfOptions } from './create-pdf'
export type { PdfFonts } from './faces'
export type { PaintedText, PaintText } from './missing'
