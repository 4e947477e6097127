import { type Evaluation, type Id, quick, type Sheet, type Sum, seatsOf } from '../../sheet'
import type { Answer, Pen, State } from './state'

const answers = new WeakMap<Sheet, Answer>()

/** What the program says of a sheet; computed once for each sheet. */
export function answerOf(sheet: Sheet): Answer {
  const known = answers.get(sheet)
  if (known) return known
  const answer = { sheet, evaluation: quick(sheet) }
  answers.set(sheet, answer)
  return answer
}

/** The sheet as the page shows it: the draft while a drag lasts, else the committed one. */
export function shownSheet(state: State): Sheet {
  return state.draft?.sheet ?? state.history.sheet
}

/** The evaluation of the sheet as the page shows it. */
export function shownEvaluation(state: State): Evaluation {
  return answerOf(shownSheet(state)).evaluation
}

/** The sum that the check line is about, of the sheet as shown. */
export function checkedSum(sheet: Sheet, chosen: Id | undefined): Sum | undefined {
  const sums = sheet.sums ?? []
  return sums.find((sum) => sum.id === chosen) ?? sums[0]
}

/** Whether the sheet has that phasor. */
export function hasPhasor(sheet: Sheet, id: Id): boolean {
  return sheet.phasors.some((phasor) => phasor.id === id)
}

/** Whether the sheet has that sum. */
export function hasSum(sheet: Sheet, id: Id): boolean {
  return (sheet.sums ?? []).some((sum) => sum.id === id)
}

/** Whether the sheet has that hand arrow. */
export function hasHandArrow(sheet: Sheet, id: Id): boolean {
  return (sheet.hand ?? []).some((arrow) => arrow.id === id)
}

const nothingHidden: ReadonlySet<Id> = new Set()
const hiddenAlone = new Map<Id, ReadonlySet<Id>>()

/**
 * The sums whose exact drawing is hidden: the one in the check line while it is constructed by hand,
 * until its last arrow is drawn or the user asks. The same set while nothing changes.
 */
export function hiddenSums(sheet: Sheet, pen: Pen, chosen: Id | undefined): ReadonlySet<Id> {
  if (pen.mode !== 'hand' || pen.isExactShown) return nothingHidden
  const sum = checkedSum(sheet, chosen)
  if (!sum || isConstructed(sheet, sum)) return nothingHidden
  const known = hiddenAlone.get(sum.id)
  if (known) return known
  const alone = new Set([sum.id])
  hiddenAlone.set(sum.id, alone)
  return alone
}

/** Whether a hand drew every term of a sum and closed it. */
export function isConstructed(sheet: Sheet, sum: Sum): boolean {
  const drawn = seatsOf(sheet).filter(
    (seat) => seat.sum?.id === sum.id && seat.position !== undefined,
  )
  return drawn.length === sum.terms.length + 1
}
