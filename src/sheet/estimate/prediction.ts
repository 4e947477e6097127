import { failure, type Result, success, toPolar } from '../../core'
import {
  type Predicted,
  type PredictedElement,
  type PredictedTree,
  predict,
  type Toleranced,
} from '../../core/circuit'
import { combinedUncertainty, type UncertaintyPart } from '../../core/estimate'
import { assumedOf } from '../assumed'
import { formOf, isGroup } from '../circuit/tree'
import { predictingValue, valuesOfKind } from '../circuit/values'
import { type Side, type WiredNode, wiredNodes, wiringOf } from '../circuit/wiring'
import type { Limited } from '../evaluation'
import type { CircuitElement, Id, PhasorId, Sheet } from '../types'
import { onlyFinite } from './finite'
import { measuredOf } from './measured'
import type { SheetProblem } from './sheet-problem'

/** What a circuit makes of the one value that drives it. */
export interface Prediction {
  /** The phasor whose magnitude drives it. */
  readonly drive: PhasorId
  /** The phasor from which its angles count. */
  readonly origin: PhasorId
  readonly phasors: ReadonlyMap<PhasorId, Limited>
  /** In Ω, by element; an open one is left out. */
  readonly impedances: ReadonlyMap<Id, Limited>
  /** Of the circuit as a whole, in Ω. */
  readonly whole?: Limited
}

/** The place of a phasor in the circuit. */
interface PlacedPhasor {
  readonly id: PhasorId
  readonly path: readonly number[]
  readonly side: Side
}

/**
 * What the circuit of a sheet predicts, from the magnitude of its supply as typed or read; where it names
 * none, of the first phasor of the circuit that has one. Angles count from the reference where it is in
 * the circuit, else from what drives. Fails with the sentence that says what is missing.
 */
export function predictionOf(sheet: Sheet, problem: SheetProblem): Result<Prediction> | undefined {
  const wiring = wiringOf(sheet)
  if (wiring === undefined || (sheet.elements ?? []).length === 0) return undefined
  const placed = placesIn(wiring)
  const drive = driveOf(sheet, problem, placed)
  if (!drive.ok) return drive
  const frequency = frequencyOf(sheet)
  if (frequency === undefined && needsFrequency(sheet)) {
    return failure('The circuit has a coil or a capacitor: type the frequency to predict from it.')
  }
  const { reference } = problem.asRead
  const origin = placed.find(({ id }) => id === reference)
  const answer = predict({
    circuit: treeOf(wiring, sheet),
    frequency: frequency ?? { value: 0, limit: 0 },
    drive: drive.value,
    ...(origin && { reference: { ...origin, angle: angleOf(origin.id, problem) } }),
  })
  if (!answer.ok) return answer
  return success({
    drive: drive.value.id,
    origin: origin?.id ?? drive.value.id,
    phasors: namedValues(placed, answer.value),
    ...impedancesIn(wiring, answer.value),
  })
}

/** The elements of the circuit with the values that are predicted from. */
export function treeOf(wired: WiredNode, sheet: Sheet): PredictedTree {
  if (!isGroup(wired.node)) return predictedElement(wired.element, sheet)
  const branches = wired.branches.map((branch) => treeOf(branch, sheet))
  return formOf(wired.node) === 'series' ? { series: branches } : { parallel: branches }
}

/** A value with its limit as stated, else as the sheet assumes it for elements. */
export function tolerancedOf(
  typed: { readonly value: number; readonly limit?: number },
  sheet: Sheet,
): Toleranced {
  const assumed = (Math.abs(typed.value) * assumedOf(sheet).elementPercent) / 100
  return { value: typed.value, limit: typed.limit ?? assumed }
}

/** The frequency of a sheet in Hz: exact where no limit is stated. */
export function frequencyOf(sheet: Sheet): Toleranced | undefined {
  const { value, limit = 0 } = sheet.frequency ?? {}
  return value === undefined ? undefined : { value, limit }
}

function predictedElement(element: CircuitElement | undefined, sheet: Sheet): PredictedElement {
  if (element === undefined) return { kind: 'impedance', values: undefined }
  const entries = valuesOfKind(element.kind).flatMap((value) => {
    const typed = predictingValue(element, value)
    return typed === undefined ? [] : [[value, tolerancedOf(typed, sheet)] as const]
  })
  const values = isPredictable(element) ? Object.fromEntries(entries) : undefined
  return { kind: element.kind, values }
}

