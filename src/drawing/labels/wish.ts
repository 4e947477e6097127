import type { Place } from '../../sheet'
import type { TextRun } from '../scene'

/** A label that is to find its place. */
export interface Wish {
  /** The key of the arrow that it belongs to. */
  readonly arrow: string
  /** What it names: a stretch from tail to tip, a point where both are the same. */
  readonly from: Place
  readonly to: Place
  /** The whole text, and the least that serves. */
  readonly full: readonly TextRun[]
  readonly short: readonly TextRun[]
  readonly fill: string
  /** Where along the stretch it stands best, 0 at the tail, and whether past the tip is as good. */
  readonly along: number
  readonly isBestAtTip: boolean
  /** The side it stands best on, looking along the stretch: 1 left, −1 right, 0 either. */
  readonly side: 1 | -1 | 0
  /** Half the width of what is drawn there: the label keeps clear of it. */
  readonly reach: number
  /** The label of an angle stands about an arc instead. */
  readonly arc?: { readonly centre: Place; readonly radius: number; readonly sweep: number }
}
