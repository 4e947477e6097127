import fc from 'fast-check'
import { expect, test } from 'vitest'
import { exampleSheet } from '../../../src/sheet'
import { pack, unpack } from '../../../src/sheet/link/pack'
import { anySheet } from '../arbitrary-sheet'
import { unhurried } from '../laws'

test('any JSON value is unpacked as it was, its fields in the same order', () => {
  const objects = fc.array(fc.dictionary(fc.constantFrom('a', 'b', '2', 'c|d'), fc.jsonValue()))
  const columns = fc.array(fc.constantFrom('x', '', 'y|z', null, 1, -1.5, 1e21, true, 'null'))
  fc.assert(
    fc.property(fc.oneof(fc.jsonValue(), objects, columns), (value) => {
      const json = JSON.stringify(value)
      fc.pre(!json.includes('"__proto__":'))
      const packed = JSON.parse(JSON.stringify(pack(JSON.parse(json))))
      expect(JSON.stringify(unpack(packed))).toBe(json)
    }),
    { numRuns: 500 },
  )
})

test('any sheet is unpacked as it was', unhurried, () => {
  fc.assert(
    fc.property(anySheet, (sheet) => {
      expect(unpack(JSON.parse(JSON.stringify(pack(sheet))))).toEqual(sheet)
    }),
  )
})

test('a list of objects is packed field by field, words and numbers in one text', () => {
  expect(
    pack([
      { id: 'a', n: 1 },
      { id: 'b', x: true },
    ]),
  ).toEqual([1, 'id|x|n', 'a|b', [0, null, true], [2, '1|']])
  expect(pack(['a|b', ''])).toEqual([0, 'a|b', ''])
  expect(pack({ list: ['a', 'b'] })).toEqual({ list: [3, 'a|b'] })
  expect(pack([{ a: null }, {}])).toEqual([0, { a: null }, {}])
})

test('objects whose fields stand in contrary orders are packed one by one', () => {
  const list = [
    { a: 1, b: 2 },
    { b: 3, a: 4 },
  ]
  expect(pack(list)).toEqual([0, ...list])
})

test('lists of very different objects do not swell', () => {
  const list = Array.from({ length: 300 }, (_, index) => ({ [`field${index}`]: index }))
  expect(JSON.stringify(pack(list)).length).toBeLessThan(JSON.stringify(list).length + 10)
})

test('what was never packed is refused', () => {
  for (const packed of [
    [],
    [7, 'a'],
    ['a'],
    [1],
    [1, 'a'],
    [1, 'a|b', 'x'],
    [1, 'a|b', 'x|y', 'z'],
    [1, {}, 'x'],
    { a: [1, [0, 'a'], [2]] },
  ]) {
    expect(() => unpack(packed)).toThrow(RangeError)
  }
})

test('nesting without end is refused before the stack runs out', () => {
  const deep = JSON.parse(`${'[0,'.repeat(50_000)}0${']'.repeat(50_000)}`)
  expect(() => unpack(deep)).toThrow(RangeError)
})

test('the example is packed into fewer characters than its JSON', () => {
  const json = JSON.stringify(exampleSheet)
  expect(JSON.stringify(pack(exampleSheet)).length).toBeLessThan(0.85 * json.length)
})
