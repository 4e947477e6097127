import { heading, note, paragraph } from '../blocks'
import { cell } from '../names'
import type { Section } from '../section'
import { table } from '../table'

const RISKS = { low: 'low', medium: 'medium', high: 'high' } as const

/** The record of hazards, to be completed by someone who can judge them. */
export const hazards: Section = {
  name: 'hazards',
  blocks: ({ sheet, width }) => {
    const recorded = sheet.report?.hazards ?? []
    const rows = recorded.map(({ hazard, control, risk, supervision }) => [
      cell(hazard),
      cell(control),
      cell(RISKS[risk]),
      cell(supervision),
    ])
    const columns = ['Hazard', 'Control', 'Risk', 'Supervision'].map((title) => ({ title }))
    return [
      heading('Before you measure', width),
      ...(rows.length === 0
        ? [paragraph('No hazards were recorded on this sheet.', width)]
        : table(columns, rows, width)),
      note(
        'This is a record for a competent person to complete. It replaces no local rule and no permit: these have the last word.',
        width,
      ),
    ]
  },
}
