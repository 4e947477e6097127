import { describe, expect, test } from 'vitest'
import { subsetFont } from '../../../src/drawing/pdf/subset-font'
import { fonts } from './fonts'

/** Where a table of a typeface lies. */
function tableOf(font: Uint8Array, tag: string): Uint8Array {
  const view = new DataView(font.buffer, font.byteOffset, font.byteLength)
  for (let at = 12; at < 12 + 16 * view.getUint16(4); at += 16) {
    if (String.fromCharCode(...font.subarray(at, at + 4)) !== tag) continue
    return font.subarray(view.getUint32(at + 8), view.getUint32(at + 8) + view.getUint32(at + 12))
  }
  throw new Error(`There is no table ${tag}.`)
}

function outlineOf(font: Uint8Array, glyph: number): Uint8Array {
  const [head, loca, glyf] = [tableOf(font, 'head'), tableOf(font, 'loca'), tableOf(font, 'glyf')]
  const view = new DataView(loca.buffer, loca.byteOffset, loca.byteLength)
  const isLong = head[51] === 1
  const at = (index: number) => (isLong ? view.getUint32(4 * index) : 2 * view.getUint16(2 * index))
  return glyf.subarray(at(glyph), at(glyph + 1))
}

/** An outline without the zeros that fill it up to a whole word. */
function hexOf(outline: Uint8Array): string {
  return Buffer.from(outline)
    .toString('hex')
    .replace(/(00)+$/, '')
}

describe('a typeface with some of its letters', () => {
  const used = [3, 36, 40, 120]
  const subset = subsetFont(fonts.sans, used)

  test('keeps their outlines, byte for byte, and no other ones that they do not need', () => {
    for (const glyph of used) {
      expect(hexOf(outlineOf(subset, glyph))).toBe(hexOf(outlineOf(fonts.sans, glyph)))
    }
    expect(outlineOf(subset, 41)).toHaveLength(0)
    expect(outlineOf(fonts.sans, 41).length).toBeGreaterThan(0)
    expect(subset.length).toBeLessThan(0.5 * fonts.sans.length)
  })

  test('keeps what a letter is composed of', () => {
    const count = new DataView(tableOf(fonts.sans, 'maxp').slice().buffer).getUint16(4)
    const composed = Array.from({ length: count }, (_, glyph) => glyph).filter(
      (glyph) => (outlineOf(fonts.sans, glyph)[0] ?? 0) === 0xff,
    )
    expect(composed.length).toBeGreaterThan(20)
    for (const glyph of composed) {
      const outline = outlineOf(fonts.sans, glyph)
      const part = ((outline[12] ?? 0) << 8) | (outline[13] ?? 0)
      const kept = subsetFont(fonts.sans, [glyph])
      expect(hexOf(outlineOf(kept, part))).toBe(hexOf(outlineOf(fonts.sans, part)))
    }
  })

  test('keeps the widths of all', () => {
    expect(tableOf(subset, 'hmtx')).toEqual(tableOf(fonts.sans, 'hmtx'))
  })
})
