import { measureText } from '../font/measure'
import { shareOut } from '../items/share-out'
import type { TextRun } from '../scene'
import { STYLES } from './style'
import { type TextStyle, widestPiece, widthOf } from './wrap'

/** What stands in a cell: plain text, or that text in words of several faces, if each of these fits. */
export interface Cell {
  readonly text: string
  readonly words?: readonly (readonly TextRun[])[]
}

/** A column of a table. */
export interface Column {
  readonly title: string
  /** Figures stand at the end. */
  readonly align?: 'end'
}

/** Free millimetres between two columns. */
export const GUTTER = 3.2
/** A piece wider than this share of the table is broken rather than let the others be squeezed. */
const LARGEST_SHARE = 0.4

/**
 * The widths of a table's columns, in millimetres, gutters left out: what all of a column's text needs on
 * one line where there is room, else no less than its widest word and the rest shared by need. What is
 * left over goes to the columns of words.
 */
export function columnWidths(
  columns: readonly Column[],
  rows: readonly (readonly Cell[])[],
  width: number,
): number[] {
  const room = width - GUTTER * (columns.length - 1)
  const needs = columns.map((column, at) =>
    needsOf(
      column,
      rows.map((row) => row[at]),
    ),
  )
  const whole = sum(needs.map(({ full }) => full))
  if (whole <= room) {
    const words = columns.filter(({ align }) => align !== 'end').length
    const share = (room - whole) / Math.max(1, words)
    return needs.map(({ full }, at) =>
      columns[at]?.align === 'end' && words > 0 ? full : full + share,
    )
  }
  const least = needs.map((need) => Math.min(need.word, LARGEST_SHARE * room))
  const left = room - sum(least)
  if (left < 0) return shareOut(room, least)
  const wishes = needs.map(({ full }, at) => Math.max(0, full - (least[at] ?? 0)))
  // By the root of the need: a very long text does not starve the middling ones.
  const weights = wishes.map(Math.sqrt)
  return shareByWeight(left, wishes, weights).map((more, at) => (least[at] ?? 0) + more)
}

interface Need {
  /** All on one line. */
  readonly full: number
  /** The widest word. */
  readonly word: number
}

function needsOf({ title }: Column, cells: readonly (Cell | undefined)[]): Need {
  const head = { full: widthOf(title, STYLES.caption), word: widestPiece(title, STYLES.caption) }
  return cells.reduce<Need>((most, cell) => {
    const own = cell ? needOf(cell, STYLES.body) : { full: 0, word: 0 }
    return { full: Math.max(most.full, own.full), word: Math.max(most.word, own.word) }
  }, head)
}

function needOf({ text, words }: Cell, style: TextStyle): Need {
  if (words) {
    const widths = words.map(measureText)
    const spaces = (widths.length - 1) * widthOf(' ', style)
    return { full: sum(widths) + spaces, word: Math.max(0, ...widths) }
  }
  const full = text.split('\n').reduce((most, line) => Math.max(most, widthOf(line, style)), 0)
  return { full, word: widestPiece(text, style) }
}

/** Shares out by weight, to no one more than was wished; what that leaves goes to the others. */
function shareByWeight(
  room: number,
  wishes: readonly number[],
  weights: readonly number[],
): number[] {
  const given = wishes.map(() => 0)
  let left = room
  for (let round = 0; round < wishes.length && left > 1e-9; round += 1) {
    const open = wishes.flatMap((wish, at) => ((given[at] ?? 0) < wish - 1e-9 ? [at] : []))
    const weight = sum(open.map((at) => weights[at] ?? 0))
    if (weight === 0) break
    const share = left / weight
    for (const at of open) {
      const wish = (wishes[at] ?? 0) - (given[at] ?? 0)
      const more = Math.min(wish, share * (weights[at] ?? 0))
      given[at] = (given[at] ?? 0) + more
      left -= more
    }
  }
  return given
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, each) => total + each, 0)
}
