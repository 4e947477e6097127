import { cosDegrees, sinDegrees } from '../../core'
import { measureText } from '../font/measure'
import type { TextItem, TextRun } from '../scene'
import { type Lettering, letter, type Setting } from './lettering'

/** Text that shows as itself, whatever a font holds: marks of direction, which are for the renderers. */
const INVISIBLE = /[\p{Cc}\p{Cf}]/gu
/** Spaces of every width are the same letter in a font, and are found as a plain space. */
const SPACES = /[\u00a0\u2007\u2008\u2009\u202f]/gu

/** Draws a line of text on the current page, its runs one behind the other as they were measured. */
export function drawText(lettering: Lettering, item: TextItem, height: number): void {
  const { at, anchor, runs, turn = 0 } = item
  const total = measureText(runs)
  let along = anchor === 'start' ? 0 : anchor === 'end' ? -total : -total / 2
  const [cosine, sine] = [cosDegrees(turn), sinDegrees(turn)]
  for (const run of runs) {
    const rise = run.rise ?? 0
    const x = at.x + along * cosine - rise * sine
    const y = height - (at.y + along * sine + rise * cosine)
    drawRun(lettering, run, { x, y, turn, fill: item.fill, halo: item.halo })
    along += measureText([run])
  }
}

function drawRun(lettering: Lettering, run: TextRun, setting: Setting): void {
  const { faces, missing } = lettering
  const text = run.text.replace(SPACES, ' ').replace(INVISIBLE, '').normalize('NFC')
  if (text.trim() === '') return
  const own = { ...run, text }
  const face = [faces[run.face], faces.sans].find((candidate) => candidate.has(text))
  if (face) letter(lettering, own, face, setting, measureText([run]))
  else missing.draw(lettering, own, setting, measureText([run]))
}
