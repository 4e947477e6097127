import { expect, test } from 'vitest'
import { exampleSheet, type Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'

/** The example with one limit for all of its readings. */
function limited(limit: number): Sheet {
  const readings = (exampleSheet.readings ?? []).map((reading) => ({ ...reading, limit }))
  return { ...exampleSheet, readings }
}

test('a limit that is too small to be reckoned with counts as exact', () => {
  const exact = evaluate(limited(0)).agreement
  expect(exact?.degreesOfFreedom).toBeGreaterThan(0)
  for (const limit of [Number.MIN_VALUE, 1e-300]) {
    expect(evaluate(limited(limit)).agreement).toEqual(exact)
  }
})
