import type { CircuitNode, Sheet } from '../../sheet'
import { valueText } from './values'

/** The circuit in words: `R1 (47 Ω) in series with (C1 (16 µF) in parallel with L1 (150 mH))`; empty without one. */
export function describeCircuit(sheet: Sheet): string {
  return sheet.circuit ? wordsOf(sheet.circuit, sheet) : ''
}

function wordsOf(node: CircuitNode, sheet: Sheet): string {
  if ('element' in node) {
    const element = sheet.elements?.find(({ id }) => id === node.element)
    if (element === undefined) return node.element
    const value = valueText(element)
    const name = element.label || element.id
    return value === '' ? name : `${name} (${value})`
  }
  const isSeries = 'series' in node
  const parts = isSeries ? node.series : node.parallel
  return parts
    .map((part) => ('element' in part ? wordsOf(part, sheet) : `(${wordsOf(part, sheet)})`))
    .join(isSeries ? ' in series with ' : ' in parallel with ')
}
