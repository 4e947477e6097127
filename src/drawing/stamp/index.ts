import type { Evaluation, Sheet } from '../../sheet'
import type { Box } from '../geometry'
import { createGround } from '../labels/ground'
import { roomNear } from '../rooms'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { sizeOfStamp, stampItems } from './items'
import { stampWordsOf } from './words'

/** A stamp as it stands on the sheet, and the boxes that labels keep out of. */
export interface Stamp {
  readonly items: readonly Item[]
  readonly boxes: readonly Box[]
  readonly isLeftOut: boolean
}

/** Where nothing was judged. */
export const NO_STAMP: Stamp = { items: [], boxes: [], isLeftOut: false }

/** How large a stamp is tried, as shares of its full size: a crowded sheet takes a smaller one. */
const SCALES = [1, 0.8, 0.65]

/**
 * The verdict as a stamp where the drawing leaves room; left out where it leaves none.
 *
 * @param items What is drawn so far.
 * @param fences Boxes that the stamp keeps out of.
 * @param former The evaluation of an older sheet, stamped in grey where the new one has no verdict yet.
 */
export function createStamp(
  sheet: Sheet,
  evaluation: Evaluation,
  former: Evaluation | undefined,
  { items, frame, fences }: { items: readonly Item[]; frame: Box; fences: readonly Box[] },
  palette: Palette,
): Stamp {
  const isFormer = evaluation.agreement === undefined && former !== undefined
  const words = stampWordsOf(sheet, isFormer ? former : evaluation)
  if (words === undefined) return NO_STAMP
  const { occupancy, region } = createGround(items, frame, fences)
  for (const scale of SCALES) {
    const room = roomNear('right', occupancy, region, sizeOfStamp(words, scale))
    if (room) {
      const stamped = stampItems(words, room, scale, palette, isFormer)
      return { items: stamped, boxes: [room], isLeftOut: false }
    }
  }
  return { ...NO_STAMP, isLeftOut: true }
}
