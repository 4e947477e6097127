import { fromPolar, isFiniteComplex } from '../../core'
import { evaluateSum } from '../evaluate'
import type { PhasorEvaluation, SumEvaluation } from '../evaluation'
import type { PhasorId, Sheet, Sum } from '../types'
import { limitOfGap } from './gap'
import type { SheetProblem } from './sheet-problem'
import type { SolvedSheet } from './solved-sheet'

/** A gap below this share of the largest term is rounding. */
const ROUNDING = 1e-9

/** A phasor as it was read, with its best value for what was not read. */
export function asReadElseBest(best: PhasorEvaluation): PhasorEvaluation {
  const magnitude = best.asRead.magnitude ?? best.magnitude
  const angle = best.asRead.angle ?? best.angle
  const { real: _real, imaginary: _imaginary, ...rest } = best
  if (magnitude === 0) return { ...rest, magnitude, real: 0, imaginary: 0 }
  if (magnitude === undefined || angle === undefined) return rest
  const { re, im } = fromPolar(magnitude, angle)
  return { ...rest, magnitude, angle, real: re, imaginary: im }
}

function withLimit(
  sum: Sum,
  evaluated: SumEvaluation,
  phasors: ReadonlyMap<PhasorId, PhasorEvaluation>,
  problem: SheetProblem,
  solved: SolvedSheet,
): SumEvaluation {
  const { closingError, ...rest } = evaluated
  if (closingError === undefined) return evaluated
  const values = new Map(
    [...phasors].flatMap(([id, { magnitude, angle = 0 }]) =>
      magnitude === undefined ? [] : [[id, { magnitude, angle }] as const],
    ),
  )
  const gap = fromPolar(closingError.magnitude, closingError.angle)
  if (!isFiniteComplex(gap)) return evaluated
  const limit = limitOfGap(sum, gap, values, problem, solved)
  if (limit === undefined) return evaluated
  const largest = Math.max(
    ...sum.terms.map(({ phasor }) => phasors.get(phasor)?.magnitude ?? 0),
    phasors.get(sum.equals || '')?.magnitude ?? 0,
  )
  const isNothing = closingError.magnitude <= ROUNDING * largest
  const isAllRead = [...sum.terms.map(({ phasor }) => phasor), sum.equals || '']
    .flatMap((id) => phasors.get(id) ?? [])
    .every(({ asRead }) => asRead.magnitude !== undefined && asRead.angle !== undefined)
  // A gap that is nothing because a term was solved from it claims nothing.
  if (!limit.isChecked && isNothing && !isAllRead) return rest
  return {
    ...rest,
    closingError: { ...closingError, allowed: limit.allowed },
    closes: isNothing || closingError.magnitude <= limit.allowed,
  }
}

/** The sums of a sheet: resultants of the terms as read, gaps, and how far they may reach. */
export function evaluateSums(
  sheet: Sheet,
  best: readonly PhasorEvaluation[],
  problem: SheetProblem,
  solved: SolvedSheet,
): readonly SumEvaluation[] {
  const phasors = new Map(best.map((each) => [each.id, asReadElseBest(each)]))
  return (sheet.sums ?? []).map((sum) =>
    withLimit(sum, evaluateSum(sum, phasors), phasors, problem, solved),
  )
}
