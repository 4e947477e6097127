import { decimalPlacesOf, formatNumber, resolutionOf, wrapDegrees } from '../../core'
import { parseShown } from '../digits'
import type {
  AngleReading,
  EllipseReading,
  Instrument,
  PhasorId,
  PowerFactorReading,
  PowerReading,
  Reading,
  ShiftReading,
  Shown,
} from '../types'
import { opposite } from './power'

/** Whether a reading says something else when the phasor is counted the other way round. */
export function turnsWith(
  reading: Reading,
  id: PhasorId,
  reference: PhasorId | undefined,
): boolean {
  if (reading.kind === 'magnitude') return false
  if (reading.of === id) return true
  if ('with' in reading) return reading.with === id
  return (reading.against ?? reference) === id
}

/**
 * The reading as the meter shows it with one pair of its leads exchanged: an angle 180° further, power,
 * reactive power and power factor with the other sign, an ellipse that leans the other way. Digits stay
 * as fine as they were. Magnitudes do not change.
 */
export function withLeadsExchanged(reading: Reading, instrument: Instrument | undefined): Reading {
  switch (reading.kind) {
    case 'magnitude':
      return reading
    case 'angle':
      return exchangedAngle(reading, instrument)
    case 'shift':
      return exchangedShift(reading)
    case 'ellipse':
      return exchangedEllipse(reading)
    case 'power':
    case 'reactive-power':
    case 'power-factor':
      return exchangedPower(reading)
  }
}

type Turn = (value: number) => number

/** What is shown, and each repeat, through the same step; the text keeps as many decimals. */
function throughStep<Kind extends AngleReading | PowerReading | PowerFactorReading>(
  reading: Kind,
  unit: string,
  step: Turn,
): Kind {
  return {
    ...reading,
    shown: shownThrough(reading.shown, unit, step),
    ...(reading.repeats === undefined
      ? {}
      : { repeats: reading.repeats.map((value) => tidy(step(value))) }),
  }
}

/** A sum of two decimals without the tail of a rounding. */
function tidy(value: number): number {
  return Number(value.toPrecision(14)) + 0
}

function shownThrough(shown: Shown, unit: string, step: Turn): Shown {
  const parsed = parseShown(shown, unit)
  if (!parsed.ok) return shown
  const value = tidy(step(parsed.value))
  if (typeof shown === 'number') return value
  const resolution = resolutionOf(shown)
  if (resolution === undefined) return value
  const suffix = /\p{L}$/u.test(shown) && unit !== '°' ? ` ${unit}` : ''
  const text = `${formatNumber(value, decimalPlacesOf(resolution))}${suffix}`
  const again = parseShown(text, unit)
  const isSame = again.ok && again.value === value && resolutionOf(text) === resolution
  return isSame ? text : value
}

/** A display with the word for its sense counts 0 to 180°; one that counts lag runs on to 360°. */
function exchangedAngle(reading: AngleReading, instrument: Instrument | undefined): AngleReading {
  if (reading.sense === undefined) {
    const isRound = instrument?.angles === 'lag-positive'
    return throughStep(reading, '°', (value) =>
      isRound ? (((value + 180) % 360) + 360) % 360 : wrapDegrees(value + 180),
    )
  }
  const shown = parseShown(reading.shown, '°')
  const isNear = shown.ok && shown.value >= 0
  return throughStep(
    { ...reading, sense: reading.sense === 'leads' ? 'lags' : 'leads' },
    '°',
    (value) => (isNear ? 180 - value : -180 - value),
  )
}

/** Half a period further on; back, where that would be past the period. */
function exchangedShift(reading: ShiftReading): ShiftReading {
  const shift = parseShown(reading.shift, 's')
  const period = parseShown(reading.period, 's')
  if (!shift.ok || !period.ok) return reading
  const half = period.value / 2
  const step = shift.value <= half ? half : -half
  const repeats = reading.repeats?.map((value) => tidy(value + step))
  return {
    ...reading,
    shift: shownThrough(reading.shift, 's', (value) => value + step),
    ...(repeats === undefined ? {} : { repeats }),
  }
}

function exchangedEllipse({ tilt, sense, ...rest }: EllipseReading): EllipseReading {
  const turned = opposite(sense)
  return {
    ...rest,
    ...(tilt === undefined ? {} : { tilt: tilt === 'rising' ? 'falling' : 'rising' }),
    ...(turned === undefined ? {} : { sense: turned }),
  }
}

function exchangedPower(
  reading: PowerReading | PowerFactorReading,
): PowerReading | PowerFactorReading {
  if (reading.kind !== 'power-factor') {
    return throughStep(reading, reading.kind === 'power' ? 'W' : 'var', (value) => -value)
  }
  const sense = opposite(reading.sense)
  return throughStep(
    { ...reading, ...(sense === undefined ? {} : { sense }) },
    '',
    (value) => -value,
  )
}
