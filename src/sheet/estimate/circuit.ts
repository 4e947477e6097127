import { elementsOf } from '../checks/references'
import type { Caution, ElementEvaluation, Evaluation, PhasorEvaluation } from '../evaluation'
import type { Sheet } from '../types'
import { circuitCautions } from './circuit-cautions'
import { compare } from './comparison'
import { evaluatePower } from './power'
import { isPredictable, predictionOf } from './prediction'
import { evaluateResonance } from './resonance'
import type { SheetProblem } from './sheet-problem'

/** What the circuit of a sheet adds to its evaluation. */
export interface CircuitAnswer {
  readonly parts: Pick<Evaluation, 'elements' | 'comparison' | 'impedance' | 'power' | 'resonance'>
  readonly cautions: readonly Caution[]
}

/** Predicted beside measured, power, resonance, and the cautions that all these numbers call for. */
export function evaluateCircuit(
  sheet: Sheet,
  phasors: readonly PhasorEvaluation[],
  elements: readonly ElementEvaluation[],
  problem: SheetProblem,
): CircuitAnswer {
  const predicted = predictionOf(sheet, problem)
  const prediction = predicted?.ok ? predicted.value : undefined
  const comparison = prediction && compare(sheet, prediction, problem)
  const power = evaluatePower(sheet, phasors, prediction?.phasors)
  const resonance = evaluateResonance(sheet)
  const figures = { phasors, elements, comparison: comparison ?? [], power, resonance }
  return {
    parts: {
      elements: elements.map((element) => {
        const impedance = prediction?.impedances.get(element.id)
        return impedance === undefined ? element : { ...element, predicted: impedance }
      }),
      ...(comparison === undefined ? {} : { comparison }),
      ...(prediction?.whole && { impedance: prediction.whole }),
      ...(power.length === 0 ? {} : { power }),
      ...(resonance === undefined ? {} : { resonance }),
    },
    cautions: [
      ...(predicted === undefined || predicted.ok ? [] : [unpredicted(sheet, predicted.problem)]),
      ...(prediction === undefined ? [] : unknownElements(sheet)),
      ...circuitCautions(sheet, figures),
    ],
  }
}

function unpredicted(sheet: Sheet, problem: string): Caution {
  const about = sheet.supply ?? 'sheet'
  return { about, text: `Nothing is predicted yet. ${problem}` }
}

/** What stands in the way of predicting all of the circuit. */
function unknownElements(sheet: Sheet): readonly Caution[] {
  const inCircuit = new Set([...elementsOf(sheet.circuit ?? { series: [] })].map(({ id }) => id))
  return (sheet.elements ?? [])
    .filter((element) => inCircuit.has(element.id) && !isPredictable(element))
    .map(({ id, label = id }) => ({
      about: id,
      text: `${label} has no value to predict from: what hangs on it is not predicted.`,
    }))
}
