import type { Sheet } from '../sheet'
import type { Box } from './geometry'
import { scaleBarsHeight } from './items/scale-bars'
import { titleBlockHeight } from './items/title-block'

/** What stays free for labels beside, above and below the arrows, in millimetres. */
const MARGINS = { side: 17, top: 11, bottom: 7 }

/** Where arrows are drawn: the frame less title block and scale bars, and room for labels. */
export function drawingAreaOf(sheet: Sheet, frame: Box): Box {
  const quantities = new Set(sheet.phasors.map(({ quantity }) => quantity))
  const strip = Math.max(titleBlockHeight(sheet), scaleBarsHeight(quantities.size))
  return {
    left: frame.left + MARGINS.side,
    right: frame.right - MARGINS.side,
    top: frame.top - MARGINS.top,
    bottom: frame.bottom + strip + MARGINS.bottom,
  }
}
