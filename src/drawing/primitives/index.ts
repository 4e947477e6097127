import type { Place } from '../../sheet'
import { type Box, joinBoxes, NO_BOX } from '../geometry'
import type { Item } from '../scene'
import { arc } from './arc'
import { lines } from './lines'
import { path } from './path'
import type { Primitive } from './primitive'
import { text } from './text'

const PRIMITIVES: {
  readonly [Kind in Item['kind']]: Primitive<Extract<Item, { kind: Kind }>>
} = { lines, path, arc, text }

/** The smallest box about an item in millimetres, without the width of its stroke. */
export function boundsOf(item: Item): Box {
  return primitiveOf(item).bounds(item)
}

/** The smallest box that holds all the items; `NO_BOX` for none. */
export function boundsOfAll(items: readonly Item[]): Box {
  return items.reduce((box, item) => joinBoxes(box, boundsOf(item)), NO_BOX)
}

/** How far a point is from an item in millimetres: 0 inside what is filled. */
export function distance(item: Item, point: Place): number {
  return primitiveOf(item).distance(item, point)
}

/** An item as an SVG element. */
export function svgOf(item: Item, height: number): string {
  return primitiveOf(item).svg(item, height)
}

/** A table by kind cannot say to the compiler that an item and its entry belong together. */
function primitiveOf({ kind }: Item): Primitive<Item> {
  return PRIMITIVES[kind] as Primitive<Item>
}
