import * as v from 'valibot'
import { MAXIMUM_PHASORS } from '../limits'
import type { Job, Sheet } from '../types'
import { circuitSchema, elementSchema, threePhaseSchema } from './circuit'
import { channelSchema, instrumentSchema } from './instrument'
import { drawingSchema, handArrowSchema, hazardSchema } from './paper'
import {
  fields,
  list,
  maybeText,
  notNegativeSchema,
  numberSchema,
  typedPositiveSchema,
} from './parts'
import { phasorSchema } from './phasor'
import { readingSchema } from './reading'
import { sumSchema } from './sum'
import { dateSchema, idSchema, textSchema } from './text'

const maybeId = v.exactOptional(idSchema)
const maybeLimit = v.exactOptional(notNegativeSchema)

/** Which job the sheet belongs to. */
export const jobSchema: v.GenericSchema<unknown, Job> = fields({
  number: maybeText,
  site: maybeText,
  circuit: maybeText,
  conditions: maybeText,
  testedBy: maybeText,
  checkedBy: maybeText,
  approvedBy: maybeText,
  date: v.exactOptional(dateSchema),
  notes: maybeText,
})

const chosenSchema = fields({
  phasor: idSchema,
  magnitude: notNegativeSchema,
  angle: numberSchema,
})

/**
 * The shape of a whole sheet: types, ranges and lengths. What one part says of another (ids, terms,
 * texts) is checked beside it.
 */
export const sheetSchema: v.GenericSchema<unknown, Sheet> = fields({
  format: v.literal('phasogon-sheet', 'This is not a sheet: its format must be "phasogon-sheet".'),
  version: v.literal(1, 'The version must be 1.'),
  title: textSchema,
  revision: maybeText,
  job: v.exactOptional(jobSchema),
  frequency: v.exactOptional(typedPositiveSchema),
  reference: maybeId,
  supply: maybeId,
  assumed: v.exactOptional(
    fields({ percent: maybeLimit, degrees: maybeLimit, elementPercent: maybeLimit }),
  ),
  drift: maybeLimit,
  phasors: list(phasorSchema, MAXIMUM_PHASORS),
  readings: v.exactOptional(list(readingSchema)),
  instruments: v.exactOptional(list(instrumentSchema)),
  channels: v.exactOptional(list(channelSchema)),
  sums: v.exactOptional(list(sumSchema)),
  elements: v.exactOptional(list(elementSchema)),
  circuit: v.exactOptional(circuitSchema),
  threePhase: v.exactOptional(list(threePhaseSchema)),
  chosen: v.exactOptional(list(chosenSchema)),
  hand: v.exactOptional(list(handArrowSchema)),
  drawing: v.exactOptional(drawingSchema),
  report: v.exactOptional(
    fields({
      hazards: v.exactOptional(list(hazardSchema)),
      criterion: maybeText,
      conclusion: maybeText,
    }),
  ),
})
