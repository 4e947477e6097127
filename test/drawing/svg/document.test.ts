import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { layout, paletteOf, type Scene, svg } from '../../../src/drawing'
import {
  extractSheetText,
  parseSheetText,
  quick,
  type Sheet,
  serializeSheet,
} from '../../../src/sheet'
import { fan, phasor, sheetOf } from '../sheets'
import { render } from './render'

function sceneOf(sheet: Sheet): Scene {
  return layout(sheet, quick(sheet))
}

function svgOf(sheet: Sheet): string {
  return svg(sceneOf(sheet), serializeSheet(sheet))
}

/** Whether two colours are the same, give or take what blending at an edge makes. */
function isNear(pixel: readonly number[], colour: string): boolean {
  const parts = [1, 3, 5].map((at) => Number.parseInt(colour.slice(at, at + 2), 16))
  return parts.every((part, index) => Math.abs(part - (pixel[index] ?? 0)) < 60)
}

describe('the millimetres of an SVG', () => {
  it('are those of width, height and viewBox', () => {
    const text = svgOf(fan)
    expect(text).toContain('width="297mm" height="210mm" viewBox="0 0 297 210"')
    const letter = svgOf({ ...fan, drawing: { paper: 'Letter', orientation: 'portrait' } })
    expect(letter).toContain('width="215.9mm" height="279.4mm" viewBox="0 0 215.9 279.4"')
  })

  it('are true: a phasor of 100 mm, drawn by another renderer, measures 100 mm', () => {
    const drawing = { origin: { x: 50, y: 120 }, unitsPerCentimetre: { voltage: 5 } }
    const text = svg(
      layout(
        sheetOf([phasor('V1', '50', '0')], { drawing }),
        quick(sheetOf([phasor('V1', '50', '0')])),
        { labels: false },
      ),
      '{}',
    )
    const perMillimetre = 10
    const picture = render(text, 297 * perMillimetre)
    const row = (210 - 120) * perMillimetre
    const colour = paletteOf('light').quantities.voltage
    const inked = Array.from({ length: picture.width }, (_, x) => x).filter((x) =>
      isNear(picture.at(x, row), colour),
    )
    const [first = 0, last = 0] = [inked[0], inked.at(-1)]
    expect((last + 1 - first) / perMillimetre).toBeGreaterThan(99.7)
    expect((last + 1 - first) / perMillimetre).toBeLessThanOrEqual(100.05)
    expect(first / perMillimetre).toBeCloseTo(50, 1)
  })

  it('are true: the frame, drawn by another renderer, lies 10 mm from every edge', () => {
    const picture = render(svgOf(fan), 2970)
    const { ink } = paletteOf('light')
    const inked = Array.from({ length: picture.width }, (_, x) => x).filter((x) =>
      isNear(picture.at(x, 505), ink),
    )
    expect(picture.height).toBe(2100)
    expect([inked[0], inked.at(-1)].map((x) => Math.round((x ?? 0) / 10))).toEqual([10, 287])
  })
})

describe('an SVG', () => {
  it('states its scale and its resultant in words', () => {
    const { description } = sceneOf(fan)
    expect(description).toContain('10 mm = 5 V')
    expect(description).toMatch(/Resultant VS 41\.\d+ V ∠ \d+\.\d°/)
    expect(svgOf(fan)).toContain(`<desc id="phasogon-description">${description}</desc>`)
  })

  it('has a title and is an image to a screen reader', () => {
    const text = svgOf(fan)
    expect(text).toContain('<title id="phasogon-title">Roof fan 4, auxiliary winding</title>')
    expect(text).toContain('role="img" aria-labelledby="phasogon-title phasogon-description"')
  })

  it('keeps text as text', () => {
    expect(svgOf(fan)).toContain('57.3 V ∠ 74.6°')
  })

  it('has no style, no script, no link, and no name twice', () => {
    const text = svgOf(fan)
    expect(text).not.toMatch(/ style=| class=|<style|<script|href| on[a-z]+=/)
    const names = [...text.matchAll(/ id="([^"]*)"/g)].map(([, id]) => id)
    expect(names.length).toBeGreaterThan(5)
    expect(new Set(names).size).toBe(names.length)
    for (const name of names) expect(name).toMatch(/^phasogon-[a-z-]+$/)
  })

  it('rounds every number to a thousandth of a millimetre', () => {
    const drawn = svgOf(fan).replace(/<metadata>.*<\/metadata>/s, '')
    expect(drawn).toMatch(/\d\.\d{3}\b/)
    expect(drawn).not.toMatch(/\d\.\d{4}/)
    expect(drawn).not.toMatch(/NaN|Infinity|e[+-]\d/)
  })

  it('of an arrow far beyond the paper has only finite numbers', () => {
    const sheet = sheetOf([phasor('V1', '1e300', '30')], {
      drawing: { unitsPerCentimetre: { voltage: 1e-9 } },
    })
    expect(svgOf(sheet).replace(/<metadata>.*<\/metadata>/s, '')).not.toMatch(
      /NaN|Infinity|e[+-]\d/,
    )
  })
})

const anyText = fc.string({ unit: 'binary', maxLength: 40 })
const hostile = fc.constantFrom(
  '<script>alert(1)</script>',
  '"><rect onload="x"/>',
  ']]></metadata></svg>',
  '\u202eVcoil',
  'שלום V',
  '\u0000\u0008\ufffe\uffff',
  '\ud800',
  '&amp;&#x0;',
)
const label = fc.oneof(anyText, hostile)

describe('whatever is typed', () => {
  it('gives a drawing that another renderer can read', () => {
    fc.assert(
      fc.property(label, label, label, (title, name, site) => {
        const sheet = sheetOf([{ ...phasor('V1', '10', '20'), label: name }], {
          title,
          job: { site },
        })
        const text = svgOf(sheet)
        const picture = render(text, 100)
        expect(picture.width).toBe(100)
        expect(text).not.toContain('<script')
        expect(text).not.toContain('onload="x"/>')
      }),
      { numRuns: 40 },
    )
  })

  it('comes back out of the drawing as the same sheet', () => {
    fc.assert(
      fc.property(label, label, (title, name) => {
        const sheet = sheetOf([{ ...phasor('V1', '10', '20'), label: name }], { title })
        const inside = extractSheetText(svgOf(sheet))
        expect(JSON.parse(inside ?? '')).toEqual(JSON.parse(serializeSheet(sheet)))
      }),
    )
  })

  it('opens again as the sheet it was', () => {
    const read = parseSheetText(extractSheetText(svgOf(fan)) ?? '')
    expect(read).toEqual({ ok: true, sheet: fan })
  })

  it('from right to left is fenced, so that it turns nothing round', () => {
    const text = svgOf(sheetOf([{ ...phasor('V1', '10', '20'), label: 'מתח' }]))
    expect(text).toContain('\u2068מתח\u2069')
    const mark = svgOf(sheetOf([{ ...phasor('V1', '10', '20'), label: 'V\u202ecoil' }]))
    expect(mark.replace(/<metadata>.*<\/metadata>/s, '')).not.toContain('\u202e')
  })
})
