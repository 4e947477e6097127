import type { Place } from '../../sheet'
import type { Box } from '../geometry'
import type { Item } from '../scene'

/** Something of a height that is drawn below and to the right of a place: a line, a rule, a picture. */
export interface Piece {
  /** Millimetres. */
  readonly height: number
  readonly draw: (topLeft: Place) => readonly Item[]
}

/** Pieces that stay together unless they are long: a row of a table, a heading, a paragraph. */
export interface Block {
  readonly pieces: readonly Piece[]
  /** Free millimetres above it, but not at the top of a column. */
  readonly space?: number
  /** Drawn above it again where it begins a column: the head of its table. */
  readonly head?: readonly Piece[]
  /** Is no column's last: a heading stays with what follows. */
  readonly isHeading?: boolean
}

/** What stands on one page. */
export interface FilledPage {
  readonly items: readonly Item[]
}

/** How high pieces are together, in millimetres. */
export function heightOf(pieces: readonly Piece[]): number {
  return pieces.reduce((sum, { height }) => sum + height, 0)
}

/** A block that takes more of a column than this is broken rather than leave so much of one empty. */
const LARGEST_WHOLE = 0.35

/** What a rounding error may let a column run over, in millimetres. */
const ROUNDING = 1e-6

/**
 * Sets blocks one below the other into the columns of as many pages as they need. A block is not broken
 * unless it is long; a long one is broken between its pieces. The columns of every page
 * are alike.
 */
export function flow(blocks: readonly Block[], columns: readonly Box[]): FilledPage[] {
  const pages: Item[][] = []
  const [first] = columns
  const fullHeight = first === undefined ? 0 : first.top - first.bottom
  let column = columns.length
  let y = 0
  let isTop = true

  const box = () => columns[column] as Box
  const room = () => (column >= columns.length ? 0 : y - box().bottom + ROUNDING)
  const next = () => {
    column += 1
    if (column >= columns.length) {
      pages.push([])
      column = 0
    }
    y = box().top
    isTop = true
  }
  const set = (piece: Piece) => {
    pages.at(-1)?.push(...piece.draw({ x: box().left, y }))
    y -= piece.height
    isTop = false
  }

  blocks.forEach((block, index) => {
    const { pieces, head = [], space = 0 } = block
    const wanted = heightOf(pieces) + heightKeptWith(blocks, index, fullHeight)
    const isBreakable = heightOf(head) + wanted > LARGEST_WHOLE * fullHeight
    const needed = isBreakable ? heightOf(pieces.slice(0, 3)) : wanted
    if (room() < (isTop ? 0 : space) + needed) next()
    else if (!isTop) y -= space
    for (const piece of pieces) {
      if (!isTop && room() < piece.height) next()
      if (isTop) for (const part of head) set(part)
      set(piece)
    }
  })
  return pages.map((items) => ({ items }))
}

/** How much of what follows a heading stays with it: up to the first block that is none. */
function heightKeptWith(blocks: readonly Block[], index: number, fullHeight: number): number {
  const following = blocks[index]?.isHeading ? blocks[index + 1] : undefined
  if (following === undefined) return 0
  const { pieces, space = 0 } = following
  const whole = heightOf(pieces)
  const own = whole > LARGEST_WHOLE * fullHeight ? heightOf(pieces.slice(0, 3)) : whole
  return space + own + heightKeptWith(blocks, index + 1, fullHeight)
}
