import type { TextRun } from '../scene'
import { ADVANCES, UNITS_PER_EM } from './advances'

type Face = TextRun['face']

/** The height of capitals and of the tallest small letters above the baseline, in ems. */
export const ASCENT = 0.76
/** How far the lowest letters reach below the baseline, in ems. */
export const DESCENT = 0.24

const tables: { [face in Face]?: Map<number, number> } = {}

/**
 * The width of a line of text in millimetres: the sum of its characters' advances in the shipped
 * fonts. A character that they lack takes a whole em where it is ideographic or a pictograph, nothing
 * where it is a mark or invisible, and 0.64 em otherwise.
 */
export function measureText(runs: readonly TextRun[]): number {
  let width = 0
  for (const { text, face, size } of runs) {
    const table = tableOf(face)
    let units = 0
    for (const character of text) {
      const code = character.codePointAt(0) as number
      units += table.get(code) ?? unknownAdvance(character, code, face)
    }
    width += (units * size) / UNITS_PER_EM
  }
  return width
}

function tableOf(face: Face): Map<number, number> {
  const known = tables[face]
  if (known) return known
  const table = new Map<number, number>()
  for (const run of ADVANCES[face].split(';')) {
    const [first = '', widths = ''] = run.split(':')
    const start = Number.parseInt(first, 16)
    widths.split(' ').forEach((width, index) => {
      table.set(start + index, Number(width))
    })
  }
  tables[face] = table
  return table
}

/** Renderers take what a face lacks from another: the upright one first. */
function unknownAdvance(character: string, code: number, face: Face): number {
  const upright = face === 'sans' ? undefined : tableOf('sans').get(code)
  if (upright !== undefined) return upright
  if (/[\p{M}\p{Cc}\p{Cf}]/u.test(character)) return 0
  const isWide =
    /[\p{Ideographic}\p{Extended_Pictographic}\p{Regional_Indicator}\u3000-\u30ff\uac00-\ud7a3\uff01-\uff60]/u
  return isWide.test(character) ? UNITS_PER_EM : 0.64 * UNITS_PER_EM
}
