import { magnitudeOf, type Typed } from '../../core'
import type { CircuitElement, Phasor } from '../types'
import { assumedLimits } from './limit-of-reading'
import type { Names } from './names'
import type { PendingObservation } from './pending'

/** The limit as stated, else the one that is assumed. */
function limitOf({ limit }: Typed, assumed: number): number {
  return limit ?? assumed
}

/**
 * What was typed of a phasor, polar or rectangular. The angle of the reference is no observation: it
 * is what its angle is by definition. A phasor of no size has no angle.
 */
export function observePhasor(
  phasor: Phasor,
  names: Names,
  isReference: boolean,
): readonly PendingObservation[] {
  const place = names.phasor.get(phasor.id) ?? 0
  const { percent, degrees } = assumedLimits(names.sheet)
  const common = {
    source: { kind: 'typed', phasor: phasor.id },
    common: [],
  } as const
  const { magnitude, angle, real, imaginary } = phasor
  const observations: PendingObservation[] = []
  if (real !== undefined && imaginary !== undefined) {
    const size = magnitudeOf({ re: real.value, im: imaginary.value })
    const assumed = (size * percent) / 100
    const limits = [limitOf(real, assumed), limitOf(imaginary, assumed)] as const
    if (isReference) {
      // Its direction is given: only its size is left to be observed.
      const limit = Math.max(...limits)
      const of = { kind: 'magnitude', phasor: place } as const
      return [{ ...common, of, value: size, limit, gives: 'magnitude' }]
    }
    return [
      { ...common, of: { kind: 'real', phasor: place }, value: real.value, limit: limits[0] },
      {
        ...common,
        of: { kind: 'imaginary', phasor: place },
        value: imaginary.value,
        limit: limits[1],
      },
    ]
  }
  if (magnitude !== undefined) {
    observations.push({
      ...common,
      of: { kind: 'magnitude', phasor: place },
      value: magnitude.value,
      limit: limitOf(magnitude, (Math.abs(magnitude.value) * percent) / 100),
      gives: 'magnitude',
    })
  }
  if (angle !== undefined && !isReference && magnitude?.value !== 0) {
    observations.push({
      ...common,
      of: { kind: 'angle', phasor: place },
      value: angle.value,
      limit: limitOf(angle, degrees),
      gives: 'angle',
    })
  }
  return observations
}

/** The values of an element that its kind has, in the words of both the sheet and the estimator. */
const VALUES_OF_KIND = {
  resistor: ['resistance'],
  coil: ['resistance', 'inductance'],
  capacitor: ['capacitance', 'resistance'],
  impedance: ['resistance', 'reactance'],
} as const

/** A value that an element may have. */
export type ElementValue = 'resistance' | 'inductance' | 'capacitance' | 'reactance'

/** Which values an element of this kind has. */
export function valuesOfKind(kind: CircuitElement['kind']): readonly ElementValue[] {
  return VALUES_OF_KIND[kind]
}

/** A value of an element as it was typed, outside its nameplate. */
function typedValue(element: CircuitElement, name: ElementValue): Typed | undefined {
  const values: { readonly [value in ElementValue]?: Typed } = element
  return values[name]
}

/** What was typed of an element's values; what its nameplate says is no observation. */
export function observeElement(
  element: CircuitElement,
  names: Names,
): readonly PendingObservation[] {
  const place = names.element.get(element.id) ?? 0
  const { elementPercent } = assumedLimits(names.sheet)
  return valuesOfKind(element.kind).flatMap((name) => {
    const typed = typedValue(element, name)
    const needsFrequency = name === 'inductance' || name === 'capacitance'
    if (typed === undefined || (needsFrequency && !names.sheet.frequency?.value)) return []
    if (name === 'capacitance' && typed.value === 0) return []
    return [
      {
        of: { kind: name, element: place },
        value: typed.value,
        limit: limitOf(typed, (Math.abs(typed.value) * elementPercent) / 100),
        common: [],
        source: { kind: 'element', element: element.id },
      } satisfies PendingObservation,
    ]
  })
}