/**
 * Whether an element has all values that its impedance needs. A capacitor's series resistance is none
 * where none is stated; nothing else is taken for 0.
 */
export function isPredictable(element: CircuitElement): boolean {
  return valuesOfKind(element.kind).every(
    (value) =>
      predictingValue(element, value) !== undefined ||
      (element.kind === 'capacitor' && value === 'resistance'),
  )
}

function needsFrequency(sheet: Sheet): boolean {
  return (sheet.elements ?? []).some(({ kind }) => kind === 'coil' || kind === 'capacitor')
}

/** Every phasor of the circuit at the first place where it stands, the whole before its parts. */
function placesIn(wiring: WiredNode): readonly PlacedPhasor[] {
  const seen = new Map<PhasorId, PlacedPhasor>()
  for (const { voltage, current, path } of wiredNodes(wiring)) {
    if (voltage !== undefined && !seen.has(voltage)) {
      seen.set(voltage, { id: voltage, path, side: 'voltage' })
    }
    if (current !== undefined && !seen.has(current)) {
      seen.set(current, { id: current, path, side: 'current' })
    }
  }
  return [...seen.values()]
}

function driveOf(sheet: Sheet, problem: SheetProblem, placed: readonly PlacedPhasor[]) {
  const candidates =
    sheet.supply === undefined ? placed : placed.filter(({ id }) => id === sheet.supply)
  for (const place of candidates) {
    const phasor = sheet.phasors.find(({ id }) => id === place.id)
    const measured = phasor && measuredOf(phasor, problem)
    if (measured?.magnitude === undefined) continue
    const { value, parts } = measured.magnitude
    const angle = angleOf(place.id, problem)
    const angleParts = measured.angle?.parts ?? []
    return success({ ...place, magnitude: value, angle, parts: oneOf(parts), angleParts })
  }
  const label = sheet.phasors.find(({ id }) => id === candidates[0]?.id)?.label
  return failure(
    label === undefined
      ? 'The supply is no voltage and no current of the circuit: name one that is.'
      : `Type or read ${label} to predict from it, or name another supply.`,
  )
}

/** Several errors of what drives, as one: it moves everything alike. */
function oneOf(parts: readonly UncertaintyPart[]): readonly UncertaintyPart[] {
  const uncertainty = combinedUncertainty(parts)
  return parts.length < 2 ? parts : [{ uncertainty, shape: 'normal' }]
}

function angleOf(id: PhasorId, { asRead }: SheetProblem): number {
  return asRead.values.get(id)?.angle ?? 0
}

function namedValues(
  placed: readonly PlacedPhasor[],
  values: readonly Predicted[],
): ReadonlyMap<PhasorId, Limited> {
  const byPlace = new Map(values.map((each) => [`${each.side}${each.path.join()}`, each]))
  return new Map(
    placed.flatMap(({ id, path, side }) => {
      const found = byPlace.get(`${side}${path.join()}`)
      return found === undefined ? [] : [[id, limitedOf(found)] as const]
    }),
  )
}

function impedancesIn(
  wiring: WiredNode,
  values: readonly Predicted[],
): Pick<Prediction, 'impedances' | 'whole'> {
  const byPath = new Map(
    values
      .filter(({ side }) => side === 'impedance')
      .map((each) => [each.path.join(), limitedOf(each)]),
  )
  const impedances = [...wiredNodes(wiring)].flatMap(({ element, path }) => {
    const impedance = byPath.get(path.join())
    return element && impedance ? [[element.id, impedance] as const] : []
  })
  const whole = byPath.get('')
  return { impedances: new Map(impedances), ...(whole && { whole }) }
}

function limitedOf({ value, magnitudeLimit, angleLimit }: Predicted): Limited {
  const { magnitude, angle } = toPolar(value)
  return onlyFinite({
    magnitude,
    ...(magnitude > 0 ? { angle } : {}),
    real: value.re,
    imaginary: value.im,
    ...(magnitudeLimit === undefined ? {} : { magnitudeLimit }),
    ...(magnitude > 0 && angleLimit !== undefined ? { angleLimit } : {}),
  })
}
