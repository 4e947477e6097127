import { indexOf } from '../sheet-index'
import type { Reading, Sheet } from '../types'
import { indicationOfAngle } from './angle'
import { indicationOfEllipse } from './ellipse'
import { indicationOfMagnitude } from './magnitude'
import type { Indication, Observed } from './observed'
import { indicationOfPower, indicationOfPowerFactor } from './power'
import { indicationOfShift } from './shift'

/**
 * A reading of a sheet, understood. Undefined where its figures cannot be read or cannot be: an
 * ellipse whose intercept is above its height, a power factor above 1.
 */
export function indicationOf(sheet: Sheet, reading: Reading): Indication | undefined {
  const { phasors, instruments, channels } = indexOf(sheet)
  const channel = channels.get(reading.channel ?? '')
  switch (reading.kind) {
    case 'magnitude': {
      const quantity = phasors.get(reading.of)?.quantity ?? 'other'
      return indicationOfMagnitude(reading, quantity, channel)
    }
    case 'angle':
      return indicationOfAngle(reading, instruments.get(reading.instrument ?? ''), channel)
    case 'shift':
      return indicationOfShift(reading, channel)
    case 'ellipse':
      return indicationOfEllipse(reading, channel)
    case 'power':
    case 'reactive-power':
      return indicationOfPower(reading, channel, channels.get(reading.currentChannel ?? ''))
    case 'power-factor':
      return indicationOfPowerFactor(reading, channel)
  }
}

/** What a reading of a sheet says of its phasors. Undefined where it says nothing. */
export function observedOf(sheet: Sheet, reading: Reading): Observed | undefined {
  return indicationOf(sheet, reading)?.observed
}
