import type { EstimateWorker } from './estimator'

/** Starts a worker of its own chunk, which alone holds the linear algebra. */
export function createEstimateWorker(): EstimateWorker {
  return new Worker(new URL('./estimate.worker.ts', import.meta.url), { type: 'module' })
}
