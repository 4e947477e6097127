export { BeforeMeasuring } from './BeforeMeasuring'
export { Findings } from './Findings'
export { ReportVerb } from './ReportVerb'
