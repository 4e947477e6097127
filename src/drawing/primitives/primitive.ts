import type { Place } from '../../sheet'
import type { Box } from '../geometry'

/** What every kind of item can be asked. */
export interface Primitive<Kind> {
  /** The smallest box about the item, without the width of its stroke. */
  bounds(item: Kind): Box
  /** How far a point is from the item in millimetres: 0 inside what is filled. */
  distance(item: Kind, point: Place): number
  /** The item as an SVG element; `height` is the paper's, since SVG counts y downwards. */
  svg(item: Kind, height: number): string
}
