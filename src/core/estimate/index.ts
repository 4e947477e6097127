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
export { type Equations, type LeastSquaresProblem, NO_EQUATIONS } from './problem'
