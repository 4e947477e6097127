import { expect, test } from 'vitest'
import type { Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { ballasted, figure } from '../../drawing/schematic/circuits'

const supplied: Sheet = {
  ...ballasted,
  phasors: ballasted.phasors.map((phasor) =>
    phasor.id === 'VS' ? { ...phasor, magnitude: figure(230, '230') } : phasor,
  ),
}

test('a circuit of which only the supply is known leaves all else open: no branch is taken for dead', () => {
  const { agreement, phasors } = evaluate(supplied)
  expect(agreement?.verdict).toBe('not-enough')
  for (const { id, magnitudeState, angleState } of phasors) {
    expect([id, magnitudeState, angleState]).toEqual(
      id === 'VS' ? ['VS', 'given', 'given'] : [id, 'open', 'open'],
    )
  }
})
