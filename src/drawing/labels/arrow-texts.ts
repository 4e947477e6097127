import type { Phasor, Sum } from '../../sheet'
import { partsOf } from '../placement/vectors'
import type { PlacedArrow, TextRun } from '../scene'
import { formatDrawn, nameOfDrawn } from '../text/hand-text'
import { isolate } from '../text/label-runs'
import { digitsOfResult, formatMagnitude, formatPhasor } from '../text/phasor-text'
import { coarser, type Digits, digitsOf } from '../text/resolution'
import type { Register } from './register'
import { named, words } from './texts'

/** The whole text of a label, and the least that serves. */
export interface LabelTexts {
  readonly full: readonly TextRun[]
  readonly short: readonly TextRun[]
}

/** What an arrow is labelled: its symbol and its value, and for the two ends of a sum which it is. */
export function arrowTexts(arrow: PlacedArrow, register: Register): LabelTexts {
  if (arrow.role === 'hand') return handTexts(arrow, register)
  return arrow.role === 'resultant' ? resultantTexts(arrow, register) : phasorTexts(arrow, register)
}

function handTexts({ hand = '', quantity, sign }: PlacedArrow, register: Register): LabelTexts {
  const drawn = register.hand.get(hand)
  if (!drawn) return { full: [], short: [] }
  const { phasors, sums, unitsPerCentimetre } = register
  const label = nameOfDrawn(drawn.arrow, phasors, sums)
  const before = sign === 1 ? '' : '−'
  const value = formatDrawn(drawn.found, quantity, unitsPerCentimetre[quantity])
  return { full: named(label, { before, after: value }), short: named(label, { before }) }
}

function phasorTexts(
  { phasor: id = '', sign, role, sum }: PlacedArrow,
  register: Register,
): LabelTexts {
  const phasor = register.phasors.get(id)
  if (!phasor) return { full: [], short: [] }
  const { label, quantity } = phasor
  const { magnitude = 0, angle = 0 } = partsOf(register.vectors, id)
  const digits = digitsOf(phasor, register.readings)
  const value =
    id === register.reference && angle === 0
      ? `${formatMagnitude(magnitude, quantity, digits.magnitude)}, reference`
      : formatPhasor({ magnitude, angle }, quantity, digits)
  const before = sign === 1 ? '' : '−'
  const terminals = register.hasTerminals ? terminalsOf(phasor) : ''
  const isCompared = role === 'measured' && register.vectors.sums.get(sum ?? '')?.resultant
  const mark = isCompared ? 'measured' : ''
  return {
    full: named(label, { before, terminals, after: [value, mark].filter(Boolean).join(' ') }),
    short: named(label, { before, terminals, after: mark }),
  }
}

/** The positive direction, from the first terminal to the second: `a–b`; empty where none is named. */
function terminalsOf({ from = '', to = '' }: Phasor): string {
  return from === '' && to === '' ? '' : `${isolate(from)}–${isolate(to)}`
}

function resultantTexts({ sum: id = '', quantity }: PlacedArrow, register: Register): LabelTexts {
  const sum = register.sums.get(id)
  const resultant = register.vectors.sums.get(id)?.resultant
  if (!sum || !resultant) return { full: [], short: [] }
  const magnitude = digitsOfResult(resultant.magnitude, digitsOfSum(sum, register), 2)
  const value = formatPhasor(resultant, quantity, { magnitude, angle: {} })
  const equals = typeof sum.equals === 'string' ? register.phasors.get(sum.equals) : undefined
  if (equals) {
    return {
      full: named(equals.label, { after: `${value} calculated` }),
      short: named(equals.label, { after: 'calculated' }),
    }
  }
  const label = sum.label?.trim() || 'resultant'
  return isSymbol(label)
    ? { full: named(label, { after: value }), short: named(label, {}) }
    : { full: [words(`${isolate(label)} ${value}`)], short: [words(isolate(label))] }
}

/** A sum may be called by a symbol, `VS`, or in words, `Supply loop`. */
function isSymbol(label: string): boolean {
  return /^\p{L}(?:[_\p{Lu}\d]\S*)?$/u.test(label)
}

/** A sum is known no better than the coarsest of its terms. */
export function digitsOfSum({ terms }: Sum, { phasors, readings }: Register): Digits {
  return (
    terms.reduce((digits: Digits | undefined, term) => {
      const phasor = phasors.get(term.phasor)
      return phasor ? coarser(digits, digitsOf(phasor, readings).magnitude) : digits
    }, undefined) ?? {}
  )
}
