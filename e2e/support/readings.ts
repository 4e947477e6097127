import type { Locator, Page } from '@playwright/test'
import { tabTo } from './keyboard'
import { expect } from './test'

/** The field in which the next reading is typed, whatever it stands ready for. */
export function nextReading(page: Page): Locator {
  return page.getByRole('textbox', { name: /^What the display shows of / })
}

/** Types what a display shows into the field that has the focus; the page then stands ready for the next. */
export async function typeReading(page: Page, readyFor: string, text: string): Promise<void> {
  await expect(nextReading(page)).toHaveAccessibleName(`What the display shows of ${readyFor}`)
  await expect(nextReading(page)).toBeFocused()
  await page.keyboard.type(text)
  await page.keyboard.press('Enter')
  await expect(nextReading(page)).toHaveValue('')
}

/** Goes back from the field of the next reading to a list before it, picks by typing, and returns. */
export async function pickForNext(page: Page, list: string, name: string): Promise<void> {
  await tabTo(page, page.getByRole('combobox', { name: list, exact: true }), 'Shift+Tab')
  await page.keyboard.type(name)
  await tabTo(page, nextReading(page))
}

/** The sentence below a reading: what it comes to. */
export function wordsOfReading(page: Page, number: number): Locator {
  return page
    .getByRole('region', { name: 'Readings' })
    .getByRole('listitem')
    .filter({
      has: page.getByRole('combobox', { name: `Phasor of reading ${number}`, exact: true }),
    })
    .locator('.reading-words')
}
