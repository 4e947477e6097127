import { labelOf, nameOfReading, remarksOn } from '../../../sheet'
import { heading } from '../blocks'
import { cell } from '../names'
import type { Report, Section } from '../section'
import { table } from '../table'

/** What whoever reads the report should know of the values and of the readings. */
export const cautions: Section = {
  name: 'cautions',
  blocks: (report) => {
    const { sheet, evaluation, width } = report
    const found = [...(evaluation.cautions ?? []), ...remarksOn(sheet)]
    const distinct = new Map(found.map((caution) => [`${caution.about} ${caution.text}`, caution]))
    if (distinct.size === 0) return []
    return [
      heading('Cautions', width),
      ...table(
        [{ title: 'About' }, { title: 'Caution' }],
        [...distinct.values()].map(({ about, text }) => [cell(nameOf(report, about)), cell(text)]),
        width,
      ),
    ]
  },
}

function nameOf({ sheet }: Report, id: string): string {
  if (id === 'sheet') return 'The sheet'
  if (sheet.readings?.some((reading) => reading.id === id))
    return `Reading ${nameOfReading(sheet, id)}`
  const meter = sheet.instruments?.find((instrument) => instrument.id === id)
  const channel = sheet.channels?.find((own) => own.id === id)
  const element = sheet.elements?.find((own) => own.id === id)
  return meter?.name ?? channel?.label ?? element?.label ?? labelOf(sheet, id)
}
