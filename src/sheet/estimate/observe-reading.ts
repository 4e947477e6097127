import { cosDegrees, degreesOfEllipse, degreesOfShift, type Quantity, sinDegrees } from '../../core'
import type { AsRead } from '../as-read'
import { parseShown } from '../digits'
import { unitOfMagnitude } from '../figures'
import { channelTurn, leadOfReading, signOfReading } from '../readings/angle'
import { magnitudeFactor } from '../readings/magnitude'
import type {
  Accuracy,
  AngleReading,
  Channel,
  EllipseReading,
  MagnitudeReading,
  PhasorId,
  PowerFactorReading,
  PowerReading,
  Reading,
  ShiftReading,
} from '../types'
import { assumedLimits, type IndicationLimit, limitOfIndication } from './limit-of-reading'
import type { Names } from './names'
import type { CommonError, PendingObservation } from './pending'

/** What is at hand where a reading is turned into an observation. */
interface Context {
  readonly names: Names
  readonly asRead: AsRead
}

const FUNCTION_OF_QUANTITY: { readonly [quantity in Quantity]: Accuracy['of'] } = {
  voltage: 'voltage',
  current: 'current',
  impedance: 'resistance',
  power: 'power',
  other: 'voltage',
}

/** The indications of repeats in the observation's unit: they may lack the prefix of what is shown. */
function repeatsOf(reading: Reading, shown: number, factor: number) {
  const values = reading.repeats ?? []
  if (values.length < 2) return {}
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length
  const ratio = shown !== 0 && mean !== 0 ? Math.abs(shown / mean) : 1
  const prefix = 1000 ** Math.round(Math.log10(ratio) / 3)
  const scaled = values.map((value) => value * prefix * factor)
  return { repeats: { values: scaled, ...(reading.pass ? { set: reading.pass } : {}) } }
}

/** A limit in the unit of what was shown, as the observation's own and common errors. */
function scaled(limit: IndicationLimit, factor: number) {
  const common: CommonError[] = limit.ofReading
    ? [
        {
          key: limit.ofReading.key,
          halfWidth: limit.ofReading.halfWidth * factor,
          isOfReading: true,
        },
      ]
    : []
  return { limit: limit.own * Math.abs(factor), common }
}

/** By how much the supply may have moved: common to a pass; none where several passes were averaged. */
function driftOf(reading: Reading, value: number, { sheet }: Names, power: number): CommonError[] {
  if (!sheet.drift || (reading.repeats?.length ?? 0) > 1) return []
  const key = reading.pass === undefined ? `drift of ${reading.id}` : `drift in ${reading.pass}`
  return [{ key, halfWidth: (power * value * sheet.drift) / 100 }]
}

/** The error of a channel's ratio, common to all that use it. */
function ratioError(channel: Channel | undefined, value: number, { sheet }: Names): CommonError[] {
  const ratio = channel?.ratio
  if (channel === undefined || ratio === undefined || ratio.value === 0) return []
  const share =
    ratio.limit === undefined ? assumedLimits(sheet).percent / 100 : ratio.limit / ratio.value
  return [{ key: `ratio of ${channel.id}`, halfWidth: value * share }]
}

/** The error of a channel's phase, in degrees, common to all that use it. */
function phaseError(channel: Channel | undefined, { sheet }: Names): CommonError[] {
  const phase = channel?.phaseError
  if (channel === undefined || phase === undefined) return []
  const halfWidth = phase.limit ?? assumedLimits(sheet).degrees
  return [{ key: `phase of ${channel.id}`, halfWidth: -halfWidth }]
}

function observeMagnitude(reading: MagnitudeReading, place: number, { names }: Context) {
  const phasor = names.phasors[place]
  if (phasor === undefined) return undefined
  const channel = names.channels.get(reading.channel ?? '')
  const unit = unitOfMagnitude(reading, phasor.quantity)
  const shown = parseShown(reading.shown, unit)
  if (!shown.ok) return undefined
  const factor = magnitudeFactor(reading, channel)
  const value = Math.abs(shown.value * factor)
  const of = reading.shunt === undefined ? FUNCTION_OF_QUANTITY[phasor.quantity] : 'voltage'
  const limit = limitOfIndication(
    reading,
    names.instruments.get(reading.instrument ?? ''),
    { value: shown.value, shown: reading.shown, unit, of },
    Math.abs(shown.value) * (assumedLimits(names.sheet).percent / 100),
  )
  const { limit: own, common } = scaled(limit, factor)
  const drifts = phasor.quantity === 'voltage' || phasor.quantity === 'current'
  return {
    of: { kind: 'magnitude', phasor: place },
    value,
    limit: own,
    common: [
      ...common,
      ...ratioError(channel, value, names),
      ...(drifts ? driftOf(reading, value, names, 1) : []),
    ],
    gives: 'magnitude',
    ...repeatsOf(reading, shown.value, factor),
  } as const
}

