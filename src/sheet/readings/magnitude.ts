import type { Quantity } from '../../core'
import { parseShown } from '../digits'
import { unitOfMagnitude } from '../figures'
import type { Channel, MagnitudeReading } from '../types'

const RMS_OF_FORM = { rms: 1, peak: Math.SQRT1_2, 'peak-to-peak': Math.SQRT1_2 / 2 }

/**
 * How many units of the phasor one unit on the display stands for: rms of the wave's form (÷ √2 of a
 * peak, ÷ 2√2 of a peak-to-peak value, of a sine), × the ratio, ÷ the turns in the clamp, ÷ the shunt's
 * ohms; a channel's ratio and turns count besides the reading's own.
 */
export function magnitudeFactor(reading: MagnitudeReading, channel: Channel | undefined): number {
  const ratio = (reading.ratio ?? 1) * (channel?.ratio?.value ?? 1)
  const turns = (reading.turns ?? 1) * (channel?.turns ?? 1)
  return (RMS_OF_FORM[reading.form ?? 'rms'] * ratio) / (turns * (reading.shunt ?? 1))
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
