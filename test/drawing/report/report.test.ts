import { describe, expect, test } from 'vitest'
import { type Item, paperSizeOf, svg } from '../../../src/drawing'
import {
  constructionPages,
  drawingPage,
  type Page,
  pageSvg,
  reportPages,
} from '../../../src/drawing/report'
import { quick, type Sheet } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'
import { render } from '../svg/render'
import { faultsOf } from './faults'
import { bare, crowded, mixer, typed } from './sheets'

const code = { size: 45, isDark: (row: number, column: number) => (row * 7 + column * 3) % 5 < 2 }
const options = { fingerprint: '7F3A-22C1-9B0D', code }

/** All the text of pages, a line of the page a line. */
function textOf(pages: readonly Page[]): string {
  return pages.flatMap(({ items }) => items.flatMap(lineOf)).join('\n')
}

function lineOf(item: Item): readonly string[] {
  return item.kind === 'text' ? [item.runs.map(({ text }) => text).join('')] : []
}

/** The same with every white space as a single space, so that it does not matter where lines end. */
function proseOf(pages: readonly Page[]): string {
  return textOf(pages).replace(/\s+/g, ' ')
}

describe('the job report', () => {
  const pages = reportPages(mixer, evaluate(mixer), options)

  test('begins with the drawing, at the scale and on the paper that the sheet names', () => {
    const [first] = pages
    expect(first).toMatchObject({ ...paperSizeOf(mixer.drawing), number: 1, count: pages.length })
    expect(textOf(first ? [first] : [])).toContain('10 mm = 10 V')
    const alone = drawingPage(mixer, evaluate(mixer))
    const arrows = ({ items }: Page) => items.filter(({ part }) => part === 'arrow')
    expect(first && arrows(first)).toEqual(arrows(alone))
    expect(arrows(alone).length).toBeGreaterThan(4)
  })

  test('counts its sheets', () => {
    pages.forEach((page, index) => {
      expect(textOf([page])).toContain(`Sheet ${index + 1} of ${pages.length}`)
    })
  })

  test.each([
    ['the hazards', 'Before you measure', 'A second person who'],
    ['that the record replaces no rule', 'replaces no local rule', 'competent person'],
    ['the criterion in the tester’s words', 'Every reading lies within its limits of values that'],
    ['the verdict', 'READINGS AGREE'],
    ['the readings as shown', '8.02 A, 4 turns', 'shift 2.1 of 10.0'],
    ['what they come to', '2.005 A ± 0.021 A'],
    ['what is kept and not used', 'Struck: kept, not used'],
    ['the original of a correction', '2.1 of 5.0', 'read again from the photograph'],
    ['the instruments', 'Bench meter A', '40-1187', 'CAT III 600 V'],
    ['a caution', 'The calibration of Clamp B'],
    ['the conclusion', 'The mixer can go back into service.'],
    ['lines to sign on', 'Tested by', 'Approved by', 'Signature'],
    ['a signature that was voided', 'checked by A. Rossi on 2026-09-12 for revision A'],
    ['the fingerprint', 'Fingerprint 7F3A-22C1-9B0D'],
  ])('says %s', (_, ...parts) => {
    const prose = proseOf(pages)
    for (const part of parts) expect(prose).toContain(part)
  })

  test('puts calculated beside measured, with the gap that is allowed', () => {
    const prose = proseOf(pages)
    expect(prose).toMatch(/\d+\.\d V ∠ \d+\.\d°/)
    expect(prose).toMatch(/0\.2 V of 1\.3 V/)
    expect(prose).toContain('allowed: it closes')
  })

  test('prints no value with more digits than its limit supports', () => {
    const prose = proseOf(pages)
    const limited = [...prose.matchAll(/(\d+\.?\d*) (\S+) ± (\d+\.?\d*) \2/g)]
    expect(limited.length).toBeGreaterThan(5)
    for (const [, value = '', , limit = ''] of limited) {
      const decimals = (text: string) => text.split('.')[1]?.length ?? 0
      expect(decimals(value)).toBeLessThanOrEqual(decimals(limit) + 1)
      expect(limit.replace(/^[0.]+/, '').replace('.', '').length).toBeLessThanOrEqual(3)
    }
  })

  test('leaves out what it is told to, and what has nothing to say', () => {
    const without = new Set(['hazards', 'readings'] as const)
    const prose = proseOf(reportPages(mixer, evaluate(mixer), { ...options, without }))
    expect(prose).not.toContain('Before you measure')
    expect(prose).not.toContain('8.02 A, 4 turns')
    expect(proseOf(reportPages(typed, evaluate(typed)))).not.toContain('Instruments')
  })

  test('says that there is no verdict where none was worked out', () => {
    expect(proseOf(reportPages(mixer, quick(mixer)))).toContain('was not worked out')
  })

  test('leaves the code out where a telephone could not read it, and says so', () => {
    const large = { size: 177, isDark: () => true }
    const found = reportPages(typed, evaluate(typed), { code: large })
    expect(found.flatMap(({ items }) => items).some(({ part }) => part === 'qr-code')).toBe(false)
    expect(proseOf(found)).toContain('too long for a code')
  })

  test('gives the same pages for the same sheet', () => {
    expect(reportPages(mixer, evaluate(mixer), options)).toEqual(pages)
  })
})

