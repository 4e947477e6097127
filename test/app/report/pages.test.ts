import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { type Choice, pagesOf } from '../../../src/app/report/pages'
import type { Page } from '../../../src/drawing/report'
import { exampleSheet, fingerprintOf, quick } from '../../../src/sheet'
import { evaluate } from '../../../src/sheet/estimate'

const choice: Choice = { kind: 'report', paper: {} }
const whole = evaluate(exampleSheet)
const settled = { sheet: exampleSheet, evaluation: whole, whole }

function textOf(pages: readonly Page[]): string {
  const items = pages.flatMap((page) => page.items)
  return items
    .flatMap((item) => (item.kind === 'text' ? item.runs.map(({ text }) => text) : []))
    .join(' ')
}

describe('the pages of a print', () => {
  beforeAll(() => {
    Object.assign(globalThis, { window: { location: { href: 'https://example.org/sheet/' } } })
  })
  afterAll(() => {
    Reflect.deleteProperty(globalThis, 'window')
  })

  test('have the verdict, and the fingerprint on each', () => {
    const pages = pagesOf(settled, choice, false)
    expect(textOf(pages)).toContain('READINGS AGREE')
    for (const page of pages) expect(textOf([page])).toContain(fingerprintOf(exampleSheet))
  })

  test('have no verdict while only that of an older sheet is known', () => {
    const waiting = { sheet: exampleSheet, evaluation: quick(exampleSheet), former: whole }
    expect(textOf(pagesOf(waiting, choice, false))).not.toContain('READINGS AGREE')
  })

  test('lie on the paper that was chosen, and the drawing on its own', () => {
    const [drawing, ...others] = pagesOf(
      settled,
      { ...choice, paper: { format: 'Letter', orientation: 'portrait' } },
      false,
    )
    expect(drawing).toMatchObject({ format: 'A4', width: 297, height: 210 })
    expect(others.length).toBeGreaterThan(0)
    for (const page of others) expect(page).toMatchObject({ width: 215.9, height: 279.4 })
  })

  test('of a construction are the empty frame first, and what it comes to last', () => {
    const pages = pagesOf(settled, { kind: 'construction', paper: {} }, false)
    expect(textOf(pages.slice(0, 1))).not.toContain('calculated')
    expect(textOf(pages.slice(-1))).toContain('calculated')
  })
})
