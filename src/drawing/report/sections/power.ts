import { powerRows, resonanceText } from '../../circuit'
import { heading, note, paragraph } from '../blocks'
import { cell } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** The powers of the elements and of the whole, and where the circuit would be at resonance. */
export const power: Section = {
  name: 'power',
  blocks: ({ sheet, evaluation, width }) => {
    const rows = powerRows(sheet, evaluation)
    const resonance = resonanceText(evaluation)
    if (rows.length === 0 && resonance === undefined) return []
    return [
      heading('Power', width),
      ...(rows.some(({ isPredicted }) => isPredicted)
        ? [
            {
              ...note('Predicted by the circuit: the readings do not give it.', width),
              isHeading: true,
            },
          ]
        : []),
      ...table(
        [
          { title: 'Element' },
          { title: 'Active', align: 'end' },
          { title: 'Reactive', align: 'end' },
          { title: 'Apparent', align: 'end' },
          { title: 'Power factor; the current' },
        ],
        rows.map(({ name, active, reactive, apparent, factor }) =>
          [name, active, reactive, apparent, factor].map(cell),
        ),
        width,
      ),
      ...(resonance === undefined ? [] : [paragraph(resonance, width)]),
    ]
  },
}
