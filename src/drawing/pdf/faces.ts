import type { jsPDF } from 'jspdf'
import type { TextRun } from '../scene'
import { subsetFont } from './subset-font'

type Face = TextRun['face']

/** The three typefaces that go into a PDF: the bytes of `fonts/phasogon-print-*.ttf`. */
export type PdfFonts = { readonly [face in Face]: Uint8Array }

/** What a typeface of a PDF can be asked. */
export interface PdfFace {
  readonly face: Face
  /** Whether it has a letter for every character of a text. */
  has(text: string): boolean
  /** The width of a text in ems. */
  widthOf(text: string): number
  /** Makes a letter stand for a character when text is copied, whatever it looks like. */
  stand(letter: string, forUnit: number): void
}

/** What the library keeps of a typeface that it has read. */
interface Metadata {
  characterToGlyph(code: number): number
  widthOfGlyph(glyph: number): number
  readonly toUnicode: { [glyph: number]: number }
  /** Makes the bytes that go into the PDF. */
  readonly subset: { encode(glyphs: readonly number[]): Uint8Array }
}

const NAMES: { readonly [face in Face]: string } = {
  sans: 'PhasogonPrint-Regular',
  bold: 'PhasogonPrint-Bold',
  symbol: 'PhasogonPrint-Italic',
}

/** Where the library keeps the family of a face. */
export function familyOf(face: Face): string {
  return NAMES[face]
}

/** Puts the three typefaces into a document. */
export function addFaces(document: jsPDF, fonts: PdfFonts): { readonly [face in Face]: PdfFace } {
  return {
    sans: addFace(document, 'sans', fonts.sans),
    bold: addFace(document, 'bold', fonts.bold),
    symbol: addFace(document, 'symbol', fonts.symbol),
  }
}

function addFace(document: jsPDF, face: Face, bytes: Uint8Array): PdfFace {
  const file = NAMES[face]
  document.addFileToVFS(file, toBinary(bytes))
  document.addFont(file, NAMES[face], 'normal', undefined, 'Identity-H')
  document.setFont(NAMES[face], 'normal')
  const metadata = document.getFont().metadata as unknown as Metadata
  metadata.subset.encode = (used) => subsetFont(bytes, used)
  const glyphs = new Map<number, number>()
  const glyphOf = (code: number) => {
    const known = glyphs.get(code)
    if (known !== undefined) return known
    const glyph = code > 0xffff ? 0 : metadata.characterToGlyph(code)
    glyphs.set(code, glyph)
    return glyph
  }
  return {
    face,
    has: (text) => [...text].every((character) => glyphOf(character.codePointAt(0) ?? 0) !== 0),
    widthOf: (text) =>
      [...text].reduce((sum, character) => {
        const glyph = glyphOf(character.codePointAt(0) ?? 0)
        return sum + (glyph === 0 ? 0 : metadata.widthOfGlyph(glyph) / 1000)
      }, 0),
    stand: (letter, forUnit) => {
      if (letter !== '') metadata.toUnicode[glyphOf(letter.charCodeAt(0))] = forUnit
    },
  }
}

const binaries = new WeakMap<Uint8Array, string>()

/** Bytes as the library takes them: a character each. The same typefaces are asked for again and again. */
function toBinary(bytes: Uint8Array): string {
  const known = binaries.get(bytes)
  if (known !== undefined) return known
  const parts: string[] = []
  for (let from = 0; from < bytes.length; from += 8192) {
    parts.push(String.fromCharCode(...bytes.subarray(from, from + 8192)))
  }
  const binary = parts.join('')
  binaries.set(bytes, binary)
  return binary
}
