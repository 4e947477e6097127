import { asLimit, parseCell, unitOf } from '../../core'
import { apply, type Edit, type Phasor } from '../../sheet'
import type { Store } from '../store'

/** Makes an edit from a cell; returns why the sheet refuses it, for the sentence under the cell. */
function tryEdit(store: Store, edit: Edit): string | undefined {
  const result = apply(store.getState().history.sheet, edit)
  if (!result.ok) return result.problem
  store.getState().edit(edit)
  return undefined
}

/** Takes a new label; an empty one is refused, because nothing could be called by it. */
export function commitLabel(store: Store, phasor: Phasor, text: string): string | undefined {
  if (text === '') return 'A phasor needs a label, such as V1 or Icoil.'
  return tryEdit(store, { kind: 'set-phasor', id: phasor.id, change: { label: text } })
}

/** Takes what was typed for one part of a phasor: a figure, a whole phasor, or nothing. */
export function commitValue(
  store: Store,
  phasor: Phasor,
  part: 'magnitude' | 'angle' | 'real' | 'imaginary',
  text: string,
): string | undefined {
  if (text === '') return tryEdit(store, { kind: 'set-value', id: phasor.id, part, value: null })
  const parsed = parseCell(text, { unit: unitOf(phasor.quantity), part })
  if (!parsed.ok) return parsed.problem
  return tryEdit(store, { kind: 'set-value', id: phasor.id, part, value: parsed.value })
}

/** Takes a limit of the magnitude, of the angle (with °), or of both with a semicolon between. */
export function commitLimit(store: Store, phasor: Phasor, text: string): string | undefined {
  if (text === '') return tryEdit(store, { kind: 'clear-limits', id: phasor.id })
  const edits: Edit[] = []
  for (const piece of text.split(/;|,\s/)) {
    const bare = piece.trim()
    const part = /°|deg/.test(bare) ? 'angle' : 'magnitude'
    const parsed = parseCell(asLimit(bare), {
      unit: unitOf(phasor.quantity),
      part,
    })
    if (!parsed.ok) return parsed.problem
    edits.push({ kind: 'set-value', id: phasor.id, part, value: parsed.value })
  }
  return tryEdit(store, { kind: 'several', edits })
}
