import * as v from 'valibot'
import { MAXIMUM_PHASORS } from '../limits'
import type { PhasorId, Sum } from '../types'
import { fields, list, oneOf, placeSchema } from './parts'
import { idSchema, labelSchema } from './text'

const closedSchema = v.literal(
  0,
  'This must be the id of a phasor, or 0 where the sum closes on itself.',
)
const equalsSchema: v.GenericSchema<unknown, PhasorId | 0> = v.lazy((input) =>
  typeof input === 'number' ? closedSchema : idSchema,
)

/** Phasors that add up, in drawing order. */
export const sumSchema: v.GenericSchema<unknown, Sum> = fields({
  id: idSchema,
  label: v.exactOptional(labelSchema),
  terms: list(
    fields({
      phasor: idSchema,
      sign: v.exactOptional(v.picklist([1, -1], 'The sign of a term is 1 or -1.')),
    }),
    MAXIMUM_PHASORS,
  ),
  equals: v.exactOptional(equalsSchema),
  arrangement: v.exactOptional(oneOf(['tip-to-tail', 'from-origin'])),
  start: v.exactOptional(placeSchema),
})
