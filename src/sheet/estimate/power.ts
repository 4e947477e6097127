import type { Complex } from '../../core'
import { powerOf, totalPower } from '../../core/circuit'
import { elementsOf } from '../checks/references'
import type { Limited, PhasorEvaluation, PowerEvaluation } from '../evaluation'
import type { CircuitElement, PhasorId, Sheet } from '../types'

type Value = Pick<Limited, 'real' | 'imaginary'>

/**
 * The power of each element and, last, of all of them: of the best values where these are known of every
 * element, else of the predicted ones where those are, else of what is known. The total is of the
 * circuit, on a sheet without one of all elements, and left out where the power of one of them is open.
 */
export function evaluatePower(
  sheet: Sheet,
  phasors: readonly PhasorEvaluation[],
  predicted: ReadonlyMap<PhasorId, Value> | undefined,
): readonly PowerEvaluation[] {
  const elements = sheet.elements ?? []
  const best = new Map(phasors.map((phasor) => [phasor.id, phasor]))
  const ofBest = powersOf(elements, best)
  const isComplete = ofBest.length === elements.length
  const ofPredicted = isComplete || !predicted ? [] : powersOf(elements, predicted)
  const isPredicted = ofPredicted.length === elements.length && elements.length > 0
  const powers = isPredicted
    ? ofPredicted.map((power) => ({ ...power, predicted: true as const }))
    : ofBest
  return [...powers, ...totalOf(sheet, powers)]
}

function powersOf(
  elements: readonly CircuitElement[],
  values: ReadonlyMap<PhasorId, Value>,
): readonly PowerEvaluation[] {
  return elements.flatMap(({ id, voltage, current }) => {
    const [v, i] = [values.get(voltage), values.get(current)].map(complexOf)
    const power = v && i && powerOf(v, i)
    return power && Number.isFinite(power.apparent) ? [{ of: id, ...power }] : []
  })
}

function complexOf(value: Value | undefined): Complex | undefined {
  if (value?.real === undefined || value.imaginary === undefined) return undefined
  return { re: value.real, im: value.imaginary }
}

function totalOf(sheet: Sheet, powers: readonly PowerEvaluation[]): readonly PowerEvaluation[] {
  const ids = sheet.circuit
    ? [...elementsOf(sheet.circuit)].map(({ id }) => id)
    : (sheet.elements ?? []).map(({ id }) => id)
  const parts = powers.filter(({ of }) => ids.includes(of))
  if (parts.length !== ids.length || ids.length === 0) return []
  const total = totalPower(parts)
  if (!Number.isFinite(total.apparent)) return []
  const isPredicted = powers.some(({ predicted }) => predicted === true)
  return [{ of: 'total', ...total, ...(isPredicted ? { predicted: true } : {}) }]
}
