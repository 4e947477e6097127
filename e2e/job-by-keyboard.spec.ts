import type { Page } from '@playwright/test'
import { checkFigure, expectCheckedAs } from './support/check-line'
import { sheetInLink } from './support/clipboard'
import { expectFigures, textOf } from './support/figures'
import { type JobPhasor, jobPhasors, jobResultant, jobTerms } from './support/job'
import { addPhasor, choose, press, tabTo } from './support/keyboard'
import { isDrawn, openPage, settledSheet } from './support/page'
import { cell } from './support/schedule'
import { expect, test } from './support/test'

test('a technician does the whole job without touching the mouse', async ({ page }) => {
  await openPage(page)
  const { keyboard } = page

  await test.step('starts a sheet and gives it a title', async () => {
    await press(page, 'New sheet')
    await tabTo(page, page.getByRole('textbox', { name: 'Title of the sheet' }), 'Shift+Tab')
    await keyboard.type('Fan unit 3, winding test')
  })

  await test.step('types five phasors, two of them as read', async () => {
    for (const phasor of jobPhasors) await typePhasor(page, phasor)
    await expect(cell(page, 'Imaginary', 'Vcoil')).toHaveValue('51.3 V')
  })

  await test.step('builds the sum with its signs', async () => {
    await press(page, 'Add sum')
    const term = page.getByRole('combobox', { name: 'Add a term to the sum' })
    for (const { phasor, sign } of jobTerms) {
      await tabTo(page, term, 'Shift+Tab')
      await choose(page, phasor)
      const toggle = page.getByRole('button', { name: `Sign of ${phasor}: plus` })
      await expect(toggle).toBeVisible()
      if (sign === -1) {
        await tabTo(page, toggle, 'Shift+Tab')
        await keyboard.press('Enter')
      }
      await tabTo(page, page.getByRole('button', { name: 'Add sum' }))
    }
    const equals = page.getByRole('combobox', { name: 'What the sum must equal' })
    await tabTo(page, equals, 'Shift+Tab')
    await choose(page, 'VS')
    await expect(equals).toHaveValue(/^V/)
  })

  const sheet = await settledSheet(page, ({ sums }) => typeof sums?.[0]?.equals === 'string')
  await test.step('reads the same numbers as by mouse', async () => {
    expect(sheet.title).toBe('Fan unit 3, winding test')
    await expectCheckedAs(page, sheet)
    const { magnitude, angle } = jobResultant()
    expectFigures(await textOf(checkFigure(page, 'Calculated').first()), [magnitude, angle])
    expectFigures(await textOf(checkFigure(page, 'Measured').first()), [49, 33.5])
  })

  await test.step('types over a value, takes it back and makes it again', async () => {
    await tabTo(page, cell(page, 'Magnitude', 'VR'), 'Shift+Tab')
    await keyboard.type('31.5')
    await keyboard.press('Enter')
    await expect(cell(page, 'Magnitude', 'VR')).toHaveValue('31.5 V')
    await keyboard.press('Control+z')
    await expect(cell(page, 'Magnitude', 'VR')).toHaveValue('30.0 V')
    await keyboard.press('Control+y')
    await expect(cell(page, 'Magnitude', 'VR')).toHaveValue('31.5 V')
    await keyboard.press('Control+z')
    await expect(cell(page, 'Magnitude', 'VR')).toHaveValue('30.0 V')
  })

  await test.step('moves the view, saves the drawing, and passes the link on', async () => {
    const drawing = page.getByRole('region', { name: 'Drawing' }).locator('canvas').first()
    const before = await drawing.evaluate((canvas: HTMLCanvasElement) => canvas.toDataURL())
    await tabTo(page, page.getByRole('button', { name: 'Larger' }), 'Shift+Tab')
    await keyboard.press('ArrowLeft')
    await expect
      .poll(() => drawing.evaluate((canvas: HTMLCanvasElement) => canvas.toDataURL()))
      .not.toBe(before)

    await press(page, 'Save drawing', 'Shift+Tab')
    const coming = page.waitForEvent('download')
    await press(page, /^SVG/)
    expect((await coming).suggestedFilename()).toBe('Fan unit 3, winding test.svg')

    await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
    await press(page, 'Copy link', 'Shift+Tab')
    await expect(page.getByText('Link copied.')).toBeVisible()
    const link = await page.evaluate(() => navigator.clipboard.readText())
    expect(sheetInLink(link)).toEqual(sheet)
    const other = await page.context().newPage()
    await other.goto(link)
    await isDrawn(other)
    await expectCheckedAs(other, sheet)
  })
})

/** Adds a phasor and fills its row, going from cell to cell with Tab. */
async function typePhasor(page: Page, phasor: JobPhasor): Promise<void> {
  const { label, quantity, magnitude, angle, known } = phasor
  const { keyboard } = page
  await addPhasor(page, label, quantity)
  await keyboard.press('Tab')
  await keyboard.type(magnitude)
  await keyboard.press('Tab')
  await keyboard.type(angle)
  await tabTo(page, page.getByRole('combobox', { name: `How ${label} is known` }))
  await keyboard.type(known)
}
