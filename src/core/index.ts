export {
  angleOf,
  cosDegrees,
  degreesFromRadians,
  differenceDegrees,
  radiansFromDegrees,
  sinDegrees,
  wrapDegrees,
} from './angle'
export {
  add,
  type Complex,
  conjugate,
  divide,
  isFiniteComplex,
  magnitudeOf,
  multiply,
  negate,
  scaleBy,
  subtract,
  ZERO,
} from './complex'
export { fromPolar, type Polar, toPolar } from './polar'
export { failure, type Result, success } from './result'
export { resultant, resultantOfPolar, type SignedTerm } from './resultant'
export { isNiceScale, nextScale, niceScale, previousScale } from './scale'
export type { Typed } from './typed'
export { type Quantity, unitOf } from './units'
