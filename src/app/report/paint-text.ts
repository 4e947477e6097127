import type { PaintText } from '../../drawing/pdf'
import { fontOf } from '../fonts'

/** As fine as a printer sets letters: 600 dots an inch. */
const dotsPerMillimetre = 600 / 25.4

/**
 * Paints a text that the PDF's own typefaces lack, with whatever typeface the machine has for its script.
 * Undefined where the browser has no canvas to paint on.
 */
export const paintText: PaintText = (run, fill) => {
  const canvas = document.createElement('canvas')
  const pen = canvas.getContext('2d')
  if (!pen) return undefined
  const font = fontOf({ face: run.face, size: run.size * dotsPerMillimetre })
  pen.font = font
  const { width, fontBoundingBoxAscent, fontBoundingBoxDescent } = pen.measureText(run.text)
  const [above, below] = [Math.ceil(fontBoundingBoxAscent), Math.ceil(fontBoundingBoxDescent)]
  canvas.width = Math.max(1, Math.ceil(width))
  canvas.height = Math.max(1, above + below)
  // A canvas that changes its size forgets its pen.
  pen.font = font
  pen.fillStyle = fill
  pen.fillText(run.text, 0, above)
  return {
    data: canvas.toDataURL('image/png'),
    width: canvas.width / dotsPerMillimetre,
    above: above / dotsPerMillimetre,
    below: below / dotsPerMillimetre,
  }
}
