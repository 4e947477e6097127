import type { Channel, Instrument } from '../../../sheet'
import { heading } from '../blocks'
import type { Cell } from '../columns'
import { cell } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** The instruments with their serials and calibration, and what readings were taken through. */
export const instruments: Section = {
  name: 'instruments',
  blocks: ({ sheet, width }) => {
    const meters = sheet.instruments ?? []
    const channels = sheet.channels ?? []
    const columns = (...titles: readonly string[]) => titles.map((title) => ({ title }))
    return [
      ...(meters.length === 0
        ? []
        : [
            heading('Instruments', width),
            ...table(
              columns('Instrument', 'Serial number', 'Calibration due', 'Category', 'Accuracy'),
              meters.map(meterRow),
              width,
            ),
          ]),
      ...(channels.length === 0
        ? []
        : [
            heading('Transformers, clamps and probes', width),
            ...table(
              columns('Channel', 'Ratio', 'Turns', 'Phase error', 'Remark'),
              channels.map(channelRow),
              width,
            ),
          ]),
    ]
  },
}

function meterRow({
  name,
  serial,
  calibrationDue,
  category,
  responding,
  accuracy = [],
}: Instrument): readonly Cell[] {
  const statements = accuracy.map(
    ({ of, range, text }) => `${of}${range === undefined ? '' : `, range ${range}`}: ${text}`,
  )
  const kind =
    responding === 'average' ? 'average responding' : responding === 'true-rms' ? 'true rms' : ''
  return [
    cell([name, kind].filter((part) => part !== '').join(', ')),
    cell(serial),
    cell(calibrationDue),
    cell(category),
    cell(statements.join('\n')),
  ]
}

function channelRow({ id, label, ratio, turns, phaseError, reversed }: Channel): readonly Cell[] {
  return [
    cell(label ?? id),
    cell(ratio && (ratio.text ?? String(ratio.value))),
    cell(turns === undefined ? undefined : String(turns)),
    cell(phaseError && `${phaseError.text ?? phaseError.value}°`.replace('°°', '°')),
    cell(reversed ? 'connected the wrong way round: turned by 180°' : undefined),
  ]
}
