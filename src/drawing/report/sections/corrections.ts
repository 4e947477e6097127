import { nameOfReading, type Reading, readingText, type Sheet } from '../../../sheet'
import { heading } from '../blocks'
import type { Cell } from '../columns'
import { cell } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** Every correction, with what stood there before it. */
export const corrections: Section = {
  name: 'corrections',
  blocks: ({ sheet, width }) => {
    const corrected = (sheet.readings ?? []).filter((reading) => reading.corrected !== undefined)
    if (corrected.length === 0) return []
    return [
      heading('Corrections', width),
      ...table(
        ['Reading', 'Before', 'Now', 'Mistake', 'By, on, why'].map((title) => ({ title })),
        corrected.map((reading) => rowOf(sheet, reading)),
        width,
      ),
    ]
  },
}

function rowOf(sheet: Sheet, reading: Reading): readonly Cell[] {
  const { mistake, original, by, date, reason } = reading.corrected ?? {}
  return [
    cell(nameOfReading(sheet, reading.id)),
    cell(original && originalText(reading, original)),
    cell(readingText(reading)),
    cell(mistake?.replaceAll('-', ' ')),
    cell([by, date, reason].filter((part) => part !== undefined && part.trim() !== '').join(', ')),
  ]
}

/** What stood there: as a reading where the original is one, else field by field. */
function originalText(reading: Reading, original: object): string {
  const whole = { ...reading, ...original }
  const isReading = Object.keys(original).some((key) => key in reading)
  if (isReading) return readingText(whole)
  return Object.entries(original)
    .map(
      ([field, value]) => `${field} ${typeof value === 'object' ? JSON.stringify(value) : value}`,
    )
    .join(', ')
}
