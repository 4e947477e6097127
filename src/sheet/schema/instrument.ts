import * as v from 'valibot'
import type { Channel, Instrument } from '../types'
import {
  fields,
  flagSchema,
  list,
  maybeText,
  oneOf,
  positiveSchema,
  turnsSchema,
  typedNotNegativeSchema,
  typedPositiveSchema,
  typedSchema,
} from './parts'
import { dateSchema, idSchema, labelSchema, textSchema } from './text'

/** A meter, with what is known of it. */
export const instrumentSchema: v.GenericSchema<unknown, Instrument> = fields({
  id: idSchema,
  name: textSchema,
  serial: maybeText,
  calibrationDue: v.exactOptional(dateSchema),
  category: maybeText,
  responding: v.exactOptional(oneOf(['true-rms', 'average'])),
  angles: v.exactOptional(oneOf(['lead-positive', 'lag-positive'])),
  inputResistance: v.exactOptional(typedNotNegativeSchema),
  accuracy: v.exactOptional(
    list(
      fields({
        of: oneOf(['voltage', 'current', 'power', 'angle', 'time', 'resistance']),
        range: v.exactOptional(positiveSchema),
        text: textSchema,
      }),
    ),
  ),
})

/** A CT, VT, probe or clamp that several readings share. */
export const channelSchema: v.GenericSchema<unknown, Channel> = fields({
  id: idSchema,
  label: v.exactOptional(labelSchema),
  ratio: v.exactOptional(typedPositiveSchema),
  turns: v.exactOptional(turnsSchema),
  phaseError: v.exactOptional(typedSchema),
  reversed: v.exactOptional(flagSchema),
})
