export { Schedule } from './Schedule'
