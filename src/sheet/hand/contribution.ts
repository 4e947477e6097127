import type { Evaluation, HandEvaluation } from '../evaluation'
import type { HandArrow, Id, Sheet } from '../types'
import { seatsOf } from './seats'

/** How much one hand arrow takes part in how far a construction ends from where it should. */
export interface Contribution {
  readonly arrow: HandArrow
  /** What its own error adds to the miss, in the unit: along the miss, so that all of them add up to it. */
  readonly amount: number
}

/**
 * The hand arrow that contributes most to the miss of a sum's construction: of its closing arrow, or
 * while there is none, of the tip of the last term that was drawn. Undefined where nothing is missed.
 */
export function largestContribution(
  sheet: Sheet,
  evaluation: Evaluation,
  sum: Id,
): Contribution | undefined {
  const found = new Map(evaluation.hand.map((each) => [each.id, each]))
  const seats = seatsOf(sheet)
    .filter((seat) => seat.sum?.id === sum && seat.position !== undefined)
    .toSorted((one, other) => rankOf(one.position) - rankOf(other.position))
  const last = seats.at(-1)
  const miss = last && tipErrorOf(found.get(last.arrow.id))
  if (!miss) return undefined
  const size = Math.hypot(miss.real, miss.imaginary)
  if (size === 0) return undefined
  const contributions = seats.flatMap(({ arrow }) => {
    const own = found.get(arrow.id)?.ownError
    if (!own) return []
    return [{ arrow, amount: (own.real * miss.real + own.imaginary * miss.imaginary) / size }]
  })
  return contributions.reduce<Contribution | undefined>(
    (most, each) => (most && most.amount >= each.amount ? most : each),
    undefined,
  )
}

/** How far the tip of a hand arrow is from where it should be, in the unit, as it lies on the paper. */
export function tipErrorOf(
  found: HandEvaluation | undefined,
): { readonly real: number; readonly imaginary: number } | undefined {
  const { ownError: own, inheritedError: inherited } = found ?? {}
  return (
    own &&
    inherited && {
      real: own.real + inherited.real,
      imaginary: own.imaginary + inherited.imaginary,
    }
  )
}

/** The closing arrow is drawn last. */
function rankOf(position: number | 'closing' | undefined): number {
  return typeof position === 'number' ? position : Number.POSITIVE_INFINITY
}
