import * as v from 'valibot'
import type { Reading } from '../types'
import {
  fields,
  flagSchema,
  kinds,
  list,
  maybeText,
  notNegativeSchema,
  numberSchema,
  oneOf,
  positiveSchema,
  shownSchema,
  turnsSchema,
} from './parts'
import { dateSchema, idSchema } from './text'

/** Every mistake that can be assumed and corrected. */
export const MISTAKES = [
  'reversed',
  'peak-as-rms',
  'peak-to-peak-as-rms',
  'rms-as-peak',
  'turns-not-divided',
  'turns-divided-twice',
  'ratio-left-out',
  'ratio-applied-twice',
  'wrong-ratio',
  'line-as-phase',
  'phase-as-line',
  'decade-slip',
  'digits-transposed',
  'lead-lag-swapped',
  'half-period',
  'double-period',
  'wrong-angle-reference',
  'readings-swapped',
  'phases-swapped',
  'winding-resistance-omitted',
  'element-decade-slip',
  'element-changed',
  'distorted-waveform',
  'one-reading-off',
] as const

const senseSchema = oneOf(['leads', 'lags'])
const maybeId = v.exactOptional(idSchema)

const common = {
  id: idSchema,
  of: idSchema,
  instrument: maybeId,
  channel: maybeId,
  range: v.exactOptional(positiveSchema),
  limit: v.exactOptional(notNegativeSchema),
  repeats: v.exactOptional(list(numberSchema)),
  pass: maybeText,
  struck: v.exactOptional(flagSchema),
  corrected: v.exactOptional(
    fields({
      mistake: oneOf(MISTAKES),
      original: fields({}),
      by: maybeText,
      date: v.exactOptional(dateSchema),
      reason: maybeText,
    }),
  ),
}

const against = { against: maybeId }
const maybeSense = v.exactOptional(senseSchema)
const fromPower = {
  ...common,
  shown: shownSchema,
  with: idSchema,
  ratio: v.exactOptional(positiveSchema),
  currentChannel: maybeId,
}

/** One indication of one meter. */
export const readingSchema: v.GenericSchema<unknown, Reading> = kinds<Reading>({
  magnitude: fields({
    ...common,
    kind: v.literal('magnitude'),
    shown: shownSchema,
    form: v.exactOptional(oneOf(['rms', 'peak', 'peak-to-peak'])),
    turns: v.exactOptional(turnsSchema),
    ratio: v.exactOptional(positiveSchema),
    shunt: v.exactOptional(positiveSchema),
  }),
  angle: fields({
    ...common,
    ...against,
    kind: v.literal('angle'),
    shown: shownSchema,
    sense: maybeSense,
  }),
  shift: fields({
    ...common,
    ...against,
    kind: v.literal('shift'),
    shift: shownSchema,
    period: shownSchema,
    sense: senseSchema,
  }),
  ellipse: fields({
    ...common,
    ...against,
    kind: v.literal('ellipse'),
    intercept: shownSchema,
    height: shownSchema,
    tilt: v.exactOptional(oneOf(['rising', 'falling'])),
    sense: maybeSense,
  }),
  power: fields({ ...fromPower, kind: v.literal('power') }),
  'reactive-power': fields({ ...fromPower, kind: v.literal('reactive-power') }),
  'power-factor': fields({
    ...common,
    kind: v.literal('power-factor'),
    shown: shownSchema,
    with: idSchema,
    sense: maybeSense,
  }),
})
