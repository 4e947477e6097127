import { failure, success } from '../../core'
import { addedInto } from '../circuit/add-branch'
import { idForElement } from '../circuit/names'
import {
  branchesOf,
  type CircuitPath,
  type Form,
  formOf,
  groupOf,
  isGroup,
  nodeAt,
  withNode,
} from '../circuit/tree'
import { wrapped } from '../circuit/wrap'
import type { CircuitElement, CircuitNode, PhasorId, Sheet } from '../types'
import type { EditKind } from './edit-kind'

/** Adds an element to the circuit, with the phasors and the term of a sum that come with it. */
export interface AddElement {
  readonly kind: 'add-element'
  readonly element: {
    readonly kind: CircuitElement['kind']
    readonly label?: string
    readonly marked?: NonNullable<CircuitElement['marked']>
    readonly rating?: NonNullable<CircuitElement['rating']>
  }
  /** The node of the circuit beside which it goes; `[]` is the whole. */
  readonly at: CircuitPath
  /** How it is joined to that node. */
  readonly form: Form
  /**
   * A phasor of the sheet that is its own: its voltage in series, its current in parallel. Omitted: the
   * one of the sheet that has the name already (VR for R), else a new one.
   */
  readonly own?: PhasorId
}

/**
 * Adds an element in series or in parallel with a node. Where that node, or what it stands in, is a group
 * of that form, the element becomes a branch of it; else the two become a group of their own in the
 * node's place. What was typed or read stays with its phasor.
 */
export const addElement: EditKind<AddElement> = {
  apply: (sheet, { element, at, form, own }) => {
    const node = sheet.circuit && nodeAt(sheet.circuit, at)
    if (sheet.circuit === undefined) {
      return failure('There is no circuit yet: start one, in series or in parallel.')
    }
    if (node === undefined) return failure('There is nothing at that place of the circuit.')
    const place = placeFor(sheet, sheet.circuit, node, at, form)
    const { kind, label, marked, rating } = element
    const id = idForElement(place.sheet, kind, label)
    const added = {
      id,
      kind,
      ...(label === undefined ? {} : { label }),
      ...(marked === undefined ? {} : { marked }),
      ...(rating === undefined ? {} : { rating }),
    }
    return success(addedInto(place.sheet, place.group, place.index, added, own))
  },
  describe: (_, { element, form }) =>
    `Add ${element.label ?? `a ${element.kind}`} in ${form}`.replace('a impedance', 'an impedance'),
}

interface BranchPlace {
  readonly sheet: Sheet
  readonly group: CircuitPath
  readonly index: number
}

function placeFor(
  sheet: Sheet,
  circuit: CircuitNode,
  node: CircuitNode,
  at: CircuitPath,
  form: Form,
): BranchPlace {
  const branches = branchesOf(node)
  if (isGroup(node) && branches.length === 0) {
    const emptied = withNode(circuit, at, () => groupOf(form, []))
    return { sheet: { ...sheet, circuit: emptied }, group: at, index: 0 }
  }
  if (isGroup(node) && formOf(node) === form) return { sheet, group: at, index: branches.length }
  const parent = at.length === 0 ? undefined : nodeAt(circuit, at.slice(0, -1))
  if (parent !== undefined && isGroup(parent) && formOf(parent) === form) {
    return { sheet, group: at.slice(0, -1), index: (at.at(-1) ?? 0) + 1 }
  }
  return { sheet: wrapped(sheet, at, form), group: at, index: 1 }
}
