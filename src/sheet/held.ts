import { asReadOf, readingsOf } from './as-read'
import { referenceOf } from './reference'
import type { PhasorId, Sheet } from './types'

/** Which parts of a phasor cannot be dragged, and a sentence that says why. */
export interface Held {
  readonly magnitude: boolean
  readonly angle: boolean
  /** Whether it is a reading that holds the angle, rather than being the reference. */
  readonly isAngleRead: boolean
  readonly why?: string
}

/**
 * What holds the tip of a phasor where it is: readings, which stay as the meter showed them, and being
 * the reference at 0°, from which the other angles count.
 */
export function heldBy(sheet: Sheet, id: PhasorId): Held {
  const readings = readingsOf(sheet, id)
  const magnitude = readings.magnitude.length > 0
  const isReference = isReferenceAtZero(sheet, id)
  const isAngleRead = readings.angle.length > 0 && !isReference
  const label = sheet.phasors.find((phasor) => phasor.id === id)?.label ?? id
  const read = [...(magnitude ? ['magnitude'] : []), ...(isAngleRead ? ['angle'] : [])]
  const verb = read.length > 1 ? 'were' : 'was'
  const sentences = [
    ...(isReference ? [`${label} is the reference: its angle stays 0°.`] : []),
    ...(read.length > 0
      ? [
          `The ${read.join(' and ')} of ${label} ${verb} read on a meter: change the reading instead.`,
        ]
      : []),
  ]
  const held = { magnitude, angle: isAngleRead || isReference, isAngleRead }
  return sentences.length === 0 ? held : { ...held, why: sentences.join(' ') }
}

/** Whether a phasor is the reference, named so or by being at 0°. */
export function isReferenceAtZero(sheet: Sheet, id: PhasorId): boolean {
  return referenceOf(sheet) === id && asReadOf(sheet).values.get(id)?.angle === 0
}
