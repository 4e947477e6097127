import { ASCENT, DESCENT, measureText } from '../font/measure'
import { type Box, boxOfPoints, cornersOf, distanceToBox, turnPoints } from '../geometry'
import type { TextItem, TextRun } from '../scene'
import { escapeText } from '../svg/escape'
import { formatMillimetres } from '../svg/number'
import type { Primitive } from './primitive'

/** How wide the halo's stroke is: half of it shows round the letters. Millimetres. */
export const HALO_WIDTH = 1

const FACES: { readonly [face in TextRun['face']]: string } = {
  sans: '',
  bold: ' font-family="Phasogon Bold, DejaVu Sans, Verdana, sans-serif" font-weight="bold"',
  symbol: ' font-family="Phasogon Symbol, DejaVu Serif, Georgia, serif" font-style="italic"',
}

/** A line of text. The upright face is taken from what the element stands in. */
export const text: Primitive<TextItem> = {
  bounds(item) {
    const { at, turn = 0 } = item
    const box = boxOfText(item)
    return turn === 0 ? box : boxOfPoints(turnPoints(cornersOf(box), at, turn))
  },
  distance(item, point) {
    const { at, turn = 0 } = item
    const [x = point.x, y = point.y] = turnPoints([point.x, point.y], at, -turn)
    return distanceToBox({ x, y }, boxOfText(item))
  },
  svg({ at, anchor, runs, fill, halo, turn = 0 }, height) {
    const [first] = runs
    const [x, y] = [formatMillimetres(at.x), formatMillimetres(height - at.y)]
    const turned = turn === 0 ? '' : ` transform="rotate(${formatMillimetres(-turn)} ${x} ${y})"`
    const place = `x="${x}" y="${y}"${turned}`
    const anchored = anchor === 'start' ? '' : ` text-anchor="${anchor}"`
    const haloed = halo
      ? ` stroke="${halo}" stroke-width="${HALO_WIDTH}" stroke-linejoin="round" paint-order="stroke"`
      : ''
    const open = `<text ${place}${anchored} fill="${fill}"${haloed}`
    if (first && runs.length === 1 && !first.rise) {
      return `${open}${faceOf(first)}>${escapeText(first.text)}</text>`
    }
    return `${open}>${spansOf(runs)}</text>`
  },
}

/** The box of a line of text, whatever its letters: from the lowest descender to the highest ascender. */
export function boxOfText({ at, anchor, runs }: Pick<TextItem, 'at' | 'anchor' | 'runs'>): Box {
  const width = measureText(runs)
  const left = at.x - (anchor === 'start' ? 0 : anchor === 'end' ? width : width / 2)
  let [bottom, top] = [0, 0]
  for (const { size, rise = 0 } of runs) {
    bottom = Math.min(bottom, rise - DESCENT * size)
    top = Math.max(top, rise + ASCENT * size)
  }
  return { left, right: left + width, bottom: at.y + bottom, top: at.y + top }
}

function faceOf({ face, size }: TextRun): string {
  return `${FACES[face]} font-size="${formatMillimetres(size)}"`
}

/** SVG moves the baseline step by step, so each step is from the run before. */
function spansOf(runs: readonly TextRun[]): string {
  let baseline = 0
  let spans = ''
  for (const run of runs) {
    const rise = run.rise ?? 0
    const step = rise === baseline ? '' : ` dy="${formatMillimetres(baseline - rise)}"`
    baseline = rise
    spans += `<tspan${step}${faceOf(run)}>${escapeText(run.text)}</tspan>`
  }
  return spans
}
