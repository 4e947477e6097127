import { formatEstimate, formatLimit, formatNumber, formatQuantity } from '../../core'
import { assumedOf } from '../assumed'
import type { ElementEvaluation, Estimate } from '../evaluation'
import type { CircuitElement, Sheet, Typed } from '../types'
import { formatElementLimit, formatElementValue } from './value-text'
import {
  countedValue,
  type MarkedValue,
  markedValue,
  nameOfElementValue,
  unitOfElementValue,
  valuesOfKind,
} from './values'

/** Where a found value lies beside the tolerance of its mark. */
export type FoundVerdict = 'within' | 'below' | 'above' | 'undecided'

/** A value of an element as the readings give it, beside its mark. */
export interface FoundValue {
  readonly value: MarkedValue
  /** `winding resistance` says more than `resistance`: how the value is called of this kind of element. */
  readonly name: string
  readonly unit: string
  readonly found: Estimate
  readonly marked?: Typed
  /** Half the width of the mark's tolerance, in the unit: as stated, else as the sheet assumes it. */
  readonly tolerance?: number
  /** Left out without a mark, and of an `impedance`, whose value is no constant. */
  readonly verdict?: FoundVerdict
  /** One sentence that says all of this. */
  readonly text: string
}

/**
 * What was found of an element, value by value. `within`: all that the found value may be lies within the
 * mark's tolerance; `below` and `above`: none of it does; `undecided`: the edge of the tolerance lies
 * within its limit (guard bands on both sides, as ISO 14253-1 has them; from memory). A found value
 * that is off its mark by a power of a thousand is said to be: a prefix was mistyped.
 */
export function foundBesideMark(
  sheet: Sheet,
  element: CircuitElement,
  evaluation: ElementEvaluation,
): readonly FoundValue[] {
  return valuesOfKind(element.kind).flatMap((value) => {
    const found = evaluation.found?.[value]
    return found === undefined ? [] : [besideMark(sheet, element, value, found)]
  })
}

function besideMark(
  sheet: Sheet,
  element: CircuitElement,
  value: MarkedValue,
  found: Estimate,
): FoundValue {
  const unit = unitOfElementValue(value)
  const marked = markedValue(element, value)
  const name = nameOfFound(element, value)
  const subject = [element.label ?? element.id, name].filter((part) => part !== '').join(', ')
  const start = `${subject}: ${formatEstimate(found.value, found.expanded, unit, found.value)} found`
  const base = { value, name: name || nameOfElementValue(value), unit, found }
  if (marked === undefined)
    return { ...base, text: `${start}${addition(sheet, element, value, found)}.` }
  const tolerance = toleranceOf(sheet, marked)
  const mark = `${start}, ${markText(sheet, marked, value)} marked`
  const more = addition(sheet, element, value, found)
  if (element.kind === 'impedance') {
    const text = `${mark}; no verdict, since the impedance of a running machine is no constant.`
    return { ...base, marked, tolerance, text }
  }
  const verdict = verdictOf(found, marked.value, tolerance)
  const text = `${mark}: ${WORDS[verdict]}${slipText(found.value, marked.value)}${more}.`
  return { ...base, marked, tolerance, verdict, text }
}

const WORDS: { readonly [verdict in FoundVerdict]: string } = {
  within: 'within tolerance',
  below: 'below tolerance',
  above: 'above tolerance',
  undecided: 'at the edge of its tolerance, closer than the readings can tell',
}

function verdictOf({ value, expanded }: Estimate, marked: number, tolerance: number): FoundVerdict {
  const [low, high] = [marked - tolerance, marked + tolerance]
  if (value + expanded < low) return 'below'
  if (value - expanded > high) return 'above'
  return value - expanded >= low && value + expanded <= high ? 'within' : 'undecided'
}

function toleranceOf(sheet: Sheet, { value, limit }: Typed): number {
  return limit ?? (Math.abs(value) * assumedOf(sheet).elementPercent) / 100
}

/** The value that an element is named by needs no name; a winding's or a capacitor's resistance does. */
function nameOfFound({ kind }: CircuitElement, value: MarkedValue): string {
  if (kind === 'coil' && value === 'resistance') return 'ac resistance'
  if (kind === 'coil') return 'inductance'
  if (kind === 'capacitor' && value === 'resistance') return 'series resistance'
  return kind === 'impedance' ? value : ''
}

/** A mark with its tolerance, in per cent where that is how it comes out even: `16 µF ± 5 %`. */
function markText(sheet: Sheet, marked: Typed, value: MarkedValue): string {
  const figure = formatElementValue(marked, value)
  if (marked.limit === 0) return figure
  const stated = formatElementLimit(marked, value)
  if (stated !== undefined) return `${figure} ${stated}`
  return `${figure} ${formatLimit({ percent: assumedOf(sheet).elementPercent }, '%')} (assumed)`
}

/** Within this of a power of a thousand, a value is off by a prefix rather than off. */
const LIKE = 0.3

function slipText(found: number, marked: number): string {
  const ratio = found / marked
  if (!(ratio > 0)) return ''
  const power = Math.round(Math.log10(ratio) / 3) * 3
  const isSlip = power !== 0 && Math.abs(ratio / 10 ** power - 1) <= LIKE
  const times = formatNumber(10 ** Math.abs(power), 0)
  if (isSlip) {
    return `, by a factor of about ${times}: look at the prefix of the mark`
  }
  const factor = ratio > 1 ? ratio : 1 / ratio
  return factor >= 10 ? `, by a factor of about ${formatQuantity(factor, '', { digits: 2 })}` : ''
}

/** What a resistance that was measured with direct current says of a winding, and what not. */
function addition(
  sheet: Sheet,
  element: CircuitElement,
  value: MarkedValue,
  { value: found, expanded }: Estimate,
): string {
  const direct = element.kind === 'coil' ? countedValue(element, 'dcResistance') : undefined
  if (value !== 'resistance' || direct === undefined) return ''
  const width = toleranceOf(sheet, direct)
  const figure = formatQuantity(direct.value, 'Ω', { limit: width })
  if (found + expanded < direct.value - width) {
    return `; the dc resistance, ${figure}, is the least that it can be at the same temperature, so one of the two is wrong`
  }
  if (found - expanded > direct.value + width) {
    return `; above the dc resistance, ${figure}, by what iron, eddy currents and warmth add, which dc does not show`
  }
  return `; not told apart from the dc resistance, ${figure}, which does not show what iron, eddy currents and warmth add`
}
