import { newId } from '../new-id'
import type { CircuitElement, PhasorId, Sheet } from '../types'
import { labelFor, withPhasorFor } from './names'
import { withCircuit, withSum } from './rewire'
import { type CircuitPath, formOf, isGroup, withBranchesAt } from './tree'
import { ADDED, SHARED, type Side, type WiredNode, wiredAt, wiringOf } from './wiring'

/** An element before its phasors are known. */
export type Unwired = Pick<CircuitElement, 'id' | 'kind' | 'label' | 'marked' | 'rating'>

/**
 * The sheet with an element as a branch of the group at a path: what the branches share becomes one side
 * of it, `own` (a phasor made for it where none is named) the other, and a term of the group's sum. The
 * first branch of a circuit brings the sum and what else it needs of the supply.
 */
export function addedInto(
  sheet: Sheet,
  group: CircuitPath,
  index: number,
  element: Unwired,
  own?: PhasorId,
): Sheet {
  const before = wiredAt(wiringOf(sheet), group)
  if (before === undefined || sheet.circuit === undefined || !isGroup(before.node)) return sheet
  const form = formOf(before.node)
  const [shared, added] = [SHARED[form], ADDED[form]]
  const common =
    before[shared] === undefined
      ? withSupplied(sheet, shared, shared === 'voltage' ? 'V' : 'I')
      : { sheet, id: before[shared] }
  const named = own === undefined ? withOwn(common.sheet, added, element) : { ...common, id: own }
  const wired = { ...element, [shared]: common.id, [added]: named.id } as CircuitElement
  const circuit = withBranchesAt(sheet.circuit, group, (branches) =>
    branches.toSpliced(index, 0, { element: element.id }),
  )
  const withBranch = withCircuit(
    { ...named.sheet, elements: [...(named.sheet.elements ?? []), wired] },
    circuit,
  )
  return before.branches.length === 0
    ? withFirstSum(withBranch, group, added, named.id)
    : withTerm(withBranch, before, index, added, named.id)
}

function withOwn(sheet: Sheet, side: Side, { id }: Unwired) {
  return withPhasorFor(sheet, side, labelFor(side, id))
}

/** The supply where it is of that side, else a phasor of that name. */
function withSupplied(sheet: Sheet, side: Side, label: string) {
  const supply = sheet.phasors.find(({ id }) => id === sheet.supply)
  return supply?.quantity === side ? { sheet, id: supply.id } : withPhasorFor(sheet, side, label)
}

/** The sum of a group that had none, up to what the supply gives; one that the sheet has already serves. */
function withFirstSum(sheet: Sheet, group: CircuitPath, side: Side, own: PhasorId): Sheet {
  if (wiredAt(wiringOf(sheet), group)?.sum !== undefined) return sheet
  const total = withSupplied(sheet, side, labelFor(side, 'S'))
  const sum = { id: newId(total.sheet, 's1'), terms: [{ phasor: own }], equals: total.id }
  return { ...total.sheet, sums: [...(total.sheet.sums ?? []), sum] }
}

/** A term in the group's sum, behind that of the branch before; a sum that was taken out stays out. */
function withTerm(
  sheet: Sheet,
  { sum, branches }: WiredNode,
  index: number,
  side: Side,
  own: PhasorId,
): Sheet {
  if (sum === undefined || sum.terms.some(({ phasor }) => phasor === own)) return sheet
  const neighbour = branches[index - 1]?.[side]
  const at = sum.terms.findIndex(({ phasor }) => phasor === neighbour) + 1
  const terms = sum.terms.toSpliced(at === 0 ? sum.terms.length : at, 0, { phasor: own })
  return withSum(sheet, { ...sum, terms })
}
