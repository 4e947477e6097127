import { expect, test } from 'vitest'
import { earlierIn, nameWithSerial } from '../../../src/app/keep/earlier'
import type { KeptSheet } from '../../../src/app/keep/record'
import { emptySheet, type Sheet, serializeSheet } from '../../../src/sheet'

function kept(id: string, parts: Partial<Sheet>): KeptSheet {
  const text = serializeSheet({ ...emptySheet(), ...parts })
  return {
    id,
    revision: 1,
    writer: 'page',
    seen: {},
    touched: 1,
    saved: 0,
    title: parts.title ?? '',
    words: '',
    text,
    marks: [],
  }
}

test('words of earlier sheets are offered once each, the latest first, and blank ones never', () => {
  const sheets = [
    kept('b', { job: { site: 'Lock 4', testedBy: 'E. Falk', checkedBy: 'A. Berg' } }),
    kept('a', {
      job: { site: ' Lock 4 ', circuit: 'Way 3', testedBy: '  ', approvedBy: 'E. Falk' },
    }),
  ]
  const earlier = earlierIn(sheets, 'open')
  expect(earlier.sites).toEqual(['Lock 4'])
  expect(earlier.circuits).toEqual(['Way 3'])
  expect(earlier.people).toEqual(['E. Falk', 'A. Berg'])
})

test('whoever checked is still offered when the signature is void', () => {
  const voided = [{ kind: 'checked' as const, by: 'A. Berg' }]
  expect(earlierIn([kept('a', { job: { voided } })], 'open').people).toEqual(['A. Berg'])
})

test('the open sheet offers nothing to itself, and one that cannot be read nothing to any', () => {
  const spoiled = { ...kept('a', {}), text: '{' }
  const own = kept('open', { job: { site: 'Lock 4' } })
  expect(earlierIn([own, spoiled], 'open').sites).toEqual([])
})

test('instruments are told apart by their serial numbers, and come with all that is known', () => {
  const meter = { id: 'm1', name: 'Clamp meter', serial: '20417', category: 'CAT III 600 V' }
  const other = { id: 'm1', name: 'Clamp meter', serial: '20418' }
  const sheets = [
    kept('b', { instruments: [meter] }),
    kept('a', { instruments: [{ ...meter, id: 'm7' }, other] }),
  ]
  const { instruments } = earlierIn(sheets, 'open')
  expect(instruments).toEqual([meter, other])
  expect(instruments.map(nameWithSerial)).toEqual(['Clamp meter, 20417', 'Clamp meter, 20418'])
})
