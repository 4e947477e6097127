import { failure, type Result, success } from '../../core'
import { nameOfElement } from '../circuit/names'
import { rewired, withCircuit, withoutBare, withSum } from '../circuit/rewire'
import {
  type CircuitPath,
  formOf,
  groupOf,
  isGroup,
  otherForm,
  withBranchesAt,
} from '../circuit/tree'
import { ADDED, SHARED, type WiredNode, wiredAt, wiringOf } from '../circuit/wiring'
import { subscriptOf, withGroupSum, withOwnSide } from '../circuit/wrap'
import type { Sheet } from '../types'
import type { EditKind } from './edit-kind'

/** Makes neighbouring branches of a group into a group of the other form inside it. */
export interface GroupBranches {
  readonly kind: 'group-branches'
  /** The group. */
  readonly at: CircuitPath
  /** The first of the branches, and how many: two or more. */
  readonly from: number
  readonly count: number
}

/**
 * Puts neighbouring branches of a series circuit in parallel with each other, or the reverse. The voltage
 * (in the reverse, the current) of the first becomes that of all; each gets a current (a voltage) of its
 * own. A phasor that comes to stand for nothing goes where nothing was typed or read of it, else stays.
 */
export const groupBranches: EditKind<GroupBranches> = {
  apply: (sheet, { at, from, count }) => {
    const group = wiredAt(wiringOf(sheet), at)
    const chosen = group?.branches.slice(from, from + count) ?? []
    if (group === undefined || from < 0 || count < 2 || chosen.length !== count) {
      return failure('Choose two or more branches that stand side by side in one group.')
    }
    return grouped(sheet, group, chosen, from)
  },
  describe: (sheet, { at, from, count }) => {
    const group = wiredAt(wiringOf(sheet), at)
    const form = group && isGroup(group.node) ? otherForm(formOf(group.node)) : 'a group'
    const names = (group?.branches ?? [])
      .slice(from, from + count)
      .map((branch) => nameOfElement(sheet, subscriptOf(branch)))
    return `Put ${names.join(', ') || 'branches'} in ${form}`
  },
}

function grouped(
  sheet: Sheet,
  group: WiredNode,
  chosen: readonly WiredNode[],
  from: number,
): Result<Sheet> {
  if (!isGroup(group.node) || sheet.circuit === undefined) return success(sheet)
  const form = formOf(group.node)
  const [outerShared, outerAdded] = [SHARED[form], ADDED[form]]
  const common = chosen[0]?.[outerAdded]
  let changed = sheet
  const terms = chosen.map((branch) => {
    const own = withOwnSide(changed, branch, outerShared)
    changed = own.sheet
    return own.id
  })
  const freed = chosen.slice(1).flatMap((branch) => branch[outerAdded] ?? [])
  if (common !== undefined) {
    const { path } = group
    for (let index = from + 1; index < from + chosen.length; index += 1) {
      const branch = wiredAt(wiringOf(changed), [...path, index])
      if (branch !== undefined) changed = rewired(changed, branch, outerAdded, common)
    }
  }
  changed = withGroupSum(changed, terms, group[outerShared])
  const { sum } = group
  if (sum !== undefined) {
    const left = sum.terms.filter(({ phasor }) => phasor === common || !freed.includes(phasor))
    changed = withSum(changed, { ...sum, terms: left })
  }
  const circuit = withBranchesAt(sheet.circuit, group.path, (branches) =>
    branches.toSpliced(
      from,
      chosen.length,
      groupOf(otherForm(form), branches.slice(from, from + chosen.length)),
    ),
  )
  return success(withoutBare(withCircuit(changed, circuit), freed))
}
