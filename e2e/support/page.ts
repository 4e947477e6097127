import type { Page } from '@playwright/test'
import { parseLink, type Sheet, serializeLink } from '../../src/sheet'
import { expect } from './test'

/** Opens the page, with a sheet in its address or as a first visit sees it, and waits for its drawing. */
export async function openPage(page: Page, sheet?: Sheet): Promise<void> {
  await page.goto(sheet ? serializeLink(sheet) : './')
  await isDrawn(page)
}

/** Waits until the page has drawn its sheet. */
export async function isDrawn(page: Page): Promise<void> {
  await expect(page.locator('html')).toHaveAttribute('data-ready', 'true')
}

/** Opens a part of the page by its heading, once the first answer has come: until then it may move down. */
export async function unfold(page: Page, heading: string): Promise<void> {
  await expect(page.locator('html')).toHaveAttribute('data-settled', 'true')
  await page.getByText(heading, { exact: true }).click()
}

/** The sheet that the address carries; undefined where it carries none that can be read. */
export function sheetInAddress(page: Page): Sheet | undefined {
  const result = parseLink(page.url())
  return result.ok ? result.sheet : undefined
}

/** The sheet in the address, once it is as a check wants it: the page writes it some time after an edit. */
export async function settledSheet(
  page: Page,
  isSettled: (sheet: Sheet) => boolean,
): Promise<Sheet> {
  let sheet: Sheet | undefined
  await expect
    .poll(() => {
      sheet = sheetInAddress(page)
      return sheet !== undefined && isSettled(sheet)
    }, 'the address carries the edit')
    .toBe(true)
  return sheet as unknown as Sheet
}
