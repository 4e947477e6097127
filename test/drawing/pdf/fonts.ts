import { readFileSync } from 'node:fs'
import type { PdfFonts } from '../../../src/drawing/pdf'

const folder = new URL('../../../public/fonts/', import.meta.url)

function read(face: keyof PdfFonts): Uint8Array {
  return new Uint8Array(readFileSync(new URL(`phasogon-print-${face}.ttf`, folder)))
}

/** The typefaces that the page puts into a PDF. */
export const fonts: PdfFonts = { sans: read('sans'), bold: read('bold'), symbol: read('symbol') }
