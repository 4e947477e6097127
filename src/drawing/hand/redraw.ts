import { angleOf, fromPolar, wrapDegrees } from '../../core'
import type { Edit, HandArrow, Place, Sheet } from '../../sheet'
import { movedAlong, redrawn, shifted } from './joined'

/** A hand arrow as rule and protractor say it: millimetres, and degrees from the reference. */
export interface RuleAndProtractor {
  readonly millimetres: number
  readonly degrees: number
}

/** What rule and protractor say of an arrow as it lies on the paper; 0° where it has no length. */
export function measureOf(from: Place, to: Place): RuleAndProtractor {
  const [re, im] = [to.x - from.x, to.y - from.y]
  return { millimetres: Math.hypot(re, im), degrees: angleOf({ re, im }) }
}

/** Where an arrow ends that begins at a place and is so long, at so many degrees. */
export function tipOf(from: Place, { millimetres, degrees }: RuleAndProtractor): Place {
  const { re, im } = fromPolar(millimetres, degrees)
  return { x: from.x + re, y: from.y + im }
}

/** The edit that puts the tip of a hand arrow somewhere else; what hangs on it moves along. */
export function moveHandTip(sheet: Sheet, arrow: HandArrow, to: Place): Edit {
  const by = { x: to.x - arrow.to.x, y: to.y - arrow.to.y }
  return several(
    redrawn(arrow, arrow.from, to),
    movedAlong(sheet, arrow.sum, arrow.to, by, new Set([arrow.id])),
  )
}

/** The edit that moves a whole hand arrow by a distance in millimetres, with what hangs on its tip. */
export function moveHandArrow(sheet: Sheet, arrow: HandArrow, by: Place): Edit {
  return several(
    redrawn(arrow, shifted(arrow.from, by), shifted(arrow.to, by)),
    movedAlong(sheet, arrow.sum, arrow.to, by, new Set([arrow.id])),
  )
}

/** The edit that lengthens a hand arrow by so many millimetres and turns it by so many degrees. */
export function nudgeHand(sheet: Sheet, arrow: HandArrow, by: RuleAndProtractor): Edit {
  const { millimetres, degrees } = measureOf(arrow.from, arrow.to)
  const next = {
    millimetres: Math.max(0, millimetres + by.millimetres),
    degrees: wrapDegrees(degrees + by.degrees),
  }
  return moveHandTip(sheet, arrow, tipOf(arrow.from, next))
}

function several(first: Edit, others: readonly Edit[]): Edit {
  return others.length === 0 ? first : { kind: 'several', edits: [first, ...others] }
}
