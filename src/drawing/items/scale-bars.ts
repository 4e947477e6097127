import type { Place, Quantity, UnitsPerCentimetre } from '../../sheet'
import { measureText } from '../font/measure'
import { type Box, joinBoxes, NO_BOX } from '../geometry'
import type { Item, TextRun } from '../scene'
import { QUANTITIES } from '../text/quantities'
import { formatScale } from '../text/quantity-text'
import type { Palette } from '../theme'

const ROW_HEIGHT = 7
const INSET = 7
const BAR = 10
const TICK = 1.3
/** Height of the text beside the bars, in millimetres. */
export const SCALE_TEXT_SIZE = 3.5

/** The scale bars: one for each quantity that is drawn, and the box that each takes. */
export interface ScaleBars {
  readonly boxes: readonly Box[]
  readonly items: readonly Item[]
}

/** How high the scale bars of so many quantities stand above the frame, in millimetres. */
export function scaleBarsHeight(count: number): number {
  return count === 0 ? 0 : INSET + count * ROW_HEIGHT
}

/** Where the bar of a row begins: rows count upwards from the lowest. */
export function barPlace(row: number, frame: Box): Place {
  return { x: frame.left + INSET, y: frame.bottom + INSET + row * ROW_HEIGHT }
}

/** Bars 10 mm long in the lower left corner, each saying what it stands for. */
export function createScaleBars(
  unitsPerCentimetre: UnitsPerCentimetre,
  frame: Box,
  palette: Palette,
): ScaleBars {
  const drawn = QUANTITIES.filter((quantity) => unitsPerCentimetre[quantity] !== undefined)
  const boxes: Box[] = []
  const items: Item[] = []
  drawn.forEach((quantity, index) => {
    const { x, y } = barPlace(drawn.length - 1 - index, frame)
    const text: TextRun = {
      text: formatScale(unitsPerCentimetre[quantity] ?? 1, quantity),
      face: 'sans',
      size: SCALE_TEXT_SIZE,
    }
    items.push(barItem(x, y, quantity, palette), {
      part: 'scale-bar',
      kind: 'text',
      at: { x: x + BAR + 3, y: y - 0.36 * SCALE_TEXT_SIZE },
      anchor: 'start',
      runs: [text],
      fill: palette.ink,
    })
    const right = x + BAR + 3 + measureText([text])
    boxes.push({ left: x - 0.5, right, bottom: y - 2.5, top: y + 2.5 })
  })
  return { boxes, items }
}

/** The smallest box about all bars. */
export function boxOfScaleBars({ boxes }: ScaleBars): Box {
  return boxes.reduce(joinBoxes, NO_BOX)
}

function barItem(x: number, y: number, quantity: Quantity, palette: Palette): Item {
  const [end, middle] = [x + BAR, x + BAR / 2]
  return {
    part: 'scale-bar',
    kind: 'lines',
    segments: [
      ...[x, y, end, y],
      ...[x, y - TICK, x, y + TICK],
      ...[end, y - TICK, end, y + TICK],
      ...[middle, y - TICK / 2, middle, y + TICK / 2],
    ],
    stroke: palette.quantities[quantity],
    width: 0.4,
  }
}
