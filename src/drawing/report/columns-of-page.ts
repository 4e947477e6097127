import type { Box } from '../geometry'
import { frameOf } from '../paper'
import { STRIP_HEIGHT } from './strip'

/** How far the text lies inside the frame, in millimetres. */
const INSET = { side: 6, top: 5.5, bottom: 4 }
/** Free millimetres between two columns. */
const BETWEEN = 9
/** No column is narrower than this: a table of readings needs as much. */
const NARROWEST = 122

/** The columns of a page of text, from left to right: one, two or three, as its paper is wide. */
export function columnsOf(size: { readonly width: number; readonly height: number }): Box[] {
  const frame = frameOf(size)
  const left = frame.left + INSET.side
  const width = frame.right - INSET.side - left
  const count = Math.max(1, Math.floor((width + BETWEEN) / (NARROWEST + BETWEEN)))
  const own = (width - (count - 1) * BETWEEN) / count
  return Array.from({ length: count }, (_, at) => ({
    left: left + at * (own + BETWEEN),
    right: left + at * (own + BETWEEN) + own,
    bottom: frame.bottom + STRIP_HEIGHT + INSET.bottom,
    top: frame.top - INSET.top,
  }))
}
