import { parseAccuracy } from '../../core'
import { UNIT_OF_FUNCTION } from '../readings/accuracy-row'
import type { Instrument, Sheet } from '../types'
import type { Remark } from './remark'

/** Instruments in use whose calibration had lapsed, or whose accuracy cannot be read. */
export function calibrationRemarks(sheet: Sheet): readonly Remark[] {
  const used = new Set(
    (sheet.readings ?? [])
      .filter(({ struck }) => struck !== true)
      .map((reading) => reading.instrument),
  )
  return (sheet.instruments ?? []).flatMap((instrument) => [
    ...(used.has(instrument.id) ? lapsed(instrument, sheet.job?.date) : []),
    ...unreadable(instrument),
  ])
}

/** Only the days are compared: ISO 8601 dates sort as text. */
function lapsed(
  { id, name, serial, calibrationDue }: Instrument,
  date: string | undefined,
): readonly Remark[] {
  if (calibrationDue === undefined || date === undefined) return []
  if (calibrationDue.slice(0, 10) >= date.slice(0, 10)) return []
  const which = serial === undefined ? name : `${name} (${serial})`
  const text = `The calibration of ${which} was due on ${calibrationDue.slice(0, 10)}, before the test of ${date.slice(0, 10)}: have it checked, and say so in the report.`
  return [{ about: id, text }]
}

function unreadable({ id, name, accuracy = [] }: Instrument): readonly Remark[] {
  return accuracy.flatMap(({ of, text }) => {
    const parsed = parseAccuracy(text, UNIT_OF_FUNCTION[of])
    if (parsed.ok) return []
    return [{ about: id, text: `The ${of} accuracy of ${name} is not used. ${parsed.problem}` }]
  })
}
