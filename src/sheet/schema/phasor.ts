import * as v from 'valibot'
import type { Phasor, Tail } from '../types'
import { fields, oneOf, placeSchema, typedMagnitudeSchema, typedSchema } from './parts'
import { idSchema, labelSchema } from './text'

/** What kind of quantity a phasor is. */
export const quantitySchema = oneOf(['voltage', 'current', 'impedance', 'power', 'other'])

const hangingSchema = fields({ tipOf: idSchema })

/** A place, or another phasor's tip. */
export const tailSchema: v.GenericSchema<unknown, Tail> = v.lazy((input) =>
  typeof input === 'object' && input !== null && 'tipOf' in input ? hangingSchema : placeSchema,
)

/** A phasor: typed polar or rectangular, or not typed. */
export const phasorSchema: v.GenericSchema<unknown, Phasor> = v.pipe(
  fields({
    id: idSchema,
    label: labelSchema,
    quantity: quantitySchema,
    from: v.exactOptional(labelSchema),
    to: v.exactOptional(labelSchema),
    magnitude: v.exactOptional(typedMagnitudeSchema),
    angle: v.exactOptional(typedSchema),
    real: v.exactOptional(typedSchema),
    imaginary: v.exactOptional(typedSchema),
    tail: v.exactOptional(tailSchema),
  }),
  v.check(
    (phasor) => !(isPolar(phasor) && isRectangular(phasor)),
    'A phasor is typed either as magnitude and angle or as real and imaginary part, not as both.',
  ),
  v.check(
    (phasor) => (phasor.real === undefined) === (phasor.imaginary === undefined),
    'A phasor that is typed in rectangular form needs both its real and its imaginary part.',
  ),
)

function isPolar(phasor: Phasor): boolean {
  return phasor.magnitude !== undefined || phasor.angle !== undefined
}

function isRectangular(phasor: Phasor): boolean {
  return phasor.real !== undefined || phasor.imaginary !== undefined
}
