import * as v from 'valibot'
import { MAXIMUM_PHASORS } from '../limits'
import type { Job, Sheet, VoidedSignature } from '../types'
import { elementSchema, threePhaseSchema } from './circuit'
import { channelSchema, instrumentSchema } from './instrument'
import { drawingSchema, handArrowSchema, hazardSchema } from './paper'
import {
  fields,
  list,
  maybeText,
  notNegativeSchema,
  numberSchema,
  oneOf,
  typedPositiveSchema,
} from './parts'
import { phasorSchema } from './phasor'
import { readingSchema } from './reading'
import { sumSchema } from './sum'
import { dateSchema, idSchema, textSchema } from './text'

const maybeId = v.exactOptional(idSchema)
const maybeLimit = v.exactOptional(notNegativeSchema)

const voidedSchema: v.GenericSchema<unknown, VoidedSignature> = fields({
  kind: oneOf(['checked', 'approved']),
  by: textSchema,
  date: v.exactOptional(dateSchema),
  revision: maybeText,
})

/** Which job the sheet belongs to. */
export const jobSchema: v.GenericSchema<unknown, Job> = fields({
  number: maybeText,
  site: maybeText,
  circuit: maybeText,
  conditions: maybeText,
  testedBy: maybeText,
  checkedBy: maybeText,
  checkedDate: v.exactOptional(dateSchema),
  approvedBy: maybeText,
  approvedDate: v.exactOptional(dateSchema),
  date: v.exactOptional(dateSchema),
  voided: v.exactOptional(list(voidedSchema)),
  notes: maybeText,
})

const chosenSchema = fields({
  phasor: idSchema,
  magnitude: notNegativeSchema,
  angle: numberSchema,
})

/** The lists of a sheet whose entries are checked one by one. */
type ListName =
  | 'phasors'
  | 'readings'
  | 'instruments'
  | 'channels'
  | 'sums'
  | 'elements'
  | 'threePhase'
  | 'chosen'
  | 'hand'

/** The shapes of the entries of the lists of a sheet. */
export const entrySchemas: {
  readonly [name in ListName]: v.GenericSchema<unknown, NonNullable<Sheet[name]>[number]>
} = {
  phasors: phasorSchema,
  readings: readingSchema,
  instruments: instrumentSchema,
  channels: channelSchema,
  sums: sumSchema,
  elements: elementSchema,
  threePhase: threePhaseSchema,
  chosen: chosenSchema,
  hand: handArrowSchema,
}

const maybeList = v.exactOptional(list(v.unknown()))

/** The shape of a sheet, but for the entries of its lists and the nodes of its circuit. */
export const sheetSchema: v.GenericSchema<unknown, Omit<Sheet, ListName | 'circuit'>> = fields({
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
  phasors: list(v.unknown(), MAXIMUM_PHASORS),
  readings: maybeList,
  instruments: maybeList,
  channels: maybeList,
  sums: maybeList,
  elements: maybeList,
  threePhase: maybeList,
  chosen: maybeList,
  hand: maybeList,
  drawing: v.exactOptional(drawingSchema),
  safety: v.exactOptional(fields({ voltageLimit: maybeLimit, dischargeResistance: maybeLimit })),
  report: v.exactOptional(
    fields({
      hazards: v.exactOptional(list(hazardSchema)),
      criterion: maybeText,
      conclusion: maybeText,
    }),
  ),
})
