export { createEstimateWorker } from './create'
export { createEstimator, type EstimateWorker, type Estimator, type Reply } from './estimator'
export { settledAnswer, type Timers, watchEstimate } from './watch'
