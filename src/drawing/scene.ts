import type { Id, Place, Quantity, UnitsPerCentimetre } from '../sheet'

/** A stretch of text in one face. `rise` shifts the baseline up (negative: down), in millimetres. */
export interface TextRun {
  readonly text: string
  /** `sans` is upright, `symbol` the italic of quantity symbols. */
  readonly face: 'sans' | 'bold' | 'symbol'
  /** Height of the em in millimetres. */
  readonly size: number
  readonly rise?: number
}

interface ItemCommon {
  /** What the item shows, so that a renderer can leave a part out. */
  readonly part:
    | 'paper'
    | 'grid'
    | 'frame'
    | 'axis'
    | 'arrow'
    | 'angle'
    | 'gap'
    | 'region'
    | 'construction'
    | 'aid'
    | 'label'
    | 'scale-bar'
    | 'title-block'
    | 'stamp'
    | 'schematic'
    | 'predicted'
    | 'report'
    | 'check-line'
    | 'qr-code'
  /** The key of the placed arrow that it belongs to. */
  readonly arrow?: string
}

interface Stroke {
  readonly stroke?: string
  /** Millimetres. */
  readonly width?: number
  /** Millimetres on, off, … */
  readonly dash?: readonly number[]
}

/** Straight strokes, four figures each: x1, y1, x2, y2, in one style. */
export type LinesItem = ItemCommon &
  Stroke & { readonly kind: 'lines'; readonly segments: readonly number[] }
/** A chain of points x, y, …; closed and filled where it has a fill. */
export type PathItem = ItemCommon &
  Stroke & {
    readonly kind: 'path'
    readonly points: readonly number[]
    readonly closed?: boolean
    readonly fill?: string
  }
/** An arc about a centre, from `start` anticlockwise through `sweep` degrees (negative: clockwise). */
export type ArcItem = ItemCommon &
  Stroke & {
    readonly kind: 'arc'
    readonly centre: Place
    readonly radius: number
    readonly start: number
    readonly sweep: number
    readonly fill?: string
  }
/** One line of text; `at` is on the baseline. */
export type TextItem = ItemCommon & {
  readonly kind: 'text'
  readonly at: Place
  readonly anchor: 'start' | 'middle' | 'end'
  readonly runs: readonly TextRun[]
  readonly fill: string
  /** Degrees by which it is turned about `at`, anticlockwise; not at all where nothing is said. */
  readonly turn?: number
  /** The colour of a halo that keeps the text clear of what lies under it. */
  readonly halo?: string
}

/** A primitive in millimetres, y up, with its style resolved: renderers decide nothing. */
export type Item = LinesItem | PathItem | ArcItem | TextItem

/**
 * An arrow as it lies on the paper. The resultant of a sum that must close is listed like any other,
 * and drawn as a gap alone: what it is short of its start.
 */
export interface PlacedArrow {
  /**
   * Unique in the scene and stable while values change: `term:s1:0`, `measured:s1`, `resultant:s1`,
   * `loose:V1`, `hand:h1`.
   */
  readonly key: string
  readonly role: 'term' | 'resultant' | 'measured' | 'loose' | 'hand'
  /** The phasor it shows; a resultant shows none, nor does what a hand drew. */
  readonly phasor?: Id
  /** The hand arrow that it is. */
  readonly hand?: Id
  /** Set on the hand arrow that closes a sum. */
  readonly isClosing?: true
  readonly sum?: Id
  readonly sign: 1 | -1
  readonly quantity: Quantity
  readonly from: Place
  readonly to: Place
}

/** A sheet laid out on its paper: what every renderer paints, in painting order. */
export interface Scene {
  /** Paper size in millimetres. */
  readonly width: number
  readonly height: number
  readonly items: readonly Item[]
  readonly arrows: readonly PlacedArrow[]
  readonly origin: Place
  /** Only of the quantities that are drawn. */
  readonly unitsPerCentimetre: UnitsPerCentimetre
  /** Where figures start that the layout set apart from the origin: `sum:s2`, `loose:I`. */
  readonly starts: ReadonlyMap<string, Place>
  readonly title: string
  readonly description: string
  /** How many labels found no free place. */
  readonly labelsLeftOut: number
  /** Set where there is a verdict and no room for its stamp. */
  readonly isStampLeftOut?: true
  /** How many predicted arrows reach beyond the frame, and are not drawn; left out where none does. */
  readonly predictedLeftOut?: number
  /** Set where there is a circuit and no room for its schematic. */
  readonly isSchematicLeftOut?: true
}
