import {
  type CircuitElement,
  type Edit,
  type ElementValue,
  formatElementLimit,
  parseElementValue,
  type Typed,
} from '../../sheet'
import { tryEdit } from '../readings/commit'
import type { Store } from '../store'

type ElementChange = Extract<Edit, { kind: 'set-element' }>['change']
/** Where a value stands: on the nameplate, or among what counts in the check. */
export type Standing = 'marked' | 'counted'

/** Takes what was typed for a value of an element; an empty text takes it back. */
export function commitElementValue(
  store: Store,
  { id }: CircuitElement,
  value: ElementValue,
  standing: Standing | undefined,
  before: Typed | undefined,
  text: string,
): string | undefined {
  const as = standing === undefined ? {} : { as: standing }
  if (text === '')
    return tryEdit(store, { kind: 'set-element-value', id, value, typed: null, ...as })
  const parsed = parseElementValue(text, value, before)
  if (!parsed.ok) return parsed.problem
  const typed = withFormerLimit(parsed.value, value, before)
  return tryEdit(store, { kind: 'set-element-value', id, value, typed, ...as })
}

/** A new value goes on with the tolerance of the old one: the same percentage, where it is one. */
function withFormerLimit(typed: Typed, value: ElementValue, before: Typed | undefined): Typed {
  if (typed.limit !== undefined || before?.limit === undefined) return typed
  const text = formatElementLimit(before, value) ?? ''
  const again = text.endsWith('%') ? parseElementValue(text, value, typed) : undefined
  return again?.ok ? again.value : { ...typed, limit: before.limit }
}

/** Takes the tolerance of a value, in its unit or as a percentage; an empty text takes it back. */
export function commitElementLimit(
  store: Store,
  { id }: CircuitElement,
  value: ElementValue,
  standing: Standing | undefined,
  before: Typed | undefined,
  text: string,
): string | undefined {
  if (before === undefined) {
    return text === '' ? undefined : 'Type the value first, then how far off it may be.'
  }
  const as = standing === undefined ? {} : { as: standing }
  const { limit: _, ...bare } = before
  if (text === '')
    return tryEdit(store, { kind: 'set-element-value', id, value, typed: bare, ...as })
  const limit = /^(±|\+\s*\/?\s*[-−])/.test(text) ? text : `± ${text}`
  const parsed = parseElementValue(limit, value, before)
  if (!parsed.ok) return parsed.problem
  return tryEdit(store, { kind: 'set-element-value', id, value, typed: parsed.value, ...as })
}

/** Changes an element; returns why the sheet refuses it. */
export function changeElement(
  store: Store,
  { id }: CircuitElement,
  change: ElementChange,
): string | undefined {
  return tryEdit(store, { kind: 'set-element', id, change })
}
