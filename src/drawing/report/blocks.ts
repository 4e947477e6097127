import type { Item, TextRun } from '../scene'
import type { Block, Piece } from './flow'
import { BASELINE, INK, lineHeight, STYLES } from './style'
import { type TextStyle, wrapText } from './wrap'

/** Nothing, so high. */
export function gap(height: number): Piece {
  return { height, draw: () => [] }
}

/** A line of text on a page. */
export function textItem(
  at: { readonly x: number; readonly y: number },
  runs: readonly TextRun[],
  fill: string = INK.ink,
  anchor: 'start' | 'middle' | 'end' = 'start',
): Item {
  return { part: 'report', kind: 'text', at, anchor, runs, fill }
}

/** A text as pieces, a line each, no wider than `width` millimetres. */
export function lines(text: string, style: TextStyle, width: number, fill?: string): Piece[] {
  return wrapText(text, style, width).map((line) => ({
    height: lineHeight(style),
    draw: ({ x, y }) =>
      line === ''
        ? []
        : [textItem({ x, y: y - BASELINE * style.size }, [{ ...style, text: line }], fill)],
  }))
}

/** A paragraph. */
export function paragraph(text: string, width: number): Block {
  return { pieces: [...lines(text, STYLES.body, width), gap(1.2)] }
}

/** A remark in small quiet letters. */
export function note(text: string, width: number): Block {
  return { pieces: lines(text, STYLES.note, width, INK.quiet), space: 1.2 }
}

/** The heading of a section. */
export function heading(text: string, width: number): Block {
  return {
    pieces: [...lines(text, STYLES.heading, width), gap(1.2)],
    space: 4.6,
    isHeading: true,
  }
}
