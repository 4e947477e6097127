import { wrapDegrees } from '../../core'
import { parseShown } from '../digits'
import type { AngleReading, Channel, Instrument } from '../types'

/**
 * By how many degrees a phasor leads what it was measured against. `lags` turns the sign; without a
 * word the sign is the display's, anticlockwise positive, or clockwise where the instrument counts lag
 * as positive. A channel that is the wrong way round adds 180°, and its phase error (positive where
 * what comes out leads what goes in, as IEC 61869-2 counts it) is taken off.
 */
export function leadOfReading(
  reading: AngleReading,
  instrument: Instrument | undefined,
  channel: Channel | undefined,
): number | undefined {
  const shown = parseShown(reading.shown, '°')
  if (!shown.ok) return undefined
  return wrapDegrees(shown.value * signOfReading(reading, instrument) + channelTurn(channel))
}

/** 1 where a positive figure on the display means a lead, −1 where it means a lag. */
export function signOfReading(reading: AngleReading, instrument: Instrument | undefined): 1 | -1 {
  if (reading.sense !== undefined) return reading.sense === 'leads' ? 1 : -1
  return instrument?.angles === 'lag-positive' ? -1 : 1
}

/** The degrees that a channel makes of a lead: what must be added to a reading through it. */
export function channelTurn(channel: Channel | undefined): number {
  return (channel?.reversed ? 180 : 0) - (channel?.phaseError?.value ?? 0)
}
