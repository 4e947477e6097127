import type { TextRun } from '../scene'
import { measureText } from './measure'

/** The text, shortened with … where it is wider than `width` millimetres; empty where not even … fits. */
export function shorten(text: string, style: Omit<TextRun, 'text'>, width: number): string {
  const widthOf = (candidate: string) => measureText([{ ...style, text: candidate }])
  if (widthOf(text) <= width) return text
  // Whole characters only: half of a pair, or a letter parted from its marks, would show as a box.
  const characters = text.match(/\P{M}\p{M}*/gu) ?? []
  let [fits, tooLong] = [-1, characters.length]
  while (tooLong - fits > 1) {
    const middle = (fits + tooLong) >> 1
    if (widthOf(cut(characters, middle)) <= width) fits = middle
    else tooLong = middle
  }
  return fits < 0 ? '' : cut(characters, fits)
}

function cut(characters: readonly string[], count: number): string {
  return `${characters.slice(0, count).join('').trimEnd()}…`
}
