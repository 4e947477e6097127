import type { Box } from '../geometry'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { WIDTHS } from './style'

/** The sheet of paper itself. */
export function paperItem(size: { width: number; height: number }, palette: Palette): Item {
  const { width, height } = size
  return {
    part: 'paper',
    kind: 'path',
    points: [0, 0, width, 0, width, height, 0, height],
    closed: true,
    fill: palette.paper,
  }
}

/** The grid inside a frame: every millimetre, and every tenth stronger. */
export function gridItems(frame: Box, palette: Palette): Item[] {
  const fine: number[] = []
  const strong: number[] = []
  const addUpright = (x: number, target: number[]) => target.push(x, frame.bottom, x, frame.top)
  const addLevel = (y: number, target: number[]) => target.push(frame.left, y, frame.right, y)
  for (let x = frame.left + 1; x < frame.right; x += 1) {
    addUpright(x, x % 10 === 0 ? strong : fine)
  }
  for (let y = frame.bottom + 1; y < frame.top; y += 1) {
    addLevel(y, y % 10 === 0 ? strong : fine)
  }
  return [
    {
      part: 'grid',
      kind: 'lines',
      segments: fine,
      stroke: palette.fineGrid,
      width: WIDTHS.fineGrid,
    },
    { part: 'grid', kind: 'lines', segments: strong, stroke: palette.grid, width: WIDTHS.grid },
  ]
}

/** The frame. */
export function frameItem({ left, bottom, right, top }: Box, palette: Palette): Item {
  return {
    part: 'frame',
    kind: 'path',
    points: [left, bottom, right, bottom, right, top, left, top],
    closed: true,
    stroke: palette.ink,
    width: WIDTHS.frame,
  }
}
