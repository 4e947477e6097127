import { formatQuantity, unitOf } from '../../core'
import type { Place } from '../../sheet'
import { measureText } from '../font/measure'
import { type Box, isInside, isOverlapping } from '../geometry'
import { WIDTHS } from '../items/style'
import { SYMBOL_SIZE, TEXT_SIZE } from '../labels/texts'
import type { Item, PlacedArrow, TextRun } from '../scene'
import { labelRuns } from '../text/label-runs'
import { digitsOf, type ReadingsByPhasor } from '../text/resolution'
import type { Palette } from '../theme'
import { type OpenArc, pointOn } from './arcs'

/** Millimetres on, off. */
const DASH = [2.4, 1.4]
const TEXT_HEIGHT = 5.6
/** Where along an arc a label is tried, in this order. */
const SHARES = [0.08, 0.92, 0.42, 0.58, 0.02, 0.98, 0.5, 0.14, 0.86, 0.3, 0.7, 0.22, 0.78]
/** How fine a shaft is followed, in millimetres. */
const SHAFT_STEP = 2
/** How far a label stands off its arc, in millimetres. */
const GAP = 2.2

/** The arcs of phasors whose angle is open: dashed, in the hue of their quantity. */
export function openArcItems(arcs: readonly OpenArc[], palette: Palette): readonly Item[] {
  return arcs.flatMap(({ phasor, centre, radius, stretches }) =>
    stretches.map(
      ({ start, sweep }): Item => ({
        part: 'angle',
        kind: 'arc',
        centre,
        radius,
        start,
        sweep,
        stroke: palette.quantities[phasor.quantity],
        width: WIDTHS.gap / 2,
        dash: DASH,
      }),
    ),
  )
}

/** What labels of arcs keep clear of. */
export interface Surroundings {
  readonly frame: Box
  readonly taken: readonly Box[]
  readonly readings: ReadingsByPhasor
}

/** Boxes along the shafts of arrows, so fine that a label beside a shaft is not taken to lie on it. */
export function boxesAlong(arrows: readonly PlacedArrow[]): readonly Box[] {
  return arrows.flatMap(({ from, to }) => {
    const length = Math.hypot(to.x - from.x, to.y - from.y)
    const count = Math.min(200, Math.max(1, Math.ceil(length / SHAFT_STEP)))
    return Array.from({ length: count + 1 }, (_, at) => {
      const x = from.x + ((to.x - from.x) * at) / count
      const y = from.y + ((to.y - from.y) * at) / count
      const reach = SHAFT_STEP / 2
      return { left: x - reach, right: x + reach, bottom: y - reach, top: y + reach }
    })
  })
}

/** Boxes along such arcs, so that the label of one is not set on another. */
export function boxesAlongArcs(arcs: readonly OpenArc[]): readonly Box[] {
  return arcs.flatMap(({ centre, radius, stretches }) =>
    stretches.flatMap(({ start, sweep }) => {
      const count = Math.min(720, Math.ceil((radius * sweep * Math.PI) / 180 / SHAFT_STEP))
      return Array.from({ length: count + 1 }, (_, at) => {
        const { x, y } = pointOn(centre, radius, start + (sweep * at) / Math.max(1, count))
        const reach = SHAFT_STEP / 4
        return { left: x - reach, right: x + reach, bottom: y - reach, top: y + reach }
      })
    }),
  )
}

/** The labels of such arcs, and the boxes that they take up. Where there is no room, an arc has none. */
export function openArcLabels(
  arcs: readonly OpenArc[],
  { frame, taken, readings }: Surroundings,
  palette: Palette,
): { readonly items: readonly Item[]; readonly boxes: readonly Box[]; readonly leftOut: number } {
  const items: Item[] = []
  const boxes: Box[] = []
  let leftOut = 0
  for (const arc of arcs) {
    const runs = runsOf(arc, readings)
    const found = spotFor(arc, measureText(runs), frame, [...taken, ...boxes])
    if (found === undefined) {
      leftOut += 1
      continue
    }
    boxes.push(found.box)
    items.push({
      part: 'label',
      kind: 'text',
      at: found.at,
      anchor: 'start',
      runs,
      fill: palette.ink,
      halo: palette.paper,
    })
  }
  return { items, boxes, leftOut }
}

function runsOf({ phasor, magnitude }: OpenArc, readings: ReadingsByPhasor): readonly TextRun[] {
  const { magnitude: digits } = digitsOf(phasor, readings)
  const size = formatQuantity(magnitude, unitOf(phasor.quantity), digits)
  return [
    ...labelRuns(phasor.label, SYMBOL_SIZE),
    { text: ` ${size}, angle open`, face: 'sans', size: TEXT_SIZE },
  ]
}

/** The first place along an arc, just outside it, where a text of that width keeps clear. */
function spotFor(
  { centre, radius, stretches }: OpenArc,
  width: number,
  frame: Box,
  taken: readonly Box[],
): { readonly at: Place; readonly box: Box } | undefined {
  for (const { start, sweep } of stretches) {
    for (const share of SHARES) {
      const degrees = start + share * sweep
      const point = pointOn(centre, radius + GAP, degrees)
      const isLeft = Math.cos((degrees * Math.PI) / 180) < 0
      const left = isLeft ? point.x - width : point.x
      const bottom = point.y - TEXT_HEIGHT / 2
      const box = { left, right: left + width, bottom, top: bottom + TEXT_HEIGHT }
      if (!isInside(box, frame)) continue
      if (!taken.some((other) => isOverlapping(box, other))) {
        return { at: { x: left, y: bottom + 0.3 * TEXT_HEIGHT }, box }
      }
    }
  }
  return undefined
}
