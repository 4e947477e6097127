import { describe, expect, it } from 'vitest'
import { boundsOf, boundsOfAll, type Item, layout, svg } from '../../../src/drawing'
import { stampWordsOf } from '../../../src/drawing/stamp/words'
import { quick, type Sheet, serializeSheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { fan, phasor, sheetOf, sum } from '../sheets'

const bad: Sheet = {
  ...fan,
  phasors: fan.phasors.map((each) =>
    each.id === 'VL' ? { ...phasor('VL', '77.3', '74.6'), label: 'Vcoil' } : each,
  ),
}
const solved = sheetOf(
  [
    phasor('V1', '30.0', '0'),
    phasor('V2', '40.0', '90'),
    { id: 'VS', label: 'VS', quantity: 'voltage' },
  ],
  { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] },
)
const open = sheetOf(
  [
    phasor('V1', '30.0', '0'),
    { id: 'V2', label: 'V2', quantity: 'voltage' },
    { id: 'VS', label: 'VS', quantity: 'voltage' },
  ],
  { sums: [sum('s', ['V1', 'V2'], { equals: 'VS' })] },
)

function stampOf(sheet: Sheet): readonly Item[] {
  return layout(sheet, evaluate(sheet)).items.filter(({ part }) => part === 'stamp')
}

function wordsOf(sheet: Sheet): string {
  const words = stampWordsOf(sheet, evaluate(sheet))
  return `${words?.head} | ${words?.figures}`
}

describe('the stamp', () => {
  it('says each verdict in words, with the figures that it rests on', () => {
    expect(wordsOf(fan)).toMatch(
      /^READINGS AGREE \| gap [\d.]+ V of [\d.]+ V allowed · \d checks?$/,
    )
    expect(wordsOf(bad)).toMatch(/^READINGS DO NOT AGREE \| gap [\d.]+ V of [\d.]+ V allowed · /)
    expect(wordsOf(solved)).toBe(
      'SOLVED, NOTHING LEFT TO CHECK | no reading checks another · 0 checks',
    )
    expect(wordsOf(open)).toBe('NOT ENOUGH READINGS | open: magnitude of V2 and 1 more')
  })

  it('gives each verdict a border of its own', () => {
    const borders = [fan, bad, solved, open].map((sheet) =>
      JSON.stringify(
        stampOf(sheet).flatMap((item) => (item.kind === 'path' ? [[item.width, item.dash]] : [])),
      ),
    )
    expect(new Set(borders).size).toBe(4)
  })

  it('is left away where nothing was judged', () => {
    const { items } = layout(fan, quick(fan))
    expect(items.filter(({ part }) => part === 'stamp')).toEqual([])
    const bare = sheetOf([phasor('V1', '30.0', '0')])
    expect(stampOf(bare)).toEqual([])
  })

  it('stands on the sheet, clear of arrows, and labels keep clear of it', () => {
    for (const sheet of [fan, bad, solved, open]) {
      const scene = layout(sheet, evaluate(sheet))
      const box = boundsOfAll(scene.items.filter(({ part }) => part === 'stamp'))
      expect(box.right).toBeLessThan(scene.width)
      expect(box.top).toBeLessThan(scene.height)
      for (const item of scene.items) {
        if (item.part !== 'label' && item.part !== 'title-block' && item.part !== 'gap') continue
        const { left, right, bottom, top } = boundsOf(item)
        const isApart =
          right <= box.left || left >= box.right || top <= box.bottom || bottom >= box.top
        expect([item.part, isApart]).toEqual([item.part, true])
      }
    }
  })

  it('is grey while it is of the sheet before', () => {
    const former = evaluate(fan)
    const inks = (items: readonly Item[]) =>
      new Set(items.map((item) => (item.kind === 'text' ? item.fill : item.stroke)))
    const grey = layout(fan, quick(fan), { former }).items.filter(({ part }) => part === 'stamp')
    expect(inks(grey).size).toBe(1)
    expect(inks(grey)).not.toEqual(inks(stampOf(fan)))
  })

  it('stands in the SVG, turned', () => {
    const text = svg(layout(fan, evaluate(fan)), serializeSheet(fan))
    expect(text).toMatch(/<text [^>]*transform="rotate\(-4 [^>]*>READINGS AGREE<\/text>/)
  })
})
