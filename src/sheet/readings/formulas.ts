import { type Conversion, FORMULAS } from '../../core'
import { indexOf } from '../sheet-index'
import type { Channel, Reading, Sheet } from '../types'

/** The formulas by which a reading comes to what it says of its phasor, none where it is shown as it is. */
export function formulasOf(sheet: Sheet, reading: Reading): readonly string[] {
  const { channels, instruments } = indexOf(sheet)
  const channel = channels.get(reading.channel ?? '')
  const isAveraging =
    reading.kind === 'magnitude' &&
    instruments.get(reading.instrument ?? '')?.responding === 'average'
  const conversions: readonly (Conversion | undefined)[] = [
    ...ownConversions(reading),
    ...(channel === undefined ? [] : channelConversions(reading, channel)),
    ...(isAveraging ? (['average-responding'] as const) : []),
  ]
  return [...new Set(conversions.flatMap((name) => (name === undefined ? [] : FORMULAS[name])))]
}

function ownConversions(reading: Reading): readonly (Conversion | undefined)[] {
  switch (reading.kind) {
    case 'magnitude':
      return [
        reading.form === 'rms' ? undefined : reading.form,
        reading.turns === undefined ? undefined : 'turns',
        reading.ratio === undefined ? undefined : 'ratio',
        reading.shunt === undefined ? undefined : 'shunt',
      ]
    case 'angle':
      return []
    case 'shift':
      return ['shift']
    case 'ellipse':
      return [reading.tilt === 'falling' ? 'ellipse-falling' : 'ellipse-rising']
    case 'power':
    case 'reactive-power':
      return [reading.kind, reading.ratio === undefined ? undefined : 'ratio']
    case 'power-factor':
      return ['power-factor']
  }
}

function channelConversions(
  reading: Reading,
  { ratio, turns, phaseError, reversed }: Channel,
): readonly (Conversion | undefined)[] {
  const isMagnitude = reading.kind === 'magnitude'
  const isPower = reading.kind === 'power' || reading.kind === 'reactive-power'
  return [
    ratio && (isMagnitude || isPower) ? 'ratio' : undefined,
    turns && (isMagnitude || isPower) ? 'turns' : undefined,
    phaseError && !isMagnitude ? 'phase-error' : undefined,
    reversed && !isMagnitude ? 'reversed' : undefined,
  ]
}
