import type { Sheet } from '../../sheet'
import { measureText } from '../font/measure'
import { shorten } from '../font/shorten'
import type { Box } from '../geometry'
import type { Item, TextRun } from '../scene'
import { isolate } from '../text/label-runs'
import { formatFrequency } from '../text/quantity-text'
import type { Palette } from '../theme'
import { WIDTHS } from './style'

const WIDTH = 110
const TITLE_HEIGHT = 9.5
const ROW_HEIGHT = 8.6
const PADDING = 1.8
const COLUMNS = 3
const CAPTION = { face: 'sans', size: 2.2 } as const
const VALUE = { face: 'sans', size: 3.5 } as const
const TITLE_SIZE = 4.4

interface Cell {
  readonly caption: string
  readonly value: string
}

/** The title block: its outline in the lower right corner of the frame, and its items. */
export interface TitleBlock {
  readonly box: Box
  readonly items: readonly Item[]
}

/** How high the title block of a sheet stands above the frame, in millimetres. */
export function titleBlockHeight(sheet: Sheet): number {
  return TITLE_HEIGHT + rowsOf(sheet).length * ROW_HEIGHT
}

/**
 * The title block, its fields named as ISO 7200 names them (from memory). Only what the sheet fills
 * is there, and always title, revision index, frequency with "rms", and sheet number.
 */
export function createTitleBlock(sheet: Sheet, frame: Box, palette: Palette): TitleBlock {
  const rows = rowsOf(sheet)
  const box = {
    left: frame.right - WIDTH,
    right: frame.right,
    bottom: frame.bottom,
    top: frame.bottom + TITLE_HEIGHT + rows.length * ROW_HEIGHT,
  }
  const rules: number[] = []
  const texts: Item[] = [...titleItems(sheet, box, palette)]
  rows.forEach((cells, row) => {
    const top = box.top - TITLE_HEIGHT - row * ROW_HEIGHT
    let left = box.left
    rules.push(left, top, box.right, top)
    widthsOf(cells).forEach((width, column) => {
      if (column > 0) rules.push(left, top, left, top - ROW_HEIGHT)
      texts.push(...cellItems(cells[column] as Cell, { left, top, width }, palette))
      left += width
    })
  })
  return { box, items: [outline(box, palette), ruleItem(rules, palette), ...texts] }
}

function rowsOf(sheet: Sheet): Cell[][] {
  const job = sheet.job ?? {}
  const place = [job.circuit, job.site].map((part) => part?.trim()).filter(Boolean)
  const optional: [string, string | undefined][] = [
    ['Identification number', job.number],
    ['Supplementary title', place.join(' · ')],
    ['Date of issue', job.date],
    ['Creator', job.testedBy],
    ['Checked by', job.checkedBy],
    ['Approval person', job.approvedBy],
  ]
  const filled = optional.flatMap(([caption, value = '']) =>
    value.trim() === '' ? [] : [{ caption, value: value.trim() }],
  )
  const rows: Cell[][] = []
  const columns = Math.ceil(filled.length / Math.ceil(filled.length / COLUMNS))
  for (let first = 0; first < filled.length; first += columns) {
    rows.push(filled.slice(first, first + columns))
  }
  const frequency = sheet.frequency && formatFrequency(sheet.frequency)
  rows.push([
    { caption: 'Revision index', value: sheet.revision?.trim() || '0' },
    { caption: 'Frequency and values', value: frequency ? `${frequency} · rms` : 'rms' },
    { caption: 'Sheet number', value: 'Sheet 1 of 1' },
  ])
  return rows
}

/** Each cell as wide as its text, what is left shared out; where it is short, the widest give way. */
function widthsOf(cells: readonly Cell[]): number[] {
  const needs = cells.map(({ caption, value }) => {
    const texts = [
      { ...CAPTION, text: caption },
      { ...VALUE, text: oneLine(value) },
    ]
    return Math.max(...texts.map((text) => measureText([text]))) + 2 * PADDING
  })
  const largest = widestThatFits(needs)
  const widths = needs.map((need) => Math.min(need, largest))
  const left = WIDTH - widths.reduce((sum, width) => sum + width, 0)
  return widths.map((width) => width + left / cells.length)
}

/** The width to which the widest are cut so that all fit: the narrow ones keep theirs. */
function widestThatFits(needs: readonly number[]): number {
  const rising = needs.toSorted((one, other) => one - other)
  let room = WIDTH
  for (const [index, need] of rising.entries()) {
    const share = room / (rising.length - index)
    if (need > share) return share
    room -= need
  }
  return WIDTH
}

function titleItems({ title }: Sheet, { left, top }: Box, palette: Palette): Item[] {
  const style = { face: 'bold', size: TITLE_SIZE } as const
  const text = shorten(oneLine(title) || 'Untitled', style, WIDTH - 2 * PADDING)
  const at = { x: left + PADDING, y: top - TITLE_HEIGHT / 2 - TITLE_SIZE * 0.36 }
  return [textItem(at, [{ ...style, text: isolate(text) }], palette.ink)]
}

function cellItems(
  { caption, value }: Cell,
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
