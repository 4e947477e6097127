import { degreesOfShift, wrapDegrees } from '../../core'
import { parseShown, resolutionOfShown } from '../digits'
import type { Channel, ShiftReading } from '../types'
import { againstOf, channelTurn } from './angle'
import type { Indication } from './observed'

/** A shift along a time base, understood: 360° · shift / period, a lead or a lag as the reading says. */
export function indicationOfShift(
  reading: ShiftReading,
  channel: Channel | undefined,
): Indication | undefined {
  const shift = parseShown(reading.shift, 's')
  const period = parseShown(reading.period, 's')
  if (!shift.ok || !period.ok) return undefined
  const sign = reading.sense === 'leads' ? 1 : -1
  const degrees = sign * degreesOfShift(shift.value, period.value)
  const value = wrapDegrees(degrees + channelTurn(channel))
  if (!Number.isFinite(value)) return undefined
  const slope = (sign * 360) / period.value
  return {
    value: shift.value,
    ...resolutionOfShown(reading.shift),
    moves: (error) => error * slope,
    observed: { kind: 'angle', value, ...againstOf(reading) },
    of: 'time',
    beside: {
      value: period.value,
      ...resolutionOfShown(reading.period),
      moves: (error) => (-degrees / period.value) * error,
    },
    assumed: 'degrees',
  }
}
