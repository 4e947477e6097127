import { type Id, type Sheet, seatsOf } from '../../sheet'
import type { PlacedArrow } from '../scene'

/** The key of a hand arrow in a scene. */
export function keyOfHand(id: Id): string {
  return `hand:${id}`
}

/** The arrows that a hand drew, where the sheet says that they lie. */
export function handArrowsOf(sheet: Sheet): PlacedArrow[] {
  if (sheet.hand === undefined) return []
  return seatsOf(sheet).map(({ arrow: { id, from, to }, sum, sign, quantity, position }) => ({
    key: keyOfHand(id),
    role: 'hand',
    hand: id,
    sign,
    quantity,
    from,
    to,
    ...(sum && { sum: sum.id }),
    ...(position === 'closing' && { isClosing: true }),
  }))
}

/** The arrows that are shown: of a sum that is hidden, only those that a hand drew. */
export function shownArrows(
  sheet: Sheet,
  placed: readonly PlacedArrow[],
  hidden: ReadonlySet<Id> | undefined,
): readonly PlacedArrow[] {
  const hand = handArrowsOf(sheet)
  const isShown = ({ sum }: PlacedArrow) => sum === undefined || !hidden?.has(sum)
  const calculated = hidden === undefined || hidden.size === 0 ? placed : placed.filter(isShown)
  return hand.length === 0 ? calculated : [...calculated, ...hand]
}
