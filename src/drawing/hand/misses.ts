import { type Evaluation, type Id, type Sheet, seatsOf, tipErrorOf } from '../../sheet'
import type { Gap } from '../items/gaps'
import { keyOfHand } from './arrows'

/** A smaller miss is no more than a line's width: no bar is drawn, in millimetres. */
const LEAST = 0.05

/** How far the tip of a hand arrow is from its exact place. */
export interface Miss extends Gap {
  /** It ends a construction: how far the whole of it is off. */
  readonly isClosing: boolean
}

/** The misses of the hand arrows, but for those of a sum whose exact drawing is hidden. */
export function missesOf(
  sheet: Sheet,
  evaluation: Evaluation,
  hidden: ReadonlySet<Id> | undefined,
): Miss[] {
  if (sheet.hand === undefined) return []
  const found = new Map(evaluation.hand.map((each) => [each.id, each]))
  return seatsOf(sheet).flatMap(({ arrow, quantity, sum, position }) => {
    const error = tipErrorOf(found.get(arrow.id))
    const scale = sheet.drawing?.unitsPerCentimetre?.[quantity]
    if (!error || scale === undefined || (sum && hidden?.has(sum.id))) return []
    const exact = {
      x: arrow.to.x - (error.real * 10) / scale,
      y: arrow.to.y - (error.imaginary * 10) / scale,
    }
    const millimetres = Math.hypot(arrow.to.x - exact.x, arrow.to.y - exact.y)
    if (!(millimetres >= LEAST) || !Number.isFinite(millimetres)) return []
    const isClosing = position === 'closing'
    return [{ key: keyOfHand(arrow.id), from: arrow.to, to: exact, millimetres, isClosing }]
  })
}
