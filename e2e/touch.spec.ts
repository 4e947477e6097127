import type { Page } from '@playwright/test'
import { benchSheet } from './support/bench'
import { arrowOf, away, paperOnScreen, type SheetOnScreen, sheetOnScreen } from './support/board'
import { openPage, settledSheet } from './support/page'
import { cell } from './support/schedule'
import { expect, test } from './support/test'
import { touch } from './support/touch'

test.use({ hasTouch: true, isMobile: true, viewport: { width: 820, height: 1180 } })

test('a finger drags a tip', async ({ page }) => {
  const screen = await openBench(page)
  const { from, to } = arrowOf(screen.scene, 'term:s1:0')
  const finger = await touch(page)
  await finger.down(screen.at(to))
  await finger.move(screen.at(away(from, 93.2, 24.3)))
  await expect(page.locator('output.readout')).toContainText('V1 93.0 mm')
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('24°')
  await finger.lift()
  const { phasors } = await settledSheet(page, (sheet) => sheet.phasors[1]?.angle?.value === 24)
  expect(phasors[1]?.magnitude).toEqual({ value: 46.5, text: '46.5' })
})

test('a second finger ends a drag without a trace, and both then zoom', async ({ page }) => {
  const screen = await openBench(page)
  const { from, to } = arrowOf(screen.scene, 'term:s1:0')
  const aim = screen.at(away(from, 60, 70))
  const other = { x: aim.x + 200, y: aim.y }
  const fingers = await touch(page)
  await fingers.down(screen.at(to))
  await fingers.move(aim)
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('70°')
  await fingers.down(aim, other)
  await expect(page.locator('output.readout')).toHaveCount(0)
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('10°')
  await fingers.move({ x: aim.x + 50, y: aim.y }, { x: other.x - 50, y: other.y })
  await expect
    .poll(async () => (await paperOnScreen(page)).width / screen.paper.width)
    .toBeCloseTo(0.5, 1)
  await fingers.lift()
  await expectUntouched(page)
})

test('a finger that the system takes away leaves no trace of its drag', async ({ page }) => {
  const screen = await openBench(page)
  const { from, to } = arrowOf(screen.scene, 'term:s1:0')
  const finger = await touch(page)
  await finger.down(screen.at(to))
  await finger.move(screen.at(away(from, 60, 70)))
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('70°')
  await finger.lose()
  await expect(page.locator('output.readout')).toHaveCount(0)
  await expectUntouched(page)
})

test('two fingers zoom about the point between them, and Whole sheet fits again', async ({
  page,
}) => {
  const screen = await openBench(page)
  const { paper } = screen
  const centre = { x: paper.left + 0.4 * paper.width, y: paper.top + 0.3 * paper.height }
  const fingers = await touch(page)
  await fingers.down({ x: centre.x - 100, y: centre.y })
  await fingers.down({ x: centre.x - 100, y: centre.y }, { x: centre.x + 100, y: centre.y })
  await fingers.move({ x: centre.x - 50, y: centre.y }, { x: centre.x + 50, y: centre.y })
  await fingers.lift()
  await expect.poll(async () => (await paperOnScreen(page)).width / paper.width).toBeCloseTo(0.5, 1)
  const small = await paperOnScreen(page)
  expect(small.left + 0.4 * small.width).toBeCloseTo(centre.x, 0)
  expect(small.top + 0.3 * small.height).toBeCloseTo(centre.y, 0)
  await page.getByRole('button', { name: 'Whole sheet' }).tap()
  await expect.poll(() => paperOnScreen(page)).toEqual(paper)
  await expectUntouched(page)
})

async function openBench(page: Page): Promise<SheetOnScreen> {
  await openPage(page, benchSheet)
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('40 V')
  return sheetOnScreen(page, benchSheet)
}

/** Expects that nothing can be undone and that the row says what it said. */
async function expectUntouched(page: Page): Promise<void> {
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('40 V')
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('10°')
}
