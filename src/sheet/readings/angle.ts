import { wrapDegrees } from '../../core'
import { parseShown, resolutionOfShown } from '../digits'
import type { AngleReading, Channel, Instrument, PhasorId } from '../types'
import type { Indication } from './observed'

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

/** The phasor that was measured against, where one is named. */
export function againstOf(reading: { readonly against?: PhasorId }): {
  readonly against?: PhasorId
} {
  return reading.against === undefined ? {} : { against: reading.against }
}

/** An angle reading, understood. */
export function indicationOfAngle(
  reading: AngleReading,
  instrument: Instrument | undefined,
  channel: Channel | undefined,
): Indication | undefined {
  const shown = parseShown(reading.shown, '°')
  const lead = leadOfReading(reading, instrument, channel)
  if (!shown.ok || lead === undefined || !Number.isFinite(lead)) return undefined
  const sign = signOfReading(reading, instrument)
  return {
    value: shown.value,
    ...resolutionOfShown(reading.shown),
    moves: (error) => error * sign,
    observed: { kind: 'angle', value: lead, ...againstOf(reading) },
    of: 'angle',
    assumed: 'degrees',
  }
}
