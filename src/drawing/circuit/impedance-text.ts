import { formatEstimate, toPolar } from '../../core'
import { type Evaluation, type Id, type Limited, nameOfElement, type Sheet } from '../../sheet'
import { triangleSubjects } from './triangle-subjects'

/** The impedance of an element, or of all of the circuit, as it is printed; empty where it is open. */
export interface ImpedanceRow {
  readonly of: Id | 'total'
  readonly name: string
  /** By the marks, or what else is predicted from, with its limits. */
  readonly predicted: readonly string[]
  /** By the best values of the readings. */
  readonly found: readonly string[]
}

/** The impedances of a sheet's elements and last of the whole, those of which anything is known. */
export function impedanceRows(sheet: Sheet, evaluation: Evaluation): readonly ImpedanceRow[] {
  const total = triangleSubjects(sheet, evaluation).find(
    ({ of, basis }) => of === 'total' && basis === 'found',
  )
  const rows: readonly ImpedanceRow[] = [
    ...(evaluation.elements ?? []).map(({ id, impedance, predicted }) => ({
      of: id,
      name: nameOfElement(sheet, id),
      predicted: textsOf(predicted),
      found: textsOf(impedance),
    })),
    {
      of: 'total',
      name: 'Total',
      predicted: textsOf(evaluation.impedance),
      found: textsOf(total?.impedance && toPolar(total.impedance)),
    },
  ]
  return rows.filter(({ predicted, found }) => predicted.length + found.length > 0)
}

/** The magnitude, and the angle where it has one. */
function textsOf(value: Limited | undefined): readonly string[] {
  if (value?.magnitude === undefined) return []
  const { magnitude, angle, magnitudeLimit, angleLimit } = value
  const size = formatEstimate(magnitude, magnitudeLimit, 'Ω')
  return angle === undefined ? [size] : [size, formatEstimate(angle, angleLimit, '°')]
}
