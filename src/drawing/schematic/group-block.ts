import type { Phasor } from '../../sheet'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { type Block, itemsAt, wireLength } from './block'
import { directionItems, phasorWords } from './directions'
import { currentItems, leadOfCurrent, type Shown } from './element-block'
import { wireItem, wordItem } from './items'
import { INK, jointItem } from './symbols'

/** How far the joints of parallel parts stand before and behind them, in millimetres. */
const STUB = 2.5
/** What stays free between one branch and the next, in millimetres. */
const BETWEEN = 1
/** What the direction of a group's voltage takes above it, and how far its arrow stays from its ends. */
const VOLTAGE_ROOM = 7
const INSET = 3

/** Parts in series, one behind the other on one wire. */
export function seriesBlock(parts: readonly Block[]): Block {
  const items: Item[] = []
  let width = 0
  for (const part of parts) {
    items.push(...itemsAt(part, { x: width, y: 0 }))
    width += part.width
  }
  return {
    width,
    up: Math.max(0, ...parts.map(({ up }) => up)),
    down: Math.max(0, ...parts.map(({ down }) => down)),
    items,
  }
}

/** Parts in parallel: the first on the wire itself, the others hung below it between two joints. */
export function parallelBlock(parts: readonly Block[], palette: Palette): Block {
  const inner = Math.max(0, ...parts.map(({ width }) => width))
  const [left, right] = [STUB, STUB + inner]
  const width = right + STUB
  const items: Item[] = [wireItem([0, 0, left, 0, right, 0, width, 0], palette.ink, INK.wire)]
  let y = 0
  let bottom = 0
  for (const [at, part] of parts.entries()) {
    if (at > 0) y = bottom - BETWEEN - part.up
    bottom = y - part.down
    const free = (inner - part.width) / 2
    items.push(
      ...wires(left, left + free, y, palette),
      ...itemsAt(part, { x: left + free, y }),
      ...wires(right - free, right, y, palette),
    )
    if (at < parts.length - 1) items.push(jointItem(left, y, palette), jointItem(right, y, palette))
  }
  if (y < 0) {
    items.push(wireItem([left, 0, left, y, right, 0, right, y], palette.ink, INK.wire))
  }
  return { width, up: parts[0]?.up ?? 0, down: -bottom, items }
}

function wires(from: number, to: number, y: number, { ink }: Palette): readonly Item[] {
  const segments = wireLength(from, to)
  return segments.length === 0 ? [] : [wireItem([from, y, to, y], ink, INK.wire)]
}

/** A group with the directions of its own current before it, and of its own voltage above it. */
export function withDirections(block: Block, { voltage, current }: Shown, palette: Palette): Block {
  const led = current ? withCurrent(block, current, palette) : block
  return voltage ? withVoltage(led, voltage, palette) : led
}

function withCurrent(block: Block, current: Phasor, palette: Palette): Block {
  const lead = leadOfCurrent(current)
  return {
    ...block,
    up: Math.max(block.up, 7),
    width: lead + block.width,
    items: [
      wireItem([0, 0, lead, 0], palette.ink, INK.wire),
      ...currentItems(current, lead, palette),
      ...itemsAt(block, { x: lead, y: 0 }),
    ],
  }
}

function withVoltage(block: Block, voltage: Phasor, palette: Palette): Block {
  const { runs, width: words } = phasorWords(voltage)
  const width = Math.max(block.width, words + 2 * INSET)
  const free = (width - block.width) / 2
  const y = block.up + 1.4
  return {
    width,
    up: block.up + VOLTAGE_ROOM,
    down: block.down,
    items: [
      ...wires(0, free, 0, palette),
      ...itemsAt(block, { x: free, y: 0 }),
      ...wires(width - free, width, 0, palette),
      ...directionItems(voltage, { x: INSET, y }, { x: width - INSET, y }, palette),
      wordItem({ x: width / 2, y: y + 2.4 }, 'middle', runs, palette.quantities[voltage.quantity]),
    ],
  }
}
