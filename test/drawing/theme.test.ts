import { describe, expect, it } from 'vitest'
import { distance, type Item, type Palette, paletteOf } from '../../src/drawing'
import { headOf } from '../../src/drawing/items/head'
import { HEAD_SHAPES, HEADS, type HeadShape } from '../../src/drawing/items/style'

/** The three parts of a colour, linear, from 0 to 1 (IEC 61966-2-1). */
function linearOf(colour: string): number[] {
  return [1, 3, 5].map((at) => {
    const part = Number.parseInt(colour.slice(at, at + 2), 16) / 255
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4
  })
}

/** Relative luminance (WCAG 2.2). */
function luminanceOf(colour: string): number {
  const [red = 0, green = 0, blue = 0] = linearOf(colour)
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}

/** Contrast ratio (WCAG 2.2), from 1 to 21. */
function contrastOf(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminanceOf(one), luminanceOf(other)].sort((a, b) => a - b)
  return (light + 0.05) / (dark + 0.05)
}

describe.each(['light', 'dark'] as const)('the %s palette', (theme) => {
  const palette: Palette = paletteOf(theme)
  const { paper, ink, quiet, gap, quantities } = palette

  it('has text and arrows that stand out from the paper', () => {
    for (const colour of [ink, quiet, gap, ...Object.values(quantities)]) {
      expect([colour, contrastOf(colour, paper) >= 4.5]).toEqual([colour, true])
    }
  })

  it('has a grid that stays behind what is drawn, its fine lines the fainter', () => {
    expect(contrastOf(palette.grid, paper)).toBeLessThan(2)
    expect(contrastOf(palette.fineGrid, paper)).toBeLessThan(contrastOf(palette.grid, paper))
  })

  it('has a resultant that is the strongest of all, also in grey', () => {
    for (const colour of [gap, ...Object.values(quantities)]) {
      expect(contrastOf(ink, paper)).toBeGreaterThan(1.5 * contrastOf(colour, paper))
    }
  })
})

/** Which points of a fine lattice about a head's tip are inked, whatever the colour. */
function inkOf(shape: HeadShape): boolean[] {
  const [length, reach] = HEADS[shape]
  const style = { shape, colour: '#000000', width: 0.5, headLength: length, headReach: reach }
  const { points, shaftEnd, width } = headOf({ x: 0, y: 0 }, { x: 1, y: 0 }, 40, style)
  const head: Item = { part: 'arrow', kind: 'path', points, closed: true, fill: '#000000' }
  const shaft: Item = { part: 'arrow', kind: 'lines', segments: [-40, 0, -shaftEnd, 0], width }
  const inked: boolean[] = []
  for (let x = -6; x <= 0; x += 0.1) {
    for (let y = -2; y <= 2; y += 0.1) {
      inked.push(distance(head, { x, y }) === 0 || distance(shaft, { x, y }) <= width / 2)
    }
  }
  return inked
}

describe('arrows of different quantities', () => {
  it('differ in the shape of their heads, so that no hue is needed to tell them apart', () => {
    const shapes = Object.values(HEAD_SHAPES)
    expect(shapes).toHaveLength(5)
    const inks = shapes.map(inkOf)
    for (const [index, one] of inks.entries()) {
      for (const [other, another] of inks.entries()) {
        if (other <= index) continue
        const either = one.filter((ink, at) => ink || another[at]).length
        const different = one.filter((ink, at) => ink !== another[at]).length
        const pair = `${shapes[index]} and ${shapes[other]}`
        // A quarter of what either of them inks is inked by one alone.
        expect([pair, different / either > 0.25]).toEqual([pair, true])
      }
    }
  })
})
