import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import type { Page } from '@playwright/test'
import { projectFolder } from '../src/command/run.mjs'
import type { Reading, Sheet } from '../src/sheet'
import { evaluate } from '../src/sheet/estimate'
import { checkFigure } from './support/check-line'
import { openPage, settledSheet } from './support/page'
import { nextReading, typeReading } from './support/readings'
import { sheetOf } from './support/sheets'
import { expect, test } from './support/test'

/*
 * An invented job: a dehumidifier's fan motor behind a series choke, a resistor for measuring and a
 * capacitor. Magnitudes first, then how far each voltage leads the current: the page stands ready for
 * them in this order.
 */
type Typing = readonly (readonly [readyFor: string, shown: string])[]

const sound: Typing = [
  ['VR, magnitude', '24.1'],
  ['Vchoke, magnitude', '61.3'],
  ['VC, magnitude', '27.4'],
  ['VS, magnitude', '52.1'],
  ['VR, angle', '0.4'],
  ['Vchoke, angle', '73.2'],
  ['VC, angle', '-89.6'],
  ['VS, angle', '36.6'],
]

/** A sum of voltages, all to be read, beside a current that is known. */
function job(terms: readonly string[], order = [...terms, 'VS']): Sheet {
  return sheetOf({
    title: 'Dehumidifier 3, fan motor',
    reference: 'I',
    phasors: [
      ...order.map((label) => ({ id: label, label, quantity: 'voltage' as const })),
      { id: 'I', label: 'I', quantity: 'current', magnitude: { value: 1.84, text: '1.84' } },
    ],
    sums: [{ id: 's1', terms: terms.map((phasor) => ({ phasor })), equals: 'VS' }],
  })
}

const fourVoltages = job(['VR', 'Vchoke', 'VC'])

/** Types what the displays show, one after the other, wherever the page stands ready. */
async function typeReadings(page: Page, shown: Typing): Promise<Sheet> {
  await nextReading(page).click()
  for (const [readyFor, text] of shown) await typeReading(page, readyFor, text)
  return settledSheet(page, ({ readings }) => readings?.length === shown.length)
}

function panel(page: Page) {
  return page.getByRole('region', { name: 'Best values' })
}

/** The text of the SVG that the page saves. */
async function savedSvg(page: Page): Promise<string> {
  const download = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Save drawing' }).click()
  await page.getByRole('button', { name: 'SVG, true to scale' }).click()
  return readFile(await (await download).path(), 'utf8')
}

test('eight sound readings are typed, and the sheet is stamped: they agree', async ({ page }) => {
  await openPage(page, fourVoltages)
  const sheet = await typeReadings(page, sound)
  const { agreement, sums, phasors } = evaluate(sheet)
  expect(agreement?.verdict).toBe('agree')

  await expect(panel(page).getByText('READINGS AGREE')).toBeVisible()
  await expect(checkFigure(page, 'Gap allowed').nth(1)).toHaveText(
    'the sum closes within its limits',
  )
  const allowed = Number.parseFloat(
    (await checkFigure(page, 'Gap allowed').first().textContent()) ?? '',
  )
  expect(allowed).toBeCloseTo(sums[0]?.closingError?.allowed ?? Number.NaN, 1)

  const row = page.locator('[data-row="Vchoke"]')
  await expect(row.locator('[data-area="known"] .best')).toHaveText('adjusted')
  const best = (await row.locator('[data-area="limit"] .best').textContent()) ?? ''
  const found = phasors.find(({ id }) => id === 'Vchoke')
  const shown = Number.parseFloat(best.replace(/^.*?: /, ''))
  expect(Math.abs(shown - (found?.magnitude ?? Number.NaN))).toBeLessThan(0.06)

  await panel(page)
    .getByRole('checkbox', { name: /95 % region at each tip/ })
    .check()
  const text = await savedSvg(page)
  expect(text).toContain('>READINGS AGREE<')
  expect(text).toContain('Ellipses: 95 % regions')
  expect(text).toMatch(/>gap [\d.]+ V of [\d.]+ V allowed · 2 checks</)

  await panel(page).getByRole('radio', { name: 'As adjusted' }).check()
  await expect(page.getByText('Drawn as adjusted')).toBeVisible()
  // A pen draws beside the readings as read, and the page says that it went back to them.
  await page.getByRole('button', { name: 'Draw by hand' }).click()
  await expect(page.getByText('Drawn as adjusted')).toHaveCount(0)
  await expect(page.getByText(/draws the values as read again/)).toBeVisible()
  await expect(panel(page).getByText('READINGS AGREE')).toHaveCount(0)
})

test('one bad reading among eight is stamped, and listed first', async ({ page }) => {
  await openPage(page, fourVoltages)
  const sheet = await typeReadings(
    page,
    sound.map(([of, text]) => [of, of === 'VC, magnitude' ? '37.4' : text]),
  )
  expect(evaluate(sheet).agreement?.verdict).toBe('disagree')

  await expect(panel(page).getByText('READINGS DO NOT AGREE')).toBeVisible()
  await expect(checkFigure(page, 'Gap allowed').nth(1)).toHaveText('the sum does not close')
  const first = evaluate(sheet).suspects?.[0]?.reading
  const number = (sheet.readings ?? []).findIndex(({ id }: Reading) => id === first) + 1
  await expect(panel(page).getByRole('rowheader').first()).toHaveText(
    new RegExp(`^${number}: VC, magnitude`),
  )
  expect(await savedSvg(page)).toContain('>READINGS DO NOT AGREE<')
})

test('with nothing left to check, the page says so and claims nothing', async ({ page }) => {
  await openPage(
    page,
    job(['VR', 'VC', 'Vchoke', 'Vcable'], ['VR', 'VC', 'VS', 'Vchoke', 'Vcable']),
  )
  await expect(panel(page).getByText('NOT ENOUGH READINGS')).toBeVisible()
  await typeReadings(page, [
    ['VR, magnitude', '24.1'],
    ['VC, magnitude', '27.4'],
    ['VS, magnitude', '58.1'],
    ['Vchoke, magnitude', '61.3'],
    ['Vcable, magnitude', '6.2'],
    ['VR, angle', '0.4'],
    ['VC, angle', '-89.6'],
    ['VS, angle', '35.9'],
  ])
  await expect(panel(page).getByText('SOLVED, NOTHING LEFT TO CHECK')).toBeVisible()
  await expect(panel(page).getByText(/^Nothing checks reading 1: VR, magnitude/)).toBeVisible()
  await expect(checkFigure(page, 'Gap allowed')).toHaveCount(0)

  // What two voltages must make up, their sizes being known, is a triangle or its mirror.
  const pictures = panel(page).getByRole('listitem').getByRole('button')
  await expect(pictures).toHaveCount(2)
  await pictures.nth(1).click()
  await settledSheet(page, ({ chosen }) => (chosen?.length ?? 0) > 0)
  await expect(pictures).toHaveCount(2)
})

test('the linear algebra stays out of the first load', async () => {
  const folder = join(projectFolder, 'dist')
  const assets = await readdir(join(folder, 'assets'))
  const contents = await Promise.all(
    assets
      .filter((name) => name.endsWith('.js'))
      .map(async (name) => ({ name, text: await readFile(join(folder, 'assets', name), 'utf8') })),
  )
  // A sentence of the library's own, which no shortening of names touches.
  const holders = contents.filter(({ text }) => text.includes('Row index out of range'))
  expect(holders.map(({ name }) => name)).toEqual([expect.stringMatching(/^estimate\.worker-/)])
  expect(await readFile(join(folder, 'service-worker.js'), 'utf8')).toContain(holders[0]?.name)
})
