import { labelOf } from '../names'
import type { Id, Sheet } from '../types'
import { nameOfElement } from './names'
import { formOf, isGroup } from './tree'
import { ADDED, SHARED, type Side, type WiredNode, wiredNodes, wiringOf } from './wiring'

/**
 * Where the sheet has parted from its circuit: one sentence for each place at which phasors, sums or
 * elements, edited by hand, say something else than the circuit does. Empty where they agree, and on a
 * sheet without a circuit.
 */
export function partedFrom(sheet: Sheet): readonly string[] {
  const wiring = wiringOf(sheet)
  if (wiring === undefined) return []
  const nodes = [...wiredNodes(wiring)]
  return [
    ...nodes.flatMap((node) => partedQuantities(sheet, node)),
    ...nodes.flatMap((node) => partedGroup(sheet, node)),
    ...partedSupply(sheet, nodes),
    ...outside(sheet, nodes),
  ]
}

function partedQuantities(sheet: Sheet, { element }: WiredNode): readonly string[] {
  if (element === undefined) return []
  return (['voltage', 'current'] as const).flatMap((side) => {
    const quantity = sheet.phasors.find(({ id }) => id === element[side])?.quantity
    if (quantity === undefined || quantity === side) return []
    const label = labelOf(sheet, element[side])
    const name = nameOfElement(sheet, element.id)
    return [`${label} stands for the ${side} of ${name}, but its quantity is ${quantity}.`]
  })
}

function partedGroup(sheet: Sheet, group: WiredNode): readonly string[] {
  const { node, branches } = group
  if (!isGroup(node) || branches.length === 0) return []
  const form = formOf(node)
  return [
    ...partedShare(sheet, group, SHARED[form], form),
    ...partedSum(sheet, group, ADDED[form], form),
  ]
}

function partedShare(sheet: Sheet, group: WiredNode, side: Side, form: string): readonly string[] {
  const [first] = group.branches
  const common = group[side]
  return group.branches.flatMap((branch) => {
    const own = branch[side]
    if (first === undefined || own === undefined || own === common) return []
    const [one, other] = [first, branch].map((each) => nameOf(sheet, each))
    return [
      `${one} and ${other} are in ${form}, but their ${side}s are ${labelOf(sheet, common ?? '')} and ${labelOf(sheet, own)}.`,
    ]
  })
}

function partedSum(sheet: Sheet, group: WiredNode, side: Side, form: string): readonly string[] {
  const { sum, branches } = group
  const own = branches.flatMap((branch) => branch[side] ?? [])
  const names = listed(branches.map((branch) => nameOf(sheet, branch)))
  if (sum === undefined) {
    return [`No sum adds up the ${side}s of ${names}, which are in ${form}.`]
  }
  const total = labelOf(sheet, typeof sum.equals === 'string' ? sum.equals : '')
  const held = new Set(sum.terms.map(({ phasor }) => phasor))
  const inCircuit = new Set(own)
  return [
    ...branches.flatMap((branch) => {
      const id = branch[side]
      return id === undefined || held.has(id)
        ? []
        : [`The sum ${total} lacks ${labelOf(sheet, id)}, the ${side} of ${nameOf(sheet, branch)}.`]
    }),
    ...sum.terms.flatMap(({ phasor, sign = 1 }) => {
      const label = labelOf(sheet, phasor)
      if (!inCircuit.has(phasor)) {
        return [`The sum ${total} also holds ${label}, which the circuit does not have there.`]
      }
      return sign === 1 ? [] : [`The sum ${total} takes ${label} away, where the circuit adds it.`]
    }),
  ]
}

function partedSupply(sheet: Sheet, nodes: readonly WiredNode[]): readonly string[] {
  const { supply } = sheet
  const elements = nodes.some(({ element }) => element !== undefined)
  if (supply === undefined || !elements) return []
  if (nodes.some(({ voltage, current }) => voltage === supply || current === supply)) return []
  return [`The supply ${labelOf(sheet, supply)} is no voltage and no current of the circuit.`]
}

function outside(sheet: Sheet, nodes: readonly WiredNode[]): readonly string[] {
  const inside = new Set(nodes.flatMap(({ element }) => element?.id ?? []))
  return (sheet.elements ?? [])
    .filter(({ id }) => !inside.has(id))
    .map(
      ({ id }) => `${nameOfElement(sheet, id)} is an element of the sheet, but not of the circuit.`,
    )
}

/** How a node is called: its element, or its elements. */
function nameOf(sheet: Sheet, wired: WiredNode): string {
  if (!isGroup(wired.node)) return nameOfElement(sheet, wired.node.element)
  return `the group of ${listed(elementsOf(wired).map((id) => nameOfElement(sheet, id)))}`
}

function elementsOf(wired: WiredNode): readonly Id[] {
  return [...wiredNodes(wired)].flatMap(({ element }) => element?.id ?? [])
}

function listed(names: readonly string[]): string {
  if (names.length < 2) return names.join('')
  return `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`
}
