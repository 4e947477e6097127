import { measureText } from '../font/measure'
import type { TextRun } from '../scene'
import { isolate } from '../text/label-runs'

/** How text is set: its face and size. */
export type TextStyle = Omit<TextRun, 'text' | 'rise'>

/** Behind these a line may end without a space; before and behind an ideograph it may, too. */
const BREAK_AFTER = /[-\u2010\u2013\u2014/\\,;:·]/u
const IDEOGRAPH = /[\p{Ideographic}\u3000-\u30ff\uac00-\ud7a3\uff01-\uff60]/u
/** What never begins a line. */
const NEVER_FIRST = /^[\p{M}\p{Pe}\p{Pf}.,;:!?%°、。，．」』】）]/u

/** A text as lines that are no wider than `width` millimetres: its own lines, broken where need be. */
export function wrapText(text: string, style: TextStyle, width: number): string[] {
  return text
    .replace(/\r\n?/g, '\n')
    .split('\n')
    .flatMap((line) => wrapLine(bind(line.replace(/\s+/gu, ' ').trim()), style, width))
    .map((line) => isolate(line.replaceAll(BOUND, ' ')))
}

/** The space that no line is broken at; on the page it is a plain one, so that it is found as such. */
const BOUND = '\u00a0'

/** Keeps a figure with its unit, ± with what follows, and an angle with its sign. */
function bind(text: string): string {
  return text
    .replace(/(?<=[\d–]) (?=[pnµmkMGT]?(?:V|VA|A|Ω|W|var|Hz|H|F|s|m|%|σ)(?![\p{L}\d]))/gu, BOUND)
    .replace(/(?<=[±∠−+<>=]) (?=[\d−jπ.])/gu, BOUND)
    .replace(/ (?=∠)/gu, BOUND)
}

/** The width of a line in millimetres. */
export function widthOf(text: string, style: TextStyle): number {
  return measureText([{ ...style, text }])
}

/** The width of the widest piece of a text that is best not broken, in millimetres. */
export function widestPiece(text: string, style: TextStyle): number {
  return piecesOf(bind(text.replace(/\s+/gu, ' '))).reduce(
    (widest, piece) => Math.max(widest, widthOf(piece.trimEnd(), style)),
    0,
  )
}

function wrapLine(text: string, style: TextStyle, width: number): string[] {
  const lines: string[] = []
  let line = ''
  for (const piece of piecesOf(text)) {
    if (widthOf((line + piece).trimEnd(), style) <= width) {
      line += piece
      continue
    }
    if (line.trim() !== '') lines.push(line.trimEnd())
    const parts = breakPiece(piece, style, width)
    lines.push(...parts.slice(0, -1).map((part) => part.trimEnd()))
    line = parts.at(-1) ?? ''
  }
  lines.push(line.trimEnd())
  return lines
}

/** A text in pieces behind which a line may end. */
function piecesOf(text: string): string[] {
  const pieces: string[] = []
  let piece = ''
  let before = ''
  for (const character of charactersOf(text)) {
    if (piece !== '' && mayBreak(before, character)) {
      pieces.push(piece)
      piece = ''
    }
    piece += character
    before = character
  }
  return piece === '' ? pieces : [...pieces, piece]
}

function mayBreak(before: string, character: string): boolean {
  if (character === ' ' || NEVER_FIRST.test(character)) return false
  // A dash or a stroke between figures belongs to them.
  if (BREAK_AFTER.test(before)) return !/^[\d\s]/u.test(character)
  return before === ' ' || IDEOGRAPH.test(before) || IDEOGRAPH.test(character)
}

/** A piece that is wider than a line, broken between its letters. */
function breakPiece(piece: string, style: TextStyle, width: number): string[] {
  if (widthOf(piece.trimEnd(), style) <= width) return [piece]
  const parts: string[] = []
  let part = ''
  for (const character of charactersOf(piece)) {
    if (part !== '' && widthOf(part + character, style) > width) {
      parts.push(part)
      part = ''
    }
    part += character
  }
  return [...parts, part]
}

/** Whole letters: each with its marks, and pictographs that are joined to one. */
function charactersOf(text: string): readonly string[] {
  if (/^[\u0020-\u02ff\u0370-\u0482\u2000-\u22ff]*$/u.test(text)) return [...text]
  return Array.from(graphemes.segment(text), ({ segment }) => segment)
}

const graphemes = new Intl.Segmenter('en')
