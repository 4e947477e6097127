import type { Page } from '@playwright/test'
import { arrowOf, away, dragOver, sheetOnScreen } from './support/board'
import { checkFigure, checkLine, expectCheckedAs } from './support/check-line'
import { allowClipboard, copyLink, sheetInLink } from './support/clipboard'
import { expectFigures, textOf } from './support/figures'
import { chooseFile, drop, saveDrawing } from './support/files'
import { jobPhasors, jobResultant, jobTerms } from './support/job'
import { isDrawn, openPage, settledSheet } from './support/page'
import { cell, typeInto } from './support/schedule'
import { expect, test } from './support/test'

test('a technician does the whole job with the mouse', async ({ page }) => {
  await allowClipboard(page)
  await openPage(page)

  await test.step('starts a sheet', async () => {
    await page.getByRole('button', { name: 'New sheet', exact: true }).click()
    await expect(page.getByRole('region', { name: 'Empty sheet' })).toBeVisible()
    const title = page.getByRole('textbox', { name: 'Title of the sheet' })
    await title.fill('Fan unit 3, winding test')
    await title.press('Enter')
  })

  await test.step('types five phasors, two of them as read', async () => {
    for (const phasor of jobPhasors) await addPhasor(page, phasor)
    await expect(
      page.getByRole('table', { name: 'Phasors' }).locator('tbody').getByRole('row'),
    ).toHaveCount(5)
    await expect(cell(page, 'Real', 'Vcoil')).toHaveValue(/^10\.9/)
    await expect(cell(page, 'Imaginary', 'Vcoil')).toHaveValue(/^51\.3/)
  })

  await test.step('builds the sum with its signs', () => buildSum(page))

  const sheet = await settledSheet(page, ({ sums }) => sums?.[0]?.equals !== undefined)
  await test.step('reads the exact resultant beside the measured one', async () => {
    const labels = new Map(sheet.phasors.map(({ id, label }) => [id, label]))
    expect(sheet.readings?.map(({ of, kind }) => `${labels.get(of)} ${kind}`)).toEqual([
      'Vcoil magnitude',
      'Vcoil angle',
      'VS magnitude',
      'VS angle',
    ])
    await expectCheckedAs(page, sheet)
    const { magnitude, angle } = jobResultant()
    expectFigures(await textOf(checkFigure(page, 'Calculated').first()), [magnitude, angle])
    expectFigures(await textOf(checkFigure(page, 'Measured').first()), [49, 33.5])
  })

  await test.step('drags a tip, the schedule follows, and one undo takes it back', async () => {
    const before = await textOf(checkLine(page))
    const screen = await sheetOnScreen(page, sheet)
    const { from, to } = arrowOf(screen.scene, `term:${sheet.sums?.[0]?.id}:0`)
    const unitsPerMillimetre = (screen.scene.unitsPerCentimetre.voltage ?? 0) / 10
    const length = Math.round(Math.hypot(to.x - from.x, to.y - from.y)) + 10
    await dragOver(page, screen.at(to), screen.at(away(from, length, 20)))
    const dragged = length * unitsPerMillimetre
    await expect(page.locator('output.readout')).toContainText(`VR ${length}.0 mm`)
    expectFigures(await cell(page, 'Magnitude', 'VR').inputValue(), [dragged])
    await expect(cell(page, 'Angle', 'VR')).toHaveValue('20°')
    await expect(checkLine(page)).not.toHaveText(before)
    await page.mouse.up()

    await expect(page.locator('output.readout')).toHaveCount(0)
    const after = await settledSheet(page, ({ phasors }) => phasors[1]?.angle?.value === 20)
    expect(after.phasors[1]?.magnitude?.value).toBeCloseTo(dragged, 9)
    await expectCheckedAs(page, after)
    await page.getByRole('button', { name: 'Undo', exact: true }).first().click()
    await expect(cell(page, 'Magnitude', 'VR')).toHaveValue('30.0 V')
    await expect(cell(page, 'Angle', 'VR')).toHaveValue('0°')
    await expect(checkLine(page)).toHaveText(before)
    const undone = await settledSheet(page, ({ phasors }) => phasors[1]?.angle?.value === 0)
    expect(undone).toEqual(sheet)
  })

  await test.step('saves the drawing, and opens it again by the chooser and by a drop', async () => {
    const saved = await saveDrawing(page, /^SVG/)
    expect(saved.name).toBe('Fan unit 3, winding test.svg')
    await startAfresh(page)
    await chooseFile(page, saved.path)
    await expect(cell(page, 'Magnitude', 'Vcap')).toHaveValue('24.0 V')
    expect(sheetInLink(await copyLink(page))).toEqual(sheet)
    await startAfresh(page)
    await drop(page, { files: [saved.path] })
    await expect(cell(page, 'Magnitude', 'Vcap')).toHaveValue('24.0 V')
    expect(sheetInLink(await copyLink(page))).toEqual(sheet)
  })

  await test.step('sends a link that opens the same sheet elsewhere', async () => {
    const other = await page.context().newPage()
    await other.goto(await copyLink(page))
    await isDrawn(other)
    expect(sheetInLink(await copyLink(other))).toEqual(sheet)
    const table = page.getByRole('table', { name: 'Phasors' })
    expect(await other.getByRole('table', { name: 'Phasors' }).ariaSnapshot()).toBe(
      await table.ariaSnapshot(),
    )
    await expectCheckedAs(other, sheet)
  })
})

async function addPhasor(page: Page, phasor: (typeof jobPhasors)[number]): Promise<void> {
  const { label, quantity, magnitude, angle, known } = phasor
  await page.getByRole('button', { name: 'Add phasor', exact: true }).click()
  const row = page.getByRole('table', { name: 'Phasors' }).locator('tbody').getByRole('row').last()
  const name = row.getByRole('textbox', { name: /^Label of/ })
  await expect(name).toBeFocused()
  await name.fill(label)
  await name.press('Enter')
  await page.getByRole('combobox', { name: `Quantity of ${label}` }).selectOption(quantity)
  await typeInto(page, 'Magnitude', label, magnitude)
  await typeInto(page, 'Angle', label, angle)
  await page.getByRole('combobox', { name: `How ${label} is known` }).selectOption(known)
}

async function buildSum(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Add sum', exact: true }).click()
  for (const { phasor, sign } of jobTerms) {
    await page.getByRole('combobox', { name: 'Add a term to the sum' }).selectOption(phasor)
    const toggle = page.getByRole('button', { name: `Sign of ${phasor}` })
    await expect(toggle).toHaveText('+')
    if (sign === -1) await toggle.click()
  }
  await expect(page.getByRole('button', { name: 'Sign of Vcap: minus' })).toHaveText('−')
  await page.getByRole('combobox', { name: 'What the sum must equal' }).selectOption('VS')
}

async function startAfresh(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'New sheet', exact: true }).click()
  await expect(page.getByRole('region', { name: 'Empty sheet' })).toBeVisible()
}
