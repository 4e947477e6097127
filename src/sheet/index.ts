export { asAdjusted, asAlternative, asFormerlyAdjusted, withFormerValues } from './adjusted'
export { type AssumedLimits, assumedOf } from './assumed'
export { type FoundValue, type FoundVerdict, foundBesideMark } from './circuit/found'
export { nameOfElement } from './circuit/names'
export { partedFrom } from './circuit/parted'
export {
  branchesOf,
  type CircuitGroup,
  type CircuitPath,
  type Form,
  formOf,
  isGroup,
  nodeAt,
  pathOf,
} from './circuit/tree'
export {
  formatElementLimit,
  formatElementValue,
  parseElementValue,
} from './circuit/value-text'
export {
  countedValue,
  countsInCheck,
  type ElementValue,
  hasValue,
  type MarkedValue,
  markedValue,
  nameOfElementValue,
  predictingValue,
  unitOfElementValue,
  valuesOfKind,
} from './circuit/values'
export { type WiredNode, wiredAt, wiredNodes, wiringOf } from './circuit/wiring'
export { serializeSheet } from './codec-file'
export { parseLink, serializeLink } from './codec-link'
export { parseShown as parseShownValue } from './digits'
export { apply, describeEdit, type Edit, type Several } from './edit'
export type { Change } from './edits/change'
export { nameOfChannel } from './edits/channels'
export { nameOfInstrument } from './edits/instruments'
export { describeRemoval } from './edits/remove-phasor'
export type { ValuePart } from './edits/set-value'
export { quick } from './evaluate'
export type * from './evaluation'
export { emptySheet, exampleSheet } from './example'
export { type ShownFigure, shownFigures } from './figures'
export { fingerprintOf } from './fingerprint'
export { type Contribution, largestContribution, tipErrorOf } from './hand/contribution'
export { type Seat, seatsOf } from './hand/seats'
export { toleranceOf } from './hand/tolerance'
export { hazardsFrom, missingHazards, usualHazards } from './hazards'
export { type Held, heldBy } from './held'
export { commit, createHistory, type History, redo, type Step, undo } from './history'
export * from './limits'
export { type Move, movesOf } from './moves'
export { labelOf, NAMES_OF_KINDS, nameOfReading } from './names'
export { newId } from './new-id'
export { parseSheet, parseSheetText } from './parse-sheet'
export { extractSheetFromPdf, isPdf } from './pdf-attachment'
export { type LimitedTerm, standardUncertaintyOf } from './readings/combine'
export { createReading, type ReadingSubject } from './readings/create'
export { formulasOf } from './readings/formulas'
export { observedOf } from './readings/indication'
export { type Lead, leadOf } from './readings/lead'
export { limitOf, type ReadingLimit } from './readings/limit'
export type { LimitPart, SharedLimitPart } from './readings/limit-part'
export { type NextReading, nextReading } from './readings/next'
export type { Observed } from './readings/observed'
export {
  numbersIn,
  READING_COLUMNS,
  type ReadingRows,
  readingTable,
  readReadingRows,
} from './readings/rows'
export { parseReadingText, type ReadingFigures, readingText } from './readings/text'
export { angleSentence, wordsOf } from './readings/words'
export { referenceOf } from './reference'
export { type Remark, remarksOn } from './remarks'
export { type RowsRead, readRows, tableOf } from './rows'
export { formatErrors, type SheetError, type SheetResult } from './sheet-result'
export {
  type Signature,
  type SignatureKind,
  signatureOf,
  voidedBetween,
  voidedSignatureOf,
} from './signatures'
export { extractSheetText } from './svg-metadata'
export { readingsTable } from './tables/readings-table'
export { scheduleTable } from './tables/schedule-table'
export { sumsTable } from './tables/sums-table'
export type { Cell, Table } from './tables/table'
export type * from './types'
