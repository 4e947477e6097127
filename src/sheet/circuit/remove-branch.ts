import { withChange } from '../edits/change'
import { orNone } from '../edits/lists'
import type { PhasorId, Sheet, Sum } from '../types'
import { isBare, rewired, withCircuit, withoutBare, withSum } from './rewire'
import { type CircuitPath, formOf, isGroup, withBranchesAt, withNode } from './tree'
import { ADDED, type Side, type WiredNode, wiredAt, wiringOf } from './wiring'

/**
 * The sheet without the branch at a path, its term in the sum, and its elements. A group that comes out
 * empty goes too, but for the whole circuit; one with a single branch left is that branch, unless
 * something was typed or read of what the two phasors would become one.
 */
export function withoutBranch(sheet: Sheet, path: CircuitPath): Sheet {
  const wiring = wiringOf(sheet)
  const parentPath = path.slice(0, -1)
  const [branch, parent] = [wiredAt(wiring, path), wiredAt(wiring, parentPath)]
  const index = path.at(-1)
  if (sheet.circuit === undefined || branch === undefined || parent === undefined) return sheet
  if (index === undefined) return withoutWhole(sheet, branch)
  if (parent.branches.length === 1 && parentPath.length > 0) {
    return withoutBare(withoutBranch(sheet, parentPath), phasorsIn(branch))
  }
  const circuit = withBranchesAt(sheet.circuit, parentPath, (all) => all.toSpliced(index, 1))
  const side = isGroup(parent.node) ? ADDED[formOf(parent.node)] : 'voltage'
  const trimmed = withoutTerm(withCircuit(sheet, circuit), parent.sum, branch[side])
  const cleared = withoutBare(withoutElements(trimmed, branch), [
    ...phasorsIn(branch),
    parent.voltage,
    parent.current,
  ])
  return parentPath.length === 0 ? cleared : collapsed(cleared, parentPath)
}

/** The sheet without its circuit, the elements and the sums of it. */
export function withoutWhole(sheet: Sheet, wired: WiredNode): Sheet {
  const bare = withChange<Sheet>(withoutElements(sheet, wired), { circuit: null })
  return withoutBare(bare, phasorsIn(wired))
}

/** Every phasor that stands for something in a node. */
function phasorsIn(wired: WiredNode): readonly PhasorId[] {
  return [wired.voltage, wired.current, ...wired.branches.flatMap(phasorsIn)].filter(
    (id) => id !== undefined,
  )
}

function sumsIn({ sum, branches }: WiredNode): readonly Sum[] {
  return [...(sum ? [sum] : []), ...branches.flatMap(sumsIn)]
}

function elementsIn({ element, branches }: WiredNode): readonly string[] {
  return [...(element ? [element.id] : []), ...branches.flatMap(elementsIn)]
}

function withoutElements(sheet: Sheet, wired: WiredNode): Sheet {
  const gone = new Set(elementsIn(wired))
  const sums = new Set(sumsIn(wired).map(({ id }) => id))
  const left = (sheet.elements ?? []).filter(({ id }) => !gone.has(id))
  return withoutSumsNamed(withChange<Sheet>(sheet, { elements: orNone(left) }), sums)
}

function withoutSumsNamed(sheet: Sheet, ids: ReadonlySet<string>): Sheet {
  const drawn = new Set((sheet.hand ?? []).map(({ sum }) => sum))
  // What a hand drew of a sum stays, and so does the sum.
  const left = (sheet.sums ?? []).filter(({ id }) => !ids.has(id) || drawn.has(id))
  return withChange<Sheet>(sheet, { sums: orNone(left) })
}

function withoutTerm(sheet: Sheet, sum: Sum | undefined, phasor: PhasorId | undefined): Sheet {
  if (sum === undefined || phasor === undefined) return sheet
  const terms = sum.terms.filter((term) => term.phasor !== phasor)
  if (terms.length > 0) return withSum(sheet, { ...sum, terms })
  return withoutSumsNamed(sheet, new Set([sum.id]))
}

/** The sheet with a group of one branch at a path made into that branch. */
function collapsed(sheet: Sheet, path: CircuitPath): Sheet {
  const group = wiredAt(wiringOf(sheet), path)
  const [only, other] = group?.branches ?? []
  if (group === undefined || only === undefined || other !== undefined) return sheet
  if (sheet.circuit === undefined || !isGroup(group.node)) return sheet
  const side: Side = ADDED[formOf(group.node)]
  const [inner, outer] = [only[side], group[side]]
  if (inner === undefined || outer === undefined || group.sum === undefined) return sheet
  const joined = rewired(withoutSumsNamed(sheet, new Set([group.sum.id])), only, side, outer)
  if (!isBare(joined, inner)) return sheet
  return withCircuit(
    withoutBare(joined, [inner]),
    withNode(sheet.circuit, path, () => only.node),
  )
}
