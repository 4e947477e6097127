import { formatQuantity, unitOf } from '../../../core'
import type {
  ComparisonEvaluation,
  ElementEvaluation,
  PhasorEvaluation,
  PowerEvaluation,
  ResonanceEvaluation,
} from '../../evaluation'
import type { PhasorId, Sheet } from '../../types'

/** The figures of an evaluation that cautions rest on. */
export interface Figures {
  readonly phasors: readonly PhasorEvaluation[]
  readonly elements: readonly ElementEvaluation[]
  readonly comparison: readonly ComparisonEvaluation[]
  readonly power: readonly PowerEvaluation[]
  readonly resonance: ResonanceEvaluation | undefined
}

/** The largest size that is known of a phasor, and how it is known. */
export interface Size {
  readonly id: PhasorId
  readonly label: string
  readonly value: number
  /** The figure with its unit and where it comes from: `123 V (predicted)`. */
  readonly text: string
}

/** The larger of a phasor's best and predicted magnitude; undefined where neither is known. */
export function sizeOf(sheet: Sheet, figures: Figures, id: PhasorId): Size | undefined {
  const phasor = sheet.phasors.find((each) => each.id === id)
  const best = figures.phasors.find((each) => each.id === id)
  const predicted = figures.comparison.find((each) => each.phasor === id)?.predicted
  const [known = -1, expected = -1] = [best?.magnitude, predicted?.magnitude]
  if (phasor === undefined || Math.max(known, expected) < 0) return undefined
  const isKnown = known >= expected
  const value = isKnown ? known : expected
  const figure = formatQuantity(value, unitOf(phasor.quantity), { digits: 3 })
  const word = isKnown ? (best?.asRead.magnitude === undefined ? ' (solved)' : '') : ' (predicted)'
  return { id, label: phasor.label, value, text: `${figure}${word}` }
}

/** How every caution ends: the figures are of the sheet, the say is of those who answer for the work. */
export const LAST_WORD = 'Local rules and licensed practice have the last word.'

/** Above this much of a limit it is passed: no rounding, and no reading at the limit itself, passes it. */
export const ABOVE = 1 + 1e-9

/** Names in a sentence: `A, B and C`. */
export function listed(names: readonly string[]): string {
  if (names.length < 2) return names.join('')
  return `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`
}
