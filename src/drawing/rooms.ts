import { type Box, growBox } from './geometry'
import type { Occupancy } from './labels/occupancy'

/** How far apart the places are that are tried, in millimetres. */
const STEP = 2
/** What is best left free round it, in millimetres, the most generous first. */
const MARGINS = [6, 3, 1]

/** The upper corner of the region in which a thing stands by preference. */
export type Corner = 'left' | 'right'

/**
 * Where a thing of a size stands: clear of all that is drawn, as near to an upper corner of the region as
 * it can. Undefined where there is no room.
 */
export function roomNear(
  corner: Corner,
  occupancy: Occupancy,
  region: Box,
  { width, height }: { readonly width: number; readonly height: number },
): Box | undefined {
  for (const margin of MARGINS) {
    let best: Box | undefined
    let least = Number.POSITIVE_INFINITY
    const [widest, highest] = [
      region.right - region.left - width - 2 * margin,
      region.top - region.bottom - height - 2 * margin,
    ]
    for (let down = 0; down <= highest; down += STEP) {
      for (let across = 0; across <= widest; across += STEP) {
        const away = Math.hypot(margin + across, margin + down)
        if (away >= least) break
        const box = boxAt(corner, region, margin + across, margin + down, width, height)
        if (!occupancy.isFree(growBox(box, margin))) continue
        best = box
        least = away
      }
    }
    if (best) return best
  }
  return undefined
}

function boxAt(
  corner: Corner,
  region: Box,
  across: number,
  down: number,
  width: number,
  height: number,
): Box {
  const top = region.top - down
  const left = corner === 'left' ? region.left + across : region.right - across - width
  const right = corner === 'left' ? region.left + across + width : region.right - across
  return { left, right, top, bottom: top - height }
}
