import type { Drawing, Evaluation, Place, Sheet, UnitsPerCentimetre } from '../../sheet'
import type { Box } from '../geometry'
import type { PlacedArrow } from '../scene'
import type { Scales } from './extent'
import type { Figure, Member } from './figure'
import { figuresOf } from './figures'
import { firstScale, fitToArea } from './fit'

/** What a drag holds still: with the scene itself, nothing moves but what the drag changes. */
export interface Frozen {
  readonly origin: Place
  readonly unitsPerCentimetre: UnitsPerCentimetre
  /** Where figures start that the layout set apart; omitted, they are arranged anew. */
  readonly starts?: ReadonlyMap<string, Place>
}

/** The arrows of a sheet on its paper. */
export interface Placement {
  readonly arrows: readonly PlacedArrow[]
  readonly origin: Place
  readonly unitsPerCentimetre: UnitsPerCentimetre
  readonly starts: ReadonlyMap<string, Place>
}

/**
 * Places every arrow whose value is known. The tail of each lies exactly on the tip that it follows,
 * and its length is its magnitude by the scale of its quantity.
 *
 * @param area Where there is room to draw, in millimetres.
 * @param within Places only the figures of arrows with these keys. They stand where they did only where
 *   `frozen` holds their starts.
 */
export function place(
  sheet: Sheet,
  evaluation: Evaluation,
  area: Box,
  frozen?: Frozen,
  within?: ReadonlySet<string>,
): Placement {
  const figures = figuresOf(sheet, evaluation, within)
  const { origin, starts, scales } = settle(figures, sheet.drawing ?? {}, area, frozen)
  const arrows: PlacedArrow[] = []
  for (const figure of figures) {
    placeFigure(figure, figure.start ?? starts.get(figure.key) ?? origin, scales, arrows)
  }
  const unitsPerCentimetre = within
    ? { ...frozen?.unitsPerCentimetre, ...Object.fromEntries(scales) }
    : Object.fromEntries(scales)
  return { arrows, origin, unitsPerCentimetre, starts }
}

function settle(
  figures: readonly Figure[],
  drawing: Drawing,
  area: Box,
  frozen: Frozen | undefined,
): { origin: Place; starts: ReadonlyMap<string, Place>; scales: Scales } {
  if (!frozen) return fitToArea(figures, drawing, area)
  const { origin, unitsPerCentimetre, starts } = frozen
  if (!starts) return fitToArea(figures, { origin, unitsPerCentimetre }, area)
  const scales: Scales = new Map()
  const known = { ...drawing.unitsPerCentimetre, ...unitsPerCentimetre }
  for (const { members } of figures) {
    for (const { quantity } of members) {
      if (scales.has(quantity)) continue
      scales.set(quantity, known[quantity] ?? firstScale(figures, quantity, area))
    }
  }
  return { origin, starts, scales }
}

function placeFigure(
  { members }: Figure,
  start: Place,
  scales: Scales,
  arrows: PlacedArrow[],
): void {
  const first = arrows.length
  for (const member of members) {
    const from = member.after < 0 ? start : (arrows[first + member.after] as PlacedArrow).to
    arrows.push(placeMember(member, from, scales.get(member.quantity) ?? 1))
  }
}

function placeMember(
  { key, role, phasor, sum, sign, quantity, vector }: Member,
  from: Place,
  unitsPerCentimetre: number,
): PlacedArrow {
  const to = {
    x: from.x + (vector.re * 10) / unitsPerCentimetre,
    y: from.y + (vector.im * 10) / unitsPerCentimetre,
  }
  // Written out, because spreading takes most of the time of a drag's frame.
  if (phasor === undefined) {
    return sum === undefined
      ? { key, role, sign, quantity, from, to }
      : { key, role, sum, sign, quantity, from, to }
  }
  return sum === undefined
    ? { key, role, phasor, sign, quantity, from, to }
    : { key, role, phasor, sum, sign, quantity, from, to }
}
