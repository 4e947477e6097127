import { idsOf } from './checks/ids'
import { isId } from './schema/text'
import type { Id, Sheet } from './types'

/**
 * An id that nothing on the sheet has yet, made from a hint such as a label: short, since every id
 * counts in the length of a link. `Vcoil` stays so where it is free, else `Vcoil2`; `r1` counts on: `r2`.
 */
export function newId(sheet: Sheet, hint: string): Id {
  return newIdBeside(idsOf(sheet), hint)
}

/** The same, beside ids that are given. */
export function newIdBeside(taken: ReadonlySet<Id>, hint: string): Id {
  const letters = hint.normalize('NFKD').replace(/[^A-Za-z0-9_]/g, '')
  const wanted = letters.replace(/^[^A-Za-z]+/, '').slice(0, 16) || 'p1'
  if (isId(wanted) && !taken.has(wanted)) return wanted
  const stem = wanted.replace(/\d+$/, '').slice(0, 11)
  for (let number = wanted === stem ? 2 : 1; ; number += 1) {
    const id = `${stem}${number}`
    if (isId(id) && !taken.has(id)) return id
  }
}
