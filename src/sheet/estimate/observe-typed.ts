import { magnitudeOf, type Typed } from '../../core'
import { assumedOf } from '../assumed'
import { countedValue, valuesOfKind } from '../circuit/values'
import { withinLimit } from '../readings/limit-part'
import type { CircuitElement, Phasor } from '../types'
import type { Names } from './names'
import type { PendingObservation } from './pending'

/** The error of a typed value: within its limit as stated, else within the one that is assumed; none at 0. */
function ownOf({ limit }: Typed, assumed: number): PendingObservation['own'] {
  const width = limit ?? assumed
  return width > 0 ? [withinLimit('as typed', width)] : []
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
  const { percent, degrees } = assumedOf(names.sheet)
  const common = {
    source: { kind: 'typed', phasor: phasor.id },
    shared: [],
  } as const
  const { magnitude, angle, real, imaginary } = phasor
  const observations: PendingObservation[] = []
  if (real !== undefined && imaginary !== undefined) {
    const size = magnitudeOf({ re: real.value, im: imaginary.value })
    const assumed = (size * percent) / 100
    const limits = [real.limit ?? assumed, imaginary.limit ?? assumed]
    if (isReference) {
      // Its direction is given: only its size is left to be observed.
      const limit = Math.max(...limits)
      const of = { kind: 'magnitude', phasor: place } as const
      return [
        { ...common, of, value: size, own: ownOf({ value: size, limit }, 0), gives: 'magnitude' },
      ]
    }
    return [
      {
        ...common,
        of: { kind: 'real', phasor: place },
        value: real.value,
        own: ownOf(real, assumed),
      },
      {
        ...common,
        of: { kind: 'imaginary', phasor: place },
        value: imaginary.value,
        own: ownOf(imaginary, assumed),
      },
    ]
  }
  if (magnitude !== undefined) {
    observations.push({
      ...common,
      of: { kind: 'magnitude', phasor: place },
      value: magnitude.value,
      own: ownOf(magnitude, (Math.abs(magnitude.value) * percent) / 100),
      gives: 'magnitude',
    })
  }
  if (angle !== undefined && !isReference && magnitude?.value !== 0) {
    observations.push({
      ...common,
      of: { kind: 'angle', phasor: place },
      value: angle.value,
      own: ownOf(angle, degrees),
      gives: 'angle',
    })
  }
  return observations
}

/** What was typed of an element's values; what its nameplate says is no observation. */
export function observeElement(
  element: CircuitElement,
  names: Names,
): readonly PendingObservation[] {
  const place = names.element.get(element.id) ?? 0
  const { elementPercent } = assumedOf(names.sheet)
  return valuesOfKind(element.kind).flatMap((name) => {
    const typed = countedValue(element, name)
    const needsFrequency = name === 'inductance' || name === 'capacitance'
    if (typed === undefined || (needsFrequency && !names.sheet.frequency?.value)) return []
    if (name === 'capacitance' && typed.value === 0) return []
    return [
      {
        of: { kind: name, element: place },
        value: typed.value,
        own: ownOf(typed, (Math.abs(typed.value) * elementPercent) / 100),
        shared: [],
        source: { kind: 'element', element: element.id },
      } satisfies PendingObservation,
    ]
  })
}
