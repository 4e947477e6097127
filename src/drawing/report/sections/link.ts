import type { Item } from '../../scene'
import { heading, lines } from '../blocks'
import { heightOf, type Piece } from '../flow'
import type { ModuleMatrix } from '../page'
import type { Section } from '../section'
import { STYLES } from '../style'

/** The light frame that ISO/IEC 18004 asks for, in modules. */
const QUIET_ZONE = 4
/** Smaller modules than these, in millimetres, telephones read only now and then (common practice, no source). */
const SMALLEST_MODULE = 0.36
/** No code is smaller, nor larger than a column has room for: millimetres a side. */
const SMALLEST = 26
const LARGEST = 62

const WORDS =
  'This code is the link to the sheet: a telephone that reads it opens the drawing with all its readings, to be checked or gone on with. The sheet itself is in the code; nothing is kept anywhere else.'
const TOO_LARGE =
  'The link to this sheet is too long for a code that a telephone could read from paper: open the sheet from its file, or from the PDF of this report, which carries it.'

/** The QR code of the link, where it fits. */
export const link: Section = {
  name: 'link',
  blocks: ({ options, width }) => {
    const { code } = options
    if (code === undefined) return []
    const side = sideOf(code)
    if (side > LARGEST)
      return [heading('The sheet', width), { pieces: lines(TOO_LARGE, STYLES.body, width) }]
    const words = lines(WORDS, STYLES.body, width - side - 5)
    const piece: Piece = {
      height: Math.max(side, heightOf(words)),
      draw: ({ x, y }) => {
        const items: Item[] = [codeItem(code, { x, y }, side)]
        let top = y
        for (const line of words) {
          items.push(...line.draw({ x: x + side + 5, y: top }))
          top -= line.height
        }
        return items
      },
    }
    return [heading('The sheet', width), { pieces: [piece] }]
  },
}

function sideOf({ size }: ModuleMatrix): number {
  return Math.max(SMALLEST, (size + 2 * QUIET_ZONE) * SMALLEST_MODULE)
}

/** The dark modules of each row as strokes as broad as a module. */
function codeItem(
  code: ModuleMatrix,
  { x, y }: { readonly x: number; readonly y: number },
  side: number,
): Item {
  const module = side / (code.size + 2 * QUIET_ZONE)
  const segments: number[] = []
  for (let row = 0; row < code.size; row += 1) {
    const level = y - (row + QUIET_ZONE + 0.5) * module
    for (let column = 0; column < code.size; ) {
      let end = column
      while (end < code.size && code.isDark(row, end)) end += 1
      if (end > column) {
        const from = x + (column + QUIET_ZONE) * module
        segments.push(from, level, from + (end - column) * module, level)
      }
      column = end + 1
    }
  }
  return { part: 'qr-code', kind: 'lines', segments, stroke: '#000000', width: module }
}
