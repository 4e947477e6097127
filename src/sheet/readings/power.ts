import { wrapDegrees } from '../../core'
import { parseShown, resolutionOfShown } from '../digits'
import type { Channel, PowerFactorReading, PowerReading, Sense } from '../types'
import type { Indication } from './observed'

/** How many units of the circuit's power one unit on the display stands for, turned round or not. */
export function scaleOfPower(
  reading: PowerReading,
  voltage: Channel | undefined,
  current: Channel | undefined,
): number {
  return (reading.ratio ?? 1) * scaleOf(voltage) * scaleOf(current)
}

function scaleOf(channel: Channel | undefined): number {
  const size = (channel?.ratio?.value ?? 1) / (channel?.turns ?? 1)
  return channel?.reversed ? -size : size
}

/** What the phase errors of the channels add to the angle between voltage and current, in degrees. */
function turnOf(voltage: Channel | undefined, current: Channel | undefined): number {
  return wrapDegrees((voltage?.phaseError?.value ?? 0) - (current?.phaseError?.value ?? 0))
}

/** A power or reactive power, understood. */
export function indicationOfPower(
  reading: PowerReading,
  voltage: Channel | undefined,
  current: Channel | undefined,
): Indication | undefined {
  const shown = parseShown(reading.shown, reading.kind === 'power' ? 'W' : 'var')
  if (!shown.ok) return undefined
  const scale = scaleOfPower(reading, voltage, current)
  const value = shown.value * scale
  if (!Number.isFinite(value)) return undefined
  return {
    value: shown.value,
    ...resolutionOfShown(reading.shown),
    moves: (error) => error * scale,
    observed: { kind: reading.kind, value, with: reading.with, turn: turnOf(voltage, current) },
    of: 'power',
    assumed: 'percent',
  }
}

/** A power factor, understood; a channel that is the wrong way round turns it and its sense. */
export function indicationOfPowerFactor(
  reading: PowerFactorReading,
  voltage: Channel | undefined,
): Indication | undefined {
  const shown = parseShown(reading.shown, '')
  if (!shown.ok || Math.abs(shown.value) > 1) return undefined
  const sign = voltage?.reversed ? -1 : 1
  const sense = voltage?.reversed ? opposite(reading.sense) : reading.sense
  return {
    value: shown.value,
    ...resolutionOfShown(reading.shown),
    moves: (error) => sign * error,
    observed: {
      kind: 'power-factor',
      value: sign * shown.value + 0,
      with: reading.with,
      ...(sense === undefined ? {} : { sense }),
      turn: turnOf(voltage, undefined),
    },
    assumed: 'percent',
  }
}

/** The other sense; none where there is none. */
export function opposite(sense: Sense | undefined): Sense | undefined {
  if (sense === undefined) return undefined
  return sense === 'leads' ? 'lags' : 'leads'
}
