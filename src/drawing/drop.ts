import type { Edit, Id, Place, Sheet } from '../sheet'
import { arrowIndexOf } from './arrow-index'
import type { PlacedArrow, Scene } from './scene'

/** What comes of letting a loose phasor go where its tail lies on a tip. */
export interface Drop {
  readonly edit: Edit
  /** The sum that it becomes a term of; omitted where it hangs on a loose phasor. */
  readonly sum?: Id
  /** The phasor whose tip it was dropped on. */
  readonly on: Id
}

/**
 * What it means to let a loose phasor go with its tail at a place: on the tip of a sum's term of the
 * same quantity it becomes the next term, on that of a loose phasor it hangs there. Undefined where no
 * tip is within reach (millimetres), and for what is not loose.
 */
export function dropAt(
  sheet: Sheet,
  scene: Scene,
  arrow: PlacedArrow,
  tail: Place,
  reach: number,
): Drop | undefined {
  const { phasor, role } = arrow
  if (role !== 'loose' || phasor === undefined) return undefined
  let best: { on: PlacedArrow; away: number } | undefined
  for (const { arrow: on } of arrowIndexOf(scene).tipsNear(tail, reach)) {
    const away = Math.hypot(on.to.x - tail.x, on.to.y - tail.y)
    const isTarget = on.role === 'term' ? on.quantity === arrow.quantity : on.role === 'loose'
    if (!isTarget || away > reach || hangsOn(sheet, on.phasor, phasor)) continue
    if (best === undefined || away < best.away) best = { on, away }
  }
  if (best?.on.phasor === undefined) return undefined
  const { on } = best
  return on.role === 'term' ? asTerm(sheet, on, phasor) : hung(on.phasor as Id, phasor)
}

function asTerm(sheet: Sheet, { key, sum: id, phasor: on = '' }: PlacedArrow, phasor: Id) {
  const sum = sheet.sums?.find((each) => each.id === id)
  if (!sum || sum.equals === phasor) return undefined
  const position = Number(key.split(':').at(-1)) + 1
  const terms = sum.terms.toSpliced(position, 0, { phasor })
  const edits: Edit[] = [
    { kind: 'set-sum', id: sum.id, change: { terms } },
    { kind: 'place-phasor', id: phasor, tail: null },
  ]
  return { edit: { kind: 'several' as const, edits }, sum: sum.id, on }
}

function hung(on: Id, phasor: Id): Drop {
  return { edit: { kind: 'place-phasor', id: phasor, tail: { tipOf: on } }, on }
}

/** Whether a phasor is the other, or hangs on it by way of others. */
function hangsOn(sheet: Sheet, phasor: Id | undefined, other: Id): boolean {
  const tails = new Map(sheet.phasors.map(({ id, tail }) => [id, tail]))
  const seen = new Set<Id>()
  for (let at = phasor; at !== undefined && !seen.has(at); ) {
    if (at === other) return true
    seen.add(at)
    const tail = tails.get(at)
    at = tail && 'tipOf' in tail ? tail.tipOf : undefined
  }
  return false
}
