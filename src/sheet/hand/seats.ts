import type { HandArrow, Id, PhasorId, Quantity, Sheet, Sum } from '../types'

/** What a hand arrow stands for in the construction that it belongs to. */
export interface Seat {
  readonly arrow: HandArrow
  readonly quantity: Quantity
  /** −1 where it stands for a term that is taken off, and so is drawn reversed. */
  readonly sign: 1 | -1
  /** The sum that is constructed; omitted for an arrow that stands for a phasor by itself. */
  readonly sum?: Sum
  /** Which term of the sum it is, or its closing arrow; omitted for any other phasor. */
  readonly position?: number | 'closing'
}

/** Seats each hand arrow of a sheet, in the sheet's order. */
export function seatsOf(sheet: Sheet): readonly Seat[] {
  const sums = new Map((sheet.sums ?? []).map((sum) => [sum.id, sum]))
  const quantities = new Map(sheet.phasors.map(({ id, quantity }) => [id, quantity]))
  const taken = new Map<Id, Set<number | 'closing'>>()
  return (sheet.hand ?? []).map((arrow) => {
    const sum = sumOf(sheet, sums, arrow)
    const seats = taken.get(sum?.id ?? '') ?? new Set()
    const position = sum && positionIn(sum, arrow.stands, seats)
    if (sum && position !== undefined) taken.set(sum.id, seats.add(position))
    return {
      arrow,
      quantity: quantityOf(quantities, sum, arrow),
      sign: typeof position === 'number' ? (sum?.terms[position]?.sign ?? 1) : 1,
      ...(sum && { sum }),
      ...(position !== undefined && { position }),
    }
  })
}

/** A closing arrow that names no sum closes the first. */
function sumOf(
  sheet: Sheet,
  sums: ReadonlyMap<Id, Sum>,
  { sum, stands }: HandArrow,
): Sum | undefined {
  if (sum !== undefined) return sums.get(sum)
  return stands === 'closing' ? sheet.sums?.[0] : undefined
}

/** The first place that is left: a phasor that is two terms is drawn twice. */
function positionIn(
  { terms }: Sum,
  stands: HandArrow['stands'],
  taken: ReadonlySet<number | 'closing'>,
): number | 'closing' | undefined {
  if (stands === 'closing') return taken.has(stands) ? undefined : stands
  const at = terms.findIndex(({ phasor }, index) => phasor === stands && !taken.has(index))
  return at < 0 ? undefined : at
}

function quantityOf(
  quantities: ReadonlyMap<PhasorId, Quantity>,
  sum: Sum | undefined,
  { stands }: HandArrow,
): Quantity {
  const phasor = stands === 'closing' ? sum?.terms[0]?.phasor : stands
  return quantities.get(phasor ?? '') ?? 'other'
}
