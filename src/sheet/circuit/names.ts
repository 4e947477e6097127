import { newId } from '../new-id'
import type { CircuitElement, Id, Phasor, Sheet } from '../types'
import type { Side } from './wiring'

const WORDS: { readonly [kind in CircuitElement['kind']]: string } = {
  resistor: 'R',
  coil: 'coil',
  capacitor: 'C',
  impedance: 'Z',
}

/** A name that makes a short subscript. */
const SHORT = /^[A-Za-z][A-Za-z0-9_]{0,7}$/

/** How an element is called in a sentence: its label, or its id. */
export function nameOfElement(sheet: Sheet, id: Id): string {
  return (sheet.elements ?? []).find((element) => element.id === id)?.label ?? id
}

/** An id for a new element: its label where that is short, else the usual letter of its kind. */
export function idForElement(sheet: Sheet, kind: CircuitElement['kind'], label?: string): Id {
  return newId(sheet, label !== undefined && SHORT.test(label) ? label : WORDS[kind])
}

const LETTERS: { readonly [side in Side]: string } = { voltage: 'V', current: 'I' }

/** What the voltage or current of something is called: VR, Icoil. */
export function labelFor(side: Side, subscript: string): string {
  return LETTERS[side] + subscript
}

/**
 * The sheet with a phasor of that label, and its id: one that stands there already, where nothing of a
 * circuit has it yet, else a new one, numbered where the name is taken.
 */
export function withPhasorFor(
  sheet: Sheet,
  side: Side,
  label: string,
): { readonly sheet: Sheet; readonly id: Id } {
  const found = sheet.phasors.find((each) => each.label === label && each.quantity === side)
  if (found !== undefined && isFree(sheet, found)) return { sheet, id: found.id }
  const id = newId(sheet, label)
  const phasor: Phasor = { id, label: id, quantity: side }
  return { sheet: { ...sheet, phasors: [...sheet.phasors, phasor] }, id }
}

function isFree(sheet: Sheet, { id }: Phasor): boolean {
  const isTotal = (sheet.sums ?? []).some(({ equals }) => equals === id)
  const isOfElement = (sheet.elements ?? []).some(
    ({ voltage, current }) => voltage === id || current === id,
  )
  return sheet.supply !== id && !isTotal && !isOfElement
}