/** What an angle is counted from: the phasor that is named, else the reference. */
function againstOf(
  reading: { readonly against?: PhasorId },
  place: number,
  { names, asRead }: Context,
): number | undefined {
  const against = names.phasor.get(reading.against ?? asRead.reference ?? '')
  return against === place ? undefined : against
}

function observeAngle(reading: AngleReading, place: number, context: Context) {
  const { names } = context
  const against = againstOf(reading, place, context)
  const instrument = names.instruments.get(reading.instrument ?? '')
  const channel = names.channels.get(reading.channel ?? '')
  const shown = parseShown(reading.shown, '°')
  const lead = leadOfReading(reading, instrument, channel)
  if (against === undefined || lead === undefined || !shown.ok) return undefined
  const limit = limitOfIndication(
    reading,
    instrument,
    { value: shown.value, shown: reading.shown, unit: '°', of: 'angle' },
    assumedLimits(names.sheet).degrees,
  )
  const sign = signOfReading(reading, instrument)
  const { limit: own, common } = scaled(limit, sign)
  return {
    of: { kind: 'angle', phasor: place, against },
    value: lead,
    limit: own,
    common: [...common, ...phaseError(channel, names)],
    gives: 'angle',
    ...repeatsOf(reading, shown.value, sign),
  } as const
}

function observeShift(reading: ShiftReading, place: number, context: Context) {
  const { names } = context
  const against = againstOf(reading, place, context)
  const channel = names.channels.get(reading.channel ?? '')
  const [shift, period] = [parseShown(reading.shift, 's'), parseShown(reading.period, 's')]
  if (against === undefined || !shift.ok || !period.ok || !(period.value > 0)) return undefined
  const perUnit = degreesOfShift(1, period.value) * (reading.sense === 'leads' ? 1 : -1)
  const limit = limitOfIndication(
    reading,
    names.instruments.get(reading.instrument ?? ''),
    { value: shift.value, shown: reading.shift, unit: 's', of: 'time' },
    assumedLimits(names.sheet).degrees / Math.abs(perUnit),
  )
  // An error of the time base stretches shift and period alike: the angle does not notice.
  return {
    of: { kind: 'angle', phasor: place, against },
    value: shift.value * perUnit + channelTurn(channel),
    limit: limit.own * Math.abs(perUnit),
    common: phaseError(channel, names),
    gives: 'angle',
    ...repeatsOf(reading, shift.value, perUnit),
  } as const
}

/** Half-width of the angle whose sine is known within a half-width, in degrees. */
function halfWidthOfSine(sine: number, halfWidth: number): number {
  const degrees = (ratio: number) => degreesOfEllipse(Math.max(0, Math.min(1, ratio)), 1, 'rising')
  return (degrees(sine + halfWidth) - degrees(sine - halfWidth)) / 2
}

/**
 * An ellipse says the sine of an angle; which of up to four angles it is, its tilt and the sense say.
 * Without the sense it is an observation of the cosine, without the tilt of the sine itself.
 */
function observeEllipse(reading: EllipseReading, place: number, context: Context) {
  const { names } = context
  const against = againstOf(reading, place, context)
  const [intercept, height] = [parseShown(reading.intercept, ''), parseShown(reading.height, '')]
  if (against === undefined || !intercept.ok || !height.ok || !(height.value > 0)) return undefined
  const sine = Math.min(1, Math.abs(intercept.value / height.value))
  const channel = names.channels.get(reading.channel ?? '')
  const limit =
    reading.limit === undefined
      ? assumedLimits(names.sheet).degrees
      : halfWidthOfSine(sine, reading.limit / height.value)
  const common = phaseError(channel, names)
  const sign = reading.sense === 'lags' ? -1 : 1
  if (reading.tilt !== undefined) {
    const lead = degreesOfEllipse(sine, 1, reading.tilt)
    if (reading.sense !== undefined) {
      const value = sign * lead + channelTurn(channel)
      const of = { kind: 'angle', phasor: place, against } as const
      return { of, value, limit, common, gives: 'angle' } as const
    }
    const value = cosDegrees(lead) * (channel?.reversed ? -1 : 1)
    const of = { kind: 'power-factor', voltage: place, current: against } as const
    return { of, value, limit: differenceOfCosines(lead, limit), common: [] } as const
  }
  const lead = degreesOfEllipse(sine, 1, 'rising')
  const of = { kind: 'sine', phasor: place, against } as const
  return {
    of: reading.sense === undefined ? { ...of, either: true } : of,
    value: reading.sense === undefined ? sine : sign * sine * (channel?.reversed ? -1 : 1),
    limit: differenceOfCosines(90 - lead, limit),
    common: [],
  } as const
}

/** By how much the cosine of an angle changes within a half-width in degrees, at the most. */
function differenceOfCosines(degrees: number, halfWidth: number): number {
  const slope = Math.abs(sinDegrees(degrees)) * Math.abs(sinDegrees(halfWidth))
  return slope + Math.abs(cosDegrees(degrees)) * (1 - cosDegrees(halfWidth))
}

