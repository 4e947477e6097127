import type { CircuitElement, Phasor } from '../../sheet'
import { measureText } from '../font/measure'
import { shorten } from '../font/shorten'
import type { Item, TextRun } from '../scene'
import { isolate } from '../text/label-runs'
import type { Palette } from '../theme'
import type { Block } from './block'
import { directionItems, phasorWords } from './directions'
import { moveItem, wireItem, wordItem } from './items'
import { INK, SYMBOL_REACH, SYMBOL_WIDTH, symbolItems } from './symbols'
import { valueText } from './values'

/** The phasors whose directions stand at an element. */
export interface Shown {
  readonly voltage?: Phasor | undefined
  readonly current?: Phasor | undefined
}

const TEXT_SIZE = 3.2
const LINE = 4
const WIDEST_TEXT = 40
/** What stays free on both sides of texts, in millimetres. */
const BESIDE = 1.2
const SHORTEST_LEAD = 3
const CURRENT_LEAD = 7
/** Where the arrow of a voltage and the foot of its label stand above the wire. */
const VOLTAGE_AT = { arrow: SYMBOL_REACH + 1.6, label: SYMBOL_REACH + 4 }
const CURRENT_LABEL_AT = 2.9
const UP = SYMBOL_REACH + 8

/** An element: its symbol, what it is called and marked with below, its directions above and before it. */
export function elementBlock(element: CircuitElement, shown: Shown, palette: Palette): Block {
  const lines = linesOf(element)
  const widest = Math.max(0, ...lines.map((run) => measureText([run])))
  const above = shown.voltage ? phasorWords(shown.voltage).width : 0
  const beside = Math.max(SHORTEST_LEAD, (Math.max(widest, above) - SYMBOL_WIDTH) / 2 + BESIDE)
  const start = Math.max(beside, shown.current ? leadOfCurrent(shown.current) : 0)
  const end = start + SYMBOL_WIDTH
  const width = end + beside
  const middle = (start + end) / 2
  const items: readonly Item[] = [
    wireItem([0, 0, start, 0, end, 0, width, 0], palette.ink, INK.wire),
    ...symbolItems(element.kind, palette).map((item) => moveItem(item, { x: start, y: 0 })),
    ...lines.map((run, at) =>
      wordItem({ x: middle, y: -SYMBOL_REACH - (at + 1) * LINE }, 'middle', [run], palette.ink),
    ),
    ...(shown.voltage ? voltageItems(shown.voltage, start, end, palette) : []),
    ...(shown.current ? currentItems(shown.current, start, palette) : []),
  ]
  return { width, up: UP, down: SYMBOL_REACH + lines.length * LINE + 1.5, items }
}

/** What an element is called, and what it is marked with. */
function linesOf(element: CircuitElement): readonly TextRun[] {
  const style = { face: 'sans', size: TEXT_SIZE } as const
  return [element.label || element.id, valueText(element)].flatMap((text) => {
    const fitting = shorten(isolate(text), style, WIDEST_TEXT)
    return fitting === '' ? [] : [{ text: fitting, ...style }]
  })
}

function voltageItems(voltage: Phasor, from: number, to: number, palette: Palette): Item[] {
  const { runs } = phasorWords(voltage)
  const y = VOLTAGE_AT.arrow
  return [
    ...directionItems(voltage, { x: from, y }, { x: to, y }, palette),
    wordItem(
      { x: (from + to) / 2, y: VOLTAGE_AT.label },
      'middle',
      runs,
      palette.quantities[voltage.quantity],
    ),
  ]
}

/** How long the wire before a part must be to carry the direction of a current. */
export function leadOfCurrent(current: Phasor): number {
  return Math.max(CURRENT_LEAD, phasorWords(current).width + 2 * BESIDE)
}

/** The direction of a current on the wire before `start`, with its label above. */
export function currentItems(current: Phasor, start: number, palette: Palette): Item[] {
  const lead = leadOfCurrent(current)
  const middle = start - lead / 2
  return [
    ...directionItems(current, { x: start - lead, y: 0 }, { x: middle + 1.5, y: 0 }, palette),
    wordItem(
      { x: middle, y: CURRENT_LABEL_AT },
      'middle',
      phasorWords(current).runs,
      palette.quantities[current.quantity],
    ),
  ]
}
