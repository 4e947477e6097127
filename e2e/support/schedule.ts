import type { Locator, Page } from '@playwright/test'

/** A column of the schedule that is typed in, by the name that its cells carry. */
export type Column = 'Label' | 'Magnitude' | 'Angle' | 'Real' | 'Imaginary' | 'Limit'

/** The cell of a phasor, found as a screen reader names it. */
export function cell(page: Page, column: Column, label: string): Locator {
  return page.getByRole('textbox', { name: `${column} of ${label}`, exact: true })
}

/** Types into a cell as a user does, over what stood there, and leaves it with Enter. */
export async function typeInto(
  page: Page,
  column: Column,
  label: string,
  text: string,
): Promise<void> {
  const field = cell(page, column, label)
  await field.click()
  await field.fill(text)
  await field.press('Enter')
}
