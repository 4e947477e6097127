import { beforeAll, describe, expect, test } from 'vitest'
import { createPdf, type PaintedText } from '../../../src/drawing/pdf'
import { constructionPages, drawingPage, reportPages } from '../../../src/drawing/report'
import { extractSheetFromPdf, quick, type Sheet, serializeSheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { bare, crowded, mixer } from '../report/sheets'
import { fonts } from './fonts'
import { type Found, readPdf, streamsOf, strokesIn } from './reader'

const date = new Date('2026-09-20T10:00:00Z')

function pdfOf(sheet: Sheet): Uint8Array {
  const pages = reportPages(sheet, quick(sheet), { fingerprint: '7F3A-22C1' })
  return createPdf(pages, { fonts, sheetText: serializeSheet(sheet), date })
}

/** Letters alone, so that it does not matter how a reader puts runs and lines together. */
function lettersOf(text: string): string {
  return text.replace(/[\s\u2066-\u2069]+/g, '').normalize('NFC')
}

describe('the PDF of a report', () => {
  const pages = reportPages(mixer, evaluate(mixer), { fingerprint: '7F3A-22C1' })
  const bytes = createPdf(pages, { fonts, sheetText: serializeSheet(mixer), date })
  let found: Found
  beforeAll(async () => {
    found = await readPdf(bytes)
  })

  test('has its pages at their true size', () => {
    expect(found.sizes).toHaveLength(pages.length)
    found.sizes.forEach(([width, height], index) => {
      expect(width).toBeCloseTo(pages[index]?.width ?? 0, 2)
      expect(height).toBeCloseTo(pages[index]?.height ?? 0, 2)
    })
  })

  test('has a line of 100 ± 0.2 mm on every page', () => {
    const contents = streamsOf(bytes).filter((stream) => / Tf\b/.test(stream))
    expect(contents).toHaveLength(pages.length)
    for (const content of contents) {
      const foot = strokesIn(content).filter(([, y1, , y2]) => y1 === y2 && y1 > 1 && y1 < 8)
      const lengths = foot.map(([x1, , x2]) => Math.abs(x2 - x1))
      expect(lengths).toHaveLength(1)
      expect(Math.abs((lengths[0] ?? 0) - 100)).toBeLessThan(0.05)
    }
  })

  test('has the drawing at its stated scale', () => {
    // VR is 59.9 V along the axis, at 10 V to 10 mm; its head covers the end of the shaft.
    const [first = ''] = streamsOf(bytes).filter((stream) => / Tf\b/.test(stream))
    const { origin } = { origin: { x: 100, y: 80 } }
    const level = strokesIn(first).filter(([x1, y1, x2, y2]) => {
      return Math.abs(y1 - y2) < 1e-6 && Math.abs(x1 - origin.x) < 0.01 && x2 - x1 > 40
    })
    expect(level.some(([x1, , x2]) => x2 - x1 > 54 && x2 - x1 < 59.9)).toBe(true)
  })

  test('gives all of its text to be found and copied, ∠ and Ω included', () => {
    const text = found.texts.join('\n')
    for (const sign of ['∠', 'Ω', '°', '±', '−', 'φ', '÷', 'χ²']) expect(text).toContain(sign)
    expect(text).toContain('29.84 Ω ± 0.41 Ω')
    const letters = lettersOf(text)
    for (const { items } of pages) {
      for (const item of items) {
        if (item.kind !== 'text') continue
        for (const run of item.runs) expect(letters).toContain(lettersOf(run.text))
      }
    }
  })

  test('embeds every typeface that it uses', () => {
    const text = Buffer.from(bytes).toString('latin1')
    const descriptors = [...text.matchAll(/\/Type \/FontDescriptor[\s\S]*?endobj/g)]
    expect(descriptors.length).toBe(3)
    for (const [descriptor] of descriptors) expect(descriptor).toMatch(/\/FontFile2 \d+ 0 R/)
    const used = [...text.matchAll(/\/BaseFont \/(\S+)/g)].map(([, name]) => name)
    expect(new Set(used)).toEqual(
      new Set(['PhasogonPrint-Regular', 'PhasogonPrint-Bold', 'PhasogonPrint-Italic']),
    )
  })

  test('asks for no scaling when it is printed', () => {
    expect(Buffer.from(bytes).toString('latin1')).toContain('/PrintScaling /None')
  })

  test('carries the sheet, which comes back word for word', () => {
    expect(extractSheetFromPdf(bytes)).toBe(serializeSheet(mixer))
    expect(found.attached).toEqual(['sheet.phasogon.json'])
  })

  test('is the same for the same pages', () => {
    const again = createPdf(pages, { fonts, sheetText: serializeSheet(mixer), date })
    const plain = (pdf: Uint8Array) =>
      Buffer.from(pdf)
        .toString('latin1')
        .replace(/\/ID \[[^\]]*\]/, '')
    expect(plain(again)).toBe(plain(bytes))
  })
})

describe('a text that the typefaces lack', () => {
  test('is painted, and found and copied in the order in which it is read', async () => {
    const painted: string[] = []
    const paintText = ({ text }: { readonly text: string }): PaintedText => {
      painted.push(text)
      return { data: pixel, width: 20, above: 2, below: 1 }
    }
    const sheet = crowded(8)
    const pages = reportPages(sheet, quick(sheet))
    const { texts } = await readPdf(createPdf(pages, { fonts, paintText }))
    const letters = lettersOf(texts.join('\n'))
    expect(painted.length).toBeGreaterThan(10)
    for (const text of [
      '配電盤第三列電圧測定値',
      'מתחביןהמוליכים',
      'Напряжениенавводе',
      'Příkon',
    ]) {
      expect(letters).toContain(text)
    }
    // The typefaces have these: they are set, not painted.
    expect(painted.some((text) => /^[\p{Script=Cyrillic}\p{Script=Latin}\s]+$/u.test(text))).toBe(
      false,
    )
  })

  test('is named where nothing can paint, and still copied as it is', async () => {
    const { texts } = await readPdf(pdfOf({ ...bare, title: '電圧の測定' }))
    const text = texts.join('\n')
    expect(text).toMatch(/\[see sheet\]|\[…\]/)
    expect(lettersOf(text)).toContain('電圧の測定')
  })
})

test.each([
  ['an empty sheet', bare],
  ['ten phasors', crowded(10)],
  ['two hundred phasors', crowded(200)],
] as const)('%s: as many pages as the report has, and the sheet back', async (_, sheet) => {
  const bytes = pdfOf(sheet)
  const { sizes } = await readPdf(bytes)
  expect(sizes).toHaveLength(reportPages(sheet, quick(sheet)).length)
  expect(extractSheetFromPdf(bytes)).toBe(serializeSheet(sheet))
})

test('the drawing alone, and the construction sheet, are PDFs too', async () => {
  const evaluation = evaluate(mixer)
  const drawing = await readPdf(createPdf([drawingPage(mixer, evaluation)], { fonts }))
  expect(drawing.texts).toHaveLength(1)
  expect(drawing.texts[0]).toContain('Sheet 1 of 1')
  const construction = await readPdf(createPdf(constructionPages(mixer, evaluation), { fonts }))
  expect(construction.texts[0]).toContain('59.9 mm')
})

/** A picture of a single clear dot. */
const pixel =
  'data:image/png;base64,iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg=='
