import { type Complex, magnitudeOf, niceScale } from '../../core'
import type { Place } from '../../sheet'
import { type Box, growBox } from '../geometry'
import { addArrow } from '../items/arrows'
import { frameItem, gridItems, paperItem } from '../items/paper'
import { WIDTHS } from '../items/style'
import { named, TEXT_SIZE } from '../labels/texts'
import { boundsOfAll } from '../primitives'
import type { Item, PlacedArrow, Scene, TextRun } from '../scene'
import { moveItem } from '../schematic/items'
import { formatScale } from '../text/quantity-text'
import { type Palette, paletteOf, type Theme } from '../theme'
import type { TriangleKind, TriangleSubject } from './triangle-subjects'
import { wordsOfTriangle } from './triangle-words'

/** How large the triangle itself may be, in millimetres. */
const ROOM = { width: 90, height: 60 }
/** What stays free between a side and its label. */
const CLEAR = 3
const LINE = 5.5
const MARGIN = 6
const EDGE = 2
const CELL = 10
/** A part below this share of the whole is drawn as none. */
const NOTHING = 1e-9

/**
 * An impedance or power triangle to scale, on a paper of its own: the real part level, the imaginary part
 * upright at its end, the whole from the start to the end of both. Undefined where there is no such value.
 *
 * @param title What the drawing is saved as.
 */
export function triangleScene(
  kind: TriangleKind,
  subject: TriangleSubject,
  title: string,
  theme: Theme,
): Scene | undefined {
  const exact = kind === 'impedance' ? subject.impedance : subject.power
  if (exact === undefined || magnitudeOf(exact) === 0) return undefined
  const value = withoutRounding(exact)
  const palette = paletteOf(theme)
  const scale = scaleFor(value)
  const drawn = sidesOf(kind, value, scale)
  const items = [
    ...drawn.flatMap((arrow) => arrowItems(arrow, palette)),
    ...labelItems(kind, value, drawn, palette),
  ]
  const lines = captionOf(kind, subject, scale)
  return onPaper(items, lines, palette, {
    title,
    description: `${lines.join('. ')}. ${sentenceOf(kind, value)}`,
    scale: { [kind]: scale },
  })
}

/** A part that is no more than the rounding of the other is none. */
function withoutRounding({ re, im }: Complex): Complex {
  const least = NOTHING * Math.hypot(re, im)
  return { re: Math.abs(re) < least ? 0 : re, im: Math.abs(im) < least ? 0 : im }
}

function scaleFor({ re, im }: Complex): number {
  const wide = Math.abs(re) > 0 ? niceScale(Math.abs(re), ROOM.width / 10) : 0
  const high = Math.abs(im) > 0 ? niceScale(Math.abs(im), ROOM.height / 10) : 0
  return Math.max(wide, high)
}

/** The real part, the imaginary part and the whole, from (0, 0). */
function sidesOf(kind: TriangleKind, { re, im }: Complex, scale: number): readonly PlacedArrow[] {
  const start = { x: 0, y: 0 }
  const corner = { x: (re * 10) / scale, y: 0 }
  const end = { x: corner.x, y: (im * 10) / scale }
  const side = (key: string, role: PlacedArrow['role'], from: Place, to: Place): PlacedArrow => ({
    key,
    role,
    sign: 1,
    quantity: kind,
    from,
    to,
  })
  return [
    side('whole', 'resultant', start, end),
    side('real', 'term', start, corner),
    side('imaginary', 'term', corner, end),
  ]
}

function arrowItems(arrow: PlacedArrow, palette: Palette): readonly Item[] {
  const items: Item[] = []
  addArrow(items, arrow, palette)
  return items
}

