import type { TextRun } from '../scene'

/** A quantity symbol: one letter of the Latin or Greek alphabet, with its accents. */
const SYMBOL = /^(?<symbol>[\p{Script=Latin}\p{Script=Greek}\u2126\u2206]\p{M}*)_?(?<rest>\S*)$/u
const LARGEST_SUBSCRIPT = 24

/**
 * A label as ISO 80000-1 sets it: the first letter the italic symbol, the rest its upright subscript
 * (`Vcoil`, or `V_coil`). A label that does not begin with a letter, or has spaces in it, is set as
 * upright words. What is written from right to left is kept apart, so that it turns nothing round.
 *
 * @param size The em of the symbol in millimetres.
 */
export function labelRuns(label: string, size: number): TextRun[] {
  const parts = SYMBOL.exec(label.trim())?.groups
  const { symbol, rest } = parts ?? {}
  if (symbol === undefined || rest === undefined || rest.length > LARGEST_SUBSCRIPT) {
    return [{ text: isolate(label.trim()), face: 'sans', size: 0.75 * size }]
  }
  const runs: TextRun[] = [{ text: symbol, face: 'symbol', size }]
  if (rest !== '') {
    runs.push({ text: isolate(rest), face: 'sans', size: 0.66 * size, rise: -0.2 * size })
  }
  return runs
}

/** Text that may hold letters written from right to left, fenced by isolates (Unicode UAX #9). */
export function isolate(text: string): string {
  const mayTurn =
    /[\u0590-\u08ff\u200e\u200f\u202a-\u202e\u2066-\u2069\ufb1d-\ufdff\ufe70-\ufeff]|[\ud802\ud803\ud83a\ud83b]/
  if (!mayTurn.test(text)) return text
  // Directions that the text itself opens end with it; a stray end would end ours.
  const plain = text.replace(/[\u202a-\u202e\u2066-\u2069]/g, '')
  return `\u2068${plain}\u2069`
}
