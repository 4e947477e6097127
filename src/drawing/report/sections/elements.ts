import { unitOf } from '../../../core'
import type { CircuitElement, ElementEvaluation, Sheet } from '../../../sheet'
import { heading } from '../blocks'
import type { Cell } from '../columns'
import { cell, labelOf, labelsOf, limitedText, symbolsCell } from '../names'
import type { Section } from '../section'
import { table } from '../table'

/** Every element: what its nameplate says, and what was found. */
export const elements: Section = {
  name: 'elements',
  blocks: ({ sheet, evaluation, width }) => {
    const all = sheet.elements ?? []
    if (all.length === 0) return []
    const rows = all.map((element) => {
      const found = evaluation.elements?.find(({ id }) => id === element.id)
      return rowOf(sheet, element, found)
    })
    return [
      heading('Elements', width),
      ...table(
        ['Element', 'Kind', 'Voltage, current', 'Marked', 'Found'].map((title) => ({ title })),
        rows,
        width,
      ),
    ]
  },
}

const QUANTITIES = [
  ['resistance', 'R', 'Ω'],
  ['inductance', 'L', 'H'],
  ['capacitance', 'C', 'F'],
  ['reactance', 'X', unitOf('impedance')],
] as const

function rowOf(
  sheet: Sheet,
  element: CircuitElement,
  found: ElementEvaluation | undefined,
): readonly Cell[] {
  const { marked } = element
  return [
    cell(element.label ?? element.id),
    cell(element.kind),
    symbolsCell(
      `${labelOf(sheet, element.voltage)}, ${labelOf(sheet, element.current)}`,
      labelsOf(sheet),
    ),
    cell(
      QUANTITIES.flatMap(([name, symbol, unit]) => {
        const value = marked?.[name]
        return value === undefined
          ? []
          : [`${symbol} = ${limitedText(value.value, value.limit, unit)}`]
      }).join('; '),
    ),
    cell(
      QUANTITIES.flatMap(([name, symbol, unit]) => {
        const value = found?.found?.[name]
        return value === undefined
          ? []
          : [`${symbol} = ${limitedText(value.value, value.expanded, unit)}`]
      }).join('; '),
    ),
  ]
}
