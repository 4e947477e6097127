import {
  differenceDegrees,
  formatAngle,
  formatNumber,
  formatPolar,
  formatQuantity,
  signed,
  unitOf,
} from '../../../core'
import {
  labelOf,
  type Sheet,
  type Sum,
  type SumEvaluation,
  type UnitsPerCentimetre,
} from '../../../sheet'
import { digitsOfResult, formatPaperLength } from '../../text/phasor-text'
import { type Digits, digitsOf, readingsByPhasor } from '../../text/resolution'
import { heading } from '../blocks'
import type { Cell } from '../columns'
import {
  cell,
  equationOf,
  labelsOf,
  NOTHING,
  nameOfSum,
  quantityOfSum,
  symbolsCell,
} from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** Every sum: calculated beside measured, how far they are apart, and how far they may be. */
export const sums: Section = {
  name: 'sums',
  blocks: ({ sheet, evaluation, unitsPerCentimetre, width }) => {
    const all = sheet.sums ?? []
    if (all.length === 0) return []
    const rows = all.map((sum) => {
      const found = evaluation.sums.find(({ id }) => id === sum.id)
      return rowOf(sheet, sum, found, unitsPerCentimetre)
    })
    return [
      heading('Calculated beside measured', width),
      ...table(
        [
          { title: 'Sum' },
          { title: 'Calculated', align: 'end' },
          { title: 'Measured', align: 'end' },
          { title: 'Measured less calculated' },
          { title: 'Gap' },
        ],
        rows,
        width,
      ),
    ]
  },
}

function rowOf(
  sheet: Sheet,
  sum: Sum,
  found: SumEvaluation | undefined,
  scales: UnitsPerCentimetre,
): readonly Cell[] {
  const quantity = quantityOfSum(sheet, sum)
  const unit = unitOf(quantity)
  const digits = digitsOfSum(sheet, sum)
  const { resultant, measured } = found ?? {}
  const equation = equationOf(sheet, sum)
  const name = nameOfSum(sheet, sum)
  const named = sum.label === undefined ? equation : `${name}: ${equation}`
  return [
    symbolsCell(named, labelsOf(sheet)),
    resultant === undefined
      ? cell(`open: ${openIn(sheet, sum, found)}`)
      : cell(polar(resultant, unit, digits)),
    sum.equals === 0 ? cell('0') : measuredCell(measured, unit, digits),
    differenceCell(found, unit, digits),
    gapCell(found, unit, digits, scales[quantity]),
  ]
}

interface DigitsOfSum {
  readonly magnitude: Digits
  readonly angle: Digits
}

/** Short: the schedule says which values are open. */
function openIn(sheet: Sheet, { terms }: Sum, found: SumEvaluation | undefined): string {
  if (terms.length === 0 || found === undefined) return 'no terms'
  return terms.length === 1 ? labelOf(sheet, terms[0]?.phasor ?? '') : 'not every term is known'
}

function polar(
  value: { readonly magnitude: number; readonly angle: number },
  unit: string,
  { magnitude, angle }: DigitsOfSum,
): string {
  return value.magnitude === 0
    ? formatQuantity(0, unit, magnitude)
    : formatPolar(value, unit, { magnitude: digitsOfResult(value.magnitude, magnitude, 2), angle })
}

function measuredCell(
  measured: SumEvaluation['measured'],
  unit: string,
  digits: DigitsOfSum,
): Cell {
  const { magnitude, angle } = measured ?? {}
  if (magnitude === undefined) return NOTHING
  if (angle === undefined) return cell(formatQuantity(magnitude, unit, digits.magnitude))
  return cell(formatPolar({ magnitude, angle }, unit, digits))
}

function differenceCell(
  found: SumEvaluation | undefined,
  unit: string,
  { magnitude, angle }: DigitsOfSum,
): Cell {
  const { resultant, measured } = found ?? {}
  if (resultant === undefined || measured?.magnitude === undefined) return NOTHING
  const by = measured.magnitude - resultant.magnitude
  const like = Math.max(measured.magnitude, resultant.magnitude) || 1
  const size = signed(formatQuantity(by, unit, { ...magnitude, like: magnitude.like ?? like }))
  const percent =
    resultant.magnitude === 0
      ? []
      : [`${signed(formatNumber((100 * by) / resultant.magnitude, 1))} %`]
  const turn =
    measured.angle === undefined
      ? []
      : [signed(formatAngle(differenceDegrees(measured.angle, resultant.angle), angle))]
  return cell([size, ...turn, ...percent].join(', '))
}

function gapCell(
  found: SumEvaluation | undefined,
  unit: string,
  { magnitude }: DigitsOfSum,
  unitsPerCentimetre: number | undefined,
): Cell {
  const { closingError, closes } = found ?? {}
  if (closingError === undefined) return cell('nothing checks it')
  const { allowed } = closingError
  const digits =
    allowed === undefined || allowed === 0
      ? digitsOfResult(closingError.magnitude, magnitude, 1)
      : { limit: allowed }
  const like = { like: Math.max(closingError.magnitude, allowed ?? 0) || 1 }
  const text = (value: number) => formatQuantity(value, unit, { ...digits, ...like })
  const paper =
    unitsPerCentimetre === undefined
      ? ''
      : `, ${formatPaperLength((10 * closingError.magnitude) / unitsPerCentimetre)} on paper`
  const verdict = closes === undefined ? '' : closes ? ': it closes' : ': it does not close'
  const limit = allowed === undefined ? '' : ` of ${text(allowed)} allowed`
  return cell(
    `${text(closingError.magnitude)}${limit}${verdict} (${formatNumber(closingError.percent, 1)} %${paper})`,
  )
}

/** The digits of a sum: the finest that any of its terms, or what it must equal, was given with. */
function digitsOfSum(sheet: Sheet, sum: Sum): DigitsOfSum {
  const readings = readingsByPhasor(sheet)
  const ids = new Set([...sum.terms.map(({ phasor }) => phasor), sum.equals])
  const all = sheet.phasors
    .filter(({ id }) => ids.has(id))
    .map((phasor) => digitsOf(phasor, readings))
  const sizes = all.map(({ magnitude }) => magnitude)
  const known = sizes.flatMap(({ resolution }) => resolution ?? [])
  return {
    magnitude: {
      ...(known.length > 0 && { resolution: Math.min(...known) }),
      ...(sizes.length > 0 && sizes.every(({ like }) => like !== undefined) && { like: 1 }),
    },
    angle: { resolution: Math.min(0.1, ...all.flatMap(({ angle }) => angle.resolution ?? [])) },
  }
}
