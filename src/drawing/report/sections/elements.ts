import { formatEstimate, unitOf } from '../../../core'
import {
  type CircuitElement,
  type ElementEvaluation,
  type Evaluation,
  formatElementLimit,
  formatElementValue,
  foundBesideMark,
  labelOf,
  type Sheet,
  type Typed,
} from '../../../sheet'
import { heading, paragraph } from '../blocks'
import type { Cell } from '../columns'
import { cell, labelsOf, symbolsCell } from '../names'
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
      ...all
        .flatMap((element) => sentencesOf(sheet, element, evaluation))
        .map((text) => paragraph(text, width)),
    ]
  },
}

/** What is said of an element's values beside their marks. */
function sentencesOf(
  sheet: Sheet,
  element: CircuitElement,
  { elements: evaluated = [] }: Evaluation,
): readonly string[] {
  const found = evaluated.find(({ id }) => id === element.id)
  return found ? foundBesideMark(sheet, element, found).map(({ text }) => text) : []
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
      QUANTITIES.flatMap(([name, symbol]) => {
        const value = marked?.[name]
        return value === undefined ? [] : [`${symbol} = ${markText(value, name)}`]
      }).join('; '),
    ),
    cell(
      QUANTITIES.flatMap(([name, symbol, unit]) => {
        const value = found?.found?.[name]
        return value === undefined
          ? []
          : [`${symbol} = ${formatEstimate(value.value, value.expanded, unit, value.value)}`]
      }).join('; '),
    ),
  ]
}

/** A mark with the digits and the tolerance that were typed. */
function markText(value: Typed, name: (typeof QUANTITIES)[number][0]): string {
  const limit = formatElementLimit(value, name)
  const figure = formatElementValue(value, name)
  return limit === undefined ? figure : `${figure} ${limit}`
}
