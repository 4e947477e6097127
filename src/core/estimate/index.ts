export {
  combinedUncertainty,
  coverageFactor,
  effectiveFreedom,
  expandedUncertainty,
  NORMAL_95,
  type UncertaintyPart,
} from './coverage'
export {
  chiSquarePoint,
  chiSquareTail,
  normalTwoSidedPoint,
  normalTwoTails,
  studentTwoSidedPoint,
  studentTwoTails,
} from './distributions'
export { Drawing, type Found, type ObservationOutcome, type TipCovariance } from './drawing'
export {
  type EstimateOptions,
  estimatePhasors,
  type PhasorEstimate,
  type Wanted,
} from './estimate'
export { type Layout, layoutOf } from './layout'
export {
  type LeastSquaresSolution,
  type SolverOptions,
  solveLeastSquares,
} from './least-squares'
export {
  covarianceOf,
  Linearisation,
  type QuantitySpread,
  uncertaintyOf,
} from './linearisation'
export { type Missing, type MissingReadings, missingReadings } from './missing'
export type {
  ClosedSum,
  ElementIndex,
  ElementModel,
  Observable,
  Observation,
  PhasorIndex,
  PhasorProblem,
  SharedError,
  SharedErrorIndex,
  SharedPart,
} from './phasor-problem'
export { type Equations, type LeastSquaresProblem, NO_EQUATIONS } from './problem'
export { createRandom, normalDeviate, type Random, rectangularDeviate } from './random'
export { regionOf, type TipRegion } from './region'
export { type ProblemPart, splitProblem } from './split'
