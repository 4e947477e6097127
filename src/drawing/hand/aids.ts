import { cosDegrees, formatAngle, sinDegrees, wrapDegrees } from '../../core'
import type { Place } from '../../sheet'
import { WIDTHS } from '../items/style'
import type { Item, LinesItem } from '../scene'
import type { Palette } from '../theme'

const TICK = { degree: 0.03, five: 0.06, ten: 0.1 } as const
/** Millimetres of the rule's ticks. */
const RULE = { one: 1, five: 1.6, ten: 2.4 } as const
/** How far the rule reaches beyond the arrow. */
const BEYOND = 20
const LABEL_SHARE = 0.8

/**
 * A protractor about the tail of an arrow that is being drawn: a ring with a tick every 5° (every
 * degree on a large one), every 30° named, 0° along the reference and positive anticlockwise.
 *
 * @param radius Millimetres.
 */
export function protractorItems(tail: Place, radius: number, palette: Palette): Item[] {
  const step = radius >= 45 ? 1 : 5
  const segments: number[] = []
  for (let degrees = 0; degrees < 360; degrees += step) {
    const share = degrees % 10 === 0 ? TICK.ten : degrees % 5 === 0 ? TICK.five : TICK.degree
    const [x, y] = [cosDegrees(degrees), sinDegrees(degrees)]
    const inner = radius * (1 - share)
    segments.push(tail.x + x * inner, tail.y + y * inner, tail.x + x * radius, tail.y + y * radius)
  }
  const ring: Item = {
    part: 'aid',
    kind: 'arc',
    centre: tail,
    radius,
    start: 0,
    sweep: 360,
    stroke: palette.thin,
    width: WIDTHS.thin,
  }
  return [ring, lines(segments, palette), ...namesOf(tail, radius, palette)]
}

function namesOf(tail: Place, radius: number, palette: Palette): Item[] {
  const size = 0.09 * radius
  return Array.from({ length: 12 }, (_, index): Item => {
    const degrees = 30 * index
    const at = LABEL_SHARE * radius
    return {
      part: 'aid',
      kind: 'text',
      at: {
        x: tail.x + at * cosDegrees(degrees),
        y: tail.y + at * sinDegrees(degrees) - 0.36 * size,
      },
      anchor: 'middle',
      runs: [{ text: formatAngle(wrapDegrees(degrees), { resolution: 1 }), face: 'sans', size }],
      fill: palette.quiet,
    }
  })
}

/** A rule along an arrow that is being drawn, in millimetres from its tail on. */
export function ruleItems(tail: Place, tip: Place, palette: Palette): Item[] {
  const length = Math.hypot(tip.x - tail.x, tip.y - tail.y)
  if (length === 0) return []
  const [x, y] = [(tip.x - tail.x) / length, (tip.y - tail.y) / length]
  const end = 10 * Math.ceil((length + BEYOND) / 10)
  const segments = [tail.x, tail.y, tail.x + x * end, tail.y + y * end]
  for (let at = 0; at <= end; at += 1) {
    const tick = at % 10 === 0 ? RULE.ten : at % 5 === 0 ? RULE.five : RULE.one
    const [left, top] = [tail.x + x * at, tail.y + y * at]
    // On the right of the arrow, so that the arrow itself stays clear.
    segments.push(left, top, left + y * tick, top - x * tick)
  }
  return [lines(segments, palette)]
}

function lines(segments: readonly number[], palette: Palette): LinesItem {
  return {
    part: 'aid',
    kind: 'lines',
    segments,
    stroke: palette.thin,
    width: WIDTHS.thin,
  }
}
