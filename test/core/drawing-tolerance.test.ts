import { expect, test } from 'vitest'
import { tipErrorAllowed, USUAL_TOLERANCE } from '../../src/core'

test('a line may be off by the error of the rule and that of the protractor, at right angles', () => {
  expect(tipErrorAllowed(100, { millimetres: 0.5, degrees: 0 })).toBe(0.5)
  // An arc of 0.5° at 104.4 mm is 104.4 · π / 360 = 0.911 mm; with 0.5 mm across it, 1.039 mm.
  expect(tipErrorAllowed(104.4, USUAL_TOLERANCE)).toBeCloseTo(1.0392, 4)
  expect(tipErrorAllowed(0, USUAL_TOLERANCE)).toBe(0.5)
})
