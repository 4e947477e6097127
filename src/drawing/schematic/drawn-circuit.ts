import { type Phasor, type Sheet, type WiredNode, wiringOf } from '../../sheet'
import { measureText } from '../font/measure'
import { type Box, growBox } from '../geometry'
import type { Item, TextRun } from '../scene'
import { formatFrequency } from '../text/quantity-text'
import type { Palette } from '../theme'
import { itemsAt } from './block'
import { directionItems, phasorWords } from './directions'
import { currentItems, leadOfCurrent } from './element-block'
import { wireItem, wordItem } from './items'
import { networkBlock } from './network-block'
import { INK, SOURCE_RADIUS, sourceItems } from './symbols'

/** A schematic by itself: its items, and a box that holds all of them. Millimetres. */
export interface DrawnCircuit {
  readonly items: readonly Item[]
  readonly box: Box
}

/** How far the arrow of the supply stands from the middle of the source. */
const ARROW_AT = SOURCE_RADIUS + 2
/** The wire from the source to the first part, and from the last part down. */
const SHORTEST_LEAD = 4
/** How far the wire back stands below everything. */
const BELOW = 2
const LEAST_HEIGHT = 2 * SOURCE_RADIUS + 6
const TEXT_SIZE = 3.2
const EDGE = 1

/**
 * A sheet's circuit as a schematic: the source on the left, the parts on the wire from its upper end, the
 * wire back below them. Undefined where the sheet has no circuit.
 */
export function drawCircuit(sheet: Sheet, palette: Palette): DrawnCircuit | undefined {
  const circuit = wiringOf(sheet)
  return circuit && drawLoop(sheet, circuit, palette)
}

function drawLoop(sheet: Sheet, circuit: WiredNode, palette: Palette): DrawnCircuit {
  const [across, through] = [circuit.voltage, circuit.current].map((id) =>
    sheet.phasors.find((phasor) => phasor.id === id),
  )
  const block = networkBlock(
    sheet,
    circuit,
    [across, through].flatMap((phasor) => phasor?.id ?? []),
    palette,
  )
  const lead = through ? leadOfCurrent(through) : SHORTEST_LEAD
  const right = lead + block.width + SHORTEST_LEAD
  const depth = Math.max(block.down + BELOW, LEAST_HEIGHT)
  const middle = -depth / 2
  const { ink } = palette
  const words = sourceWords(sheet, across, middle, palette)
  const items: readonly Item[] = [
    wireItem(
      [
        ...[0, middle + SOURCE_RADIUS, 0, 0, 0, 0, lead, 0],
        ...[lead + block.width, 0, right, 0, right, 0, right, -depth],
        ...[right, -depth, 0, -depth, 0, -depth, 0, middle - SOURCE_RADIUS],
      ],
      ink,
      INK.wire,
    ),
    ...itemsAt({ width: 0, up: 0, down: 0, items: sourceItems(palette) }, { x: 0, y: middle }),
    ...words.items,
    ...(through ? currentItems(through, lead, palette) : []),
    ...itemsAt(block, { x: lead, y: 0 }),
  ]
  const box = { left: -words.width, right, bottom: -depth, top: Math.max(block.up, 7) }
  return { items, box: growBox(box, EDGE) }
}

/** The positive direction of the supply beside its source, from the upper end to the lower, and its frequency. */
function sourceWords(
  { frequency }: Sheet,
  supply: Phasor | undefined,
  middle: number,
  palette: Palette,
): { readonly items: readonly Item[]; readonly width: number } {
  const items: Item[] = []
  let widest = 0
  const say = (runs: readonly TextRun[], y: number, fill: string) => {
    items.push(wordItem({ x: -ARROW_AT - 2, y }, 'end', runs, fill))
    widest = Math.max(widest, measureText(runs))
  }
  if (supply) {
    const [top, bottom] = [middle + SOURCE_RADIUS, middle - SOURCE_RADIUS]
    const x = -ARROW_AT
    items.push(...directionItems(supply, { x, y: top }, { x, y: bottom }, palette))
    say(phasorWords(supply).runs, middle + 0.6, palette.quantities[supply.quantity])
  }
  if (frequency) {
    const run: TextRun = { text: formatFrequency(frequency), face: 'sans', size: TEXT_SIZE }
    say([run], middle - 5, palette.quiet)
  }
  return { items, width: widest === 0 ? SOURCE_RADIUS : ARROW_AT + 2 + widest }
}
