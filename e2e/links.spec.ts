import type { Page } from '@playwright/test'
import { serializeLink } from '../src/sheet'
import { badLinks } from './support/bad-links'
import { benchSheet } from './support/bench'
import { allowClipboard, copyLink, sheetInLink } from './support/clipboard'
import { drop } from './support/files'
import { isDrawn, openPage } from './support/page'
import { cell, typeInto } from './support/schedule'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

/** What is open when a link comes: a sheet of one's own, with an edit in it. */
const own = sheetOf({ title: 'Mine', phasors: [typed('V1', '10', '20')] })

test('a bad link pasted into the dialog gives a sentence and costs nothing', async ({ page }) => {
  await openOwn(page)
  await page.getByRole('button', { name: 'Open', exact: true }).click()
  const dialog = page.getByRole('dialog', { name: 'Open a sheet' })
  const field = dialog.getByRole('textbox')
  for (const { name, fragment, says } of [
    ...badLinks,
    { name: 'that is no link', fragment: 'see you tomorrow at eight', says: /no sheet/ },
  ]) {
    await test.step(`a link ${name}`, async () => {
      await field.fill(fragment)
      await dialog.getByRole('button', { name: 'Open the link' }).click()
      await expect(dialog.getByRole('alert')).toHaveText(/^\p{Lu}.{12,}\.$/u)
      await expect(dialog.getByRole('alert')).toHaveText(says)
      await expect(field).toHaveAccessibleDescription(says)
      await expect(field).toHaveValue(fragment)
    })
  }
  await page.keyboard.press('Escape')
  await expect(dialog).toHaveCount(0)
  await expectOwn(page)
})

test('a bad link pasted into the address gives a sentence and costs nothing', async ({ page }) => {
  await openOwn(page)
  for (const { name, fragment, says } of badLinks) {
    await test.step(`a link ${name}`, async () => {
      await page.goto(fragment)
      const notice = page.getByRole('alert').filter({ hasText: says })
      await expect(notice).toBeVisible()
      await expect(notice).toContainText('The sheet that was open is still here.')
      await expectOwn(page)
      await notice.getByRole('button', { name: 'Put away' }).click()
      await expect(notice).toHaveCount(0)
    })
  }
})

test('a bad link in the address of a first visit gives a sentence, and the page works', async ({
  context,
}) => {
  const few = badLinks.filter(({ name }) => /cut|newer|gigabytes|tip/.test(name))
  expect(few).toHaveLength(4)
  for (const { name, fragment, says } of few) {
    await test.step(`a link ${name}`, async () => {
      const page = await context.newPage()
      await page.goto(fragment)
      await isDrawn(page)
      await expect(page.getByRole('alert').filter({ hasText: says })).toBeVisible()
      await expect(page.getByRole('region', { name: 'First visit' })).toBeVisible()
      await page.close()
    })
  }
})

test('a link from any host opens, however a mail wrapped it, and the open sheet is not lost', async ({
  page,
}) => {
  const link = `https://sheets.example.org/tools/draw/?from=mail${serializeLink(benchSheet)}`
  const wrapped = [
    `Have a look: <${link}>.`,
    `${link.slice(0, 90)}\n${link.slice(90, 166)}\n${link.slice(166)}`,
    link.replace('#', '%23').replace('=1.', '%3D1.'),
  ]
  for (const text of wrapped) {
    await openOwn(page)
    await page.getByRole('button', { name: 'Open', exact: true }).click()
    const dialog = page.getByRole('dialog', { name: 'Open a sheet' })
    await dialog.getByRole('textbox').fill(text)
    await dialog.getByRole('button', { name: 'Open the link' }).click()
    await expect(cell(page, 'Magnitude', 'Vread')).toHaveValue('22.5 V')
    await page.getByRole('button', { name: 'Go back' }).click()
    await expectOwn(page)
  }
})

test('a link that is dropped on the page opens', async ({ page }) => {
  await openOwn(page)
  const data = `https://sheets.example.org/${serializeLink(benchSheet)}`
  await drop(page, { items: [{ mimeType: 'text/uri-list', data }] })
  await expect(cell(page, 'Magnitude', 'Vread')).toHaveValue('22.5 V')
})

test('what the page links to is what it shows, to the last field', async ({ page }) => {
  await allowClipboard(page)
  const unknown = { ...benchSheet, colourOfTheCat: 'grey' }
  await openPage(page, unknown)
  const link = await copyLink(page)
  expect(sheetInLink(link)).toEqual(unknown)
  expect(new URL(link).pathname).toBe(new URL(page.url()).pathname)
})

/** Opens a sheet of one's own and makes an edit in it. */
async function openOwn(page: Page): Promise<void> {
  await page.goto('about:blank')
  await openPage(page, own)
  await typeInto(page, 'Magnitude', 'V1', '11')
  await expectOwn(page)
}

/** Expects the own sheet to be open still, with its edit, which can still be undone. */
async function expectOwn(page: Page): Promise<void> {
  await expect(page.getByRole('textbox', { name: 'Title of the sheet' })).toHaveValue('Mine')
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('11 V')
  await expect(page.getByRole('button', { name: 'Undo', exact: true }).first()).toBeEnabled()
}
