import {
  type Edit,
  type HandArrow,
  type Id,
  newId,
  type Place,
  type Seat,
  type Sheet,
  seatsOf,
} from '../../sheet'
import type { Scene } from '../scene'
import { startOfSum } from './construction'
import { isTogether, movedAlong } from './joined'
import { moveHandTip, type RuleAndProtractor, tipOf } from './redraw'

/** Which arrow of a construction: a term by its place in the sum, or the closing arrow. */
export type Position = number | 'closing'

/** The hand arrow that stands at a place of a sum; undefined where it was not drawn. */
export function handArrowAt(sheet: Sheet, sum: Id, position: Position): HandArrow | undefined {
  return seatsOf(sheet).find((seat) => seat.sum?.id === sum && seat.position === position)?.arrow
}

/** What an arrow at a place of a sum stands for; undefined where the sum has no such term. */
export function standsAt(
  sheet: Sheet,
  sum: Id,
  position: Position,
): HandArrow['stands'] | undefined {
  if (position === 'closing') return position
  return sheet.sums?.find(({ id }) => id === sum)?.terms[position]?.phasor
}

/**
 * The edit that draws an arrow of a construction as rule and protractor say. One that is there keeps
 * its tail; a new one begins at the tip of the term before it, the first and the closing arrow where
 * the construction does; what hangs on its tip moves along. Undefined where the sum has no such term.
 */
export function typeHandArrow(
  sheet: Sheet,
  scene: Scene,
  sum: Id,
  position: Position,
  typed: RuleAndProtractor,
): Edit | undefined {
  const known = handArrowAt(sheet, sum, position)
  if (known) return moveHandTip(sheet, known, tipOf(known.from, typed))
  const stands = standsAt(sheet, sum, position)
  if (stands === undefined) return undefined
  const from = tailFor(sheet, scene, sum, position)
  const to = tipOf(from, typed)
  const id = newId(sheet, 'h1')
  const edit: Edit = { kind: 'set-hand-arrow', id, sum, stands, from, to }
  const along = position === 'closing' ? [] : pushedOn(sheet, sum, position, from, to)
  return along.length === 0 ? edit : { kind: 'several', edits: [edit, ...along] }
}

/** Where an arrow begins that is not drawn yet. */
function tailFor(sheet: Sheet, scene: Scene, id: Id, position: Position): Place {
  const seats = termSeats(sheet, id)
  const [first] = seats
  const sum = sheet.sums?.find((each) => each.id === id)
  const start = first?.arrow.from ?? (sum ? startOfSum(scene, sum) : scene.origin)
  if (position === 'closing' || sum?.arrangement === 'from-origin') return start
  const before = seats.findLast((seat) => (seat.position as number) < position)
  return before?.arrow.to ?? start
}

/** A term that is put in before others moves on those that began where it does. */
function pushedOn(
  sheet: Sheet,
  sum: Id,
  position: number,
  from: Place,
  to: Place,
): readonly Edit[] {
  if (sheet.sums?.find(({ id }) => id === sum)?.arrangement === 'from-origin') return []
  const seats = termSeats(sheet, sum)
  const later = seats.filter((seat) => (seat.position as number) > position)
  if (!later.some(({ arrow }) => isTogether(arrow.from, from))) return []
  const earlier = seats.filter((seat) => (seat.position as number) < position)
  const by = { x: to.x - from.x, y: to.y - from.y }
  return movedAlong(sheet, sum, from, by, new Set(earlier.map(({ arrow }) => arrow.id)))
}

/** The terms of a sum that were drawn, in its order. */
function termSeats(sheet: Sheet, sum: Id): readonly Seat[] {
  return seatsOf(sheet)
    .filter((seat) => seat.sum?.id === sum && typeof seat.position === 'number')
    .sort((one, other) => (one.position as number) - (other.position as number))
}
