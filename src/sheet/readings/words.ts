import {
  degreesOfPower,
  degreesOfPowerFactor,
  formatAngle,
  formatLimit,
  formatNumber,
  formatQuantity,
  unitOf,
} from '../../core'
import { asReadOf } from '../as-read'
import { unitOfMagnitude } from '../figures'
import { labelOf } from '../names'
import { indexOf } from '../sheet-index'
import type { MagnitudeReading, PhasorId, Reading, Sheet } from '../types'
import { indicationOf } from './indication'
import { leadOf } from './lead'
import { limitOf, type ReadingLimit } from './limit'
import type { Indication, Observed } from './observed'

/**
 * What a reading comes to, in words and figures: "1.26 A shown, 4 turns: 0.315 A ± 0.006 A", "VS leads
 * I by 37.1° ± 1° assumed". A limit that nobody stated says that it is assumed. Where the reading says
 * nothing, why.
 */
export function wordsOf(sheet: Sheet, reading: Reading): string {
  const indication = indicationOf(sheet, reading)
  const limit = limitOf(sheet, reading)
  if (indication === undefined || limit === undefined)
    return 'This says nothing yet: see the remark.'
  const { observed } = indication
  switch (observed.kind) {
    case 'magnitude':
      return magnitudeWords(sheet, reading as MagnitudeReading, indication, observed.value, limit)
    case 'angle':
      return `${takenWords(reading)}${leadSentence(sheet, reading, limit)}`
    case 'sine':
      return `${takenWords(reading)}${openWords(sheet, reading, observed)}`
    case 'power':
    case 'reactive-power':
      return powerWords(sheet, reading, observed, limit, indication)
    case 'power-factor':
      return factorWords(sheet, reading, observed, limit)
  }
}

function magnitudeWords(
  sheet: Sheet,
  reading: MagnitudeReading,
  { resolution, moves }: Indication,
  value: number,
  limit: ReadingLimit,
): string {
  const { phasors, channels } = indexOf(sheet)
  const quantity = phasors.get(reading.of)?.quantity ?? 'other'
  const unit = unitOf(quantity)
  const known = resolution === undefined ? {} : { resolution: Math.abs(moves(resolution)) }
  // 0.315 A rather than 315 mA: in the unit of its limit.
  const like = value >= 0.1 && value < 1 ? 1 : value
  const size = formatQuantity(value, unit, { ...known, limit: limit.limit, like })
  const comesTo = `${size} ${limitWords(limit, unit)}`
  const channel = channels.get(reading.channel ?? '')
  const taken = [
    ...(reading.form === undefined || reading.form === 'rms' ? [] : [FORM_WORDS[reading.form]]),
    ...(reading.turns === undefined ? [] : [counted(reading.turns)]),
    ...(reading.ratio === undefined ? [] : [`ratio ${plain(reading.ratio)}`]),
    ...(reading.shunt === undefined ? [] : [`across ${plain(reading.shunt)} Ω`]),
    ...(channel === undefined ? [] : [`through ${channel.label ?? channel.id}`]),
  ]
  if (taken.length === 0) return comesTo
  return `${shownWords(reading.shown, unitOfMagnitude(reading, quantity))} shown, ${taken.join(', ')}: ${comesTo}`
}

const FORM_WORDS = { peak: 'peak', 'peak-to-peak': 'peak to peak' }

function counted(turns: number): string {
  return turns === 1 ? '1 turn' : `${turns} turns`
}

function plain(value: number): string {
  return formatNumber(value, 6).replace(/\.?0+$/, '')
}

/** The digits as shown, with the unit where they do not say it. */
function shownWords(shown: number | string, unit: string): string {
  const text = String(shown).replace('-', '−')
  return /[\p{L}°]$/u.test(text) || unit === '' ? text : `${text} ${unit}`
}

function limitWords(limit: ReadingLimit, unit: string): string {
  return `${formatLimit(limit.limit, unit)}${limit.from === 'assumed' ? ' assumed' : ''}`
}

/** How an angle was taken, where the display did not show degrees. */
function takenWords(reading: Reading): string {
  if (reading.kind === 'shift') return `${reading.shift} of ${reading.period} shown: `
  if (reading.kind === 'ellipse') {
    const tilt = reading.tilt === undefined ? '' : `, ${reading.tilt}`
    return `${reading.intercept} of ${reading.height} shown${tilt}: `
  }
  return ''
}

