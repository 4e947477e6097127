import { failure, type Result, success, type Typed, unitOf, wrapDegrees } from '../../core'
import { type AngleLikeReading, asReadOf, type ReadingsOfPhasor } from '../as-read'
import { type FigureUnit, parseShown } from '../digits'
import { unitOfMagnitude } from '../figures'
import { labelOf } from '../names'
import { channelTurn, signOfReading } from '../readings/angle'
import { magnitudeFactor } from '../readings/magnitude'
import type {
  AngleReading,
  Channel,
  Instrument,
  MagnitudeReading,
  Phasor,
  Reading,
  Sense,
  Sheet,
  Shown,
} from '../types'
import { withReplaced } from './lists'

/** A part of a phasor that a meter can show. */
export type PolarPart = 'magnitude' | 'angle'

/** The one reading of a part. Fails where there are none or several. */
export function onlyReading(
  readings: ReadingsOfPhasor,
  part: PolarPart,
  { label }: Phasor,
): Result<MagnitudeReading | AngleLikeReading> {
  const [reading, ...others] = readings[part]
  if (reading === undefined) return failure(`The ${part} of ${label} was not read.`)
  if (others.length > 0) {
    const count = others.length + 1
    return failure(`${label} has ${count} readings of its ${part}: change them one by one.`)
  }
  return success(reading)
}

/** The sheet in which a magnitude reading shows what makes the phasor's magnitude the typed one. */
export function withShownMagnitude(
  sheet: Sheet,
  { quantity }: Phasor,
  reading: MagnitudeReading,
  typed: Typed,
): Result<Sheet> {
  const factor = magnitudeFactor(reading, channelOf(sheet, reading))
  const unit = unitOfMagnitude(reading, quantity)
  const shown = shownAs(typed.value / factor, [typed.text], unit)
  const changed = withReplaced(sheet, 'readings', { ...reading, shown })
  if (typed.limit === undefined) return success(changed)
  return success(withReadLimit(changed, { ...reading, shown }, typed.limit))
}

/** The sheet in which a reading has another limit, given in the unit of the phasor. */
export function withReadLimit(
  sheet: Sheet,
  reading: MagnitudeReading | AngleReading,
  limit: number,
): Sheet {
  const factor =
    reading.kind === 'magnitude' ? magnitudeFactor(reading, channelOf(sheet, reading)) : 1
  return withReplaced(sheet, 'readings', { ...reading, limit: limit / factor })
}

/** Whether a display showed the part itself; otherwise it was worked out from what was shown. */
export function isDirect(
  reading: MagnitudeReading | AngleLikeReading,
): reading is MagnitudeReading | AngleReading {
  return reading.kind === 'magnitude' || reading.kind === 'angle'
}

/** Why a part cannot be typed that was worked out from what a display showed. */
export function refuseIndirect(
  sheet: Sheet,
  { of, kind }: Exclude<AngleLikeReading, AngleReading>,
): Result<never> {
  const words = { shift: 'a time shift', ellipse: 'an ellipse', 'power-factor': 'a power factor' }
  return failure(
    `The angle of ${labelOf(sheet, of)} was read as ${words[kind]}: change that reading.`,
  )
}

/** The sheet in which an angle reading shows what makes the phasor's angle the typed one. */
export function withShownAngle(sheet: Sheet, reading: AngleReading, typed: Typed): Result<Sheet> {
  const { reference, values } = asReadOf(sheet)
  const against = reading.against ?? reference ?? ''
  const from = values.get(against)?.angle
  if (from === undefined) {
    const label = labelOf(sheet, against)
    return failure(`It was read against ${label}, whose angle is not known: settle that first.`)
  }
  const lead = wrapDegrees(typed.value - from - channelTurn(channelOf(sheet, reading)))
  const { value, sense } = inWords(lead, reading, instrumentOf(sheet, reading))
  const shown = shownAs(value, [typed.text, typed.text?.replace(/^[-−+]\s*/, '')], '°')
  const limit = typed.limit === undefined ? {} : { limit: typed.limit }
  return success(withReplaced(sheet, 'readings', { ...reading, shown, ...sense, ...limit }))
}

/** What a reading says, as if it had been typed: its digits where they say the value, and its limit. */
export function toTyped(
  sheet: Sheet,
  { quantity }: Phasor,
  reading: MagnitudeReading | AngleReading,
  value: number,
): Typed {
  const isMagnitude = reading.kind === 'magnitude'
  const factor = isMagnitude ? magnitudeFactor(reading, channelOf(sheet, reading)) : 1
  const digits = typeof reading.shown === 'string' ? reading.shown : undefined
  const texts = [digits, digits === undefined ? undefined : `−${digits}`]
  const text = shownAs(value, texts, isMagnitude ? unitOf(quantity) : '°')
  return {
    value,
    ...(typeof text === 'string' ? { text } : {}),
    ...(reading.limit === undefined ? {} : { limit: reading.limit * factor }),
  }
}

/** How a display says a lead: with the word for it where the reading has one, else with a sign. */
function inWords(
  lead: number,
  reading: AngleReading,
  instrument: Instrument | undefined,
): { readonly value: number; readonly sense: { readonly sense?: Sense } } {
  if (reading.sense === undefined) {
    return { value: lead * signOfReading(reading, instrument), sense: {} }
  }
  if (lead === 0) return { value: 0, sense: {} }
  return { value: Math.abs(lead), sense: { sense: lead < 0 ? 'lags' : 'leads' } }
}

/** The first of the texts that says the value exactly; where none does, the value to twelve figures. */
function shownAs(value: number, texts: readonly (string | undefined)[], unit: FigureUnit): Shown {
  for (const text of texts) {
    if (text === undefined) continue
    const parsed = parseShown(text, unit)
    if (parsed.ok && parsed.value === value) return text
  }
  return Number(value.toPrecision(12))
}

function channelOf(sheet: Sheet, { channel }: Reading): Channel | undefined {
  return (sheet.channels ?? []).find(({ id }) => id === channel)
}

function instrumentOf(sheet: Sheet, { instrument }: Reading): Instrument | undefined {
  return (sheet.instruments ?? []).find(({ id }) => id === instrument)
}
