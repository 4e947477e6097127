import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { boundsOf, type Item, layout } from '../../../src/drawing'
import { shareOut } from '../../../src/drawing/items/share-out'
import { quick, type Sheet } from '../../../src/sheet'
import { fan, sheetOf } from '../sheets'

function blockOf(sheet: Sheet): Item[] {
  const { items } = layout(sheet, quick(sheet))
  return items.filter(({ part }) => part === 'title-block')
}

function textsOf(sheet: Sheet): string[] {
  return blockOf(sheet).flatMap((item) =>
    item.kind === 'text' ? [item.runs.map(({ text }) => text).join('')] : [],
  )
}

describe('the title block', () => {
  it('says what the sheet fills, by the names of the fields', () => {
    const texts = textsOf(fan)
    for (const text of ['Roof fan 4, auxiliary winding', 'W-2207', '2026-03-14', 'M. Lindqvist']) {
      expect(texts).toContain(text)
    }
    expect(texts).toEqual(
      expect.arrayContaining(['Identification number', 'Date of issue', 'Creator', 'Checked by']),
    )
    expect(texts).not.toContain('Approval person')
  })

  it('always says revision, frequency with rms, and sheet number', () => {
    expect(textsOf(fan)).toEqual(expect.arrayContaining(['B', '50 Hz · rms', 'Sheet 1 of 1']))
    expect(textsOf(sheetOf([], { title: ' ' }))).toEqual([
      'Untitled',
      'Revision index',
      '0',
      'Frequency and values',
      'rms',
      'Sheet number',
      'Sheet 1 of 1',
    ])
  })

  it('lies in the lower right corner of the frame, its texts inside it, whatever they say', () => {
    const text = fc.string({ maxLength: 200 })
    fc.assert(
      fc.property(text, text, text, (title, number, site) => {
        const [outline, ...others] = blockOf(
          sheetOf([], { title, revision: number, job: { number, site, circuit: title } }),
        )
        if (!outline) throw new Error('There is no title block.')
        const block = boundsOf(outline)
        expect([block.right, block.bottom]).toEqual([287, 10])
        for (const item of others) {
          const { left, right, bottom, top } = boundsOf(item)
          expect(left).toBeGreaterThanOrEqual(block.left)
          expect(right).toBeLessThanOrEqual(block.right)
          expect(bottom).toBeGreaterThanOrEqual(block.bottom)
          expect(top).toBeLessThanOrEqual(block.top)
        }
      }),
      { numRuns: 40 },
    )
  })
})

describe('a width shared out among columns', () => {
  it('gives each what it needs and the same of the rest', () => {
    expect(shareOut(100, [10, 20, 40])).toEqual([20, 30, 50])
  })

  it('cuts the widest where there is too little', () => {
    expect(shareOut(100, [10, 200, 80])).toEqual([10, 45, 45])
  })

  it('always adds up to the width', () => {
    const needs = fc.array(fc.double({ min: 0, max: 300, noNaN: true }), {
      minLength: 1,
      maxLength: 4,
    })
    fc.assert(
      fc.property(needs, (each) => {
        const widths = shareOut(110, each)
        expect(widths.reduce((sum, width) => sum + width, 0)).toBeCloseTo(110, 9)
        expect(Math.min(...widths)).toBeGreaterThanOrEqual(0)
      }),
    )
  })
})