/** By how much a reading's phasor leads or lags another, as a sentence without its full stop. */
function leadSentence(sheet: Sheet, reading: Reading, limit: ReadingLimit): string {
  const lead = leadOf(sheet, reading)
  if (lead === undefined) return ''
  const against = lead.against ?? asReadOf(sheet).reference
  return `${angleSentence(sheet, lead.of, against, lead.degrees, limit.limit)} ${limitWords(limit, '°')}`
}

/** "VS leads I by 37.1°", "VR is in phase with I", "VC is opposite to VL". Degrees in (−180, 180]. */
export function angleSentence(
  sheet: Sheet,
  of: PhasorId,
  against: PhasorId | undefined,
  degrees: number,
  limit?: number,
): string {
  const name = labelOf(sheet, of)
  const other = against === undefined ? '0°' : labelOf(sheet, against)
  if (degrees === 0) return `${name} is in phase with ${other}`
  if (degrees === 180) return `${name} is opposite to ${other}, 180°`
  const size = formatAngle(Math.abs(degrees), limit === undefined ? {} : { limit, resolution: 0.1 })
  return `${name} ${degrees > 0 ? 'leads' : 'lags'} ${other} by ${size}`
}

function openWords(
  sheet: Sheet,
  reading: Reading,
  { value, against, either }: Observed & { readonly kind: 'sine' },
): string {
  const acute = (Math.asin(Math.abs(value)) * 180) / Math.PI
  const pair = `${labelOf(sheet, reading.of)} and ${labelOf(sheet, against ?? asReadOf(sheet).reference ?? '')}`
  const angles =
    acute === 90 || (reading.kind === 'ellipse' && reading.tilt !== undefined)
      ? formatAngle(reading.kind === 'ellipse' && reading.tilt === 'falling' ? 180 - acute : acute)
      : `${formatAngle(acute)} or ${formatAngle(180 - acute)}`
  const sense = either ? ', which of them leads was not noted' : value < 0 ? ', a lag' : ', a lead'
  return `${pair} are ${angles} apart${sense}`
}

/** What a power is of the voltage and current that were read, and the angle that it leaves between them. */
function powerWords(
  sheet: Sheet,
  reading: Reading,
  observed: Observed & { readonly kind: 'power' | 'reactive-power' },
  limit: ReadingLimit,
  { resolution, moves }: Indication,
): string {
  const unit = observed.kind === 'power' ? 'W' : 'var'
  const known = resolution === undefined ? {} : { resolution: Math.abs(moves(resolution)) }
  const size = `${formatQuantity(observed.value, unit, { ...known, limit: limit.limit })} ${limitWords(limit, unit)}`
  const { values } = asReadOf(sheet)
  const voltage = values.get(reading.of)?.magnitude
  const current = values.get(observed.with)?.magnitude
  if (!voltage || !current) return size
  const apparent = voltage * current
  const at = `at ${formatQuantity(apparent, 'VA', { digits: 3 })}`
  if (Math.abs(observed.value) > apparent) return size
  if (observed.kind === 'power') {
    const angle = formatAngle(degreesOfPower(observed.value, voltage, current))
    return `${size}, ${at} cos φ is ${formatNumber(observed.value / apparent, 3)}: ${angle}, lead or lag not shown`
  }
  const sense =
    observed.value === 0
      ? 'in phase'
      : observed.value > 0
        ? 'the current lags'
        : 'the current leads'
  return `${size}, ${at} sin φ is ${formatNumber(observed.value / apparent, 3)}: ${sense}`
}

function factorWords(
  sheet: Sheet,
  reading: Reading,
  { value, with: current, sense }: Observed & { readonly kind: 'power-factor' },
  limit: ReadingLimit,
): string {
  const lead = leadOf(sheet, reading)
  const off = limitWords(limit, '')
  const figure = `cos φ ${formatNumber(value, 3)} ${off}`
  if (lead === undefined) {
    const angle = formatAngle(degreesOfPowerFactor(value))
    return `${figure}: ${labelOf(sheet, reading.of)} and ${labelOf(sheet, current)} are ${angle} apart, lead or lag not noted`
  }
  const words =
    sense === undefined ? '' : sense === 'lags' ? ', the current lags' : ', the current leads'
  return `${figure}${words}: ${angleSentence(sheet, lead.of, lead.against, lead.degrees)}`
}
