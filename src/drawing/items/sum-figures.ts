import type { Id, Sheet } from '../../sheet'
import type { PlacedArrow } from '../scene'

/** What of a sum is compared on the paper. */
export interface SumFigure {
  readonly id: Id
  /** It must come back to its start: its resultant is its closing error. */
  readonly isClosing: boolean
  readonly terms: readonly PlacedArrow[]
  readonly resultant?: PlacedArrow
  readonly measured?: PlacedArrow
}

/** The sums that are drawn, in the sheet's order. */
export function sumFiguresOf(sheet: Sheet, arrows: readonly PlacedArrow[]): SumFigure[] {
  const bySum = new Map<Id, PlacedArrow[]>()
  for (const arrow of arrows) {
    if (arrow.sum === undefined) continue
    const own = bySum.get(arrow.sum)
    if (own) own.push(arrow)
    else bySum.set(arrow.sum, [arrow])
  }
  return (sheet.sums ?? []).flatMap(({ id, equals }) => {
    const own = bySum.get(id)
    if (!own) return []
    const resultant = own.find(({ role }) => role === 'resultant')
    const measured = own.find(({ role }) => role === 'measured')
    return [
      {
        id,
        isClosing: equals === 0,
        terms: own.filter(({ role }) => role === 'term'),
        ...(resultant && { resultant }),
        ...(measured && { measured }),
      },
    ]
  })
}

/** The keys of resultants that are drawn as a gap alone. */
export function closingKeys(figures: readonly SumFigure[]): Set<string> {
  return new Set(
    figures.flatMap(({ isClosing, resultant }) => (isClosing && resultant ? [resultant.key] : [])),
  )
}

/** How long an arrow is on the paper, in millimetres. */
export function lengthOf({ from, to }: PlacedArrow): number {
  return Math.hypot(to.x - from.x, to.y - from.y)
}
