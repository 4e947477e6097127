import { formatAngle, formatQuantity, unitOf } from '../../core'
import type { Evaluation, Sheet, Sum, UnitsPerCentimetre } from '../../sheet'
import { describeCircuit } from '../schematic/description'
import { QUANTITIES } from './quantities'
import { formatScale } from './quantity-text'

/** The drawing in words: its scales, and what each sum comes to. */
export function describeDrawing(
  sheet: Sheet,
  evaluation: Evaluation,
  unitsPerCentimetre: UnitsPerCentimetre,
): string {
  const scales = QUANTITIES.flatMap((quantity) => {
    const scale = unitsPerCentimetre[quantity]
    return scale === undefined ? [] : [formatScale(scale, quantity)]
  })
  const sums = (sheet.sums ?? []).flatMap((sum) => describeSum(sheet, evaluation, sum) ?? [])
  const scale =
    scales.length === 0 ? 'Nothing is drawn yet.' : `Drawn to scale, ${scales.join(', ')}.`
  const circuit = describeCircuit(sheet)
  return [scale, ...sums, ...(circuit === '' ? [] : [`Circuit: ${circuit}.`])].join(' ')
}

function describeSum(sheet: Sheet, evaluation: Evaluation, sum: Sum): string | undefined {
  const resultant = evaluation.sums.find(({ id }) => id === sum.id)?.resultant
  if (!resultant) return undefined
  const first = sheet.phasors.find(({ id }) => id === sum.terms[0]?.phasor)
  const equals = sheet.phasors.find(({ id }) => id === sum.equals)
  const name = sum.label ?? equals?.label
  const unit = unitOf((first ?? equals)?.quantity ?? 'other')
  const size = formatQuantity(resultant.magnitude, unit, { digits: 4 })
  const value = `${size} ∠ ${formatAngle(resultant.angle)}`
  return name === undefined ? `Resultant ${value}.` : `Resultant ${name} ${value}.`
}
