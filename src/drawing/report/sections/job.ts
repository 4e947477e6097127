import { formatNumber, formatQuantity } from '../../../core'
import { assumedOf, labelOf, referenceOf, type Sheet } from '../../../sheet'
import { QUANTITIES } from '../../text/quantities'
import { formatFrequency, formatScale } from '../../text/quantity-text'
import { gap, lines } from '../blocks'
import type { Report, Section } from '../section'
import { INK, STYLES } from '../style'
import { fieldList } from '../table'

/** What the report is of: the job, the conditions, and how values and drawing are to be read. */
export const job: Section = {
  name: 'job',
  blocks: (report) => {
    const { sheet, width } = report
    const fields = fieldsOf(report).filter(([, value]) => value.trim() !== '')
    return [
      {
        pieces: [
          ...lines('Job report', STYLES.caption, width, INK.quiet),
          ...lines(sheet.title.trim() || 'Untitled', STYLES.name, width),
          gap(1.6),
        ],
        isHeading: true,
      },
      ...fieldList(fields, width),
    ]
  },
}

function fieldsOf({
  sheet,
  unitsPerCentimetre,
}: Report): readonly (readonly [caption: string, value: string])[] {
  const { job = {}, revision = '' } = sheet
  const scales = QUANTITIES.flatMap((quantity) => {
    const scale = unitsPerCentimetre[quantity]
    return scale === undefined ? [] : [formatScale(scale, quantity)]
  })
  return [
    ['Job number', job.number ?? ''],
    ['Site', job.site ?? ''],
    ['Circuit', job.circuit ?? ''],
    ['Conditions', job.conditions ?? ''],
    ['Tested by', job.testedBy ?? ''],
    ['Date of the test', job.date ?? ''],
    ['Revision', revision],
    ['Frequency', sheet.frequency ? frequencyText(sheet.frequency) : ''],
    ['Values', 'rms; angles in degrees, anticlockwise positive'],
    ['Reference', referenceText(sheet)],
    ['Limits not stated', assumedText(sheet)],
    ['Scale of the drawing', scales.join('; ')],
    ['Notes', job.notes ?? ''],
  ]
}

function frequencyText(frequency: NonNullable<Sheet['frequency']>): string {
  const { limit = 0 } = frequency
  const text = formatFrequency(frequency)
  return limit === 0 ? text : `${text} ± ${formatQuantity(limit, 'Hz', { digits: 2 })}`
}

function referenceText(sheet: Sheet): string {
  const reference = referenceOf(sheet)
  return reference === undefined ? '' : `${labelOf(sheet, reference)}: angles count from it`
}

function assumedText(sheet: Sheet): string {
  const { percent, degrees } = assumedOf(sheet)
  const plain = (value: number) => formatNumber(value, 4).replace(/\.?0+$/, '')
  return `assumed as ± ${plain(percent)} % of a magnitude and ± ${plain(degrees)}° of an angle`
}
