import { type Quantity, rmsOfForm } from '../../core'
import { parseShown, resolutionOfShown } from '../digits'
import { unitOfMagnitude } from '../figures'
import type { Accuracy, Channel, MagnitudeReading, PhasorId, Reading } from '../types'
import type { Indication } from './observed'

/**
 * How many units of the phasor one unit on the display stands for: rms of the wave's form (÷ √2 of a
 * peak, ÷ 2√2 of a peak-to-peak value, of a sine), × the ratio, ÷ the turns in the clamp, ÷ the shunt's
 * ohms; a channel's ratio and turns count besides the reading's own.
 */
export function magnitudeFactor(reading: MagnitudeReading, channel: Channel | undefined): number {
  const ratio = (reading.ratio ?? 1) * (channel?.ratio?.value ?? 1)
  const turns = (reading.turns ?? 1) * (channel?.turns ?? 1)
  return (rmsOfForm(reading.form ?? 'rms') * ratio) / (turns * (reading.shunt ?? 1))
}

/**
 * The magnitude that a reading stands for, in the unit of the phasor; undefined where its digits say
 * none, or one too large to compute with.
 */
export function magnitudeOfReading(
  reading: MagnitudeReading,
  quantity: Quantity,
  channel: Channel | undefined,
): number | undefined {
  const shown = parseShown(reading.shown, unitOfMagnitude(reading, quantity))
  const magnitude = shown.ok ? shown.value * magnitudeFactor(reading, channel) : Number.NaN
  return Number.isFinite(magnitude) ? magnitude : undefined
}

const FUNCTIONS: { readonly [quantity in Quantity]: Accuracy['of'] | undefined } = {
  voltage: 'voltage',
  current: 'current',
  impedance: 'resistance',
  power: 'power',
  other: undefined,
}

/** A magnitude reading, understood. */
export function indicationOfMagnitude(
  reading: MagnitudeReading,
  quantity: Quantity,
  channel: Channel | undefined,
): Indication | undefined {
  const shown = parseShown(reading.shown, unitOfMagnitude(reading, quantity))
  const value = magnitudeOfReading(reading, quantity, channel)
  if (!shown.ok || value === undefined) return undefined
  const factor = magnitudeFactor(reading, channel)
  const of = reading.shunt === undefined ? FUNCTIONS[quantity] : 'voltage'
  return {
    value: shown.value,
    ...resolutionOfShown(reading.shown),
    moves: (error) => error * factor,
    observed: { kind: 'magnitude', value },
    ...(of === undefined ? {} : { of }),
    assumed: 'percent',
  }
}

/** Whether a reading in use is one of this phasor's magnitude. */
export function isMagnitudeOf(reading: Reading, id: PhasorId): reading is MagnitudeReading {
  return reading.kind === 'magnitude' && reading.of === id && reading.struck !== true
}
