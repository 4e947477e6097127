import { expect, test } from 'vitest'
import { nextRevision } from '../../src/sheet/revision'

test.each([
  [undefined, '1'],
  ['', '1'],
  ['  ', '1'],
  ['0', '1'],
  ['9', '10'],
  ['09', '10'],
  ['A', 'B'],
  ['Z', 'AA'],
  ['AZ', 'BA'],
  ['zz', 'aaa'],
  ['P03', 'P04'],
  ['2.9', '2.10'],
  ['99999999999999999999', '100000000000000000000'],
  ['draft', 'draft.1'],
  ['draft.1', 'draft.2'],
  ['第一版', '第一版.1'],
])('after revision %j comes %j', (revision, next) => {
  expect(nextRevision(revision)).toBe(next)
})
