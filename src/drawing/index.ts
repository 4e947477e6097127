export { type Displacement, displacementBetween } from './displacement'
export { dragBody, dragTip, pinDrawing, type TipDrag, whyTipIsHeld } from './drag'
export { type Drop, dropAt } from './drop'
export { measureText } from './font/measure'
export { shorten } from './font/shorten'
export type { Box } from './geometry'
export { type Grip, gripAt } from './grip'
export type { ConstructionLines } from './hand/construction'
export { hasScale, type Meaning, NO_SCALE, placeStroke, valueOfStroke } from './hand/place-stroke'
export { measureOf, nudgeHand, type RuleAndProtractor, tipOf } from './hand/redraw'
export { type DrawingMode, type Stroke, snapTail, strokeTo, type Tail } from './hand/snap'
export { strokeItems } from './hand/stroke-items'
export { handArrowAt, type Position, standsAt, typeHandArrow } from './hand/typed'
export { type LayoutOptions, layout } from './layout'
export { nudge } from './nudge'
export { frameOf, isOffPaper, paperSizeOf } from './paper'
export type { Frozen } from './placement/place'
export { boundsOf, boundsOfAll, distance } from './primitives'
export { HALO_WIDTH } from './primitives/text'
export { SAMPLE_SIZE, sampleArrow } from './sample'
export type {
  ArcItem,
  Item,
  LinesItem,
  PathItem,
  PlacedArrow,
  Scene,
  TextItem,
  TextRun,
} from './scene'
export { describeCircuit } from './schematic/description'
export { gapText, type StampWords, stampWordsOf } from './stamp/words'
export { svg } from './svg/document'
export { digitsOfDrawn, formatDrawn, nameOfDrawn } from './text/hand-text'
export { labelRuns } from './text/label-runs'
export { digitsOfResult } from './text/phasor-text'
export { formatScale } from './text/quantity-text'
export {
  coarser,
  type Digits,
  digitsOf,
  type PhasorDigits,
  type ReadingsByPhasor,
  readingsByPhasor,
} from './text/resolution'
export { type Palette, paletteOf, type Theme } from './theme'
