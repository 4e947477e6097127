import type { jsPDF } from 'jspdf'
import { HALO_WIDTH } from '../primitives/text'
import type { TextRun } from '../scene'
import { familyOf, type PdfFace } from './faces'

const POINTS_PER_MILLIMETRE = 72 / 25.4
/** A text that would be wider by more than this share than it was measured is drawn in to fit. */
const TOLERANCE = 0.005

/** What texts are drawn with. */
export interface Lettering {
  readonly document: jsPDF
  readonly faces: { readonly [face in TextRun['face']]: PdfFace }
  readonly missing: Missing
}

/** How texts are drawn of which a typeface lacks a letter. */
export interface Missing {
  /** Draws it in `room` millimetres. */
  draw(lettering: Lettering, run: TextRun, setting: Setting, room: number): void
}

/** Where a run of text begins on the page, y downwards, and how it is painted. */
export interface Setting {
  readonly x: number
  readonly y: number
  /** Degrees anticlockwise. */
  readonly turn: number
  readonly fill: string
  readonly halo?: string | undefined
}

/** Takes a face and a size, in millimetres, for the texts that follow. */
export function takeFace(document: jsPDF, face: PdfFace, size: number): void {
  document.setFont(familyOf(face.face), 'normal')
  document.setFontSize(size * POINTS_PER_MILLIMETRE)
}

/** Writes a text in a face that has all of its letters, no wider than `room` millimetres. */
export function letter(
  { document }: Lettering,
  { text, size }: TextRun,
  face: PdfFace,
  { x, y, turn, fill, halo }: Setting,
  room: number,
): void {
  takeFace(document, face, size)
  document.setTextColor(fill)
  const angle = turn === 0 ? {} : { angle: turn }
  if (halo !== undefined) {
    document.setDrawColor(halo)
    document.setLineWidth(HALO_WIDTH)
    document.setLineDashPattern([], 0)
    document.setLineJoin('round')
    document.text(text, x, y, { ...angle, renderingMode: 'stroke' })
    document.setLineJoin('miter')
  }
  const width = face.widthOf(text) * size
  if (width <= room * (1 + TOLERANCE)) {
    document.text(text, x, y, { ...angle, renderingMode: 'fill' })
    return
  }
  document.saveGraphicsState()
  document.text(text, x, y, { ...angle, renderingMode: 'fill', horizontalScale: room / width })
  document.restoreGraphicsState()
}
