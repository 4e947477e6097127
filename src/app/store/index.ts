export { StoreContext, usePage, usePageStore } from './context'
export { describeAnswer, nameOfSum, quantityOfSum } from './describe'
export { createIdentity, createName } from './identity'
export {
  answerOf,
  checkedSum,
  evaluationShown,
  formerPhasors,
  hiddenSums,
  isConstructed,
  quickAnswer,
  shownAnswer,
  shownEvaluation,
  shownSheet,
} from './selectors'
export type {
  Answer,
  Copy,
  Draft,
  Identity,
  Notice,
  Origin,
  Pen,
  Progress,
  Selection,
  Shelved,
  State,
} from './state'
export { type Actions, createStore, type Store } from './store'
