import { type ComparedPart, type ComparedRow, comparisonRows } from '../../circuit'
import { heading, note } from '../blocks'
import type { Cell } from '../columns'
import { cell, labelCell } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** What the circuit predicts beside what was measured, with a verdict for each quantity. */
export const comparison: Section = {
  name: 'comparison',
  blocks: ({ sheet, evaluation, width }) => {
    const rows = comparisonRows(sheet, evaluation)
    if (rows.length === 0) return []
    return [
      heading('Predicted and measured', width),
      {
        ...note(
          'Differences are measured less predicted; allowed are both limits together.',
          width,
        ),
        isHeading: true,
      },
      ...table(
        [
          { title: 'Quantity' },
          { title: 'Predicted', align: 'end' },
          { title: 'Measured', align: 'end' },
          { title: 'Difference', align: 'end' },
          { title: 'Allowed', align: 'end' },
          { title: 'Verdict' },
        ],
        rows.flatMap(rowsOf),
        width,
      ),
    ]
  },
}

/** A row for each part: the label and the verdict stand in the first. */
function rowsOf({ label, parts, verdict }: ComparedRow): readonly (readonly Cell[])[] {
  return parts
    .filter((part) => part.predicted !== '' || part.measured !== '')
    .map((part, at) => [
      at === 0 ? labelCell(label) : BLANK,
      cell(part.predicted),
      cell(part.measured),
      cell(differenceOf(part)),
      cell(part.allowed),
      at === 0 ? cell(verdict) : BLANK,
    ])
}

const BLANK: Cell = { text: '' }

function differenceOf({ difference, percent }: ComparedPart): string {
  return percent === '' ? difference : `${difference} (${percent})`
}
