import type { Sheet } from '../../sheet'
import { measureText } from '../font/measure'
import { shorten } from '../font/shorten'
import type { Box } from '../geometry'
import type { Item, TextRun } from '../scene'
import { isolate } from '../text/label-runs'
import type { Palette } from '../theme'
import { shareOut } from './share-out'
import { WIDTHS } from './style'
import { type Field, fieldRowsOf } from './title-fields'

const WIDTH = 110
const TITLE_HEIGHT = 9.5
const ROW_HEIGHT = 8.6
const PADDING = 1.8
const CAPTION = { face: 'sans', size: 2.2 } as const
const VALUE = { face: 'sans', size: 3.5 } as const
const TITLE_SIZE = 4.4

/** The title block: its outline in the lower right corner of the frame, and its items. */
export interface TitleBlock {
  readonly box: Box
  readonly items: readonly Item[]
}

/** How high the title block of a sheet stands above the frame, in millimetres. */
export function titleBlockHeight(sheet: Sheet): number {
  return TITLE_HEIGHT + fieldRowsOf(sheet).length * ROW_HEIGHT
}

/** The title block of a sheet. What is too long for its cell is shortened. */
export function createTitleBlock(
  sheet: Sheet,
  frame: Box,
  palette: Palette,
  sheetNumber?: string,
): TitleBlock {
  const rows = fieldRowsOf(sheet, sheetNumber)
  const box = {
    left: frame.right - WIDTH,
    right: frame.right,
    bottom: frame.bottom,
    top: frame.bottom + TITLE_HEIGHT + rows.length * ROW_HEIGHT,
  }
  const rules: number[] = []
  const texts: Item[] = [...titleItems(sheet, box, palette)]
  rows.forEach((fields, row) => {
    const top = box.top - TITLE_HEIGHT - row * ROW_HEIGHT
    let left = box.left
    rules.push(left, top, box.right, top)
    shareOut(WIDTH, fields.map(widthOf)).forEach((width, column) => {
      if (column > 0) rules.push(left, top, left, top - ROW_HEIGHT)
      texts.push(...cellItems(fields[column] as Field, { left, top, width }, palette))
      left += width
    })
  })
  return { box, items: [outline(box, palette), ruleItem(rules, palette), ...texts] }
}

/** The width that a field needs for all of its text, in millimetres. */
function widthOf({ caption, value }: Field): number {
  const texts = [
    { ...CAPTION, text: caption },
    { ...VALUE, text: oneLine(value) },
  ]
  return Math.max(...texts.map((text) => measureText([text]))) + 2 * PADDING
}

function titleItems({ title }: Sheet, { left, top }: Box, palette: Palette): Item[] {
  const style = { face: 'bold', size: TITLE_SIZE } as const
  const text = shorten(oneLine(title) || 'Untitled', style, WIDTH - 2 * PADDING)
  const at = { x: left + PADDING, y: top - TITLE_HEIGHT / 2 - TITLE_SIZE * 0.36 }
  return [textItem(at, [{ ...style, text: isolate(text) }], palette.ink)]
}

function cellItems(
  { caption, value }: Field,
  { left, top, width }: { left: number; top: number; width: number },
  palette: Palette,
): Item[] {
  const room = width - 2 * PADDING
  const x = left + PADDING
  return [
    textItem(
      { x, y: top - 2.7 },
      [{ ...CAPTION, text: shorten(caption, CAPTION, room) }],
      palette.quiet,
    ),
    textItem(
      { x, y: top - ROW_HEIGHT + 1.7 },
      [{ ...VALUE, text: isolate(shorten(oneLine(value), VALUE, room)) }],
      palette.ink,
    ),
  ]
}

function oneLine(text: string): string {
  return text.replace(/\s+/gu, ' ').trim()
}

function textItem(at: { x: number; y: number }, runs: readonly TextRun[], fill: string): Item {
  return { part: 'title-block', kind: 'text', at, anchor: 'start', runs, fill }
}

function outline({ left, bottom, right, top }: Box, palette: Palette): Item {
  return {
    part: 'title-block',
    kind: 'path',
    points: [left, bottom, right, bottom, right, top, left, top],
    closed: true,
    fill: palette.paper,
    stroke: palette.ink,
    width: WIDTHS.frame,
  }
}

function ruleItem(segments: readonly number[], palette: Palette): Item {
  return {
    part: 'title-block',
    kind: 'lines',
    segments,
    stroke: palette.ink,
    width: WIDTHS.thin,
  }
}
