import type { TextRun } from '../scene'
import { type Lettering, letter, type Missing, type Setting, takeFace } from './lettering'
import { visualOrder } from './visual-order'

/** A text as a picture with a clear ground: PNG bytes or a data address, and where it lies about its baseline. */
export interface PaintedText {
  readonly data: Uint8Array | string
  /** Millimetres. */
  readonly width: number
  readonly above: number
  readonly below: number
}

/**
 * Paints a text in whatever typefaces the machine has, its direction and joined letters as they should
 * be; undefined where nothing can paint.
 *
 * @param fill The colour of the letters, `#rrggbb`.
 */
export type PaintText = (run: TextRun, fill: string) => PaintedText | undefined

const FIRST_SPARE = 0xe000
const SPARES = 400
/** The width of a spare letter in ems. */
const SPARE_WIDTH = 0.5
/** Letters narrower than this share of their width cannot be read. */
const NARROWEST = 0.7

/**
 * Draws what the typefaces lack as a picture, with letters over it that cannot be seen and stand for its
 * characters, so that the text is found and copied in the order in which it is read. Where nothing can
 * paint, as outside a browser, a note in brackets takes the picture's place.
 */
export function createMissing(paint: PaintText | undefined): Missing {
  const spares = new Map<number, string>()
  const spareFor = (unit: number): string => {
    const known = spares.get(unit)
    if (known !== undefined) return known
    // Where all are given out, the rest is seen, and not found.
    if (spares.size >= SPARES) return ''
    const spare = String.fromCharCode(FIRST_SPARE + spares.size)
    spares.set(unit, spare)
    return spare
  }
  return {
    draw: (lettering, run, setting, room) => {
      const picture = paint?.(run, setting.fill)
      if (picture) drawPicture(lettering, picture, setting, room)
      else drawNote(lettering, run, setting, room)
      const units = visualOrder(run.text)
        .split('')
        .map((unit) => unit.charCodeAt(0))
      drawUnseen(lettering, units.map(spareFor).join(''), run.size, setting, room)
      // The library has taken each spare letter for the character that it is drawn by.
      for (const unit of units) lettering.faces.sans.stand(spareFor(unit), unit)
    },
  }
}

function drawPicture(
  { document }: Lettering,
  { data, width, above, below }: PaintedText,
  { x, y, turn }: Setting,
  room: number,
): void {
  const own = Math.min(width, room)
  const height = above + below
  if (turn === 0) {
    document.addImage(data, 'PNG', x, y - above, own, height, undefined, 'FAST')
    return
  }
  // The library turns a picture about its lower left corner.
  const radians = (turn * Math.PI) / 180
  const left = x + below * Math.sin(radians)
  const bottom = y + below * Math.cos(radians)
  document.addImage(data, 'PNG', left, bottom - height, own, height, undefined, 'FAST', turn)
}

/** What stands where nothing can paint, the first that there is room for: the sheet itself has the text. */
const NOTES = ['[see the attached sheet]', '[see sheet]', '[…]'] as const

function drawNote(lettering: Lettering, run: TextRun, setting: Setting, room: number): void {
  const { sans } = lettering.faces
  const fits = (note: string) => sans.widthOf(note) * run.size * NARROWEST <= room
  const note = NOTES.find(fits) ?? '[…]'
  letter(lettering, { ...run, text: note }, sans, setting, room)
}

function drawUnseen(
  { document, faces }: Lettering,
  letters: string,
  size: number,
  { x, y, turn }: Setting,
  room: number,
): void {
  if (letters === '') return
  document.saveGraphicsState()
  takeFace(document, faces.sans, size)
  document.text(letters, x, y, {
    ...(turn === 0 ? {} : { angle: turn }),
    renderingMode: 'invisible',
    horizontalScale: room / (letters.length * SPARE_WIDTH * size),
  })
  document.restoreGraphicsState()
}
