import { type Id, type Phasor, type Reading, referenceOf, type Sheet } from '../sheet'
import type { PlacedArrow, Scene } from './scene'

/** What a change of one phasor's value does to the arrows while origin and scales are held. */
export interface Trace {
  /** Arrows that change in length or direction, or move otherwise than the dragged tip; gaps and arcs with them. */
  readonly live: Set<string>
  /** Arrows that move just as the dragged tip does. */
  readonly carried: Set<string>
}

/** How often the change of the value adds up at the ends of an arrow; NaN where it does so otherwise. */
interface Shift {
  readonly tail: number
  readonly tip: number
}

/**
 * Which arrows follow when a phasor's value changes: its own and the resultants of its sums are live,
 * the terms after it and what hangs on a tip that moves are carried. A phasor whose angle was read
 * against it turns with it, and is live with all that follows.
 *
 * @param dragged The key of the arrow whose tip is dragged, where the phasor is drawn more than once;
 *   omitted, the first.
 */
export function trace(sheet: Sheet, scene: Scene, phasor: Id, dragged?: string): Trace {
  const shifts = shiftsOf(sheet, scene, phasor)
  const held = dragged ?? scene.arrows.find((arrow) => arrow.phasor === phasor)?.key ?? ''
  const tip = shifts.get(held)?.tip
  const live = new Set<string>()
  const carried = new Set<string>()
  for (const { key, role, sum } of scene.arrows) {
    const shift = shifts.get(key)
    if (!shift || (shift.tail === 0 && shift.tip === 0)) continue
    if (shift.tail === shift.tip && shift.tip === tip) carried.add(key)
    else live.add(key)
    if (role === 'measured') live.add(`resultant:${sum}`)
  }
  return { live, carried }
}

function shiftsOf(sheet: Sheet, scene: Scene, phasor: Id): Map<string, Shift> {
  const changed = changedBy(sheet, phasor)
  const phasors = new Map(sheet.phasors.map((each) => [each.id, each]))
  const chains = new Set(
    (sheet.sums ?? []).filter((sum) => sum.arrangement !== 'from-origin').map(({ id }) => id),
  )
  const shifts = new Map<string, Shift>()
  const homes = new Map<Id, Shift>()
  /** How far the tip of a sum's last term shifts, and how far its resultant does. */
  const ends = new Map<Id, number>()
  for (const arrow of scene.arrows) {
    const { key, role, sum = '' } = arrow
    const end = ends.get(sum) ?? 0
    const own = role === 'resultant' ? end : ownShift(arrow, phasor, changed)
    const tail = tailShift(arrow, phasors, homes, chains.has(sum) ? end : 0)
    const shift = { tail, tip: tail + own }
    shifts.set(key, shift)
    if (role === 'term') ends.set(sum, end + own)
    if (arrow.phasor !== undefined && !homes.has(arrow.phasor)) homes.set(arrow.phasor, shift)
  }
  return shifts
}

function ownShift({ phasor, sign }: PlacedArrow, moved: Id, changed: ReadonlySet<Id>): number {
  if (phasor === moved) return sign
  return phasor !== undefined && changed.has(phasor) ? Number.NaN : 0
}

function tailShift(
  { role, phasor = '' }: PlacedArrow,
  phasors: ReadonlyMap<Id, Phasor>,
  homes: ReadonlyMap<Id, Shift>,
  end: number,
): number {
  if (role === 'term') return end
  const tail = role === 'loose' ? phasors.get(phasor)?.tail : undefined
  return tail && 'tipOf' in tail ? (homes.get(tail.tipOf)?.tip ?? 0) : 0
}

/** The phasors whose angles were read against this one, or from power with it, by way of others too. */
function changedBy(sheet: Sheet, phasor: Id): Set<Id> {
  const reference = referenceOf(sheet)
  const changed = new Set([phasor])
  const ties = (sheet.readings ?? []).flatMap((reading) => tiesOf(reading, reference))
  let before = 0
  while (changed.size > before) {
    before = changed.size
    for (const [from, to] of ties) if (changed.has(from)) changed.add(to)
  }
  return changed
}

/** Of whose change a reading makes whose: power ties voltage and current both ways. */
function tiesOf(reading: Reading, reference: Id | undefined): (readonly [Id, Id])[] {
  if (reading.struck || reading.kind === 'magnitude') return []
  if ('with' in reading) {
    return [
      [reading.of, reading.with],
      [reading.with, reading.of],
    ]
  }
  const against = reading.against ?? reference
  return against === undefined ? [] : [[against, reading.of]]
}
