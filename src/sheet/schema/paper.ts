import * as v from 'valibot'
import type { Drawing, HandArrow, Hazard } from '../types'
import { fields, maybeText, notNegativeSchema, oneOf, placeSchema, positiveSchema } from './parts'
import { idSchema, textSchema } from './text'

const maybeScale = v.exactOptional(positiveSchema)
const maybeTolerance = v.exactOptional(notNegativeSchema)

/** How the sheet is drawn. */
export const drawingSchema: v.GenericSchema<unknown, Drawing> = fields({
  paper: v.exactOptional(oneOf(['A4', 'A3', 'Letter'])),
  orientation: v.exactOptional(oneOf(['landscape', 'portrait'])),
  origin: v.exactOptional(placeSchema),
  unitsPerCentimetre: v.exactOptional(
    fields({
      voltage: maybeScale,
      current: maybeScale,
      impedance: maybeScale,
      power: maybeScale,
      other: maybeScale,
    }),
  ),
  tolerance: v.exactOptional(fields({ millimetres: maybeTolerance, degrees: maybeTolerance })),
})

const closingSchema = v.literal('closing')

/** An arrow that a hand drew. */
export const handArrowSchema: v.GenericSchema<unknown, HandArrow> = fields({
  id: idSchema,
  sum: v.exactOptional(idSchema),
  stands: v.lazy((input) => (input === 'closing' ? closingSchema : idSchema)),
  from: placeSchema,
  to: placeSchema,
})

/** A hazard and its control. */
export const hazardSchema: v.GenericSchema<unknown, Hazard> = fields({
  hazard: textSchema,
  control: textSchema,
  risk: oneOf(['low', 'medium', 'high']),
  supervision: maybeText,
})
