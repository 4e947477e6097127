import { type Evaluation, type Id, quick, type Sheet, type Sum } from '../../sheet'
import type { Answer, State } from './state'

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
