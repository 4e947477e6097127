import { degreesOfPowerFactor, wrapDegrees } from '../../core'
import type { PhasorId, Reading, Sheet } from '../types'
import { indicationOf } from './indication'
import type { Observed } from './observed'

/** That one phasor leads another by so many degrees; the reference, where no other is named. */
export interface Lead {
  readonly of: PhasorId
  readonly against: PhasorId | undefined
  readonly degrees: number
}

/**
 * The lead that one reading alone settles: an angle, a shift, an ellipse with its tilt and sense, a
 * power factor with its sense. Undefined where the reading leaves it open.
 */
export function leadOf(sheet: Sheet, reading: Reading): Lead | undefined {
  if (reading.kind === 'magnitude') return undefined
  const observed = indicationOf(sheet, reading)?.observed
  return observed && leadFrom(reading.of, observed)
}

function leadFrom(of: PhasorId, observed: Observed): Lead | undefined {
  if (observed.kind === 'angle') {
    return { of, against: observed.against, degrees: observed.value }
  }
  if (observed.kind !== 'power-factor') return undefined
  const { value, sense, turn } = observed
  if (sense === undefined && Math.abs(value) !== 1) return undefined
  // Where the current lags, the voltage leads it.
  const size = degreesOfPowerFactor(value)
  const degrees = wrapDegrees((sense === 'leads' ? -size : size) - turn)
  return { of, against: observed.with, degrees }
}
