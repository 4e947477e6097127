import * as v from 'valibot'
import type { CircuitElement, CircuitNode, ThreePhase } from '../types'
import {
  fields,
  kinds,
  list,
  notNegativeSchema,
  oneOf,
  typedNotNegativeSchema,
  typedSchema,
} from './parts'
import { idSchema, labelSchema } from './text'

const maybePassive = v.exactOptional(typedNotNegativeSchema)
const maybeTyped = v.exactOptional(typedSchema)
const maybeRating = v.exactOptional(notNegativeSchema)

const common = {
  id: idSchema,
  label: v.exactOptional(labelSchema),
  voltage: idSchema,
  current: idSchema,
  rating: v.exactOptional(fields({ voltage: maybeRating, current: maybeRating })),
  marked: v.exactOptional(
    fields({
      resistance: maybePassive,
      inductance: maybePassive,
      capacitance: maybePassive,
      reactance: maybeTyped,
    }),
  ),
}

/** A two-terminal element. Only an impedance may have a negative resistance: a source, a running motor. */
export const elementSchema: v.GenericSchema<unknown, CircuitElement> = kinds<CircuitElement>({
  resistor: fields({ ...common, kind: v.literal('resistor'), resistance: maybePassive }),
  coil: fields({
    ...common,
    kind: v.literal('coil'),
    resistance: maybePassive,
    inductance: maybePassive,
    dcResistance: maybePassive,
  }),
  capacitor: fields({
    ...common,
    kind: v.literal('capacitor'),
    capacitance: maybePassive,
    resistance: maybePassive,
  }),
  impedance: fields({
    ...common,
    kind: v.literal('impedance'),
    resistance: maybeTyped,
    reactance: maybeTyped,
  }),
})

/** The builder's tree: an element, or nodes in series or in parallel. */
export const circuitSchema: v.GenericSchema<unknown, CircuitNode> = v.lazy((input) => {
  if (typeof input !== 'object' || input === null) return leafSchema
  if ('series' in input) return seriesSchema
  return 'parallel' in input ? parallelSchema : leafSchema
})

const leafSchema = fields({ element: idSchema })
const seriesSchema = fields({ series: list(circuitSchema) })
const parallelSchema = fields({ parallel: list(circuitSchema) })

const three = <const Item extends v.GenericSchema>(item: Item) =>
  v.strictTuple([item, item, item], 'This must be a list of exactly three.')

/** Three phasors that are one three-phase system. */
export const threePhaseSchema: v.GenericSchema<unknown, ThreePhase> = fields({
  id: idSchema,
  label: v.exactOptional(labelSchema),
  phasors: three(idSchema),
  kind: v.exactOptional(oneOf(['phase', 'line'])),
  connection: v.exactOptional(oneOf(['star', 'delta'])),
  wires: v.exactOptional(v.picklist([3, 4], 'A three-phase system has 3 or 4 wires.')),
  neutral: v.exactOptional(idSchema),
  names: v.exactOptional(three(labelSchema)),
  currents: v.exactOptional(three(idSchema)),
})
