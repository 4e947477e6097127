import { readFile } from 'node:fs/promises'
import type { Download, Page } from '@playwright/test'
import papa from 'papaparse'
import { exampleSheet, fingerprintOf, parseSheetText, serializeSheet } from '../src/sheet'
import { allowClipboard } from './support/clipboard'
import { drop } from './support/files'
import { openPage, settledSheet, unfold } from './support/page'
import { lengthOf, type PrintedPage, readPrint } from './support/print'
import { expect, test } from './support/test'

async function savedBy(page: Page, ...verbs: readonly string[]): Promise<Download> {
  const coming = page.waitForEvent('download')
  for (const verb of verbs) await verbOf(page, verb).click()
  return coming
}

function verbOf(page: Page, name: string) {
  return page.getByRole('dialog').getByRole('button', { name, exact: true })
}

async function fill(page: Page, caption: string, text: string): Promise<void> {
  const field = page.getByLabel(caption, { exact: true })
  await field.fill(text)
  await field.blur()
}

/** Asserts that a page has its check line, of 100 mm to a fifth of a millimetre. */
function expectCheckLine({ lines }: PrintedPage): void {
  const longest = lines.filter((line) => Math.abs(lengthOf(line) - 100) < 2).map(lengthOf)
  expect(longest.length).toBeGreaterThan(0)
  for (const length of longest) expect(Math.abs(length - 100)).toBeLessThan(0.2)
}

test('a job is described, signed, changed, printed, saved as a PDF and opened from it', async ({
  page,
}) => {
  await openPage(page, exampleSheet)
  await unfold(page, 'Title block')
  await fill(page, 'Tested by', 'E. Falk')
  await fill(page, 'Checked by', 'A. Berg')
  await fill(page, 'Checked on', '2026-11-30')
  await fill(page, 'Conditions', 'Motor running, valve open')

  // The change after the check voids it where everyone sees it, and is one step.
  const voided = page.getByRole('list', { name: 'Voided signatures' })
  await expect(voided).toContainText('checked by A. Berg on 2026-11-30, revision 0')
  await expect(page.getByLabel('Revision', { exact: true })).toHaveValue('1')
  await expect(page.getByLabel('Checked by', { exact: true })).toHaveValue('')
  await page.getByRole('button', { name: 'Undo', exact: true }).first().click()
  await expect(page.getByLabel('Checked by', { exact: true })).toHaveValue('A. Berg')
  await page.getByRole('button', { name: 'Redo', exact: true }).click()

  await page.getByText('Before you measure', { exact: true }).click()
  await page.getByRole('button', { name: 'Add the usual ones' }).click()
  await expect(page.getByRole('group', { name: 'Hazard 5' })).toBeVisible()
  await page.getByText('Criterion and conclusion', { exact: true }).click()
  await fill(page, 'Conclusion', 'The three voltages account for the supply: 48 Ω ∠ 0°.')
  const sheet = await settledSheet(page, ({ report }) => report?.conclusion !== undefined)
  const fingerprint = fingerprintOf(sheet)
  await expect(page.locator('.fingerprint')).toContainText(fingerprint)

  await page.getByRole('button', { name: 'Report', exact: true }).click()
  const sheets = page.getByRole('dialog').locator('.page-paper > svg')
  await expect(sheets.first()).toBeVisible()
  await expect(page.getByText('Everything fits.')).toBeVisible()
  const count = await sheets.count()
  expect(count).toBeGreaterThan(1)

  const pdf = await savedBy(page, 'Save PDF')
  expect(pdf.suggestedFilename()).toBe('V-118 Valve actuator 7- cable, choke and motor.pdf')
  const path = test.info().outputPath('report.pdf')
  await pdf.saveAs(path)
  const bytes = await readFile(path)
  expect(bytes.subarray(0, 5).toString('latin1')).toBe('%PDF-')
  const saved = await readPrint(bytes)
  const printed = await readPrint(await page.pdf({ preferCSSPageSize: true }))
  for (const pages of [saved, printed]) {
    expect(pages.length).toBe(count)
    for (const each of pages) {
      expect(each.width).toBeCloseTo(297, 0)
      expect(each.height).toBeCloseTo(210, 0)
      expectCheckLine(each)
    }
    const text = pages.map((each) => each.text).join(' ')
    for (const words of ['A. Berg', 'E. Falk', '48 Ω ∠ 0°', 'READINGS AGREE', fingerprint]) {
      expect(text.replace(/\s+/g, ' ')).toContain(words)
    }
  }
  await expect(page.locator('.printed')).toHaveCount(0)

  await page.keyboard.press('Escape')
  await expect(page.getByRole('dialog')).toHaveCount(0)
  await expect(page.getByRole('button', { name: 'Report', exact: true })).toBeFocused()
  await page.getByRole('button', { name: 'New sheet', exact: true }).click()
  await drop(page, { files: [path] })
  const back = await settledSheet(page, ({ phasors }) => phasors.length > 0)
  expect(serializeSheet(back)).toBe(serializeSheet(sheet))
  expect(parseSheetText(serializeSheet(back)).ok).toBe(true)
})

test('the tables leave with their figures as numbers, and earlier names are offered', async ({
  page,
}) => {
  await allowClipboard(page)
  const phasors = exampleSheet.phasors.map((phasor) =>
    phasor.id === 'Vcable' ? { ...phasor, label: '=Vcable' } : phasor,
  )
  await openPage(page, { ...exampleSheet, phasors })
  await page.getByRole('textbox', { name: 'Title of the sheet' }).fill('Kept')
  await page.getByRole('textbox', { name: 'Title of the sheet' }).press('Enter')

  await page.getByRole('button', { name: 'Report', exact: true }).click()
  const csv = await savedBy(page, 'Tables', 'The schedule as CSV')
  expect(csv.suggestedFilename()).toBe('V-118 Kept.schedule.csv')
  const text = await readFile(await csv.path(), 'utf8')
  expect(text).toMatch(/\r\n$/)
  const { data } = papa.parse<string[]>(text.replace(/^\ufeff/, ''), { delimiter: ',' })
  const [head = [], , cable = [], , motor = []] = data
  expect(cable[0]).toBe("'=Vcable")
  expect(Number(motor[head.indexOf('magnitude as read')])).toBe(22.4)

  await verbOf(page, 'Tables').click()
  await verbOf(page, 'The readings to the clipboard').click()
  await expect(page.getByRole('dialog').getByText(/^Copied the readings/)).toBeVisible()
  const copied = await page.evaluate(() => navigator.clipboard.readText())
  expect(copied.split('\n').length).toBe(1 + (exampleSheet.readings ?? []).length)
  // Escape closes the menu first, and only then the window.
  await verbOf(page, 'Tables').click()
  await page.keyboard.press('Escape')
  await expect(page.getByRole('dialog')).toBeVisible()
  await verbOf(page, 'Close').click()

  await page.getByRole('button', { name: 'New sheet', exact: true }).click()
  await unfold(page, 'Title block')
  const site = page.getByLabel('Site', { exact: true })
  await expect
    .poll(() =>
      site.evaluate((field: HTMLInputElement) =>
        [...(field.list?.options ?? [])].map(({ value }) => value),
      ),
    )
    .toEqual(['Pump house, lower gallery'])
})
