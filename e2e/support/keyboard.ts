import type { Locator, Page } from '@playwright/test'
import { expect } from './test'

/** More stops than the page has: whoever has not arrived by then never will. */
const mostStops = 200

/** Presses Tab (or Shift+Tab, backwards) until an element has the focus. */
export async function tabTo(
  page: Page,
  element: Locator,
  key: 'Tab' | 'Shift+Tab' = 'Tab',
): Promise<void> {
  for (let stops = 0; stops < mostStops; stops += 1) {
    await page.keyboard.press(key)
    if (await hasFocus(element)) return
  }
  throw new Error(`${key} never came to ${element}.`)
}

/** Presses Tab until a button has the focus, and Enter on it. */
export async function press(
  page: Page,
  name: string | RegExp,
  key: 'Tab' | 'Shift+Tab' = 'Tab',
): Promise<void> {
  await tabTo(page, page.getByRole('button', { name, exact: true }), key)
  await page.keyboard.press('Enter')
}

/** Adds a phasor, names it and picks its quantity, whose list has the focus then. */
export async function addPhasor(page: Page, label: string, quantity: string): Promise<void> {
  await press(page, 'Add phasor')
  await expect(
    page
      .getByRole('table', { name: 'Phasors' })
      .locator('tbody')
      .getByRole('row')
      .last()
      .getByRole('textbox')
      .first(),
  ).toBeFocused()
  await page.keyboard.type(label)
  await page.keyboard.press('Tab')
  await expect(page.getByRole('combobox', { name: `Quantity of ${label}` })).toBeFocused()
  await page.keyboard.type(quantity)
}

/** Opens the list that has the focus and picks from it by typing its name. */
export async function choose(page: Page, name: string): Promise<void> {
  await page.keyboard.press('Space')
  await page.keyboard.type(name)
  await page.keyboard.press('Enter')
}

async function hasFocus(element: Locator): Promise<boolean> {
  return element.evaluateAll((found) => found.some((each) => each === document.activeElement))
}
