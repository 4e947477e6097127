const RIGHT_TO_LEFT =
  /[\p{Script=Hebrew}\p{Script=Arabic}\p{Script=Syriac}\p{Script=Thaana}\p{Script=Nko}]/u
const LETTER = /\p{L}/u
const DIGIT = /\p{Nd}/u

/**
 * The characters of a line in the order in which they lie from left to right, which is how a PDF has them:
 * its readers turn them round again. The plain part of the algorithm of Unicode UAX #9: letters, figures
 * and what stands between; direction is that of the first letter.
 */
export function visualOrder(text: string): string {
  if (!RIGHT_TO_LEFT.test(text)) return text
  const characters = [...text]
  const levels = levelsOf(characters)
  for (let level = Math.max(...levels); level > 0; level -= 1) reverse(characters, levels, level)
  return characters.join('')
}

type Direction = 'left' | 'right'

function levelsOf(characters: readonly string[]): number[] {
  const strong = characters.map((character): Direction | undefined => {
    if (RIGHT_TO_LEFT.test(character)) return 'right'
    return LETTER.test(character) ? 'left' : undefined
  })
  const base = strong.find((direction) => direction !== undefined) ?? 'left'
  const sides = characters.map((character, at) => (DIGIT.test(character) ? 'digit' : strong[at]))
  return sides.map((side, at) => {
    if (side === 'right') return 1
    if (side === 'left') return base === 'right' ? 2 : 0
    const before = strong.slice(0, at).findLast((direction) => direction !== undefined) ?? base
    if (side === 'digit') return before === 'right' || base === 'right' ? 2 : 0
    if (isAmongDigits(sides, at)) return before === 'right' || base === 'right' ? 2 : 0
    const after = strong.slice(at).find((direction) => direction !== undefined) ?? base
    const own = before === after ? before : base
    return own === 'right' ? 1 : base === 'right' ? 2 : 0
  })
}

/** Whether it parts two figures of one number: a point, a comma. */
function isAmongDigits(sides: readonly (Direction | 'digit' | undefined)[], at: number): boolean {
  return sides[at - 1] === 'digit' && sides[at + 1] === 'digit'
}

/** Turns round every stretch that is at least at a level. */
function reverse(characters: string[], levels: number[], level: number): void {
  for (let from = 0; from < levels.length; from += 1) {
    if ((levels[from] ?? 0) < level) continue
    let to = from
    while (to < levels.length && (levels[to] ?? 0) >= level) to += 1
    characters.splice(from, to - from, ...characters.slice(from, to).reverse())
    levels.splice(from, to - from, ...levels.slice(from, to).reverse())
    from = to
  }
}
