import { describe, expect, test } from 'vitest'
import { visualOrder } from '../../../src/drawing/pdf/visual-order'

/** The letters of a word the other way round. */
function turned(word: string): string {
  return [...word].reverse().join('')
}

describe('the order in which a line lies from left to right', () => {
  test('is that of reading where nothing is written from right to left', () => {
    expect(visualOrder('Supply 12.5 V, 電圧')).toBe('Supply 12.5 V, 電圧')
  })

  test('is turned round where all is', () => {
    expect(visualOrder('מתח בין')).toBe(turned('מתח בין'))
  })

  test('leaves figures and foreign words as they are within it', () => {
    expect(visualOrder('מתח 12.5')).toBe(`12.5 ${turned('מתח')}`)
    expect(visualOrder('מתח VS קו')).toBe(`${turned('קו')} VS ${turned('מתח')}`)
  })

  test('turns a word round within a line that runs from left to right', () => {
    expect(visualOrder('line מתח end')).toBe(`line ${turned('מתח')} end`)
  })
})