/** A wattmeter's channels, the voltage's and the current's: what they make of its indication. */
function channelsOfPower(reading: PowerReading | PowerFactorReading, names: Names) {
  const voltage = names.channels.get(reading.channel ?? '')
  const current = names.channels.get(
    (reading.kind === 'power-factor' ? undefined : reading.currentChannel) ?? '',
  )
  let factor = 1
  for (const channel of [voltage, current]) {
    factor *= ((channel?.ratio?.value ?? 1) * (channel?.reversed ? -1 : 1)) / (channel?.turns ?? 1)
  }
  return { voltage, current, factor }
}

/** V · I as read, where both are. */
function apparentAsRead(reading: PowerReading, { asRead }: Context): number | undefined {
  const v = asRead.values.get(reading.of)?.magnitude
  const i = asRead.values.get(reading.with)?.magnitude
  return v === undefined || i === undefined ? undefined : v * i
}

/** The half-width that a phase error gives power: the other of P and Q, times the angle. */
function powerByPhase(
  reading: PowerReading,
  value: number,
  errors: readonly CommonError[],
  context: Context,
): readonly CommonError[] {
  const apparent = apparentAsRead(reading, context) ?? Math.abs(value)
  const other = Math.sqrt(Math.max(0, apparent ** 2 - value ** 2))
  return errors.map(({ key, halfWidth }) => ({ key, halfWidth: other * sinDegrees(halfWidth) }))
}

function observePower(reading: PowerReading, place: number, context: Context) {
  const { names } = context
  const current = names.phasor.get(reading.with)
  const unit = reading.kind === 'power' ? 'W' : 'var'
  const shown = parseShown(reading.shown, unit)
  if (current === undefined || !shown.ok) return undefined
  const channels = channelsOfPower(reading, names)
  const factor = (reading.ratio ?? 1) * channels.factor
  const value = shown.value * factor
  const { percent } = assumedLimits(names.sheet)
  const limit = limitOfIndication(
    reading,
    names.instruments.get(reading.instrument ?? ''),
    { value: shown.value, shown: reading.shown, unit, of: 'power' },
    (Math.abs(shown.value) || Math.abs((apparentAsRead(reading, context) ?? 0) / factor)) *
      (percent / 100),
  )
  const { limit: own, common } = scaled(limit, factor)
  return {
    of: { kind: reading.kind, voltage: place, current },
    value,
    limit: own,
    common: [
      ...common,
      ...ratioError(channels.voltage, value, names),
      ...ratioError(channels.current, value, names),
      ...powerByPhase(
        reading,
        value,
        [...phaseError(channels.voltage, names), ...phaseError(channels.current, names)],
        context,
      ),
      ...driftOf(reading, value, names, 2),
    ],
    ...repeatsOf(reading, shown.value, factor),
  } as const
}

function observePowerFactor(reading: PowerFactorReading, place: number, { names }: Context) {
  const current = names.phasor.get(reading.with)
  const shown = parseShown(reading.shown, '')
  if (current === undefined || !shown.ok || Math.abs(shown.value) > 1) return undefined
  const sign = Math.sign(channelsOfPower(reading, names).factor) || 1
  const limit = limitOfIndication(
    reading,
    names.instruments.get(reading.instrument ?? ''),
    { value: shown.value, shown: reading.shown, unit: '', of: 'power' },
    Math.abs(shown.value) * (assumedLimits(names.sheet).percent / 100),
  )
  // With a clamp the wrong way round a lead looks like a lag and the sign like its opposite.
  const sense = reading.sense === undefined || sign > 0 ? reading.sense : OTHER_SENSE[reading.sense]
  const of = { kind: 'power-factor', voltage: place, current } as const
  return {
    of: sense === undefined ? of : { ...of, sense },
    value: shown.value * sign,
    ...scaled(limit, sign),
    ...repeatsOf(reading, shown.value, sign),
  } as const
}

const OTHER_SENSE = { leads: 'lags', lags: 'leads' } as const

function observe(reading: Reading, place: number, context: Context) {
  switch (reading.kind) {
    case 'magnitude':
      return observeMagnitude(reading, place, context)
    case 'angle':
      return observeAngle(reading, place, context)
    case 'shift':
      return observeShift(reading, place, context)
    case 'ellipse':
      return observeEllipse(reading, place, context)
    case 'power':
    case 'reactive-power':
      return observePower(reading, place, context)
    case 'power-factor':
      return observePowerFactor(reading, place, context)
  }
}

/**
 * What a reading observes, with its limit and what it shares with others. Nothing where its digits say
 * no value, or where it is struck out, or names a phasor that is not there.
 */
export function observeReading(
  reading: Reading,
  names: Names,
  asRead: AsRead,
): PendingObservation | undefined {
  const place = names.phasor.get(reading.of)
  if (place === undefined || reading.struck === true) return undefined
  const observed = observe(reading, place, { names, asRead })
  if (
    observed === undefined ||
    !Number.isFinite(observed.value) ||
    !Number.isFinite(observed.limit)
  ) {
    return undefined
  }
  return { ...observed, source: { kind: 'reading', reading: reading.id, phasor: reading.of } }
}
