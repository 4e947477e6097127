import type { CircuitElement } from '../../sheet'
import type { Item } from '../scene'
import { labelRuns } from '../text/label-runs'
import type { Palette } from '../theme'
import { arcItem, outlineItem, wireItem, wordItem } from './items'

/** How wide every symbol of an element is, from wire to wire, in millimetres. */
export const SYMBOL_WIDTH = 12
/** How far a symbol reaches above and below its wire, in millimetres. */
export const SYMBOL_REACH = 4
/** The radius of the circle of a source, in millimetres. */
export const SOURCE_RADIUS = 5

/** Line widths in millimetres: of wires, and of symbols. */
export const INK = { wire: 0.25, symbol: 0.4 } as const

const HUMPS = 4
const PLATE_GAP = 1.2

/**
 * The symbol of an element from (0, 0) to (`SYMBOL_WIDTH`, 0), as IEC 60617 draws it: a resistor as a
 * rectangle, a coil as humps, a capacitor as two plates; any other impedance as a rectangle with its
 * letter.
 */
export function symbolItems(kind: CircuitElement['kind'], palette: Palette): readonly Item[] {
  switch (kind) {
    case 'resistor':
      return [rectangle(palette)]
    case 'impedance':
      return [rectangle(palette), letter(palette)]
    case 'coil':
      return humps(palette)
    case 'capacitor':
      return plates(palette)
  }
}

function rectangle({ ink }: Palette): Item {
  const half = SYMBOL_REACH - 1.5
  return outlineItem([0, -half, SYMBOL_WIDTH, -half, SYMBOL_WIDTH, half, 0, half], {
    closed: true,
    stroke: ink,
    width: INK.symbol,
  })
}

function letter({ ink }: Palette): Item {
  return wordItem({ x: SYMBOL_WIDTH / 2, y: -1.3 }, 'middle', labelRuns('Z', 4), ink)
}

function humps({ ink }: Palette): readonly Item[] {
  const radius = SYMBOL_WIDTH / HUMPS / 2
  return Array.from({ length: HUMPS }, (_, at) =>
    arcItem({ x: (2 * at + 1) * radius, y: 0 }, radius, [180, -180], {
      stroke: ink,
      width: INK.symbol,
    }),
  )
}

function plates({ ink }: Palette): readonly Item[] {
  const [left, right] = [SYMBOL_WIDTH / 2 - PLATE_GAP, SYMBOL_WIDTH / 2 + PLATE_GAP]
  return [
    wireItem([0, 0, left, 0, right, 0, SYMBOL_WIDTH, 0], ink, INK.wire),
    wireItem(
      [left, -SYMBOL_REACH, left, SYMBOL_REACH, right, -SYMBOL_REACH, right, SYMBOL_REACH],
      ink,
      2 * INK.symbol,
    ),
  ]
}

/** The circle of an ac source about (0, 0), with one period of a sine in it. */
export function sourceItems({ ink }: Palette): readonly Item[] {
  const points: number[] = []
  const [reach, height, steps] = [3, 1.8, 24]
  for (let step = 0; step <= steps; step += 1) {
    const turn = (2 * Math.PI * step) / steps
    points.push(reach * (turn / Math.PI - 1), height * Math.sin(turn))
  }
  return [
    arcItem({ x: 0, y: 0 }, SOURCE_RADIUS, [0, 360], { stroke: ink, width: INK.symbol }),
    outlineItem(points, { stroke: ink, width: INK.symbol }),
  ]
}

/** The dot where wires are joined. */
export function jointItem(x: number, y: number, { ink }: Palette): Item {
  return arcItem({ x, y }, 0.7, [0, 360], { fill: ink })
}
