import { expect, test } from 'vitest'
import { comparisonRows, powerRows } from '../../../src/drawing/circuit'
import { reportPages } from '../../../src/drawing/report'
import type { Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { ballasted, figure } from '../schematic/circuits'
import { faultsOf } from './faults'

const measured: Sheet = {
  ...ballasted,
  phasors: ballasted.phasors.map((phasor) =>
    phasor.id === 'VS'
      ? { ...phasor, magnitude: figure(230, '230') }
      : phasor.id === 'VR'
        ? { ...phasor, magnitude: figure(96.1, '96.1') }
        : phasor,
  ),
}

test('the report prints predicted beside measured, and the powers, as the page shows them', () => {
  const evaluation = evaluate(measured)
  const pages = reportPages(measured, evaluation)
  const text = pages
    .flatMap(({ items }) =>
      items.flatMap((item) =>
        item.kind === 'text' ? [item.runs.map((run) => run.text).join('')] : [],
      ),
    )
    .join('\n')
  const rows = comparisonRows(measured, evaluation)
  expect(rows.length).toBe(6)
  expect(text).toContain('Predicted and measured')
  for (const { parts, verdict } of rows) {
    for (const { predicted } of parts) expect(text).toContain(predicted)
    expect(text).toContain(verdict)
  }
  const powers = powerRows(measured, evaluation)
  expect(powers.map(({ name }) => name)).toContain('Total')
  for (const { active, reactive } of powers) {
    expect(text).toContain(active)
    expect(text).toContain(reactive)
  }
  expect(pages.flatMap(faultsOf)).toEqual([])
})
