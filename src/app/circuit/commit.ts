import { asLimit } from '../../core'
import {
  type CircuitElement,
  type Edit,
  type ElementValue,
  formatElementLimit,
  type Id,
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
  const set = setterOf(store, id, value, standing)
  if (text === '') return set(null)
  const parsed = parseElementValue(text, value, before)
  return parsed.ok ? set(withFormerLimit(parsed.value, value, before)) : parsed.problem
}

/** Sets a value of an element where it stands, or takes it back; returns why the sheet refuses it. */
function setterOf(
  store: Store,
  id: Id,
  value: ElementValue,
  standing: Standing | undefined,
): (typed: Typed | null) => string | undefined {
  const as = standing === undefined ? {} : { as: standing }
  return (typed) => tryEdit(store, { kind: 'set-element-value', id, value, typed, ...as })
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
  const set = setterOf(store, id, value, standing)
  const { limit: _, ...bare } = before
  if (text === '') return set(bare)
  const parsed = parseElementValue(asLimit(text), value, before)
  return parsed.ok ? set(parsed.value) : parsed.problem
}

/** Changes an element; returns why the sheet refuses it. */
export function changeElement(
  store: Store,
  { id }: CircuitElement,
  change: ElementChange,
): string | undefined {
  return tryEdit(store, { kind: 'set-element', id, change })
}
