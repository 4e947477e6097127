import type { Place } from '../../sheet'
import type { Item } from '../scene'
import { moveItem } from './items'

/**
 * A part of the circuit as it is drawn: its wire comes in at (0, 0) and goes out at (`width`, 0). All of
 * it lies within `up` above and `down` below the wire. Millimetres.
 */
export interface Block {
  readonly width: number
  readonly up: number
  readonly down: number
  readonly items: readonly Item[]
}

/** A block moved to where it stands. */
export function itemsAt({ items }: Block, place: Place): readonly Item[] {
  return items.map((item) => moveItem(item, place))
}

/** A piece of wire. */
export function wireLength(from: number, to: number): readonly number[] {
  return to > from ? [from, 0, to, 0] : []
}