describe('the check line', () => {
  test('is exactly 100 mm on every page, beside the words that ask for 100 %', () => {
    for (const page of reportPages(mixer, evaluate(mixer))) {
      const line = page.items.find(({ part }) => part === 'check-line')
      if (line?.kind !== 'lines') throw new Error('There is no check line.')
      const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = line.segments
      expect(Math.hypot(x2 - x1, y2 - y1)).toBeCloseTo(100, 9)
      expect(textOf([page])).toContain('100 mm: print at 100 %')
    }
  })

  test('measures 100 ± 0.2 mm in the SVG, by a renderer of its own', () => {
    const page = drawingPage(mixer, evaluate(mixer))
    const pixels = 10
    const line = page.items.filter(({ part }) => part === 'check-line')
    const picture = render(svg({ ...page, items: line }, '{}'), page.width * pixels)
    // Below the line only its two ends are left: a ruler is held to their middles.
    const y = Math.round((page.height - 4.9) * pixels)
    const dark = Array.from({ length: picture.width }, (_, x) => x).filter(
      (x) => (picture.at(x, y)[3] ?? 0) > 127,
    )
    const [left, right] = [dark.filter((x) => x < 600), dark.filter((x) => x >= 600)].map(
      (end) => end.reduce((sum, x) => sum + x, 0) / end.length,
    )
    const length = ((right ?? 0) - (left ?? 0)) / pixels
    expect(Math.abs(length - 100)).toBeLessThanOrEqual(0.2)
  })
})

describe('nothing overlaps and nothing is cut', () => {
  const papers = [
    { paper: 'A4', orientation: 'landscape' },
    { paper: 'A4', orientation: 'portrait' },
    { paper: 'Letter', orientation: 'portrait' },
    { paper: 'A3', orientation: 'landscape' },
  ] as const
  const sheets: readonly (readonly [string, Sheet])[] = [
    ['an ordinary job', mixer],
    ['an empty sheet', bare],
    ['typed values alone', typed],
    ['ten phasors with long names in many scripts', crowded(10)],
    ['two hundred phasors with long names in many scripts', crowded(200)],
  ]

  test.each(
    sheets.flatMap(([name, sheet]) =>
      papers.map((paper) => [name, paper.paper, paper.orientation, sheet] as const),
    ),
  )('%s on %s, %s', (_, format, orientation, sheet) => {
    const pages = reportPages(sheet, quick(sheet), { ...options, paper: { format, orientation } })
    expect(pages.length).toBeGreaterThan(1)
    expect(pages.slice(1).flatMap(faultsOf)).toEqual([])
  })

  test('every letter that was typed stands on the pages', () => {
    const sheet = crowded(10)
    const letters = (text: string) => text.replace(/[\s\u2066-\u2069]+/g, '')
    const found = letters(textOf(reportPages(sheet, quick(sheet))))
    const { conditions = '', notes = '' } = sheet.job ?? {}
    for (const line of conditions.split('\n')) expect(found).toContain(letters(line))
    expect(found.match(/x/g)?.length).toBeGreaterThanOrEqual(notes.length)
    for (const { label } of sheet.phasors) expect(found).toContain(letters(label))
  })

  test('a table that goes on in another column has its head again', () => {
    const sheet = crowded(200)
    const pages = reportPages(sheet, quick(sheet), { without: new Set(['readings']) })
    const heads = textOf(pages).match(/^State$/gm) ?? []
    expect(heads.length).toBeGreaterThan(5)
  })
})

