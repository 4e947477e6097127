import type { CircuitElement, CircuitNode, Id, PhasorId, Sheet, Sum } from '../types'
import { formOf, isGroup } from './tree'
import { SHARED, type Side, type WiredNode } from './wiring'

/** The sheet with another circuit. */
export function withCircuit(sheet: Sheet, circuit: CircuitNode): Sheet {
  return { ...sheet, circuit }
}

/** The sheet with a phasor standing for one side of a node, in its elements and sums. */
export function rewired(sheet: Sheet, wired: WiredNode, side: Side, to: PhasorId): Sheet {
  const { node, element, sum, branches } = wired
  if (!isGroup(node)) {
    return element ? withElement(sheet, element.id, (each) => ({ ...each, [side]: to })) : sheet
  }
  if (SHARED[formOf(node)] === side) {
    return branches.reduce((changed, branch) => rewired(changed, branch, side, to), sheet)
  }
  return sum === undefined ? sheet : withSum(sheet, { ...sum, equals: to })
}

/** The sheet with an element changed. */
export function withElement(
  sheet: Sheet,
  id: Id,
  change: (element: CircuitElement) => CircuitElement,
): Sheet {
  const elements = (sheet.elements ?? []).map((each) => (each.id === id ? change(each) : each))
  return { ...sheet, elements }
}

/** The sheet with a sum replaced by the one of the same id. */
export function withSum(sheet: Sheet, sum: Sum): Sheet {
  return { ...sheet, sums: (sheet.sums ?? []).map((other) => (other.id === sum.id ? sum : other)) }
}

/** The sheet without the phasors of these that nothing is typed, read, drawn or said of. */
export function withoutBare(sheet: Sheet, ids: readonly (PhasorId | undefined)[]): Sheet {
  const bare = new Set(ids.filter((id) => id !== undefined && isBare(sheet, id)))
  if (bare.size === 0) return sheet
  return { ...sheet, phasors: sheet.phasors.filter(({ id }) => !bare.has(id)) }
}

/** Whether a phasor could go without anything being lost with it. */
export function isBare(sheet: Sheet, id: PhasorId): boolean {
  const phasor = sheet.phasors.find((each) => each.id === id)
  if (phasor === undefined) return false
  const { magnitude, angle, real, imaginary, from, to, tail } = phasor
  const typed = [magnitude, angle, real, imaginary, from, to, tail]
  return typed.every((part) => part === undefined) && !isNamed(sheet, id)
}

/** Whether anything on the sheet names a phasor. */
function isNamed(sheet: Sheet, id: PhasorId): boolean {
  const { readings = [], sums = [], elements = [], threePhase = [], chosen = [], hand = [] } = sheet
  return (
    sheet.supply === id ||
    sheet.reference === id ||
    readings.some(
      (each) =>
        each.of === id ||
        ('against' in each && each.against === id) ||
        ('with' in each && each.with === id),
    ) ||
    sums.some(({ terms, equals }) => equals === id || terms.some(({ phasor }) => phasor === id)) ||
    elements.some(({ voltage, current }) => voltage === id || current === id) ||
    threePhase.some(
      ({ phasors, neutral, currents }) =>
        neutral === id || phasors.includes(id) || currents?.includes(id) === true,
    ) ||
    chosen.some(({ phasor }) => phasor === id) ||
    hand.some(({ stands }) => stands === id) ||
    sheet.phasors.some(({ tail }) => tail !== undefined && 'tipOf' in tail && tail.tipOf === id)
  )
}
