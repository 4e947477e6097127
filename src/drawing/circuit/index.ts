/*
 * What the page shows of a circuit beside the sheet. It is a door of its own, so that the first load does
 * without it.
 */
export { schematicScene } from '../schematic/scene'
export { type ComparedPart, type ComparedRow, comparisonRows } from './comparison-text'
export { type ImpedanceRow, impedanceRows } from './impedance-text'
export { type PowerRow, powerRows } from './power-text'
export { resonanceText } from './resonance-text'
export { triangleScene } from './triangle-scene'
export { type TriangleKind, type TriangleSubject, triangleSubjects } from './triangle-subjects'