describe('what does not fit is pointed out', () => {
  test('labels that found no place on the drawing', () => {
    const sheet = { ...crowded(60), drawing: {} }
    const phasors = sheet.phasors.map((phasor, at) => ({
      ...phasor,
      angle: { value: at * 6 - 179 },
    }))
    const [first] = reportPages({ ...sheet, phasors }, quick({ ...sheet, phasors }))
    expect(first?.remarks.join(' ')).toMatch(/find no free place|finds no free place/)
  })

  test('an ordinary job has nothing to point out', () => {
    const remarks = reportPages(mixer, evaluate(mixer)).flatMap((page) => page.remarks)
    expect(remarks).toEqual([])
  })
})

describe('the construction sheet', () => {
  const pages = constructionPages(mixer, evaluate(mixer))
  const [empty] = pages
  const answer = pages.at(-1)

  test('is an empty frame with scales, axes and the list of phasors', () => {
    const parts = new Set(empty?.items.map(({ part }) => part))
    expect([...parts]).toEqual(expect.arrayContaining(['frame', 'axis', 'scale-bar', 'check-line']))
    for (const part of ['arrow', 'angle', 'gap', 'stamp', 'label'] as const) {
      expect(parts.has(part)).toBe(false)
    }
    const text = textOf(empty ? [empty] : [])
    expect(text).toContain('59.9 V')
    expect(text).toContain('59.9 mm')
    expect(text).toContain('75.6°')
    expect(text).not.toContain('91.1 V')
  })

  test('has an answer that lies over it: same paper, same scales, same origin', () => {
    const bars = (page: Page | undefined) =>
      page?.items.filter(({ part, kind }) => part === 'scale-bar' && kind === 'lines')
    expect(bars(answer)).toEqual(bars(empty))
    expect([answer?.width, answer?.height]).toEqual([empty?.width, empty?.height])
    const arrow = answer?.items.find(
      ({ part, arrow: key }) => part === 'arrow' && key === 'term:s1:0',
    )
    const cross = empty?.items.find(({ part, kind }) => part === 'axis' && kind === 'lines')
    if (arrow?.kind !== 'lines' || cross?.kind !== 'lines') throw new Error('Nothing is drawn.')
    expect(arrow.segments[1]).toBe(cross.segments[1])
  })

  test('its list lies on nothing of the answer', () => {
    const box = empty?.items.find(({ part, kind }) => part === 'report' && kind === 'path')
    expect(box).toBeDefined()
    expect(faultsOf({ ...(empty as Page) })).toEqual([])
  })

  test('a long list has a page of its own', () => {
    const sheet = crowded(60)
    const phasors = sheet.phasors.map((phasor, at) => ({ ...phasor, angle: { value: at } }))
    const found = constructionPages({ ...sheet, phasors }, quick({ ...sheet, phasors }))
    expect(found.length).toBeGreaterThan(2)
    expect(found.slice(1, -1).flatMap(faultsOf)).toEqual([])
  })
})

test('pages stand in one document without sharing an id', () => {
  const texts = reportPages(mixer, evaluate(mixer)).map(pageSvg)
  const ids = texts.flatMap((text) => [...text.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id))
  expect(new Set(ids).size).toBe(ids.length)
  for (const text of texts) {
    expect(text).not.toMatch(/ style=/)
    expect(render(text, 300).width).toBe(300)
  }
})
