import { add, type Complex, scaleBy, subtract, ZERO } from '../../core'
import type { HandArrow, Id, PhasorId, Sum, UnitsPerCentimetre } from '../types'
import type { Seat } from './seats'

/** Where exact values come from: undefined where a value is open. */
export interface Exact {
  readonly phasor: (id: PhasorId) => Complex | undefined
  readonly resultant: (sum: Id) => Complex | undefined
}

/** The construction of one sum: what each of its hand arrows inherits from those before it, in the unit. */
export interface Construction {
  readonly inherited: ReadonlyMap<Id, Complex>
}

/**
 * The constructions on a sheet, by sum. A construction begins at the tail of its first term that was
 * drawn, wherever that lies; from there on each tail should lie at the exact sum of the terms between.
 */
export function constructionsOf(
  seats: readonly Seat[],
  scales: UnitsPerCentimetre | undefined,
  exact: Exact,
): ReadonlyMap<Id, Construction> {
  const bySum = new Map<Id, Seat[]>()
  for (const seat of seats) {
    if (seat.sum === undefined || seat.position === undefined) continue
    const own = bySum.get(seat.sum.id)
    if (own) own.push(seat)
    else bySum.set(seat.sum.id, [seat])
  }
  const constructions = new Map<Id, Construction>()
  for (const [id, own] of bySum) {
    const [{ sum, quantity }] = own as [Seat]
    const scale = scales?.[quantity]
    if (sum && scale !== undefined) {
      constructions.set(id, { inherited: inheritedIn(sum, own, scale / 10, exact) })
    }
  }
  return constructions
}

function inheritedIn(
  sum: Sum,
  seats: readonly Seat[],
  perMillimetre: number,
  exact: Exact,
): ReadonlyMap<Id, Complex> {
  const drawn: (HandArrow | undefined)[] = sum.terms.map(
    (_, index) => seats.find(({ position }) => position === index)?.arrow,
  )
  const inherited = new Map<Id, Complex>()
  const first = drawn.find((arrow) => arrow !== undefined)
  if (first === undefined) return inherited
  const from = (point: HandArrow['from']) =>
    scaleBy({ re: point.x - first.from.x, im: point.y - first.from.y }, perMillimetre)
  const tails = exactTails(sum, drawn.indexOf(first), exact)
  drawn.forEach((arrow, index) => {
    const tail = tails[index]
    if (arrow && tail) inherited.set(arrow.id, subtract(from(arrow.from), tail))
  })
  const closing = seats.find(({ position }) => position === 'closing')?.arrow
  const joined = joinedBy(sum, drawn, from, perMillimetre)
  const whole = exact.resultant(sum.id)
  if (closing && joined && whole) inherited.set(closing.id, subtract(joined, whole))
  return inherited
}

/** How far from the first tail that was drawn each tail should lie; undefined beyond an open term. */
function exactTails(
  { terms, arrangement }: Sum,
  first: number,
  exact: Exact,
): readonly (Complex | undefined)[] {
  let tail: Complex | undefined = ZERO
  return terms.map(({ phasor, sign = 1 }, index) => {
    if (arrangement === 'from-origin') return ZERO
    if (index < first) return undefined
    const here = tail
    const value = exact.phasor(phasor)
    tail = here && value && add(here, scaleBy(value, sign))
    return here
  })
}

/**
 * What the terms as drawn give the closing arrow to join: from where they begin to where they end.
 * Undefined while they do not reach from one to the other.
 */
function joinedBy(
  { arrangement }: Sum,
  drawn: readonly (HandArrow | undefined)[],
  from: (point: HandArrow['from']) => Complex,
  perMillimetre: number,
): Complex | undefined {
  if (arrangement !== 'from-origin') {
    const last = drawn.at(-1)
    return drawn[0] && last && from(last.to)
  }
  if (drawn.some((arrow) => arrow === undefined)) return undefined
  const vectors = drawn.flatMap((arrow) => (arrow ? [scaleBy(vectorOf(arrow), perMillimetre)] : []))
  return vectors.reduce(add, ZERO)
}

/** An arrow from its tail to its tip on the paper, in millimetres. */
export function vectorOf({ from, to }: HandArrow): Complex {
  return { re: to.x - from.x, im: to.y - from.y }
}
