import { readFile } from 'node:fs/promises'
import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import { emptySheet, parseSheetText, serializeSheet } from '../src/sheet'
import { keptOf } from './support/kept'
import { openPage } from './support/page'
import { expect, test } from './support/test'

const titleField = 'Title of the sheet'

async function typeTitle(page: Page, text: string): Promise<void> {
  await page.getByLabel(titleField).fill(text)
  await page.getByLabel(titleField).press('Enter')
}

function verb(page: Page, name: string) {
  return page.getByRole('button', { name, exact: true })
}

async function keptTitles(page: Page): Promise<readonly string[]> {
  return (await keptOf(page)).map(({ title }) => title)
}

test('the list finds, names, doubles, deletes, puts back and opens sheets, each with its own history', async ({
  page,
}) => {
  test.setTimeout(300_000)
  await openPage(page)
  await typeTitle(page, 'Pump')
  await verb(page, 'New sheet').click()
  await typeTitle(page, 'Fan')
  await expect.poll(() => keptTitles(page)).toEqual(['Fan', 'Pump'])

  await verb(page, 'My sheets').click()
  const titles = page.locator('.sheet-title')
  await expect(titles).toHaveText(['Fan', 'Pump'])
  const { violations } = await new AxeBuilder({ page }).include('dialog').analyze()
  expect(violations).toEqual([])
  // The picture of the sheet with arrows has ink on it, once it is in sight.
  await expect.poll(() => inkOf(page, 1)).toBeGreaterThan(100)

  await page.getByLabel(/^Search/).fill('gallery pump')
  await expect(titles).toHaveText(['Pump'])
  await page.getByLabel(/^Search/).fill('')

  await verb(page, 'Rename Pump').click()
  await page.getByLabel('New title').fill('Pump 4')
  await page.getByLabel('New title').press('Enter')
  await expect(titles).toHaveText(['Pump 4', 'Fan'])
  await verb(page, 'Duplicate Pump 4').click()
  await expect(titles).toHaveText(['Pump 4 (copy)', 'Pump 4', 'Fan'])
  await verb(page, 'Delete Pump 4 (copy)').click()
  await expect(titles).toHaveText(['Pump 4', 'Fan'])
  await verb(page, 'Put back Pump 4 (copy)').click()
  await expect(titles).toHaveText(['Pump 4 (copy)', 'Pump 4', 'Fan'])
  await verb(page, 'Delete Pump 4 (copy)').click()
  await expect(titles).toHaveText(['Pump 4', 'Fan'])

  await verb(page, 'Open Pump 4').click()
  await expect(page.getByLabel(titleField)).toHaveValue('Pump 4')
  await expect(verb(page, 'Undo')).toBeEnabled()
  await typeTitle(page, 'Pump 5')
  await verb(page, 'My sheets').click()
  await verb(page, 'Open Fan').click()
  await verb(page, 'Undo').click()
  await expect(page.getByLabel(titleField)).toHaveValue('')
  await expect.poll(() => keptTitles(page)).toEqual(['', 'Pump 5'])
})

/** How many dark pixels the small picture of a row has. */
function inkOf(page: Page, row: number): Promise<number> {
  return page
    .locator('.sheet-picture')
    .nth(row)
    .evaluate((canvas: HTMLCanvasElement) => {
      const pixels = canvas.getContext('2d')?.getImageData(0, 0, canvas.width, canvas.height).data
      let dark = 0
      for (let at = 0; at < (pixels?.length ?? 0); at += 4) {
        if ((pixels?.[at] ?? 255) < 128 && (pixels?.[at + 3] ?? 0) > 128) dark += 1
      }
      return dark
    })
}

test('a sheet goes into a file and comes back from it, several at once too', async ({ page }) => {
  await openPage(page)
  await typeTitle(page, 'To a file')
  const coming = page.waitForEvent('download')
  await verb(page, 'Share').click()
  await verb(page, 'Save to a file').click()
  const download = await coming
  expect(download.suggestedFilename()).toBe('V-118 To a file.phasogon.json')
  const saved = parseSheetText(await readFile(await download.path(), 'utf8'))
  expect(saved.ok && saved.sheet.title).toBe('To a file')

  await verb(page, 'Open').click()
  const file = (title: string) => ({
    name: `${title}.phasogon.json`,
    mimeType: 'application/json',
    buffer: Buffer.from(serializeSheet({ ...emptySheet(), title })),
  })
  const broken = { name: 'notes.json', mimeType: 'application/json', buffer: Buffer.from('{}') }
  await page
    .locator('dialog input[type="file"]')
    .setInputFiles([file('First of three'), broken, file('Third of three')])
  await expect(page.getByLabel(titleField)).toHaveValue('First of three')
  await expect(page.locator('.notice').first()).toContainText('“notes.json” was not opened')
  await expect
    .poll(() => keptTitles(page))
    .toEqual(['First of three', 'Third of three', 'To a file'])
})

test('the link’s QR code is on the screen, dark on white, large enough to be scanned', async ({
  page,
}) => {
  await openPage(page)
  await verb(page, 'Share').click()
  await verb(page, 'QR code of the link').click()
  const code = page.getByRole('img', { name: 'QR code of the link to this sheet' })
  await expect(code).toBeVisible()
  const { width = 0, height = 0 } = (await code.boundingBox()) ?? {}
  expect(width).toBe(height)
  expect(width).toBeGreaterThan(250)
  const { violations } = await new AxeBuilder({ page }).include('dialog').analyze()
  expect(violations).toEqual([])
})
