import type { Page } from '@playwright/test'
import { sheetOnScreen } from './support/board'
import { checkLine } from './support/check-line'
import { constructionSheet, drawByHand, drawIt, drawnEnds, expectVerifiedAs } from './support/hand'
import { openPage, settledSheet } from './support/page'
import { expect, test } from './support/test'
import { type Fingers, touch } from './support/touch'

test.use({ hasTouch: true, isMobile: true, viewport: { width: 820, height: 1180 } })

/** Draws with one finger, from one end of the construction to another. */
async function draw(page: Page, finger: Fingers, from: number, to: number): Promise<void> {
  const ends = drawnEnds()
  const screen = await sheetOnScreen(page, constructionSheet)
  const [tail, tip] = [ends[from], ends[to]]
  if (!tail || !tip) throw new Error('There is no such end.')
  await finger.down(screen.at(tail))
  await finger.move(screen.at(tip))
  await expect(page.locator('canvas.loupe')).toBeVisible()
  await finger.lift()
}

test('a construction is drawn with a finger, and checked arrow by arrow', async ({ page }) => {
  await openPage(page, constructionSheet)
  await drawByHand(page).tap()
  const finger = await touch(page)
  for (const [from, to] of [
    [0, 1],
    [1, 2],
    [2, 3],
    [0, 3],
  ] as const) {
    await draw(page, finger, from, to)
    await drawIt(page)
  }
  const sheet = await settledSheet(page, ({ hand }) => hand?.length === 4)
  await expectVerifiedAs(page, sheet)
  await expect(page.locator('canvas.loupe')).toHaveCount(0)
})

test('a second finger, and a finger that the system takes away, leave no trace', async ({
  page,
}) => {
  await openPage(page, constructionSheet)
  await drawByHand(page).tap()
  await expect(checkLine(page)).toContainText('Hidden until')
  const screen = await sheetOnScreen(page, constructionSheet)
  const [from, to] = drawnEnds().map((place) => screen.at(place))
  if (!from || !to) throw new Error('There are no ends.')
  const fingers = await touch(page)
  const readout = page.locator('output.readout')
  const question = page.getByRole('dialog', { name: 'What did you draw?' })

  await fingers.down(from)
  await fingers.move(to)
  await expect(readout).toHaveCount(1)
  await fingers.down(to, { x: to.x + 90, y: to.y })
  await expect(readout).toHaveCount(0)
  await fingers.lift()
  await expect(question).toHaveCount(0)

  await fingers.down(from)
  await fingers.move(to)
  await expect(readout).toHaveCount(1)
  await fingers.lose()
  await expect(readout).toHaveCount(0)
  await expect(question).toHaveCount(0)
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
})

test('the verbs of drawing are as large as a finger', async ({ page }) => {
  await openPage(page, constructionSheet)
  await drawByHand(page).tap()
  const verbs = page.getByRole('toolbar', { name: /^Drawing/ }).getByRole('button')
  await expect(verbs).toHaveCount(4)
  for (const verb of await verbs.all()) {
    const box = await verb.boundingBox()
    expect(Math.min(box?.width ?? 0, box?.height ?? 0)).toBeGreaterThanOrEqual(44)
  }
})
