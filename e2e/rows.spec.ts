import type { Page } from '@playwright/test'
import { quick } from '../src/sheet'
import { benchSheet } from './support/bench'
import { allowClipboard } from './support/clipboard'
import { openPage, settledSheet } from './support/page'
import { cell } from './support/schedule'
import { sheetOf, typed } from './support/sheets'
import { expect, test } from './support/test'

const start = sheetOf({ phasors: [typed('V1', '10', '20')] })

test('rows from a spreadsheet are pasted straight into the schedule', async ({ page }) => {
  await allowClipboard(page)
  await openPage(page, start)
  await cell(page, 'Magnitude', 'V1').focus()
  await paste(page, 'V2\t24,0\t0\r\nV3\t230 mV\t62.5\r\nI1\t1.84 A\t-30\r\n')
  const dialog = page.getByRole('dialog', { name: 'Rows from a spreadsheet' })
  await dialog.getByRole('button', { name: 'Add rows' }).click()
  await expect(dialog).toHaveCount(0)
  const { phasors } = await settledSheet(page, (sheet) => sheet.phasors.length === 4)
  expect(phasors.map(({ label, quantity }) => [label, quantity])).toEqual([
    ['V1', 'voltage'],
    ['V2', 'voltage'],
    ['V3', 'voltage'],
    ['I1', 'current'],
  ])
  expect(phasors.slice(1).map(({ magnitude, angle }) => [magnitude?.value, angle?.value])).toEqual([
    [24, 0],
    [0.23, 62.5],
    [1.84, -30],
  ])
  await page.getByRole('button', { name: 'Undo', exact: true }).click()
  await expect(
    page.getByRole('table', { name: 'Phasors' }).locator('tbody').getByRole('row'),
  ).toHaveCount(1)
})

test('a header settles the order of the columns, and commas and semicolons separate too', async ({
  page,
}) => {
  await openPage(page, start)
  await addRows(page, 'angle,label,known,magnitude\n45,VA,read,12.5\n-45,VB,,13.5')
  await addRows(page, 'VC;7,5;90;voltage;0,2')
  const sheet = await settledSheet(page, ({ phasors }) => phasors.length === 4)
  const [, a, b, c] = sheet.phasors
  expect(a).toEqual({ id: a?.id, label: 'VA', quantity: 'voltage' })
  expect(sheet.readings?.map(({ kind, of }) => [kind, of])).toEqual([
    ['magnitude', a?.id],
    ['angle', a?.id],
  ])
  expect(b).toMatchObject({ label: 'VB', magnitude: { value: 13.5 }, angle: { value: -45 } })
  expect(c).toMatchObject({
    label: 'VC',
    magnitude: { value: 7.5, limit: 0.2 },
    angle: { value: 90 },
  })
})

test('rows that cannot be read are named, nothing is added, and the text stays to be put right', async ({
  page,
}) => {
  await openPage(page, start)
  const dialog = page.getByRole('dialog', { name: 'Rows from a spreadsheet' })
  const rows = 'V2\t24.0\t0\nV3\tlots\t62.5\n\t5\t10\nV5\t-3\t10\nV6\t12\t30'
  await page.getByRole('button', { name: 'Paste rows' }).click()
  const field = dialog.getByRole('textbox')
  await field.fill(rows)
  await dialog.getByRole('button', { name: 'Add rows' }).click()
  const problems = dialog.getByRole('alert').getByRole('listitem')
  await expect(problems).toHaveCount(3)
  await expect(problems.nth(0)).toHaveText(/^Row 2: .*“lots”.*\.$/)
  await expect(problems.nth(1)).toHaveText(/^Row 3: .*label.*\.$/)
  await expect(problems.nth(2)).toHaveText(/^Row 4: .*\.$/)
  await expect(field).toHaveValue(rows)
  await expect(page.locator('tbody tr')).toHaveCount(1)

  await field.fill(rows.replace('lots', '31').replace('\n\t5', '\nV4\t5').replace('-3', '3'))
  await dialog.getByRole('button', { name: 'Add rows' }).click()
  await expect(dialog).toHaveCount(0)
  await expect(
    page.getByRole('table', { name: 'Phasors' }).locator('tbody').getByRole('row'),
  ).toHaveCount(6)
  await expect(cell(page, 'Magnitude', 'V3')).toHaveValue('31 V')
})

test('a single value is pasted into its cell, not as a row', async ({ page }) => {
  await allowClipboard(page)
  await openPage(page, start)
  await cell(page, 'Magnitude', 'V1').focus()
  await paste(page, '48.2 at 82')
  await page.keyboard.press('Enter')
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('48.2 V')
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('82°')
})

test('copied rows are what a spreadsheet takes, and what the page takes back', async ({ page }) => {
  await allowClipboard(page)
  await openPage(page, benchSheet)
  await page.getByRole('button', { name: 'Copy rows' }).click()
  await expect(page.getByText('7 rows copied')).toBeVisible()
  const text = await page.evaluate(() => navigator.clipboard.readText())
  const [header, ...rows] = text.split('\n').map((row) => row.split('\t'))
  expect(header?.slice(0, 4)).toEqual(['label', 'quantity', 'magnitude', 'angle'])
  const { phasors } = quick(benchSheet)
  expect(rows.map(([, , magnitude, angle]) => [Number(magnitude), Number(angle)])).toEqual(
    phasors.map(({ magnitude, angle }) => [magnitude, angle]),
  )

  await page.getByRole('button', { name: 'New sheet', exact: true }).click()
  await addRows(page, text)
  const copy = await settledSheet(page, (sheet) => sheet.phasors.length === 7)
  const values = ({ magnitude, angle }: { magnitude?: number; angle?: number }) => [
    magnitude,
    angle,
  ]
  expect(quick(copy).phasors.map(values)).toEqual(phasors.map(values))
  expect(copy.readings?.map(({ kind }) => kind)).toEqual(['magnitude', 'angle'])
})

/** Puts a text on the clipboard and pastes it where the focus is. */
async function paste(page: Page, text: string): Promise<void> {
  await page.evaluate((copied) => navigator.clipboard.writeText(copied), text)
  await page.keyboard.press('ControlOrMeta+v')
}

/** Adds rows through the dialog. */
async function addRows(page: Page, text: string): Promise<void> {
  await page.getByRole('button', { name: 'Paste rows' }).click()
  const dialog = page.getByRole('dialog', { name: 'Rows from a spreadsheet' })
  await dialog.getByRole('textbox').fill(text)
  await dialog.getByRole('button', { name: 'Add rows' }).click()
  await expect(dialog).toHaveCount(0)
}
