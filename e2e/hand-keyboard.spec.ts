import type { Page } from '@playwright/test'
import { checkLine } from './support/check-line'
import { constructionSheet, expectVerifiedAs, handRow } from './support/hand'
import { press, tabTo } from './support/keyboard'
import { openPage, settledSheet } from './support/page'
import { expect, test } from './support/test'

/** What was read off the paper: lengths in millimetres and protractor angles. */
const paper = [
  ['VR', '40.6', '0.3'],
  ['VL', '90.9', '79.5'],
  ['VC', '49.6', '-90'],
  ['closing arrow of VS', '68.7', '34.5'],
] as const

async function typeRow(page: Page, name: string, length: string, angle: string): Promise<void> {
  await tabTo(page, page.getByLabel(`Length of ${name}, mm`, { exact: true }))
  await page.keyboard.type(length)
  await page.keyboard.press('Tab')
  await page.keyboard.type(angle)
  await page.keyboard.press('Enter')
}

test('a construction on paper is read off with the keyboard alone, and checked', async ({
  page,
}) => {
  await openPage(page, constructionSheet)
  await tabTo(page, page.locator('summary', { hasText: 'Drawn by hand' }))
  await page.keyboard.press('Enter')
  await tabTo(page, page.getByLabel('10 mm on paper, in V', { exact: true }))
  await page.keyboard.press('Control+a')
  await page.keyboard.type('5 V')
  await page.keyboard.press('Enter')
  for (const [name, length, angle] of paper) await typeRow(page, name, length, angle)
  const sheet = await settledSheet(page, ({ hand }) => hand?.length === 4)
  await expectVerifiedAs(page, sheet)
  await expect(handRow(page, 'VR')).toContainText('0.6')
  await expect(checkLine(page)).toContainText('most of it by')
})

test('the mode, the nudge and undo are reached with the keyboard', async ({ page }) => {
  await openPage(page, constructionSheet)
  await press(page, 'Draw by hand')
  await typeRow(page, 'VR', '40', '0')
  const length = page.getByLabel('Length of VR, mm', { exact: true })
  await tabTo(page, length, 'Shift+Tab')
  await page.keyboard.press('ArrowUp')
  await expect(length).toHaveValue('41')
  await page.keyboard.press('Shift+ArrowDown')
  await expect(length).toHaveValue('40.9')
  await press(page, 'Undo', 'Shift+Tab')
  await expect(length).toHaveValue('41')
  await page.keyboard.press('Enter')
  await expect(length).toHaveValue('40')
})

test('a figure that cannot be read is refused in words, and the rest stays', async ({ page }) => {
  await openPage(page, constructionSheet)
  await press(page, 'Draw by hand')
  await typeRow(page, 'VR', 'forty', '0')
  await expect(handRow(page, 'VR').getByRole('alert')).toContainText('forty')
  await page.keyboard.press('Escape')
  await expect(handRow(page, 'VR').getByRole('alert')).toHaveCount(0)
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
})
