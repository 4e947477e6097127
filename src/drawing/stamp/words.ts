import { formatQuantity, unitOf } from '../../core'
import type { Evaluation, Sheet, Sum, SumEvaluation } from '../../sheet'
import { digitsOfResult } from '../text/phasor-text'

/** What a stamp says: its verdict in capitals, and the figures that it rests on. */
export interface StampWords {
  readonly verdict: NonNullable<Evaluation['agreement']>['verdict']
  readonly head: string
  readonly figures: string
}

const HEADS: { readonly [verdict in StampWords['verdict']]: string } = {
  agree: 'READINGS AGREE',
  disagree: 'READINGS DO NOT AGREE',
  'not-enough': 'NOT ENOUGH READINGS',
  'nothing-to-check': 'SOLVED, NOTHING LEFT TO CHECK',
  'agree-on-correction': 'AGREES ON AN ASSUMED CORRECTION: RETEST',
}

/**
 * What the stamp of a sheet says. Undefined where nothing was judged: the evaluation has no verdict, or
 * the sheet says nothing of how its phasors hang together.
 */
export function stampWordsOf(sheet: Sheet, evaluation: Evaluation): StampWords | undefined {
  const { agreement } = evaluation
  const isTied = (sheet.sums ?? []).length + (sheet.elements ?? []).length > 0
  if (agreement === undefined || !isTied) return undefined
  const { verdict } = agreement
  return { verdict, head: HEADS[verdict], figures: figuresOf(sheet, evaluation) }
}

function figuresOf(sheet: Sheet, evaluation: Evaluation): string {
  const { verdict, degreesOfFreedom } = evaluation.agreement ?? {}
  if (verdict === 'not-enough') return `open: ${openIn(sheet, evaluation)}`
  if (verdict === 'nothing-to-check') return 'no reading checks another · 0 checks'
  const checks = degreesOfFreedom === 1 ? '1 check' : `${degreesOfFreedom ?? 0} checks`
  const gap = gapIn(sheet, evaluation)
  return gap === undefined ? checks : `${gap} · ${checks}`
}

/** The first that is open, and how many more. */
function openIn(sheet: Sheet, evaluation: Evaluation): string {
  const open = evaluation.phasors.flatMap(({ id, magnitudeState, angleState, magnitude }) => {
    const label = sheet.phasors.find((phasor) => phasor.id === id)?.label || id
    if (magnitudeState === 'open') return [`magnitude of ${label}`]
    return angleState === 'open' && magnitude !== 0 ? [`angle of ${label}`] : []
  })
  const [first = 'a value', ...others] = open
  return others.length === 0 ? first : `${first} and ${others.length} more`
}

/** The gap that says most: of those that fail, else of all, the largest share of what is allowed. */
function gapIn(sheet: Sheet, { sums }: Evaluation): string | undefined {
  const shares = sums.flatMap((found) => {
    const { closingError } = found
    const { allowed } = closingError ?? {}
    return closingError === undefined || allowed === undefined || allowed === 0
      ? []
      : [{ found, share: closingError.magnitude / allowed }]
  })
  const worst = shares.reduce<(typeof shares)[number] | undefined>(
    (most, each) => (most === undefined || each.share > most.share ? each : most),
    undefined,
  )
  const sum = sheet.sums?.find(({ id }) => id === worst?.found.id)
  return worst && sum && gapText(sheet, sum, worst.found)
}

/** A gap beside what is allowed: `gap 0.6 V of 1.7 V allowed`. */
export function gapText(
  sheet: Sheet,
  sum: Sum,
  { closingError }: SumEvaluation,
): string | undefined {
  if (closingError?.allowed === undefined) return undefined
  const { magnitude, allowed } = closingError
  const first = sheet.phasors.find(({ id }) => id === sum.terms[0]?.phasor)
  const unit = unitOf(first?.quantity ?? 'other')
  const digits = digitsOfResult(allowed, { resolution: 10 ** Math.floor(Math.log10(allowed)) }, 2)
  const like = Math.max(magnitude, allowed)
  const text = (value: number) => formatQuantity(value, unit, { ...digits, like })
  return `gap ${text(magnitude)} of ${text(allowed)} allowed`
}
