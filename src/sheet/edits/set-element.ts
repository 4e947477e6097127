import { failure, type Result, success, type Typed } from '../../core'
import { nameOfElement } from '../circuit/names'
import {
  countedValue,
  countsInCheck,
  type ElementValue,
  hasValue,
  markedValue,
  nameOfElementValue,
  valuesOfKind,
} from '../circuit/values'
import type { CircuitElement, Id } from '../types'
import { type Change, withChange, without } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, withReplaced } from './lists'

/** Changes what an element is called, what it bears, and which phasors are its own; null takes a field away. */
export interface SetElement {
  readonly kind: 'set-element'
  readonly id: Id
  readonly change: Change<Pick<CircuitElement, 'label' | 'rating'>> & {
    readonly voltage?: Id
    readonly current?: Id
  }
}

/** Settles a value of an element; null clears it. */
export interface SetElementValue {
  readonly kind: 'set-element-value'
  readonly id: Id
  readonly value: ElementValue
  readonly typed: Typed | null
  /**
   * Whether it stands on the nameplate, or counts as an observation. Omitted: as the value does already,
   * else as the element's others do, else on the nameplate.
   */
  readonly as?: 'marked' | 'counted'
}

/** Makes an element's values observations that count in the check, or marks that are compared with. */
export interface CountElement {
  readonly kind: 'count-element'
  readonly id: Id
  readonly counts: boolean
}

/** Changes an element, but for its values. */
export const setElement: EditKind<SetElement> = {
  apply: (sheet, { id, change }) => {
    const found = entryOf(sheet, 'elements', id)
    if (!found.ok) return found
    return success(withReplaced(sheet, 'elements', withChange(found.value, change)))
  },
  describe: (sheet, { id, change }) =>
    typeof change.label === 'string'
      ? `Rename ${nameOfElement(sheet, id)} to ${change.label}`
      : `Change ${nameOfElement(sheet, id)}`,
}

/** Settles a value of an element. */
export const setElementValue: EditKind<SetElementValue> = {
  apply: (sheet, { id, value, typed, as }) => {
    const found = entryOf(sheet, 'elements', id)
    if (!found.ok) return found
    const changed = withValue(found.value, value, typed, as)
    return changed.ok ? success(withReplaced(sheet, 'elements', changed.value)) : changed
  },
  describe: (sheet, { id, value, typed }) =>
    `${typed === null ? 'Clear' : 'Change'} the ${nameOfElementValue(value)} of ${nameOfElement(sheet, id)}`,
}

/**
 * Moves each value of an element between its nameplate and the observations; its digits and limit go
 * with it. Refused where a value stands on both, since one of them would be lost.
 */
export const countElement: EditKind<CountElement> = {
  apply: (sheet, { id, counts }) => {
    const found = entryOf(sheet, 'elements', id)
    if (!found.ok) return found
    const element = found.value
    const both = valuesOfKind(element.kind).find(
      (value) => countedValue(element, value) && markedValue(element, value),
    )
    if (both !== undefined) {
      const name = nameOfElement(sheet, id)
      return failure(
        `The ${both} of ${name} is both marked and counted in the check: clear one of the two first.`,
      )
    }
    return success(withReplaced(sheet, 'elements', counts ? counted(element) : marked(element)))
  },
  describe: (sheet, { id, counts }) => {
    const name = nameOfElement(sheet, id)
    return counts ? `Count ${name} in the check` : `Take ${name} as its mark only`
  },
}

function withValue(
  element: CircuitElement,
  value: ElementValue,
  typed: Typed | null,
  as: SetElementValue['as'],
): Result<CircuitElement> {
  if (!hasValue(element.kind, value)) {
    return failure(`The kind of element "${element.kind}" has no ${nameOfElementValue(value)}.`)
  }
  if (value === 'dcResistance' && as === 'marked') {
    return failure('The dc resistance is measured: the nameplate has no place for it.')
  }
  const isMarked = as === undefined ? isOnNameplate(element, value) : as === 'marked'
  if (!isMarked || value === 'dcResistance') {
    return success(withChange<CircuitElement>(element, { [value]: typed }))
  }
  return success(withMarks(element, { ...element.marked, [value]: typed }))
}

function isOnNameplate(element: CircuitElement, value: ElementValue): boolean {
  if (value === 'dcResistance') return false
  if (markedValue(element, value) !== undefined) return true
  return countedValue(element, value) === undefined && !countsInCheck(element)
}

function counted(element: CircuitElement): CircuitElement {
  const { marked: marks, ...rest } = element
  const values = valuesOfKind(element.kind)
  const moved = values.flatMap((value) => (marks?.[value] ? [[value, marks[value]]] : []))
  const left = marks === undefined ? {} : without(marks, ...values)
  return withMarks({ ...rest, ...Object.fromEntries(moved) } as CircuitElement, left)
}

function marked(element: CircuitElement): CircuitElement {
  const moved = valuesOfKind(element.kind).flatMap((value) => {
    const typed = countedValue(element, value)
    return typed === undefined ? [] : [[value, typed] as const]
  })
  const gone = Object.fromEntries(moved.map(([value]) => [value, null]))
  const rest = withChange<CircuitElement>(element, gone)
  return withMarks(rest, { ...element.marked, ...Object.fromEntries(moved) })
}

/** The element with its marks; without the field where none is left. */
function withMarks(element: CircuitElement, marks: object): CircuitElement {
  const left = Object.fromEntries(Object.entries(marks).filter(([, typed]) => typed !== null))
  return withChange<CircuitElement>(element, {
    marked: Object.keys(left).length === 0 ? null : left,
  })
}
