import fc from 'fast-check'
import { expect, test } from 'vitest'
import { exampleSheet, newId } from '../../src/sheet'
import { isId } from '../../src/sheet/schema/text'
import { label, text } from './arbitrary-text'
import { sheetOf } from './sheets'

test('an id is the hint where that is free, else the next number', () => {
  expect(newId(exampleSheet, 'Vlamp')).toBe('Vlamp')
  expect(newId(exampleSheet, 'Vchoke')).toBe('Vchoke2')
  expect(newId(exampleSheet, 'r1')).toBe('r6')
  expect(newId(exampleSheet, 's1')).toBe('s2')
})

test('an id is made of any label', () => {
  const empty = sheetOf({})
  expect(newId(empty, 'V coil (main)')).toBe('Vcoilmain')
  expect(newId(empty, 'Vé')).toBe('Ve')
  expect(newId(empty, '2V')).toBe('V')
  expect(newId(empty, '電圧')).toBe('p1')
  expect(newId(empty, 'total')).toBe('total2')
  expect(newId(empty, 'constructor')).toBe('constructor2')
  expect(newId(empty, 'a very long label indeed')).toBe('averylonglabelin')
})

test('whatever the hint, the id is one, and free', () => {
  fc.assert(
    fc.property(fc.oneof(label, text, fc.constantFrom('I', 'VS', 'r1', 'prototype')), (hint) => {
      const id = newId(exampleSheet, hint)
      expect(isId(id)).toBe(true)
      expect(JSON.stringify(exampleSheet)).not.toContain(`"id":"${id}"`)
    }),
  )
})
