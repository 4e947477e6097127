import { angleOf } from '../../core'
import type { Place } from '../../sheet'
import type { Item, PlacedArrow } from '../scene'
import type { Palette } from '../theme'
import { WIDTHS } from './style'
import { lengthOf, type SumFigure } from './sum-figures'

const LARGEST_RADIUS = 22
const SMALLEST_RADIUS = 6
/** How much nearer the next arc about the same point lies. */
const RADIUS_STEP = 5
/** A shorter arc is a speck, in millimetres. */
const SHORTEST_ARC = 1.5

/** An angle to be drawn: the arc from the reference direction to an arrow. */
export interface AngleArc {
  readonly key: string
  readonly centre: Place
  readonly radius: number
  /** Degrees. */
  readonly sweep: number
}

/** The arcs of the sums: of each resultant, or of what was measured where there is none. */
export function angleArcsOf(figures: readonly SumFigure[]): AngleArc[] {
  const arcs: AngleArc[] = []
  for (const { isClosing, resultant, measured } of figures) {
    const arrow = (isClosing ? undefined : resultant) ?? measured
    const arc = arrow && arcOf(arrow, arcs)
    if (arc) arcs.push(arc)
  }
  return arcs
}

function arcOf(arrow: PlacedArrow, others: readonly AngleArc[]): AngleArc | undefined {
  const { from, to, key } = arrow
  const inside = others.filter(({ centre }) => centre.x === from.x && centre.y === from.y).length
  const radius = Math.min(LARGEST_RADIUS - inside * RADIUS_STEP, 0.45 * lengthOf(arrow))
  const sweep = angleOf({ re: to.x - from.x, im: to.y - from.y })
  if (radius < SMALLEST_RADIUS) return undefined
  const length = (Math.abs(sweep) * Math.PI * radius) / 180
  return length < SHORTEST_ARC ? undefined : { key, centre: from, radius, sweep }
}

/** The arc itself. */
export function angleItem({ key, centre, radius, sweep }: AngleArc, palette: Palette): Item {
  return {
    part: 'angle',
    arrow: key,
    kind: 'arc',
    centre,
    radius,
    start: 0,
    sweep,
    stroke: palette.thin,
    width: WIDTHS.thin,
  }
}
