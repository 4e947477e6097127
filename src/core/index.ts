export type { Complex } from './complex'
export { failure, type Result, success } from './result'
