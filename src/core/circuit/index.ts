export { type Charge, chargeOf, dischargeTime } from './charge'
export {
  type ElementValues,
  type Impedance,
  impedanceOf,
  inParallel,
  inSeries,
  isShort,
} from './impedance'
export { type Drive, type Flow, flowsIn, impedanceOfNetwork, type Network } from './network'
export { type Power, powerOf, totalPower } from './power'
export {
  elementValuesOf,
  networkOf,
  type Place,
  type Predicted,
  type PredictedElement,
  type PredictedTree,
  type PredictionProblem,
  predict,
  type Toleranced,
} from './prediction'
export { type ElementTree, type Resonance, resonanceOf } from './resonance'
