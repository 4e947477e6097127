import type { Quantity } from '../../core'
import { indexOf } from '../sheet-index'
import type { Channel, Instrument, Reading, Sheet } from '../types'
import { indicationOfAngle } from './angle'
import { indicationOfEllipse } from './ellipse'
import { indicationOfMagnitude } from './magnitude'
import type { Indication, Observed } from './observed'
import { indicationOfPower, indicationOfPowerFactor } from './power'
import { indicationOfShift } from './shift'

/** What an indication depends on besides the reading itself. */
interface Setting {
  readonly quantity: Quantity
  readonly instrument: Instrument | undefined
  readonly channel: Channel | undefined
  readonly currentChannel: Channel | undefined
}

const understood = new WeakMap<Reading, Setting & { readonly indication: Indication | undefined }>()

/**
 * A reading of a sheet, understood. Undefined where its figures cannot be read or cannot be: an
 * ellipse whose intercept is above its height, a power factor above 1. Its digits are read once,
 * however many sheets it stands on: a drag asks in every frame.
 */
export function indicationOf(sheet: Sheet, reading: Reading): Indication | undefined {
  const { phasors, instruments, channels } = indexOf(sheet)
  const quantity = phasors.get(reading.of)?.quantity ?? 'other'
  const instrument = instruments.get(reading.instrument ?? '')
  const channel = channels.get(reading.channel ?? '')
  const current = 'currentChannel' in reading ? reading.currentChannel : undefined
  const currentChannel = channels.get(current ?? '')
  const known = understood.get(reading)
  if (
    known?.quantity === quantity &&
    known.instrument === instrument &&
    known.channel === channel &&
    known.currentChannel === currentChannel
  ) {
    return known.indication
  }
  const setting = { quantity, instrument, channel, currentChannel }
  const indication = understand(reading, setting)
  understood.set(reading, { ...setting, indication })
  return indication
}

function understand(reading: Reading, setting: Setting): Indication | undefined {
  const { quantity, instrument, channel, currentChannel } = setting
  switch (reading.kind) {
    case 'magnitude':
      return indicationOfMagnitude(reading, quantity, channel)
    case 'angle':
      return indicationOfAngle(reading, instrument, channel)
    case 'shift':
      return indicationOfShift(reading, channel)
    case 'ellipse':
      return indicationOfEllipse(reading, channel)
    case 'power':
    case 'reactive-power':
      return indicationOfPower(reading, channel, currentChannel)
    case 'power-factor':
      return indicationOfPowerFactor(reading, channel)
  }
}

/** What a reading of a sheet says of its phasors. Undefined where it says nothing. */
export function observedOf(sheet: Sheet, reading: Reading): Observed | undefined {
  return indicationOf(sheet, reading)?.observed
}
