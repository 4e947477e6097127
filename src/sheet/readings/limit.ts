import type { Reading, Sheet } from '../types'
import { channelParts } from './channel-parts'
import { driftPart } from './drift'
import { indicationOf } from './indication'
import type { LimitPart, SharedLimitPart } from './limit-part'
import { type MeterParts, meterParts } from './meter-parts'
import { repeatParts } from './repeats'

/** How far off a reading may be, as parts that are independent of each other. */
export interface ReadingLimit {
  /** Who says so: the reading itself, the accuracy of its instrument, or nobody. */
  readonly from: MeterParts['from']
  /**
   * Half a width, for certain, of what the reading comes to: in the unit of its phasor, degrees, watts
   * or vars, or as a bare figure where an angle is open; of the meter and the channels it was read
   * through. What drifts between passes and what scatters between repeats is not in it.
   */
  readonly limit: number
  /** The errors of this reading alone. */
  readonly own: readonly LimitPart[]
  /** The errors that it has in common with others. */
  readonly shared: readonly SharedLimitPart[]
  /** Why the accuracy of the instrument does not serve, where it has one that fits. */
  readonly problem?: string
}

/**
 * How far off a reading may be. A stated limit comes first, then the accuracy of its instrument for the
 * function and range, then what the sheet assumes. Each limit is a half-width with a standard
 * uncertainty of limit / √3 (JCGM 100:2008, 4.3.7). The part of an accuracy that is "of the reading" is
 * one error of all readings of the instrument's function and range; digits and what is of the range are
 * each reading's own; a channel's ratio and phase error are common to all through it, drift to a pass,
 * and repeats of one set go together as they were observed. Undefined where the reading says nothing.
 */
export function limitOf(sheet: Sheet, reading: Reading): ReadingLimit | undefined {
  const indication = indicationOf(sheet, reading)
  if (indication === undefined) return undefined
  const meter = meterParts(sheet, reading, indication)
  const channels = channelParts(sheet, reading, indication)
  const repeats = repeatParts(reading, indication)
  const drift = driftPart(sheet, reading, indication)
  const limits = [...meter.own, ...meter.shared, ...channels]
  return {
    from: meter.from,
    limit: limits.reduce((sum, { limit = 0 }) => sum + limit, 0),
    own: [...meter.own, ...repeats.own, ...drift.own],
    shared: [...meter.shared, ...channels, ...repeats.shared, ...drift.shared],
    ...(meter.problem === undefined ? {} : { problem: meter.problem }),
  }
}