/** Each side's label on the side that lies outside the triangle. */
function labelItems(
  kind: TriangleKind,
  value: Complex,
  [whole, real, imaginary]: readonly PlacedArrow[],
  palette: Palette,
): readonly Item[] {
  if (!whole || !real || !imaginary) return []
  const words = wordsOfTriangle(kind, value)
  const up = value.im >= 0 ? 1 : -1
  const right = value.re >= 0 ? 1 : -1
  const anchor = right === 1 ? 'start' : 'end'
  const outside = right === 1 ? 'end' : 'start'
  const isUpright = Math.abs(whole.to.y) > 2 * Math.abs(whole.to.x)
  const middle = { x: whole.to.x / 2, y: whole.to.y / 2 }
  const at = (label: readonly [string, string], place: Place, how: 'start' | 'middle' | 'end') =>
    labelItem(label, place, how, palette)
  return [
    at(words.real, { x: real.to.x / 2, y: up === 1 ? -CLEAR - 4.5 : CLEAR + 1.5 }, 'middle'),
    at(words.imaginary, { x: imaginary.to.x + right * CLEAR, y: imaginary.to.y / 2 - 1.4 }, anchor),
    isUpright
      ? at(words.whole, { x: middle.x - right * (CLEAR + 1), y: middle.y }, outside)
      : at(
          words.whole,
          { x: middle.x - right * CLEAR, y: middle.y + up * (CLEAR + 1.5) - (up === 1 ? 0 : 3) },
          outside,
        ),
  ]
}

function labelItem(
  [symbol, value]: readonly [string, string],
  at: Place,
  anchor: 'start' | 'middle' | 'end',
  palette: Palette,
): Item {
  return {
    part: 'label',
    kind: 'text',
    at,
    anchor,
    runs: named(symbol, { after: value }),
    fill: palette.ink,
    halo: palette.paper,
  }
}

function captionOf(
  kind: TriangleKind,
  { name, basis }: TriangleSubject,
  scale: number,
): readonly string[] {
  const what = kind === 'impedance' ? 'Impedance' : 'Power'
  const how = basis === 'found' ? 'by the best values of the readings' : 'as predicted'
  return [`${what} of ${name}, ${how}`, formatScale(scale, kind)]
}

function sentenceOf(kind: TriangleKind, value: Complex): string {
  const { real, imaginary, whole } = wordsOfTriangle(kind, value)
  return `${[real, imaginary, whole].map((label) => label.join(' ')).join('; ')}.`
}

/** The items on a paper that just holds them, their start on the grid, with the caption below. */
function onPaper(
  items: readonly Item[],
  lines: readonly string[],
  palette: Palette,
  said: { title: string; description: string; scale: Scene['unitsPerCentimetre'] },
): Scene {
  const runs = lines.map((text): TextRun => ({ text, face: 'sans', size: TEXT_SIZE }))
  const box = growBox(boundsOfAll(items), MARGIN)
  const toGrid = (length: number) => CELL * Math.ceil((length + EDGE) / CELL)
  const origin = { x: toGrid(-box.left), y: toGrid(lines.length * LINE + 2 - box.bottom) }
  const caption = runs.map(
    (run, at): Item => ({
      part: 'title-block',
      kind: 'text',
      at: { x: EDGE + 3, y: EDGE + 3 + (runs.length - 1 - at) * LINE },
      anchor: 'start',
      runs: [run],
      fill: at === 0 ? palette.ink : palette.quiet,
      halo: palette.paper,
    }),
  )
  const widest = boundsOfAll(caption).right + MARGIN
  const size = {
    width: toGrid(Math.max(origin.x + box.right, widest)),
    height: toGrid(origin.y + box.top),
  }
  const frame: Box = {
    left: EDGE,
    bottom: EDGE,
    right: size.width - EDGE,
    top: size.height - EDGE,
  }
  return {
    ...size,
    items: [
      paperItem(size, palette),
      ...gridItems(frame, palette),
      frameItem(frame, palette),
      axisThrough(origin, frame, palette),
      ...items.map((item) => moveItem(item, origin)),
      ...caption,
    ],
    arrows: [],
    origin,
    unitsPerCentimetre: said.scale,
    starts: new Map(),
    title: said.title,
    description: said.description,
    labelsLeftOut: 0,
  }
}

function axisThrough({ y }: Place, frame: Box, palette: Palette): Item {
  return {
    part: 'axis',
    kind: 'lines',
    segments: [frame.left, y, frame.right, y],
    stroke: palette.thin,
    width: WIDTHS.thin,
    dash: [6, 1.4, 0.7, 1.4],
  }
}
