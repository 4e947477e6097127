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
 * where it is a mark or invisible, that of its letter where it only has an accent more, and otherwise
 * what letters of its script usually take.
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
  if (isWide.test(character)) return UNITS_PER_EM
  const base = character.normalize('NFD').codePointAt(0) ?? code
  const own = base === code ? undefined : tableOf(face).get(base)
  if (own !== undefined) return own
  const share = /\p{Script=Cyrillic}/u.test(character) ? cyrillicAdvance(character) : USUAL_ADVANCE
  return (face === 'bold' ? BOLDER * share : share) * UNITS_PER_EM
}

/** The advance of most letters that the faces lack, in ems, and how much wider bold ones are. */
const USUAL_ADVANCE = 0.64
const BOLDER = 1.12

/** The advance of a Cyrillic letter in ems: small and capital ones, and the broad ones of both. */
function cyrillicAdvance(character: string): number {
  const isCapital = /\p{Lu}/u.test(character)
  if (/[жмфшщыюњљ]/iu.test(character)) return isCapital ? 1.06 : 0.88
  return isCapital ? 0.74 : 0.62
}
