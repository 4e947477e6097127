import { createHash } from 'node:crypto'
import { expect, test } from 'vitest'
import { FIELD_ORDER } from '../../../src/sheet/canonical'
import { DICTIONARY_1 } from '../../../src/sheet/link/dictionary-1'
import { MISTAKES } from '../../../src/sheet/schema/reading'

test('the dictionary of version 1 is what it was when the first link was made', () => {
  const digest = createHash('sha256').update(DICTIONARY_1).digest('hex')
  expect(digest).toBe('c939e1bcfbf5037cd262100d2e014b72fc7ad9a8178dc6d22cf13427278016f8')
})

/** Fields that came after it. */
const later = ['checkedDate', 'approvedDate', 'voided']

test('the dictionary holds every field and every word of the schema as they were then', () => {
  const words =
    'voltage current impedance power other magnitude angle shift ellipse reactive-power power-factor rms peak peak-to-peak rising falling leads lags true-rms average lead-positive lag-positive time resistance tip-to-tail from-origin resistor coil capacitor phase line star delta closing A4 A3 Letter landscape portrait low medium high true'
  const all = [...FIELD_ORDER, ...MISTAKES, ...words.split(' ')]
  expect(all.filter((word) => !DICTIONARY_1.includes(word))).toEqual(later)
})

test('the dictionary takes no more than 3 KiB', () => {
  expect(new TextEncoder().encode(DICTIONARY_1).length).toBeLessThanOrEqual(3 * 1024)
})
