import { isFiniteComplex, toPolar } from '../../core'
import type { Drawing, Found } from '../../core/estimate'
import { type MarkedValue, valuesOfKind } from '../circuit/values'
import type { ElementEvaluation, Estimate, PolarValue } from '../evaluation'
import type { CircuitElement } from '../types'
import type { SheetProblem } from './sheet-problem'
import type { SolvedSheet } from './solved-sheet'

function impedanceOf(drawing: Drawing, element: number): PolarValue | undefined {
  const resistance = drawing.find({ kind: 'resistance', element })
  const reactance = drawing.find({ kind: 'reactance', element })
  if (resistance === undefined || reactance === undefined) return undefined
  const value = { re: resistance.value + 0, im: reactance.value + 0 }
  if (!isFiniteComplex(value)) return undefined
  return { ...toPolar(value), real: value.re, imaginary: value.im }
}

/** A capacitor has a resistance only where one was stated. */
function valuesOf(element: CircuitElement): readonly MarkedValue[] {
  const values = valuesOfKind(element.kind)
  const isLossless = element.kind === 'capacitor' && element.resistance === undefined
  return isLossless ? values.filter((value) => value !== 'resistance') : values
}

function estimateOf({ value, expanded }: Found): Estimate {
  return { value, expanded }
}

/** What was found of the elements of a sheet. */
export function evaluateElements(
  { names }: SheetProblem,
  solved: SolvedSheet,
): readonly ElementEvaluation[] {
  return names.elements.map((element) => {
    const at = solved.element(names.element.get(element.id))
    if (at === undefined) return { id: element.id }
    const impedance = impedanceOf(at.drawing, at.place)
    const found = valuesOf(element).flatMap((kind) => {
      const value = at.drawing.find({ kind, element: at.place })
      return value === undefined ? [] : [[kind, estimateOf(value)] as const]
    })
    return {
      id: element.id,
      ...(impedance === undefined ? {} : { impedance }),
      ...(found.length === 0 ? {} : { found: Object.fromEntries(found) }),
    }
  })
}
