import {
  asAdjusted,
  asFormerlyAdjusted,
  type Evaluation,
  type Id,
  quick,
  type Sheet,
  type Sum,
  seatsOf,
  withFormerValues,
} from '../../sheet'
import type { Answer, Pen, State } from './state'

const answers = new WeakMap<Sheet, Answer>()
const adjusted = new WeakMap<Answer, Evaluation>()

/** What the program says of a sheet: the whole answer once it came, before it what is known at once. */
export function answerOf(sheet: Sheet): Answer {
  const known = answers.get(sheet)
  if (known) return known
  const answer = { sheet, evaluation: quick(sheet) }
  answers.set(sheet, answer)
  return answer
}

/** Keeps the whole evaluation of a sheet. */
export function keepAnswer(sheet: Sheet, whole: Evaluation): Answer {
  const { phasors } = withFormerValues(sheet, quick(sheet), whole)
  const answer = { sheet, evaluation: { ...whole, phasors }, whole }
  answers.set(sheet, answer)
  return answer
}

/** Until its own answer comes, a sheet goes on with the solved values of the one that it was made from. */
export function continueAnswer(from: Sheet, sheet: Sheet): void {
  if (answers.has(sheet)) return
  const before = answerOf(from)
  const former = before.whole ?? before.former
  const evaluation = withFormerValues(sheet, quick(sheet), former)
  answers.set(sheet, { sheet, evaluation, ...(former && { former }) })
}

/** What is known of a sheet at once, nothing of an older one in it. */
export function quickAnswer(sheet: Sheet): Answer {
  return { sheet, evaluation: quick(sheet) }
}

/** The evaluation of an answer as the board shows it: as read, or adjusted where that was ever known. */
export function evaluationShown(answer: Answer, values: State['values']): Evaluation {
  const { sheet, evaluation, whole, former } = answer
  const best = whole ?? former
  if (values === 'read' || best === undefined) return evaluation
  const known = adjusted.get(answer)
  if (known) return known
  const shown = whole ? asAdjusted(sheet, whole) : asFormerlyAdjusted(sheet, evaluation, best)
  adjusted.set(answer, shown)
  return shown
}

const nothingFormer: ReadonlySet<Id> = new Set()

/** The phasors that are shown with a value of the sheet before, until the whole answer comes. */
export function formerPhasors(answer: Answer, values: State['values'] = 'read'): ReadonlySet<Id> {
  const { evaluation, whole, former } = answer
  if (whole !== undefined || former === undefined) return nothingFormer
  const shown = values === 'adjusted' ? former : evaluation
  return new Set(
    shown.phasors.flatMap(({ id, magnitudeState, angleState }) =>
      values === 'adjusted' || magnitudeState === 'solved' || angleState === 'solved' ? [id] : [],
    ),
  )
}

/** The answer for the sheet as the page shows it. */
export function shownAnswer(state: State): Answer {
  return answerOf(shownSheet(state))
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
