import { fromPolar, radiansFromDegrees, type Typed } from '../../core'
import { asReadOf } from '../as-read'
import { assumedOf } from '../assumed'
import { indexOf } from '../sheet-index'
import type { Channel, Reading, Sheet } from '../types'
import { type SharedLimitPart, sharedWithinLimit } from './limit-part'
import type { Indication, Observed } from './observed'

/** What the channels that a reading came through make uncertain of it. */
export function channelParts(
  sheet: Sheet,
  reading: Reading,
  { observed }: Indication,
): readonly SharedLimitPart[] {
  const { channels } = indexOf(sheet)
  const own = channels.get(reading.channel ?? '')
  const current = 'currentChannel' in reading && channels.get(reading.currentChannel ?? '')
  return [
    ...(own
      ? [...ratioParts(sheet, own, observed), ...phaseParts(sheet, reading, own, observed, 1)]
      : []),
    ...(current
      ? [
          ...ratioParts(sheet, current, observed),
          ...phaseParts(sheet, reading, current, observed, -1),
        ]
      : []),
  ]
}

function nameOf({ label, id }: Channel): string {
  return label ?? id
}

/** Magnitudes and powers are off by as much as the ratio is, in proportion. */
function ratioParts(
  sheet: Sheet,
  channel: Channel,
  observed: Observed,
): readonly SharedLimitPart[] {
  const { ratio } = channel
  if (ratio === undefined) return []
  if (observed.kind === 'angle' || observed.kind === 'sine' || observed.kind === 'power-factor') {
    return []
  }
  const limit = ratio.limit ?? (ratio.value * assumedOf(sheet).percent) / 100
  if (limit === 0) return []
  const words = `ratio of ${nameOf(channel)}, common to all through it${assumedWord(ratio)}`
  return [sharedWithinLimit(words, `ratio:${channel.id}`, (observed.value * limit) / ratio.value)]
}

/** By how much the phase error of a channel can be off, as a move of what the reading comes to. */
function phaseParts(
  sheet: Sheet,
  reading: Reading,
  channel: Channel,
  observed: Observed,
  side: 1 | -1,
): readonly SharedLimitPart[] {
  const { phaseError } = channel
  if (phaseError === undefined || observed.kind === 'magnitude') return []
  const limit = phaseError.limit ?? assumedOf(sheet).degrees
  const move = side * limit * slopeByTurn(sheet, reading, observed)
  if (move === 0) return []
  const words = `phase error of ${nameOf(channel)}, common to all through it${assumedWord(phaseError)}`
  return [sharedWithinLimit(words, `phase:${channel.id}`, move)]
}

function assumedWord({ limit }: Typed): string {
  return limit === undefined ? ', assumed' : ''
}

/** By how much what a reading comes to moves for each degree that the channel's output is ahead. */
function slopeByTurn(sheet: Sheet, reading: Reading, observed: Observed): number {
  switch (observed.kind) {
    case 'magnitude':
      return 0
    case 'angle':
      return -1
    case 'sine':
      return radiansFromDegrees(Math.sqrt(1 - observed.value ** 2))
    case 'power-factor': {
      const size = radiansFromDegrees(Math.sqrt(1 - observed.value ** 2))
      return observed.sense === 'leads' ? size : -size
    }
    case 'power':
    case 'reactive-power':
      return slopeOfPower(sheet, reading, observed)
  }
}

/** Turned by a small angle, power falls by the reactive power and reactive power rises by the power. */
function slopeOfPower(
  sheet: Sheet,
  reading: Reading,
  observed: Observed & { readonly kind: 'power' | 'reactive-power' },
): number {
  const { values } = asReadOf(sheet)
  const [voltage, current] = [values.get(reading.of), values.get(observed.with)]
  if (voltage?.magnitude === undefined || current?.magnitude === undefined) return 0
  const apparent = voltage.magnitude * current.magnitude
  const sign = observed.kind === 'power' ? -1 : 1
  if (voltage.angle !== undefined && current.angle !== undefined) {
    const { re, im } = fromPolar(apparent, voltage.angle - current.angle)
    return sign * radiansFromDegrees(observed.kind === 'power' ? im : re)
  }
  const other = Math.sqrt(Math.max(0, apparent ** 2 - observed.value ** 2))
  return sign * radiansFromDegrees(other)
}
