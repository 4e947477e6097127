import type { Complex } from '../../core'
import type { EstimateOptions } from '../../core/estimate'
import type { Evaluation } from '../evaluation'
import { evaluateHand } from '../hand/evaluate-hand'
import type { Sheet } from '../types'
import { agreementOf, outcomesOf } from './agreement'
import { alternativesOf } from './alternatives'
import { cautionsOf } from './cautions'
import { evaluateCircuit } from './circuit'
import { evaluateElements } from './elements'
import { evaluatePhasor } from './phasors'
import { problemOfSheet } from './sheet-problem'
import { SolvedSheet } from './solved-sheet'
import { asReadElseBest, evaluateSums } from './sums'

function complexOf(
  value: { readonly real?: number; readonly imaginary?: number } | undefined,
): Complex | undefined {
  if (value?.real === undefined || value.imaginary === undefined) return undefined
  return { re: value.real, im: value.imaginary }
}

/**
 * What the program says of a sheet, everything solved and adjusted: best values with their limits,
 * every drawing that the readings allow, which sums close, and whether all readings can be true
 * together. `draws` and `seed` are those of the Monte Carlo propagation where linear limits are poor.
 */
export function evaluate(
  sheet: Sheet,
  options: Pick<EstimateOptions, 'draws' | 'seed'> = {},
): Evaluation {
  const problem = problemOfSheet(sheet)
  const solved = new SolvedSheet(sheet, problem, options)
  const phasors = sheet.phasors.map((phasor) => evaluatePhasor(phasor, problem, solved))
  const sums = evaluateSums(sheet, phasors, problem, solved)
  const mixed = new Map(phasors.map((phasor) => [phasor.id, asReadElseBest(phasor)]))
  const outcomes = outcomesOf(problem, solved)
  const elements = evaluateElements(problem, solved)
  const circuit = evaluateCircuit(sheet, phasors, elements, problem)
  return {
    phasors,
    alternatives: alternativesOf(problem, solved),
    sums,
    hand: evaluateHand(sheet, {
      phasor: (id) => complexOf(mixed.get(id)),
      resultant: (id) => complexOf(sums.find((sum) => sum.id === id)?.resultant),
    }),
    agreement: agreementOf(phasors, outcomes, solved),
    suspects: outcomes
      .filter(({ isChecked }) => isChecked)
      .map(({ reading, score }) => ({ reading, score }))
      .sort((a, b) => b.score - a.score),
    ...circuit.parts,
    cautions: [...cautionsOf(phasors, problem, solved), ...circuit.cautions],
  }
}
