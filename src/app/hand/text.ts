import { formatAngle, formatNumber, formatQuantity, signed, unitOf } from '../../core'
import { digitsOfDrawn } from '../../drawing'
import type { HandEvaluation, Sheet, Sum } from '../../sheet'
import { quantityOfSum } from '../store'

/**
 * How a hand arrow compares with what it stands for: in the unit, per cent, degrees and millimetres of
 * paper, how much of that it inherits, and whether it is within the drawing's tolerance.
 */
export function resultText(sheet: Sheet, sum: Sum, found: HandEvaluation): string {
  const quantity = quantityOfSum(sheet, sum)
  const scale = sheet.drawing?.unitsPerCentimetre?.[quantity]
  const { magnitude = 0, magnitudeError, angleError, millimetres, allowed, within } = found
  if (magnitudeError === undefined || scale === undefined) {
    return 'What it stands for has no value yet, so nothing is compared.'
  }
  const exact = magnitude - magnitudeError
  return [
    signed(formatQuantity(magnitudeError, unitOf(quantity), digitsOfDrawn(scale))),
    ...(exact === 0 ? [] : [`${signed(formatNumber((100 * magnitudeError) / exact, 1))} %`]),
    ...(angleError === undefined ? [] : [signed(formatAngle(angleError, { resolution: 0.1 }))]),
    `${formatNumber(millimetres ?? 0, 2)} mm off, ${formatNumber(allowed ?? 0, 2)} mm allowed: ${within ? 'within' : 'not within'}`,
    inheritedText(found, scale),
  ]
    .filter(Boolean)
    .join(' · ')
}

function inheritedText({ inheritedError, ownError }: HandEvaluation, scale: number): string {
  const inherited = ((inheritedError?.magnitude ?? 0) * 10) / scale
  if (inherited < 0.05) return ''
  const own = ((ownError?.magnitude ?? 0) * 10) / scale
  return `own ${formatNumber(own, 1)} mm, inherited ${formatNumber(inherited, 1)} mm`
}
