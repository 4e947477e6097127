import {
  differenceDegrees,
  formatAngle,
  formatNumber,
  formatQuantity,
  signed,
  unitOf,
} from '../../core'
import { type Digits, digitsOfDrawn, formatDrawn } from '../../drawing'
import {
  type Evaluation,
  type HandEvaluation,
  labelOf,
  largestContribution,
  type Sheet,
  type Sum,
  seatsOf,
} from '../../sheet'
import { quantityOfSum } from '../store'
import type { CheckFigure } from './figure'

/** What the check line says of a construction by hand. */
export interface HandFigures {
  readonly drawn: CheckFigure
  /** Against what was calculated, and against what was measured: where both are known. */
  readonly differences: readonly CheckFigure[]
}

/**
 * The columns of a sum that was constructed by hand; undefined where nothing of it was. The drawing's
 * own digits: a tenth of a millimetre through the scale.
 */
export function handFigures(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
): HandFigures | undefined {
  const seats = seatsOf(sheet).filter(
    (seat) => seat.sum?.id === sum.id && seat.position !== undefined,
  )
  const scale = sheet.drawing?.unitsPerCentimetre?.[quantityOfSum(sheet, sum)]
  if (seats.length === 0 || scale === undefined) return undefined
  const closing = seats.find(({ position }) => position === 'closing')?.arrow
  const found = evaluation.hand.find(({ id }) => id === closing?.id)
  if (found?.magnitude === undefined) {
    const under = `${seats.length} of ${sum.terms.length + 1} arrows drawn: the closing one is still to come.`
    return { drawn: { name: 'Drawn by hand', figure: '–', under }, differences: [] }
  }
  const length = (found.magnitude * 10) / scale
  return {
    drawn: {
      name: 'Drawn by hand',
      figure: formatDrawn(found, quantityOfSum(sheet, sum), scale),
      under: `${formatNumber(length, 1)} mm on paper`,
    },
    differences: [
      ...againstCalculated(sheet, evaluation, sum, found, scale),
      ...againstMeasured(sheet, evaluation, sum, found, digitsOfDrawn(scale)),
    ],
  }
}

function againstCalculated(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
  found: HandEvaluation,
  scale: number,
): CheckFigure[] {
  const { magnitude = 0, magnitudeError, angleError, millimetres = 0, allowed = 0 } = found
  if (magnitudeError === undefined) return []
  const exact = magnitude - magnitudeError
  const percent =
    exact === 0 ? '' : `${signed(formatNumber((100 * magnitudeError) / exact, 1))} %, `
  const verdict = found.within ? 'within' : 'not within'
  return [
    {
      name: 'Hand less calculated',
      figure: differenceText(sheet, sum, magnitudeError, angleError, digitsOfDrawn(scale)),
      under: [
        `${percent}${formatNumber(millimetres, 2)} mm off, ${formatNumber(allowed, 2)} mm allowed at this length: ${verdict}`,
        ...contributionText(sheet, evaluation, sum, scale),
      ].join('; '),
    },
  ]
}

/** Which arrow the construction was missed by most. */
function contributionText(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
  scale: number,
): readonly string[] {
  const most = largestContribution(sheet, evaluation, sum.id)
  if (!most) return []
  const { stands } = most.arrow
  const name = stands === 'closing' ? 'the closing arrow itself' : labelOf(sheet, stands)
  const millimetres = formatNumber((most.amount * 10) / scale, 2)
  return [`most of it by ${name}, ${millimetres} mm`]
}

function againstMeasured(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
  { magnitude = 0, angle }: HandEvaluation,
  digits: Digits,
): CheckFigure[] {
  const measured = evaluation.sums.find(({ id }) => id === sum.id)?.measured
  if (sum.equals === 0 || measured?.magnitude === undefined) return []
  const by = magnitude - measured.magnitude
  const turn =
    angle === undefined || measured.angle === undefined
      ? undefined
      : differenceDegrees(angle, measured.angle)
  const percent =
    measured.magnitude === 0 ? '' : `${signed(formatNumber((100 * by) / measured.magnitude, 1))} %`
  return [
    {
      name: 'Hand less measured',
      figure: differenceText(sheet, sum, by, turn, digits),
      under: percent,
    },
  ]
}

function differenceText(
  sheet: Sheet,
  sum: Sum,
  by: number,
  degrees: number | undefined,
  digits: Digits,
): string {
  const size = signed(formatQuantity(by, unitOf(quantityOfSum(sheet, sum)), digits))
  return degrees === undefined
    ? size
    : `${size}, ${signed(formatAngle(degrees, { resolution: 0.1 }))}`
}
