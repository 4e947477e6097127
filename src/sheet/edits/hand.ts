import { failure, type Result, success } from '../../core'
import { idsOf } from '../checks/ids'
import { MAXIMUM_ENTRIES } from '../limits'
import { labelOf, nameOfSum } from '../names'
import { isId } from '../schema/text'
import type { HandArrow, Id, Place, Sheet } from '../types'
import { withChange } from './change'
import type { EditKind } from './edit-kind'
import { orNone } from './lists'

/**
 * Draws an arrow by hand, or where the sheet has a hand arrow of that id, draws it anew. Places are in
 * millimetres on the paper.
 */
export interface SetHandArrow {
  readonly kind: 'set-hand-arrow'
  readonly id: Id
  readonly sum?: Id
  readonly stands: HandArrow['stands']
  readonly from: Place
  readonly to: Place
}

/** Rubs a hand arrow out. */
export interface RemoveHandArrow {
  readonly kind: 'remove-hand-arrow'
  readonly id: Id
}

/** Rubs out all hand arrows, or those of one sum. */
export interface ClearHand {
  readonly kind: 'clear-hand'
  readonly sum?: Id
}

/** Draws an arrow by hand. Whoever draws the first pins the drawing with it: its scale then stays. */
export const setHandArrow: EditKind<SetHandArrow> = {
  apply: (sheet, { kind: _, ...arrow }) => {
    const hand = sheet.hand ?? []
    const at = hand.findIndex(({ id }) => id === arrow.id)
    const fit = checkArrow(sheet, arrow, at < 0)
    if (!fit.ok) return fit
    const before = hand[at]
    // Fields that nobody knows stay with the arrow.
    const drawn = before ? { ...withChange<HandArrow>(before, { sum: null }), ...arrow } : arrow
    return success(withHand(sheet, at < 0 ? [...hand, drawn] : hand.with(at, drawn)))
  },
  describe: (sheet, arrow) =>
    `${sheet.hand?.some(({ id }) => id === arrow.id) ? 'Redraw' : 'Draw'} ${nameOf(sheet, arrow)} by hand`,
  isLight: true,
}

/** Rubs a hand arrow out. */
export const removeHandArrow: EditKind<RemoveHandArrow> = {
  apply: (sheet, { id }) => {
    const hand = sheet.hand ?? []
    const left = hand.filter((arrow) => arrow.id !== id)
    return left.length === hand.length ? failure(noArrow(id)) : success(withHand(sheet, left))
  },
  describe: (sheet, { id }) => {
    const arrow = sheet.hand?.find((each) => each.id === id)
    return arrow ? `Rub out ${nameOf(sheet, arrow)}` : 'Rub out a hand arrow'
  },
}

/** Rubs out hand arrows. */
export const clearHand: EditKind<ClearHand> = {
  apply: (sheet, { sum }) => {
    const left = sum === undefined ? [] : (sheet.hand ?? []).filter((arrow) => arrow.sum !== sum)
    return success(withHand(sheet, left))
  },
  describe: (sheet, { sum }) =>
    sum === undefined
      ? 'Rub out all hand arrows'
      : `Rub out the hand arrows of ${nameOfSum(sheet, sum)}`,
}

function withHand(sheet: Sheet, hand: readonly HandArrow[]): Sheet {
  if (hand.length === (sheet.hand?.length ?? 0) && hand.length === 0) return sheet
  return withChange<Sheet>(sheet, { hand: orNone(hand) })
}

function checkArrow(sheet: Sheet, arrow: HandArrow, isNew: boolean): Result<HandArrow> {
  const { id, sum, stands, from, to } = arrow
  if (![from.x, from.y, to.x, to.y].every(Number.isFinite)) {
    return failure('The arrow must begin and end at places on the paper.')
  }
  if (sum !== undefined && !sheet.sums?.some((each) => each.id === sum)) {
    return failure(`There is no sum "${sum}" on this sheet.`)
  }
  if (stands !== 'closing' && !sheet.phasors.some((phasor) => phasor.id === stands)) {
    return failure(`There is no phasor "${stands}" on this sheet.`)
  }
  if (!isNew) return success(arrow)
  if (!isId(id) || idsOf(sheet).has(id)) {
    return failure(`The id "${id}" is taken, or no name for an arrow: choose another.`)
  }
  return (sheet.hand?.length ?? 0) < MAXIMUM_ENTRIES
    ? success(arrow)
    : failure(`A sheet has no more than ${MAXIMUM_ENTRIES} hand arrows: rub some out first.`)
}

function noArrow(id: Id): string {
  return `There is no hand arrow "${id}" on this sheet.`
}

function nameOf(sheet: Sheet, { stands, sum }: Pick<HandArrow, 'stands' | 'sum'>): string {
  if (stands !== 'closing') return labelOf(sheet, stands)
  const closed = sum ?? sheet.sums?.[0]?.id
  return closed === undefined
    ? 'the closing arrow'
    : `the closing arrow of ${nameOfSum(sheet, closed)}`
}
