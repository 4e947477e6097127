import type { Place } from '../sheet'
import type { PlacedArrow, Scene } from './scene'

/** What an edit does to the arrows of a scene while the rest stands still. */
export interface Displacement {
  /** Arrows that change in length or direction. */
  readonly live: ReadonlySet<string>
  /** Arrows that only move, all of one group by the same distance. */
  readonly carried: readonly ReadonlySet<string>[]
}

const nothing = 1e-9

/**
 * Sorts the arrows by what became of them between two scenes on the same paper. A resultant is live
 * where the phasor that it is compared with changed, because the gap between them did; so is what a
 * hand drew for a sum in which anything changed.
 */
export function displacementBetween(before: Scene, after: Scene): Displacement {
  const earlier = new Map(before.arrows.map((arrow) => [arrow.key, arrow]))
  const live = new Set<string>()
  const carried = new Map<string, Set<string>>()
  for (const arrow of after.arrows) {
    const old = earlier.get(arrow.key)
    const moved = old && displacementOf(old, arrow)
    if (moved === 'still') continue
    if (moved === undefined || moved === 'changed') {
      live.add(arrow.key)
      if (arrow.role === 'measured') live.add(`resultant:${arrow.sum}`)
      continue
    }
    const name = `${moved.x.toFixed(6)} ${moved.y.toFixed(6)}`
    const group = carried.get(name) ?? new Set<string>()
    carried.set(name, group.add(arrow.key))
  }
  for (const { key, sum } of handTouched(after, live)) {
    live.add(key)
    if (sum !== undefined) live.add(`resultant:${sum}`)
    for (const group of carried.values()) group.delete(key)
  }
  return { live, carried: [...carried.values()].filter(({ size }) => size > 0) }
}

function handTouched({ arrows }: Scene, live: ReadonlySet<string>): readonly PlacedArrow[] {
  const drawn = arrows.filter(({ role }) => role === 'hand')
  if (drawn.length === 0) return drawn
  const sums = new Set(arrows.flatMap(({ key, sum }) => (live.has(key) && sum ? [sum] : [])))
  return drawn.filter(({ sum }) => sum !== undefined && sums.has(sum))
}

function displacementOf(old: PlacedArrow, now: PlacedArrow): Place | 'still' | 'changed' {
  const tail = { x: now.from.x - old.from.x, y: now.from.y - old.from.y }
  const tip = { x: now.to.x - old.to.x, y: now.to.y - old.to.y }
  if (Math.hypot(tail.x - tip.x, tail.y - tip.y) > nothing) return 'changed'
  return Math.hypot(tail.x, tail.y) > nothing ? tail : 'still'
}
