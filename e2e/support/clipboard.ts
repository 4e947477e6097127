import type { Page } from '@playwright/test'
import { parseLink, type Sheet } from '../../src/sheet'
import { expect } from './test'

/** Lets the page use the clipboard, as a user does who was asked. */
export async function allowClipboard(page: Page): Promise<void> {
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
}

/** Copies the link to the sheet with the page's own verb, and takes it from the clipboard. */
export async function copyLink(page: Page): Promise<string> {
  await page.evaluate(() => navigator.clipboard.writeText(''))
  await page.getByRole('button', { name: 'Copy link', exact: true }).click()
  let link = ''
  await expect
    .poll(async () => {
      link = await page.evaluate(() => navigator.clipboard.readText())
      return link
    }, 'the link is on the clipboard')
    .not.toBe('')
  return link
}

/** The sheet that a link carries. */
export function sheetInLink(link: string): Sheet {
  const result = parseLink(link)
  if (!result.ok) throw new Error(`The link cannot be read: ${result.errors[0]?.message}`)
  return result.sheet
}
