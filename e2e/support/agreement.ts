import { readFile } from 'node:fs/promises'
import type { Page } from '@playwright/test'
import { parseSheetText, type Sheet } from '../../src/sheet'
import { isInked, sheetOnScreen } from './board'
import { press } from './keyboard'
import { expect } from './test'

/** Every term of the first sum that Node lays out for the sheet is painted where it says. */
export async function expectTermsOnBoard(page: Page, sheet: Sheet): Promise<void> {
  const screen = await sheetOnScreen(page, sheet)
  const [sum] = sheet.sums ?? []
  if (!sum) throw new Error('the sheet has no sum')
  for (const at of sum.terms.keys()) {
    const middle = screen.middle(`term:${sum.id}:${at}`)
    expect(await isInked(page, middle), `term ${at}`).toBe(true)
  }
}

/** The sheet in the file that the page saves. */
export async function savedByKeyboard(page: Page): Promise<Sheet> {
  await press(page, 'Share', 'Shift+Tab')
  const coming = page.waitForEvent('download')
  await press(page, 'Save to a file')
  const text = await readFile(await (await coming).path(), 'utf8')
  const parsed = parseSheetText(text)
  if (!parsed.ok) throw new Error('the file holds no sheet')
  return parsed.sheet
}
