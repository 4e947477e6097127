import {
  differenceDegrees,
  formatAngle,
  formatNumber,
  formatPolar,
  formatQuantity,
  signed,
  unitOf,
} from '../../core'
import { type Digits, digitsOf, digitsOfResult, formatScale, readingsByPhasor } from '../../drawing'
import {
  type Evaluation,
  type Id,
  labelOf,
  type Sheet,
  type Sum,
  type SumEvaluation,
} from '../../sheet'
import { quantityOfSum } from '../store'
import type { CheckFigure } from './figure'
import { handFigures } from './hand-figures'

/** What the check line says of a sum. */
export interface CheckText {
  readonly drawn: string
  readonly scale: string
  readonly figures: readonly CheckFigure[]
}

/** What is shown of the sheet before until the whole answer comes. */
export interface Former {
  /** Undefined where no sheet before was worked out either. */
  readonly evaluation: Evaluation | undefined
  /** The phasors that are shown with a value of it. */
  readonly phasors: ReadonlySet<Id>
}

interface Context {
  readonly sheet: Sheet
  readonly sum: Sum
  readonly found: SumEvaluation
  readonly unit: string
  readonly magnitude: Digits
  readonly angle: Digits
  /** Units for each millimetre of paper; undefined where nothing of the quantity is drawn. */
  readonly perMillimetre: number | undefined
  /** Everything was solved: a sum without a gap is one that nothing checks. */
  readonly isJudged: boolean
}

/**
 * The check line of a sum, in words and figures: calculated, measured, and the differences in the
 * unit, per cent, degrees and millimetres of paper. `unitsPerCentimetre` is that of the drawing. Where
 * the sum was constructed by hand, that comes first, and every pair of the three is compared.
 *
 * @param isHidden What is calculated stays hidden, as while the sum is being constructed.
 * @param former What hangs on it is marked.
 */
export function checkText(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Sum,
  unitsPerCentimetre: number | undefined,
  isHidden = false,
  former?: Former,
): CheckText {
  const quantity = quantityOfSum(sheet, sum)
  const count = sum.terms.length
  const head = {
    drawn:
      sum.arrangement === 'from-origin' ? 'Sum drawn from one origin' : 'Sum drawn tip to tail',
    scale: [
      count === 1 ? '1 phasor' : `${count} phasors`,
      ...(unitsPerCentimetre === undefined ? [] : [formatScale(unitsPerCentimetre, quantity)]),
    ].join(' · '),
  }
  const found = evaluation.sums.find(({ id }) => id === sum.id)
  const hand = handFigures(sheet, evaluation, sum)
  const drawn = hand ? [hand.drawn] : []
  if (!found?.resultant) {
    return { ...head, figures: [...drawn, unresolved(sheet, evaluation, sum)] }
  }
  const context: Context = {
    sheet,
    sum,
    found,
    unit: unitOf(quantity),
    ...digitsOfSum(sheet, sum),
    perMillimetre: unitsPerCentimetre === undefined ? undefined : unitsPerCentimetre / 10,
    isJudged: (evaluation.agreement ?? former?.evaluation?.agreement) !== undefined,
  }
  const seen = sum.equals === 0 ? [] : [measured(context)]
  const hangs = sum.terms.some(({ phasor }) => former?.phasors.has(phasor))
  const marked = (figure: CheckFigure) => (hangs ? { ...figure, isFormer: true as const } : figure)
  if (isHidden) return { ...head, figures: [...drawn, HIDDEN, ...seen] }
  return {
    ...head,
    figures: [
      ...drawn,
      marked(calculated(context)),
      ...seen,
      ...(hand?.differences ?? []).map(marked),
      marked(difference(context)),
      ...allowance(context),
      ...formerAllowance(context, former),
    ],
  }
}

const HIDDEN: CheckFigure = {
  name: 'Calculated',
  figure: '–',
  under: 'Hidden until the last arrow is drawn by hand, or until you ask.',
}

function unresolved(sheet: Sheet, evaluation: Evaluation, sum: Sum): CheckFigure {
  if (sum.terms.length === 0) {
    return { name: 'Calculated', figure: '–', under: 'Add terms to the sum to see its resultant.' }
  }
  const open = sum.terms
    .map(({ phasor }) => evaluation.phasors.find(({ id }) => id === phasor))
    .filter((term) => term && (term.magnitude === undefined || term.angle === undefined))
    .map((term) => labelOf(sheet, term?.id ?? ''))
  return {
    name: 'Calculated',
    figure: '–',
    under: `Still open: ${[...new Set(open)].join(', ')}. Type or read magnitude and angle.`,
  }
}

function calculated({ found, unit, magnitude, angle, perMillimetre }: Context): CheckFigure {
  const resultant = found.resultant ?? { magnitude: 0, angle: 0 }
  return {
    name: 'Calculated',
    figure:
      resultant.magnitude === 0
        ? formatQuantity(0, unit, magnitude)
        : formatPolar(resultant, unit, {
            magnitude: digitsOfResult(resultant.magnitude, magnitude, 2),
            angle,
          }),
    under:
      perMillimetre === undefined
        ? ''
        : `${millimetres(resultant.magnitude / perMillimetre)} on paper`,
  }
}

