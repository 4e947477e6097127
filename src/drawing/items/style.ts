import type { Quantity } from '../../sheet'
import type { PlacedArrow } from '../scene'
import type { Palette } from '../theme'

/** The shapes of arrowheads; each quantity has its own. */
export type HeadShape = 'closed' | 'open' | 'hollow' | 'double' | 'barb'

/** How an arrow is drawn; lengths in millimetres. */
export interface ArrowStyle {
  readonly shape: HeadShape
  readonly colour: string
  /** Of the shaft. */
  readonly width: number
  readonly headLength: number
  /** Half the breadth of the head. */
  readonly headReach: number
}

/** Line widths in millimetres. */
export const WIDTHS = {
  fineGrid: 0.08,
  grid: 0.13,
  thin: 0.18,
  arrow: 0.5,
  heavy: 1.1,
  frame: 0.5,
  gap: 0.5,
} as const

/** Voltage closed, current open (common practice, no source); the others are this program's own. */
export const HEAD_SHAPES: { readonly [quantity in Quantity]: HeadShape } = {
  voltage: 'closed',
  current: 'open',
  impedance: 'hollow',
  power: 'double',
  other: 'barb',
}

/** Length and half breadth of each head on a shaft of 0.5 mm, in millimetres. */
export const HEADS: { readonly [shape in HeadShape]: readonly [number, number] } = {
  closed: [4.4, 1.15],
  open: [4.2, 1.5],
  hollow: [4.8, 1.5],
  double: [5.6, 1.15],
  barb: [4.6, 1.7],
}

/** How much larger the head of a heavy arrow is. */
const HEAVY_HEAD = 1.45

/** What a hand drew: thin, with a blunt open head that no quantity has, whatever it stands for. */
const HAND = { shape: 'open', width: 0.35, headLength: 3, headReach: 2.3 } as const

/** The style of an arrow: its head tells the quantity, heavy ink an exact resultant. */
export function styleOf({ role, quantity }: PlacedArrow, palette: Palette): ArrowStyle {
  if (role === 'hand') return { ...HAND, colour: palette.gap }
  const shape = HEAD_SHAPES[quantity]
  const [length, reach] = HEADS[shape]
  return role === 'resultant'
    ? {
        shape,
        colour: palette.ink,
        width: WIDTHS.heavy,
        headLength: length * HEAVY_HEAD,
        headReach: reach * HEAVY_HEAD,
      }
    : {
        shape,
        colour: palette.quantities[quantity],
        width: WIDTHS.arrow,
        headLength: length,
        headReach: reach,
      }
}
