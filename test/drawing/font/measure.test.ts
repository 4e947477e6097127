import { readFileSync, statSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { measureText, shorten } from '../../../src/drawing'
import { ADVANCES } from '../../../src/drawing/font/advances'
import { readWidths } from './woff2'

const FONTS = fileURLToPath(new URL('../../../public/fonts/', import.meta.url))
const faces = [
  ['sans', 'phasogon-sans.woff2', 12_000],
  ['bold', 'phasogon-bold.woff2', 8_000],
  ['symbol', 'phasogon-symbol.woff2', 7_000],
] as const

describe.each(faces)('the %s font', (face, file, most) => {
  const { unitsPerEm, advances } = readWidths(FONTS + file)

  it('has the advances of the table, character by character', () => {
    expect(unitsPerEm).toBe(2048)
    expect(advances.size).toBeGreaterThan(90)
    for (const [character, advance] of advances) {
      const text = String.fromCodePoint(character)
      expect([text, measureText([{ text, face, size: 2048 }])]).toEqual([text, advance])
    }
  })

  it('has no character fewer than the table', () => {
    const characters = ADVANCES[face]
      .split(';')
      .flatMap((run) => run.split(':')[1]?.split(' ') ?? [])
    expect(characters).toHaveLength(advances.size)
  })

  it('is small enough to load at once', () => {
    expect(statSync(FONTS + file).size).toBeLessThanOrEqual(most)
  })
})

describe('the upright font', () => {
  it('has every sign that the program prints', () => {
    const { advances } = readWidths(`${FONTS}phasogon-sans.woff2`)
    const signs = '−∠°Ωµ√±≤≥·×∥→←↑↓…–—‘’“”•△✓₀₁₂₃₄₅₆₇₈₉φ\u00a0\u2009\u202f'
    for (const sign of signs)
      expect([sign, advances.has(sign.codePointAt(0) ?? 0)]).toEqual([sign, true])
  })

  it('travels with its licence', () => {
    const licence = readFileSync(`${FONTS}LICENSE.txt`, 'utf8')
    expect(licence).toContain('Bitstream')
    expect(licence).toContain('Permission is hereby granted')
  })
})

describe('the width of a text', () => {
  it('grows with the size and adds up over runs', () => {
    const run = { text: '48.2 V', face: 'sans', size: 4 } as const
    const whole = measureText([run])
    expect(measureText([{ ...run, size: 8 }])).toBeCloseTo(2 * whole, 12)
    expect(measureText([run, run])).toBeCloseTo(2 * whole, 12)
  })

  it('takes a whole em for ideographs and pictographs, and nothing for marks and joiners', () => {
    const widthOf = (text: string) => measureText([{ text, face: 'sans', size: 1 }])
    expect(widthOf('電')).toBe(1)
    expect(widthOf('⚡')).toBe(1)
    expect(widthOf('🔌')).toBe(1)
    expect(widthOf('\u0301\u200b\u2068\u2069')).toBe(0)
    expect(widthOf('ש')).toBeGreaterThan(0.4)
    expect(widthOf('ש')).toBeLessThan(1)
  })

  it('of a sign that a face lacks is that of the upright face', () => {
    const widthOf = (face: 'sans' | 'symbol') => measureText([{ text: '∠', face, size: 1 }])
    expect(widthOf('symbol')).toBe(widthOf('sans'))
  })
})

describe('a text that is too long', () => {
  const style = { face: 'sans', size: 4 } as const

  it('is cut with … so that it just fits', () => {
    const text = 'Distribution-board-3,way-12,north-hall'
    const short = shorten(text, style, 30)
    expect(short.endsWith('…')).toBe(true)
    expect(text.startsWith(short.slice(0, -1))).toBe(true)
    expect(measureText([{ ...style, text: short }])).toBeLessThanOrEqual(30)
    const longer = `${text.slice(0, short.length)}…`
    expect(measureText([{ ...style, text: longer }])).toBeGreaterThan(30)
  })

  it('is left as it is where it fits', () => {
    expect(shorten('Pump', style, 30)).toBe('Pump')
  })

  it('is never cut inside a character or before its marks', () => {
    for (let width = 1; width < 40; width += 1) {
      const short = shorten('🔌🔌e\u0301e\u0301🔌🔌🔌', style, width)
      expect(short).toMatch(/^(?:🔌|e\u0301)*…?$/u)
    }
  })

  it('is nothing where there is no room at all', () => {
    expect(shorten('Pump', style, 0.1)).toBe('')
  })
})
