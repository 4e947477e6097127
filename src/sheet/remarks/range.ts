import { formatQuantity, rmsOfForm } from '../../core'
import { unitOfMagnitude } from '../figures'
import { accuracyRowOf } from '../readings/accuracy-row'
import { indicationOf } from '../readings/indication'
import { limitOf } from '../readings/limit'
import type { Indication } from '../readings/observed'
import { indexOf } from '../sheet-index'
import type { Reading, Sheet } from '../types'
import type { Remark } from './remark'

/** A reading beyond its range or the category of its meter, or without what its accuracy asks for. */
export function rangeRemarks(sheet: Sheet, reading: Reading): readonly Remark[] {
  const indication = indicationOf(sheet, reading)
  if (indication === undefined) return []
  const problem = limitOf(sheet, reading)?.problem
  return [
    ...beyondRange(sheet, reading, indication),
    ...beyondCategory(sheet, reading, indication),
    ...(problem === undefined
      ? []
      : [{ about: reading.id, text: `The limit is assumed. ${problem}` }]),
  ]
}

function unitOfReading(sheet: Sheet, reading: Reading): string | undefined {
  if (reading.kind === 'power') return 'W'
  if (reading.kind === 'reactive-power') return 'var'
  if (reading.kind !== 'magnitude') return undefined
  return unitOfMagnitude(reading, indexOf(sheet).phasors.get(reading.of)?.quantity ?? 'other')
}

function beyondRange(sheet: Sheet, reading: Reading, { value, of }: Indication): readonly Remark[] {
  const unit = unitOfReading(sheet, reading)
  if (unit === undefined || of === undefined) return []
  const instrument = indexOf(sheet).instruments.get(reading.instrument ?? '')
  const rows = (instrument?.accuracy ?? []).filter((row) => row.of === of)
  const row = instrument && accuracyRowOf(instrument, of, value, reading.range)
  const largest = Math.max(...rows.map(({ range = Number.POSITIVE_INFINITY }) => range))
  const range =
    reading.range ?? row?.range ?? (rows.length > 0 ? largest : Number.POSITIVE_INFINITY)
  if (Math.abs(value) <= range) return []
  const text = `${formatQuantity(value, unit, { digits: 6 })} is beyond the range of ${formatQuantity(range, unit, { digits: 3 })}: the accuracy does not hold there. Check the reading and the range.`
  return [{ about: reading.id, text: trimmed(text) }]
}

/** A category counts rms volts; what stands behind a VT or a shunt is not at the meter's terminals. */
function beyondCategory(
  sheet: Sheet,
  reading: Reading,
  { value, of }: Indication,
): readonly Remark[] {
  if (reading.kind !== 'magnitude' || of !== 'voltage' || reading.shunt !== undefined) return []
  const instrument = indexOf(sheet).instruments.get(reading.instrument ?? '')
  const rated = instrument?.category === undefined ? undefined : ratedVoltage(instrument.category)
  const volts = value * rmsOfForm(reading.form ?? 'rms')
  if (instrument === undefined || rated === undefined || volts <= rated) return []
  const text = `${formatQuantity(volts, 'V', { digits: 4 })} is above what ${instrument.name} is made for, ${instrument.category}: do not measure it so again.`
  return [{ about: reading.id, text: trimmed(text) }]
}

/** The highest voltage that a category names: 600 of "CAT III 600 V, CAT II 300 V". */
function ratedVoltage(category: string): number | undefined {
  const volts = [...category.matchAll(/(\d+(?:[.,]\d+)?)\s*(k?)V/gi)].map(
    ([, size = '', kilo]) => Number(size.replace(',', '.')) * (kilo === '' ? 1 : 1000),
  )
  return volts.length === 0 ? undefined : Math.max(...volts)
}

/** Round figures without the zeros behind their point: 600.0 V is the range of 600 V. */
function trimmed(text: string): string {
  return text.replace(/(\d+)\.0+(?= )/g, '$1').replace(/(\d+\.\d*[1-9])0+(?= )/g, '$1')
}