function measured({ sheet, sum, found, unit, magnitude, angle }: Context): CheckFigure {
  const name = 'Measured'
  if (typeof sum.equals !== 'string') {
    return { name, figure: '–', under: 'Choose what the sum must equal to compare it.' }
  }
  const label = labelOf(sheet, sum.equals)
  const { magnitude: size, angle: turn } = found.measured ?? {}
  if (size === undefined) {
    return { name, figure: '–', under: `${label} has no magnitude yet: type it or read it.` }
  }
  if (turn === undefined) {
    return {
      name,
      figure: formatQuantity(size, unit, magnitude),
      under: `${label} has no angle yet, so only the size is compared.`,
    }
  }
  const read = sheet.readings?.some((reading) => reading.of === sum.equals && !reading.struck)
  return {
    name,
    figure: formatPolar({ magnitude: size, angle: turn }, unit, { magnitude, angle }),
    under: `${label}, ${read ? 'read on a meter' : 'as typed'}`,
  }
}

function difference(context: Context): CheckFigure {
  const { sum, found, unit, magnitude, angle, perMillimetre, isJudged } = context
  const { resultant, measured: seen, closingError } = found
  if (closingError) {
    const like = Math.max(resultant?.magnitude ?? 0, seen?.magnitude ?? 0) || closingError.magnitude
    const digits = { ...digitsOfResult(closingError.magnitude, magnitude, 1), like }
    const size = formatQuantity(closingError.magnitude, unit, digits)
    const under = [
      `${formatNumber(closingError.percent, 1)} %`,
      ...(perMillimetre === undefined
        ? []
        : [`${millimetres(closingError.magnitude / perMillimetre)} on paper`]),
    ]
    if (
      sum.equals === 0 ||
      !resultant ||
      seen?.magnitude === undefined ||
      seen.angle === undefined
    ) {
      return {
        name: 'Closing error',
        figure: size,
        under: `${under.join(', ')}; it should be nothing`,
      }
    }
    return {
      name: 'Measured less calculated',
      figure: [
        signed(formatQuantity(seen.magnitude - resultant.magnitude, unit, digits)),
        signed(formatAngle(differenceDegrees(seen.angle, resultant.angle), angle)),
      ].join(', '),
      under: `gap ${size}, ${under.join(', ')}`,
    }
  }
  const name = 'Measured less calculated'
  if (isJudged) return { name, figure: '–', under: 'Nothing checks this sum.' }
  if (resultant && seen?.magnitude !== undefined) {
    const by = seen.magnitude - resultant.magnitude
    const percent =
      resultant.magnitude === 0
        ? ''
        : `${signed(formatNumber((100 * by) / resultant.magnitude, 1))} %`
    return { name, figure: signed(formatQuantity(by, unit, magnitude)), under: percent }
  }
  return { name, figure: '–', under: 'Nothing checks this sum yet.' }
}

/** How large a gap the limits of the readings allow, and whether this one is within; nothing unless judged. */
function allowance({ found: { closingError, closes }, unit }: Context): readonly CheckFigure[] {
  const allowed = closingError?.allowed
  if (allowed === undefined || closes === undefined) return []
  return [
    {
      name: 'Gap allowed',
      figure: formatQuantity(allowed, unit, { limit: allowed }),
      under: closes ? 'the sum closes within its limits' : 'the sum does not close',
    },
  ]
}

/** In the place of the allowance that is to come, so that nothing moves then: that of the sheet before. */
function formerAllowance(context: Context, former: Former | undefined): readonly CheckFigure[] {
  if (former === undefined || context.found.closingError === undefined) return []
  const found = former.evaluation?.sums.find(({ id }) => id === context.sum.id)
  const before = found ? allowance({ ...context, found }) : []
  return (before.length > 0 ? before : [AWAITED]).map((figure) => ({ ...figure, isFormer: true }))
}

const AWAITED: CheckFigure = {
  name: 'Gap allowed',
  figure: '–',
  under: 'The limits are being worked out.',
}

/** The digits of a sum: the finest that any of its terms, or what it must equal, was given with. */
function digitsOfSum(sheet: Sheet, sum: Sum): { magnitude: Digits; angle: Digits } {
  const readings = readingsByPhasor(sheet)
  const ids = new Set([...sum.terms.map(({ phasor }) => phasor), sum.equals])
  const all = sheet.phasors
    .filter(({ id }) => ids.has(id))
    .map((phasor) => digitsOf(phasor, readings))
  const sizes = all.map((each) => each.magnitude)
  return {
    magnitude: sizes.length === 0 ? {} : sizes.reduce(finer),
    angle: { resolution: Math.min(0.1, ...all.flatMap(({ angle }) => angle.resolution ?? [])) },
  }
}

/** The finer of two digits; a plain figure is kept in its unit where both are plain. */
function finer(one: Digits, other: Digits): Digits {
  const { resolution: first = Number.POSITIVE_INFINITY } = one
  const { resolution: second = Number.POSITIVE_INFINITY } = other
  const resolution = Math.min(first, second)
  return {
    ...(Number.isFinite(resolution) && { resolution }),
    ...(one.like !== undefined && other.like !== undefined && { like: 1 }),
  }
}

function millimetres(length: number): string {
  return `${formatNumber(length, 1)} mm`
}
