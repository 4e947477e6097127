import { type Box, growBox } from '../geometry'
import type { Occupancy } from '../labels/occupancy'

/** How far apart the places are that are tried, in millimetres. */
const STEP = 2
/** What is best left free round a stamp, in millimetres, the most generous first. */
const MARGINS = [6, 3, 1]

/**
 * Where a stamp of a size stands: clear of all that is drawn, as near to the upper right corner of the
 * region as it can. Undefined where there is no room.
 */
export function roomForStamp(
  occupancy: Occupancy,
  region: Box,
  { width, height }: { readonly width: number; readonly height: number },
): Box | undefined {
  for (const margin of MARGINS) {
    let best: Box | undefined
    let least = Number.POSITIVE_INFINITY
    for (let top = region.top - margin; top - height >= region.bottom + margin; top -= STEP) {
      for (
        let right = region.right - margin;
        right - width >= region.left + margin;
        right -= STEP
      ) {
        const away = Math.hypot(region.right - right, region.top - top)
        if (away >= least) break
        const box = { left: right - width, right, top, bottom: top - height }
        if (!occupancy.isFree(growBox(box, margin))) continue
        best = box
        least = away
      }
    }
    if (best) return best
  }
  return undefined
}
