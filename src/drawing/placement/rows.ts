import type { Place } from '../../sheet'
import { type Box, joinBoxes, moveBox } from '../geometry'
import { snapDown, snapUp } from './grid-step'

/** What stays free between two figures, in millimetres. */
const BETWEEN = 12

interface Row {
  /** The first row stands beside what is there already. */
  readonly isBeside: boolean
  readonly boxes: { readonly box: Box; readonly x: number }[]
}

/**
 * Where figures start beside a first one, left to right, and then in rows below it (above, where
 * there is no room below). All places are on whole 10 mm, counted from the same point as the boxes.
 *
 * @param first The box of what is there already.
 * @param boxes How far each figure reaches from its own start.
 * @param room What the rows should stay inside.
 */
export function startsInRows(first: Box, boxes: readonly Box[], room: Box): Place[] {
  const starts: Place[] = []
  let filled = first
  for (const row of rowsOf(first, boxes, room)) {
    const y = row.isBeside ? 0 : baselineOf(row, filled, room)
    for (const { box, x } of row.boxes) {
      starts.push({ x, y })
      filled = joinBoxes(filled, moveBox(box, { x, y }))
    }
  }
  return starts
}

function rowsOf(first: Box, boxes: readonly Box[], room: Box): Row[] {
  let row: Row = { isBeside: true, boxes: [] }
  let right = first.right
  const rows = [row]
  for (const box of boxes) {
    let x = snapUp(right + BETWEEN - box.left)
    if (x + box.right > room.right && (row.isBeside || row.boxes.length > 0)) {
      row = { isBeside: false, boxes: [] }
      rows.push(row)
      x = snapUp(room.left - box.left)
    }
    row.boxes.push({ box, x })
    right = x + box.right
  }
  return rows
}

function baselineOf({ boxes }: Row, filled: Box, room: Box): number {
  const top = boxes.reduce((most, { box }) => Math.max(most, box.top), 0)
  const bottom = boxes.reduce((least, { box }) => Math.min(least, box.bottom), 0)
  const below = snapDown(filled.bottom - BETWEEN - top)
  if (below + bottom >= room.bottom) return below
  const above = snapUp(filled.top + BETWEEN - bottom)
  return above + top <= room.top ? above : below
}
