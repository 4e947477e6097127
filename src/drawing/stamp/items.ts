import { measureText } from '../font/measure'
import { type Box, boxOfPoints, cornersOf, turnPoints } from '../geometry'
import type { Item, TextRun } from '../scene'
import type { Palette } from '../theme'
import type { StampWords } from './words'

/** How far a stamp is turned, in degrees anticlockwise: by hand it never comes out level. */
const TURN = 4
const PADDING = { x: 4, y: 3 }
const HEAD_SIZE = 5.2
const FIGURES_SIZE = 3.2
const BETWEEN = 2.2

/** How the border of each verdict is drawn: one line, two, dashes or dots, so that no hue is needed. */
type Border = {
  readonly width: number
  readonly second?: number
  readonly dash?: readonly number[]
}
const BORDERS: { readonly [verdict in StampWords['verdict']]: Border } = {
  agree: { width: 0.7 },
  disagree: { width: 1.3, second: 0.35 },
  'not-enough': { width: 0.7, dash: [3, 1.8] },
  'nothing-to-check': { width: 0.7, dash: [0.8, 1.2] },
  'agree-on-correction': { width: 0.7, second: 0.35, dash: [6, 1.6, 1, 1.6] },
}

interface Measured {
  readonly head: TextRun
  readonly figures: TextRun
  readonly width: number
  readonly height: number
}

function measure({ head, figures }: StampWords, scale: number): Measured {
  const headRun: TextRun = { text: head, face: 'bold', size: HEAD_SIZE * scale }
  const figuresRun: TextRun = { text: figures, face: 'sans', size: FIGURES_SIZE * scale }
  return {
    head: headRun,
    figures: figuresRun,
    width: Math.max(measureText([headRun]), measureText([figuresRun])) + 2 * PADDING.x * scale,
    height: (HEAD_SIZE + BETWEEN + FIGURES_SIZE) * scale * 0.8 + 2 * PADDING.y * scale,
  }
}

/** How much room a stamp takes, turned, in millimetres. */
export function sizeOfStamp(
  words: StampWords,
  scale: number,
): { readonly width: number; readonly height: number } {
  const { width, height } = measure(words, scale)
  const level = { left: 0, bottom: 0, right: width, top: height }
  const { left, bottom, right, top } = boxOfPoints(
    turnPoints(cornersOf(level), { x: 0, y: 0 }, TURN),
  )
  return { width: right - left, height: top - bottom }
}

/** The stamp in the middle of a box: a border and two lines, all turned together. */
export function stampItems(
  words: StampWords,
  room: Box,
  scale: number,
  palette: Palette,
  isFormer: boolean,
): readonly Item[] {
  const { head, figures, width, height } = measure(words, scale)
  const centre = { x: (room.left + room.right) / 2, y: (room.bottom + room.top) / 2 }
  const ink = isFormer ? palette.thin : palette.verdicts[words.verdict]
  const border = BORDERS[words.verdict]
  const outline = (inset: number, stroke: number): Item => ({
    part: 'stamp',
    kind: 'path',
    points: turnPoints(
      cornersOf({
        left: centre.x - width / 2 + inset,
        right: centre.x + width / 2 - inset,
        bottom: centre.y - height / 2 + inset,
        top: centre.y + height / 2 - inset,
      }),
      centre,
      TURN,
    ),
    closed: true,
    stroke: ink,
    width: stroke,
    ...(border.dash && { dash: border.dash }),
  })
  const line = (run: TextRun, y: number): Item => {
    const [x = 0, turnedY = 0] = turnPoints([centre.x, y], centre, TURN)
    return {
      part: 'stamp',
      kind: 'text',
      at: { x, y: turnedY },
      anchor: 'middle',
      runs: [run],
      fill: ink,
      turn: TURN,
    }
  }
  const top = centre.y + height / 2 - PADDING.y * scale
  const first = top - HEAD_SIZE * scale * 0.76
  const second = first - (BETWEEN + FIGURES_SIZE * 0.76) * scale
  return [
    outline(0, border.width),
    ...(border.second === undefined ? [] : [outline(border.width + 0.5, border.second)]),
    line(head, first),
    line(figures, second),
  ]
}
