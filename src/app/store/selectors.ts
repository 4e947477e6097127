import {
  asAdjusted,
  type Evaluation,
  type Id,
  quick,
  type Sheet,
  type Sum,
  withFormerValues,
} from '../../sheet'
import type { Answer, State } from './state'

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

/** The evaluation of an answer as the board shows it: as read, or adjusted where that is known. */
export function evaluationShown(answer: Answer, values: State['values']): Evaluation {
  if (values === 'read' || answer.whole === undefined) return answer.evaluation
  const known = adjusted.get(answer)
  if (known) return known
  const evaluation = asAdjusted(answer.sheet, answer.whole)
  adjusted.set(answer, evaluation)
  return evaluation
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
