import { success } from '../../core'
import { nameOfElement } from '../circuit/names'
import { withoutBranch, withoutWhole } from '../circuit/remove-branch'
import { withoutBare } from '../circuit/rewire'
import { pathOf } from '../circuit/tree'
import { wiringOf } from '../circuit/wiring'
import type { Id, Sheet } from '../types'
import { withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, orNone } from './lists'

/** Removes an element and its place in the circuit. */
export interface RemoveElement {
  readonly kind: 'remove-element'
  readonly id: Id
}

/** Removes the circuit with its elements and sums. */
export interface RemoveCircuit {
  readonly kind: 'remove-circuit'
}

/** Removes an element. Its phasors stay where anything was typed, read, drawn or said of them. */
export const removeElement: EditKind<RemoveElement> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'elements', id)
    if (!found.ok) return found
    const path = sheet.circuit && pathOf(sheet.circuit, id)
    if (path !== undefined) return success(withoutBranch(sheet, path))
    const left = (sheet.elements ?? []).filter((element) => element.id !== id)
    const removed = withChange<Sheet>(sheet, { elements: orNone(left) })
    return success(withoutBare(removed, [found.value.voltage, found.value.current]))
  },
  describe: (sheet, { id }) => `Remove ${nameOfElement(sheet, id)} from the circuit`,
}

/** Removes the circuit. What was typed, read or drawn stays, and so does the supply. */
export const removeCircuit: EditKind<RemoveCircuit> = {
  apply: (sheet) => {
    const wiring = wiringOf(sheet)
    return success(wiring === undefined ? sheet : withoutWhole(sheet, wiring))
  },
  describe: () => 'Delete the circuit',
}
