import { parseNumber, type Typed } from '../../core'

/** Takes a figure with its digits and, where it has one, its limit; an empty text takes it back. */
export function commitTyped(
  text: string,
  unit: string,
  change: (typed: Typed | null) => string | undefined,
): string | undefined {
  if (text === '') return change(null)
  const parsed = parseNumber(text.replace(/:(?=\s*\d)/, '/'), { unit })
  return parsed.ok ? change(parsed.value) : parsed.problem
}

/** A figure as it was typed, with its limit. */
export function typedText(typed: Typed | undefined): string {
  if (typed === undefined) return ''
  const figure = typed.text ?? String(typed.value)
  return typed.limit === undefined ? figure : `${figure} ± ${typed.limit}`
}
