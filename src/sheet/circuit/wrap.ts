import { newId } from '../new-id'
import type { PhasorId, Sheet } from '../types'
import { labelFor, withPhasorFor } from './names'
import { rewired, withCircuit } from './rewire'
import { type CircuitPath, type Form, groupOf, withNode } from './tree'
import { ADDED, type Side, type WiredNode, wiredAt, wiringOf } from './wiring'

/**
 * The sheet with the node at a path as the only branch of a new group of that form, in its place. To the
 * outside the group is what the node was: it takes over the phasor that the branches will add up to, and
 * the node gets one of its own. Of the whole circuit it is the other way round, but for the supply.
 */
export function wrapped(sheet: Sheet, path: CircuitPath, form: Form): Sheet {
  const wired = wiredAt(wiringOf(sheet), path)
  if (wired === undefined || sheet.circuit === undefined) return sheet
  const side = ADDED[form]
  const outer = wired[side]
  const keepsOuter = path.length === 0 && outer !== undefined && outer !== sheet.supply
  const made = withPhasorFor(
    sheet,
    side,
    keepsOuter ? labelFor(side, 'S') : labelFor(side, subscriptOf(wired)),
  )
  const inner = keepsOuter ? outer : made.id
  const total = keepsOuter ? made.id : outer
  const moved = keepsOuter ? made.sheet : rewired(made.sheet, wired, side, made.id)
  const circuit = withNode(sheet.circuit, path, (node) => groupOf(form, [node]))
  return withCircuit(withGroupSum(moved, [inner], total), circuit)
}

/** The sheet with a sum of the branches of a group; none where what it must equal is not known. */
export function withGroupSum(
  sheet: Sheet,
  terms: readonly PhasorId[],
  equals: PhasorId | undefined,
): Sheet {
  if (equals === undefined) return sheet
  const sum = { id: newId(sheet, 's1'), terms: terms.map((phasor) => ({ phasor })), equals }
  return { ...sheet, sums: [...(sheet.sums ?? []), sum] }
}

/** What a phasor of a node is named after: its element, or the first one in it. */
export function subscriptOf({ element, branches }: WiredNode): string {
  const [first] = branches
  return element?.id ?? (first ? subscriptOf(first) : '1')
}

/** The sheet with a phasor of its own for one side of a node. */
export function withOwnSide(
  sheet: Sheet,
  wired: WiredNode,
  side: Side,
): { readonly sheet: Sheet; readonly id: PhasorId } {
  const made = withPhasorFor(sheet, side, labelFor(side, subscriptOf(wired)))
  return { sheet: rewired(made.sheet, wired, side, made.id), id: made.id }
}
