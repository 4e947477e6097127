import { nextScale, niceScale } from '../../core'
import type { Drawing, Place, Quantity } from '../../sheet'
import { type Box, growBox, isInside, joinBoxes, moveBox, NO_BOX } from '../geometry'
import { type Arrangement, arrange } from './arrange'
import { boxInUnits, boxOfFigure, type Scales } from './extent'
import type { Figure } from './figure'

/** Nothing is made smaller than this to fit, in millimetres. */
const SMALLEST_EXTENT = 2
/** How much of the area the arrows of further quantities take, beside those of the first. */
const FURTHER_SHARE = 0.55
/** What a start at the edge of the area has about it, in millimetres. */
const LEAST_ROOM = 20

/** Scales and places at which everything lies inside the area. */
export interface Fit extends Arrangement {
  readonly scales: Scales
}

/**
 * Chooses for each quantity the largest 1-2-5 scale at which all figures lie inside the area, and
 * arranges them. A scale or an origin that the drawing states is kept, whatever it leads to.
 */
export function fitToArea(figures: readonly Figure[], drawing: Drawing, area: Box): Fit {
  const scales: Scales = new Map()
  const free = new Set<Quantity>()
  for (const { members } of figures) {
    for (const { quantity } of members) {
      if (scales.has(quantity)) continue
      const stated = drawing.unitsPerCentimetre?.[quantity]
      scales.set(quantity, stated ?? firstScale(figures, quantity, area))
      if (stated === undefined) free.add(quantity)
    }
  }
  const first = new Map(scales)
  for (;;) {
    const arrangement = arrange(figures, scales, area, drawing.origin)
    const outside = misfits(figures, scales, arrangement, area)
    const tooLarge = largestOf(outside, scales, free)
    if (tooLarge !== undefined) {
      scales.set(tooLarge, nextScale(scales.get(tooLarge) ?? 1))
      continue
    }
    const isInVain = outside.length > 0 && free.size < scales.size
    if (!isInVain) return { ...arrangement, scales }
    // A stated scale leads out of the area: drawing the others small does not help.
    return { ...arrange(figures, first, area, drawing.origin), scales: first }
  }
}

/** The scale at which each figure's arrows of a quantity would fit by themselves. */
export function firstScale(figures: readonly Figure[], quantity: Quantity, area: Box): number {
  let [width, height] = [0, 0]
  let loose = NO_BOX
  for (const figure of figures) {
    const box = boxInUnits(figure, quantity)
    width = Math.max(width, box.right - box.left)
    height = Math.max(height, box.top - box.bottom)
    if (!figure.isSum && !figure.start) loose = joinBoxes(loose, box)
  }
  width = Math.max(width, loose.right - loose.left)
  height = Math.max(height, loose.top - loose.bottom)
  const share = quantity === firstQuantity(figures) ? 1 : FURTHER_SHARE
  const wide = scaleFor(width, (share * (area.right - area.left)) / 10)
  const high = scaleFor(height, (share * (area.top - area.bottom)) / 10)
  return Math.max(wide, high) || 1
}

/** The quantity that a drawing is about: its first sum's, else its first arrow's. */
function firstQuantity(figures: readonly Figure[]): Quantity | undefined {
  return (figures.find(({ isSum }) => isSum) ?? figures[0])?.quantity
}

/** 0 where nothing has an extent. */
function scaleFor(extent: number, centimetres: number): number {
  return extent > 0 && Number.isFinite(extent) ? niceScale(extent, centimetres) : 0
}

/** The figures that reach out of the area. */
function misfits(
  figures: readonly Figure[],
  scales: Scales,
  { origin, together }: Arrangement,
  area: Box,
): Figure[] {
  const isTogetherInside =
    together.left > together.right || isInside(together, around(area, origin))
  return figures.filter((figure) => {
    if (!figure.start) return !isTogetherInside
    return !isInside(moveBox(boxOfFigure(figure, scales), figure.start), around(area, figure.start))
  })
}

/** The area, and a little about a start that lies at its edge. */
function around(area: Box, { x, y }: Place): Box {
  const start = growBox({ left: x, right: x, bottom: y, top: y }, LEAST_ROOM)
  return growBox(joinBoxes(area, start), 1e-9)
}

/** Which quantity to draw smaller: the one that reaches furthest. */
function largestOf(
  figures: readonly Figure[],
  scales: Scales,
  free: ReadonlySet<Quantity>,
): Quantity | undefined {
  let [largest, most] = [undefined as Quantity | undefined, SMALLEST_EXTENT]
  for (const quantity of free) {
    for (const figure of figures) {
      const box = boxInUnits(figure, quantity)
      const extent = Math.max(box.right - box.left, box.top - box.bottom)
      const scale = scales.get(quantity) ?? 1
      const millimetres = (extent * 10) / scale
      if (millimetres > most && nextScale(scale) > scale) [largest, most] = [quantity, millimetres]
    }
  }
  return largest
}
