import { measureText } from '../font/measure'
import type { Item, TextRun } from '../scene'
import { gap, textItem } from './blocks'
import { type Cell, type Column, columnWidths, GUTTER } from './columns'
import type { Block, Piece } from './flow'
import { BASELINE, INK, lineHeight, STYLES } from './style'
import { type TextStyle, wrapText } from './wrap'

/** Free millimetres above and below the text of a row. */
const PADDING = 0.75
const RULES = { head: 0.25, row: 0.1 }

/** A cell's line: its runs, or nothing. */
type Line = readonly TextRun[]

/**
 * A table as blocks, a row each, whose head is repeated where it goes on in another column or on another
 * page. No text is wider than its column.
 */
export function table(
  columns: readonly Column[],
  rows: readonly (readonly Cell[])[],
  width: number,
): Block[] {
  const widths = columnWidths(columns, rows, width)
  const head = rowPieces(
    columns.map(({ title }) => ({ text: title })),
    columns,
    widths,
    STYLES.caption,
    INK.quiet,
  )
  const ruled = [...head, rule(width, RULES.head, INK.ink)]
  return rows.map((cells, index) => {
    const own = rowPieces(cells, columns, widths, STYLES.body, INK.ink)
    const above = index === 0 ? [] : [rule(width, RULES.row, INK.thin)]
    return index === 0
      ? { pieces: [...ruled, ...own], head: [] }
      : { pieces: [...above, ...own], head: ruled }
  })
}

/** Captions and values beside each other, without a head. */
export function fieldList(
  fields: readonly (readonly [caption: string, value: string])[],
  width: number,
): Block[] {
  const columns = [{ title: '' }, { title: '' }]
  const captionWidth = Math.min(
    0.35 * width,
    Math.max(0, ...fields.map(([caption]) => measureText([{ ...STYLES.caption, text: caption }]))),
  )
  const widths = [captionWidth, width - captionWidth - GUTTER]
  return fields.map(([caption, value], index) => ({
    pieces: [
      ...(index === 0 ? [] : [rule(width, RULES.row, INK.grid)]),
      ...rowPieces(
        [{ text: caption, words: [[{ ...STYLES.caption, text: caption }]] }, { text: value }],
        columns,
        widths,
        STYLES.body,
        INK.ink,
      ),
    ],
  }))
}

/** A level line across a column; it takes no room. */
export function rule(width: number, thickness: number, stroke: string): Piece {
  return {
    height: 0,
    draw: ({ x, y }) => [
      {
        part: 'report',
        kind: 'lines',
        segments: [x, y, x + width, y],
        stroke,
        width: thickness,
      },
    ],
  }
}

/** A row as pieces, a line of all its cells each. */
function rowPieces(
  cells: readonly Cell[],
  columns: readonly Column[],
  widths: readonly number[],
  style: TextStyle,
  fill: string,
): Piece[] {
  const texts = cells.map((cell, at) => cellLines(cell, style, widths[at] ?? 0))
  const count = Math.max(1, ...texts.map(({ length }) => length))
  const pieces = Array.from({ length: count }, (_, line) =>
    linePiece(
      texts.map((own) => own[line]),
      columns,
      widths,
      style,
      fill,
    ),
  )
  return [gap(PADDING), ...pieces, gap(PADDING)]
}

function cellLines({ text, words }: Cell, style: TextStyle, width: number): Line[] {
  if (words?.every((word) => measureText(word) <= width)) return wrapWords(words, style, width)
  return wrapText(text, style, width).map((line) => [{ ...style, text: line }])
}

/** Words as lines, with a plain space between two. */
function wrapWords(words: readonly Line[], style: TextStyle, width: number): Line[] {
  const space = { ...style, text: ' ' }
  const lines: TextRun[][] = []
  for (const word of words) {
    const line = lines.at(-1)
    if (line && measureText([...line, space, ...word]) <= width) line.push(space, ...word)
    else lines.push([...word])
  }
  return lines
}

function linePiece(
  texts: readonly (Line | undefined)[],
  columns: readonly Column[],
  widths: readonly number[],
  style: TextStyle,
  fill: string,
): Piece {
  return {
    height: lineHeight(style),
    draw: ({ x, y }) => {
      const items: Item[] = []
      let left = x
      texts.forEach((runs, at) => {
        const width = widths[at] ?? 0
        if (runs?.some(({ text }) => text !== '')) {
          const isEnd = columns[at]?.align === 'end'
          const place = { x: isEnd ? left + width : left, y: y - BASELINE * style.size }
          items.push(textItem(place, runs, fill, isEnd ? 'end' : 'start'))
        }
        left += width + GUTTER
      })
      return items
    },
  }
}
