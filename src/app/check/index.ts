export { CheckLine } from './CheckLine'
