export { Sums } from './Sums'
