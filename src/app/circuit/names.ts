import {
  type CircuitElement,
  type CircuitPath,
  formOf,
  isGroup,
  nameOfElement,
  type Sheet,
  type WiredNode,
  wiredNodes,
} from '../../sheet'

/** The kinds of elements as the page calls them, with an example of a value. */
export const ELEMENT_KINDS: { readonly [kind in CircuitElement['kind']]: string } = {
  resistor: 'resistor',
  coil: 'coil',
  capacitor: 'capacitor',
  impedance: 'any impedance',
}

/** Every kind, in the order of the list. */
export const KIND_LIST = Object.keys(ELEMENT_KINDS) as readonly CircuitElement['kind'][]

/** A path as a key of lists. */
export function keyOfPath(path: CircuitPath): string {
  return path.join('.')
}

/** A node of the circuit in words: an element, a group by what is in it, or all of it. */
export function nameOfNode(sheet: Sheet, wired: WiredNode): string {
  if (wired.path.length === 0) return 'the whole circuit'
  const { node } = wired
  if (!isGroup(node)) return nameOfElement(sheet, node.element)
  const names = [...wiredNodes(wired)].flatMap(({ element }) =>
    element ? [nameOfElement(sheet, element.id)] : [],
  )
  return `${names.join(' and ')}, in ${formOf(node)}`
}
