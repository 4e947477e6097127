import { formatAngle } from '../../core'
import type { Place } from '../../sheet'
import type { Box } from '../geometry'
import type { AngleArc } from '../items/angles'
import type { Gap } from '../items/gaps'
import { styleOf, WIDTHS } from '../items/style'
import { lengthOf, type SumFigure } from '../items/sum-figures'
import type { Picture } from '../picture'
import type { PlacedArrow, TextRun } from '../scene'
import { digitsOfResult, formatMagnitude, formatPaperLength } from '../text/phasor-text'
import type { Palette } from '../theme'
import { arrowTexts, digitsOfSum } from './arrow-texts'
import { clipToBox } from './clip'
import type { Register } from './register'
import { words } from './texts'
import type { Wish } from './wish'

/** The labels that a drawing should have, the most important first. */
export function wishesOf(
  picture: Picture,
  register: Register,
  frame: Box,
  palette: Palette,
): Wish[] {
  const sums = new Map(picture.figures.map((figure) => [figure.id, figure]))
  const ends = picture.painted.filter(({ role }) => role === 'resultant' || role === 'measured')
  // The shorter an arrow, the fewer places there are beside it.
  const others = picture.painted
    .filter(({ role }) => role === 'term' || role === 'loose')
    .sort((one, other) => lengthOf(one) - lengthOf(other))
  // Beside the exact drawing, what a hand drew needs no names: it lies along what it stands for.
  const drawn = picture.painted.filter(
    ({ role, sum }) => role === 'hand' && isAlone(sums.get(sum ?? '')),
  )
  return [
    ...picture.arcs.map((arc) => angleWish(arc, palette)),
    ...picture.gaps.map((gap) => gapWish(gap, sums, register, palette)),
    ...picture.misses
      .filter(({ isClosing }) => isClosing)
      .map((miss) => pointWish(miss, [words(formatPaperLength(miss.millimetres))], palette)),
    ...[...drawn, ...ends, ...others].map((arrow) =>
      arrowWish(arrow, sums.get(arrow.sum ?? ''), register, palette),
    ),
  ].flatMap((wish) => clipped(wish, frame))
}

/** Outside the frame there is nothing to label. */
function clipped(wish: Wish, frame: Box): Wish[] {
  const visible = clipToBox(wish.from, wish.to, frame)
  return visible ? [{ ...wish, ...visible }] : []
}

function arrowWish(
  arrow: PlacedArrow,
  figure: SumFigure | undefined,
  register: Register,
  palette: Palette,
): Wish {
  const isInChain = arrow.role === 'term' && figure !== undefined && isChain(figure)
  return {
    arrow: arrow.key,
    from: arrow.from,
    to: arrow.to,
    ...arrowTexts(arrow, register),
    fill: arrow.role === 'hand' ? palette.gap : palette.ink,
    along: isInChain ? 0.5 : 0.65,
    isBestAtTip: !isInChain && arrow.role !== 'resultant' && arrow.role !== 'hand',
    side: sideOf(arrow, figure),
    reach: styleOf(arrow, palette).width / 2,
  }
}

/** Whether nothing exact of a sum is drawn. */
function isAlone(figure: SumFigure | undefined): boolean {
  return !figure || (figure.terms.length === 0 && !figure.resultant && !figure.measured)
}

function isChain({ terms }: SumFigure): boolean {
  const [first, second] = terms
  return second === undefined || first?.from !== second.from
}

/**
 * Terms are labelled outside their figure. Of a resultant and what was measured each is labelled on
 * its own side of the other.
 */
function sideOf(arrow: PlacedArrow, figure: SumFigure | undefined): Wish['side'] {
  if (!figure) return 0
  const { resultant, measured, terms } = figure
  if (arrow.role === 'term') return awayFrom(arrow, middleOf(terms))
  const other = arrow.role === 'resultant' ? measured : resultant
  if (other && lengthOf(other) > 0) return awayFrom(arrow, other.to)
  return awayFrom(arrow, middleOf(terms))
}

/** The side of an arrow on which a point does not lie. */
function awayFrom({ from, to }: PlacedArrow, point: Place): Wish['side'] {
  const side = (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x)
  return side > 0 ? -1 : side < 0 ? 1 : 0
}

function middleOf(arrows: readonly PlacedArrow[]): Place {
  let [x, y] = [0, 0]
  for (const { from, to } of arrows) {
    x += (from.x + to.x) / 2 / arrows.length
    y += (from.y + to.y) / 2 / arrows.length
  }
  return { x, y }
}

function angleWish({ key, centre, radius, sweep }: AngleArc, palette: Palette): Wish {
  const text: TextRun[] = [words(formatAngle(sweep))]
  const half = (sweep / 2) * (Math.PI / 180)
  const at = { x: centre.x + radius * Math.cos(half), y: centre.y + radius * Math.sin(half) }
  return {
    arrow: key,
    from: at,
    to: at,
    full: text,
    short: text,
    fill: palette.quiet,
    along: 0.5,
    isBestAtTip: false,
    side: 0,
    reach: WIDTHS.thin,
    arc: { centre, radius, sweep },
  }
}

function gapWish(
  { key, from, to, millimetres }: Gap,
  sums: ReadonlyMap<string, SumFigure>,
  register: Register,
  palette: Palette,
): Wish {
  const figure = [...sums.values()].find(({ resultant }) => resultant?.key === key)
  const sum = register.sums.get(figure?.id ?? '')
  const quantity = figure?.resultant?.quantity ?? 'other'
  const size = register.vectors.sums.get(figure?.id ?? '')?.closingError?.magnitude
  const digits = sum ? digitsOfSum(sum, register) : {}
  const length = formatPaperLength(millimetres)
  const value =
    size === undefined ? length : formatMagnitude(size, quantity, digitsOfResult(size, digits, 1))
  const full = [words(size === undefined ? `gap ${length}` : `gap ${value}, ${length}`)]
  return { ...pointWish({ key, from, to }, full, palette), short: [words(`gap ${value}`)] }
}

function pointWish(
  { key, from, to }: Pick<Gap, 'key' | 'from' | 'to'>,
  text: readonly TextRun[],
  palette: Palette,
): Wish {
  return {
    arrow: key,
    from,
    to,
    full: text,
    short: text,
    fill: palette.gap,
    along: 0.5,
    isBestAtTip: false,
    side: 0,
    reach: 1.3,
  }
}
