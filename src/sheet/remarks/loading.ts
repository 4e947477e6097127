import {
  add,
  type Complex,
  divide,
  formatQuantity,
  isFiniteComplex,
  magnitudeOf,
  ZERO,
} from '../../core'
import { asReadOf } from '../as-read'
import { labelOf } from '../names'
import { limitOf } from '../readings/limit'
import { indexOf } from '../sheet-index'
import type { CircuitElement, CircuitNode, Id, Reading, Sheet } from '../types'
import type { Remark } from './remark'

/** The share of a reading's limit from which a load is worth a word. */
const NOTABLE = 0.1

/** A voltmeter that draws the voltage down by more than a tenth of the reading's limit. */
export function loadingRemarks(sheet: Sheet, reading: Reading): readonly Remark[] {
  const { instruments, phasors } = indexOf(sheet)
  const instrument = instruments.get(reading.instrument ?? '')
  const resistance = instrument?.inputResistance?.value
  if (reading.kind !== 'magnitude' || reading.shunt !== undefined) return []
  if (phasors.get(reading.of)?.quantity !== 'voltage') return []
  if (instrument === undefined || resistance === undefined || resistance <= 0) return []
  const source = sourceImpedance(sheet, reading.of)
  const magnitude = asReadOf(sheet).values.get(reading.of)?.magnitude
  const limit = limitOf(sheet, reading)?.limit
  if (source === undefined || magnitude === undefined || limit === undefined) return []
  const drop = magnitude * (1 - unloadedShare(source, resistance))
  if (Math.abs(drop) <= NOTABLE * limit) return []
  const [ohms, volts] = [
    formatQuantity(resistance, 'Ω', { digits: 3 }),
    formatQuantity(Math.abs(drop), 'V', { digits: 2 }),
  ]
  const text = `The ${ohms} of ${instrument.name} change the voltage ${labelOf(sheet, reading.of)} by about ${volts}, more than a tenth of the reading's limit: use a meter with a higher input resistance, or allow for it.`
  return [{ about: reading.id, text }]
}

/** How much of the voltage without a meter is left with one: |R / (R + Z)|. */
function unloadedShare(source: Complex, resistance: number): number {
  const whole = add(source, { re: resistance, im: 0 })
  return resistance / magnitudeOf(whole)
}

/**
 * The impedance that a meter across an element sees, with the supply of the circuit as an ideal source.
 * Undefined where the element is not in the circuit, or a value of it is not known.
 */
function sourceImpedance(sheet: Sheet, voltage: Id): Complex | undefined {
  const element = (sheet.elements ?? []).find((each) => each.voltage === voltage)
  if (element === undefined || sheet.circuit === undefined) return undefined
  const impedances = impedancesOf(sheet)
  return impedances && seenFrom(sheet.circuit, element.id, ZERO, impedances)
}

function impedancesOf(sheet: Sheet): ReadonlyMap<Id, Complex> | undefined {
  const found = new Map<Id, Complex>()
  for (const element of sheet.elements ?? []) {
    const impedance = impedanceOf(element, sheet.frequency?.value)
    if (impedance !== undefined) found.set(element.id, impedance)
  }
  return found
}

type ElementValues = NonNullable<CircuitElement['marked']>

/** What is marked, else what was found; undefined where a value that the kind needs is not known. */
function impedanceOf(element: CircuitElement, frequency: number | undefined): Complex | undefined {
  const values: ElementValues = { ...element, ...element.marked }
  const known = (part: keyof ElementValues) => values[part]?.value
  const resistance = known('resistance')
  const omega = frequency === undefined ? undefined : 2 * Math.PI * frequency
  const [inductance, capacitance] = [known('inductance'), known('capacitance')]
  switch (element.kind) {
    case 'resistor':
      return resistance === undefined ? undefined : { re: resistance, im: 0 }
    case 'coil':
      if (omega === undefined || inductance === undefined || resistance === undefined)
        return undefined
      return { re: resistance, im: omega * inductance }
    case 'capacitor':
      if (!omega || !capacitance) return undefined
      return { re: resistance ?? 0, im: -1 / (omega * capacitance) }
    case 'impedance': {
      const reactance = known('reactance')
      if (resistance === undefined || reactance === undefined) return undefined
      return { re: resistance, im: reactance }
    }
  }
}

/** What is seen at the terminals of an element: itself, and beside it all the rest of the circuit. */
function seenFrom(
  node: CircuitNode,
  element: Id,
  outside: Complex,
  impedances: ReadonlyMap<Id, Complex>,
): Complex | undefined {
  if ('element' in node) {
    if (node.element !== element) return undefined
    const own = impedances.get(element)
    return own && parallel([own, outside])
  }
  const nodes = 'series' in node ? node.series : node.parallel
  const at = nodes.findIndex((child) => holds(child, element))
  const child = nodes[at]
  if (child === undefined) return undefined
  const others = nodes.filter((_, index) => index !== at).map((each) => whole(each, impedances))
  if (others.some((other) => other === undefined)) return undefined
  const known = others as readonly Complex[]
  const beyond = 'series' in node ? [outside, ...known].reduce(add) : parallel([outside, ...known])
  return beyond && seenFrom(child, element, beyond, impedances)
}

function holds(node: CircuitNode, element: Id): boolean {
  if ('element' in node) return node.element === element
  return ('series' in node ? node.series : node.parallel).some((child) => holds(child, element))
}

function whole(node: CircuitNode, impedances: ReadonlyMap<Id, Complex>): Complex | undefined {
  if ('element' in node) return impedances.get(node.element)
  const children = ('series' in node ? node.series : node.parallel).map((child) =>
    whole(child, impedances),
  )
  if (children.some((child) => child === undefined)) return undefined
  const known = children as readonly Complex[]
  return 'series' in node ? known.reduce(add, ZERO) : parallel(known)
}

/** Impedances side by side; a short circuit among them is all that counts. */
function parallel(parts: readonly Complex[]): Complex | undefined {
  if (parts.some(({ re, im }) => re === 0 && im === 0)) return ZERO
  const admittance = parts.map((part) => divide({ re: 1, im: 0 }, part)).reduce(add, ZERO)
  const impedance = divide({ re: 1, im: 0 }, admittance)
  return isFiniteComplex(impedance) ? impedance : undefined
}
