import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { widthOf, wrapText } from '../../../src/drawing/report/wrap'

const style = { face: 'sans', size: 3 } as const

describe('a text in lines', () => {
  test('is broken at spaces, and keeps its own lines', () => {
    expect(wrapText('one two\nthree', style, 100)).toEqual(['one two', 'three'])
    const lines = wrapText('the quick meter on the long bench', style, 20)
    expect(lines.length).toBeGreaterThan(2)
    expect(lines.join(' ')).toBe('the quick meter on the long bench')
  })

  test('keeps a figure with its unit, an angle with its sign and a limit with ±', () => {
    for (let width = 5; width < 60; width += 0.5) {
      const lines = wrapText('about 48.2 V ∠ 82.0° at 50 Hz ± 0.1 Hz', style, width)
      // Where a line cannot hold even that much, it is broken between letters.
      if (width < widthOf('48.2 V ∠ 82.0°', style)) continue
      expect(lines.join('|')).not.toMatch(/48\.2\|V|V\|∠|∠\|82|50\|Hz|±\|0\.1/)
    }
  })

  test('may end behind an ideograph, and not before what closes a sentence', () => {
    const lines = wrapText('配電盤第三列電圧測定値。', style, 9)
    expect(lines.length).toBeGreaterThan(3)
    expect(lines.some((line) => line.startsWith('。'))).toBe(false)
  })

  test('never is wider than it may be, and loses no letter', () => {
    fc.assert(
      fc.property(
        fc.string({ unit: 'grapheme', maxLength: 80 }),
        fc.integer({ min: 6, max: 80 }),
        (text, width) => {
          const lines = wrapText(text, style, width)
          for (const line of lines) expect(widthOf(line, style)).toBeLessThanOrEqual(width + 1e-9)
          const letters = (whole: string) => whole.replace(/[\s\u2066-\u2069\u202a-\u202e]/gu, '')
          expect(letters(lines.join(''))).toBe(letters(text))
        },
      ),
      { seed: 20261201 },
    )
  })
})
