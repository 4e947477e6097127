export { AnswerPanel } from './AnswerPanel'
