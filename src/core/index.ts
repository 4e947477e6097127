export {
  type AccuracyLimits,
  type AccuracyStatement,
  accuracyLimits,
  parseAccuracy,
  totalLimit,
} from './accuracy'
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
export {
  degreesOfEllipse,
  degreesOfPower,
  degreesOfPowerFactor,
  degreesOfShift,
  type Form,
  formFactor,
  interceptOfDegrees,
  rmsOfAverageResponding,
  rmsOfForm,
  shiftOfDegrees,
  type Tilt,
  tiltOfDegrees,
  type Wave,
} from './conversions'
export { type DrawingTolerance, tipErrorAllowed, USUAL_TOLERANCE } from './drawing-tolerance'
export { formatEstimate } from './format-estimate'
export { formatLimit } from './format-limit'
export { decimalPlacesOf, formatNumber } from './format-number'
export { formatAngle, formatPolar, formatRectangular } from './format-phasor'
export { type FormatOptions, formatQuantity } from './format-quantity'
export { type Conversion, FORMULAS } from './formulas'
export { absoluteLimit, asLimit, type Limit } from './limit'
export { parseAngle } from './parse-angle'
export { type CellOptions, type CellPart, type CellValue, parseCell } from './parse-cell'
export { parseNumber } from './parse-number'
export { fromPolar, type Polar, toPolar } from './polar'
export { resolutionOf } from './resolution'
export { failure, type Result, success } from './result'
export { resultant, resultantOfPolar, type SignedTerm } from './resultant'
export { isNiceScale, nextScale, niceScale, previousScale } from './scale'
export { signed } from './signed'
export type { Typed } from './typed'
export { type Quantity, unitOf } from './units'
