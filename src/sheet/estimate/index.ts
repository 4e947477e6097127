export { evaluate } from './evaluate'
export { problemOfSheet, type SheetProblem } from './sheet-problem'
