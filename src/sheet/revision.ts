/** The letters of a revision that counts with letters: A, B, … Z, AA. */
const LETTERS = /^(?:[A-Z]{1,2}|[a-z]{1,2})$/
const DIGITS_AT_END = /\d+$/

/**
 * The revision after this one, counted as this one counts: 0 becomes 1, 09 becomes 10, A becomes B, Z
 * becomes AA, P03 becomes P04. Words get a number of their own: draft becomes draft.1. None counts as 0.
 */
export function nextRevision(revision: string | undefined): string {
  const text = revision?.trim() ?? ''
  if (text === '') return '1'
  if (LETTERS.test(text)) return nextLetters(text)
  const digits = DIGITS_AT_END.exec(text)?.[0]
  if (digits === undefined) return `${text}.1`
  const next = String(BigInt(digits) + 1n).padStart(digits.length, '0')
  return text.slice(0, text.length - digits.length) + next
}

function nextLetters(text: string): string {
  const isLower = text === text.toLowerCase()
  const [last, first] = isLower ? ['z', 'a'] : ['Z', 'A']
  const rest = text.slice(0, -1)
  if (!text.endsWith(last)) return rest + String.fromCharCode(text.charCodeAt(text.length - 1) + 1)
  return (rest === '' ? first : nextLetters(rest)) + first
}
