import type { Page } from '@playwright/test'
import { away, boardOf, dragOver, isInked, sheetOnScreen } from './support/board'
import { checkLine } from './support/check-line'
import {
  constructionSheet,
  drawByHand,
  drawIt,
  drawnEnds,
  expectVerifiedAs,
  handRow,
} from './support/hand'
import { openPage, settledSheet } from './support/page'
import { cell } from './support/schedule'
import { expect, test } from './support/test'

/** Opens the sheet to construct, with the pen in the hand. */
async function openConstruction(page: Page) {
  await openPage(page, constructionSheet)
  await drawByHand(page).click()
  await expect(checkLine(page)).toContainText('Hidden until the last arrow is drawn')
}

/** Draws from one place on the paper to another, wherever the paper lies now. */
async function draw(page: Page, from: number, to: number): Promise<void> {
  const ends = drawnEnds()
  const screen = await sheetOnScreen(page, constructionSheet)
  const [tail, tip] = [ends[from], ends[to]]
  if (!tail || !tip) throw new Error('There is no such end.')
  await dragOver(page, screen.at(tail), screen.at(tip))
  await expect(page.locator('output.readout')).toContainText(/^\d+\.\d mm · /)
  await page.mouse.up()
}

test('a construction is drawn with the mouse, and checked arrow by arrow', async ({ page }) => {
  await openConstruction(page)
  await draw(page, 0, 1)
  await drawIt(page)
  await draw(page, 1, 2)
  await expect(page.getByLabel('It stands for', { exact: true })).toHaveValue('1')
  await drawIt(page)
  await draw(page, 2, 3)
  await drawIt(page)
  await expect(checkLine(page)).toContainText('3 of 4 arrows drawn')
  await draw(page, 0, 3)
  await expect(page.getByLabel('It stands for', { exact: true })).toHaveValue('closing')
  await drawIt(page)
  const sheet = await settledSheet(page, ({ hand }) => hand?.length === 4)
  expect(sheet.drawing).toEqual(constructionSheet.drawing)
  const [first, second, third, closing] = sheet.hand ?? []
  expect(second?.from).toEqual(first?.to)
  expect(third?.from).toEqual(second?.to)
  expect(closing).toMatchObject({ from: first?.from, to: third?.to })
  await expectVerifiedAs(page, sheet)
  await expect(checkLine(page)).toContainText(/most of it by V[RLC]/)
})

test('the exact drawing stays hidden until the last arrow, or until it is asked for', async ({
  page,
}) => {
  await openPage(page, constructionSheet)
  const before = await sheetOnScreen(page, constructionSheet)
  await expect.poll(() => isInked(page, before.middle('term:s1:1'))).toBe(true)
  await drawByHand(page).click()
  const at = async () => (await sheetOnScreen(page, constructionSheet)).middle('term:s1:1')
  await expect.poll(async () => isInked(page, await at())).toBe(false)
  await page.getByRole('button', { name: 'Show calculated', exact: true }).click()
  await expect.poll(async () => isInked(page, await at())).toBe(true)
})

test('undo takes back one arrow at a time, and with the first its frozen scale', async ({
  page,
}) => {
  const { drawing: _, ...free } = constructionSheet
  await openPage(page, free)
  await drawByHand(page).click()
  const screen = await sheetOnScreen(page, free)
  const { origin } = screen.scene
  await dragOver(page, screen.at(origin), screen.at(away(origin, 40, 0)))
  await page.mouse.up()
  await drawIt(page)
  const drawn = await settledSheet(page, ({ hand }) => hand?.length === 1)
  expect(drawn.drawing).toMatchObject({
    origin,
    unitsPerCentimetre: screen.scene.unitsPerCentimetre,
  })
  await page.getByRole('button', { name: 'Undo', exact: true }).click()
  const undone = await settledSheet(page, ({ hand }) => hand === undefined)
  expect(undone.drawing).toBeUndefined()
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
})

test.describe('a stroke leaves no trace', () => {
  const endings: readonly (readonly [string, (page: Page) => Promise<void>])[] = [
    ['Escape is pressed', (page) => page.keyboard.press('Escape')],
    [
      'another window comes before the page',
      (page) => page.evaluate(() => void window.dispatchEvent(new Event('blur'))),
    ],
    [
      'the pointer is taken away',
      (page) =>
        boardOf(page).dispatchEvent('pointercancel', { pointerId: 1, pointerType: 'mouse' }),
    ],
  ]
  for (const [event, end] of endings) {
    test(`where ${event}`, async ({ page }) => {
      await openConstruction(page)
      const screen = await sheetOnScreen(page, constructionSheet)
      const [from, to] = drawnEnds()
      if (!from || !to) throw new Error('There are no ends.')
      await dragOver(page, screen.at(from), screen.at(to))
      await expect(page.locator('output.readout')).toHaveCount(1)
      await end(page)
      await expect(page.locator('output.readout')).toHaveCount(0)
      await page.mouse.up()
      await expect(page.getByRole('dialog', { name: 'What did you draw?' })).toHaveCount(0)
      await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
    })
  }

  test('where Escape answers what was drawn', async ({ page }) => {
    await openConstruction(page)
    await draw(page, 0, 1)
    await expect(page.getByRole('dialog', { name: 'What did you draw?' })).toBeVisible()
    await page.keyboard.press('Escape')
    await expect(page.getByRole('dialog', { name: 'What did you draw?' })).toHaveCount(0)
    await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
  })
})

test('keys move the picked arrow by 1 mm and 1°, a tenth with Shift, and what hangs on it', async ({
  page,
}) => {
  await openConstruction(page)
  await draw(page, 0, 1)
  await drawIt(page)
  await draw(page, 1, 2)
  await drawIt(page)
  const before = await settledSheet(page, ({ hand }) => hand?.length === 2)
  await handRow(page, 'VR').getByLabel('Length of VR, mm').focus()
  await drawByHand(page).focus()
  await page.keyboard.press('ArrowUp')
  await page.keyboard.press('Shift+ArrowUp')
  await page.keyboard.press('ArrowLeft')
  await expect(handRow(page, 'VR').getByLabel('Length of VR, mm')).toHaveValue('41.9')
  await expect(handRow(page, 'VR').getByLabel('Angle of VR, degrees')).toHaveValue('1')
  const after = await settledSheet(page, ({ hand }) => hand?.[0]?.to.y !== before.hand?.[0]?.to.y)
  expect(after.hand?.[1]?.from).toEqual(after.hand?.[0]?.to)
  await page.keyboard.press('Control+z')
  await expect(handRow(page, 'VR').getByLabel('Angle of VR, degrees')).toHaveValue('0')
})

test('a new phasor is placed by press and drag, hung on a tip, and named', async ({ page }) => {
  await openPage(page, constructionSheet)
  await page.getByRole('button', { name: 'Draw phasor', exact: true }).click()
  const screen = await sheetOnScreen(page, constructionSheet)
  const tip = screen.scene.arrows.find(({ key }) => key === 'measured:s1')?.to
  if (!tip) throw new Error('VS is not drawn.')
  await dragOver(page, screen.at(tip), screen.at(away(tip, 30, 120)))
  await page.mouse.up()
  await page.getByLabel('Label', { exact: true }).fill('Vextra')
  await page.getByLabel('Stands', { exact: true }).selectOption('by itself')
  await drawIt(page)
  await expect(cell(page, 'Magnitude', 'Vextra')).toHaveValue('15.0 V')
  const sheet = await settledSheet(page, ({ phasors }) => phasors.length === 6)
  expect(sheet.phasors[5]).toMatchObject({
    label: 'Vextra',
    magnitude: { value: 15 },
    angle: { value: 120 },
    tail: { tipOf: 'VS' },
  })
})

test('a loose phasor that is dropped on the last tip of a sum becomes a term of it', async ({
  page,
}) => {
  const loose = {
    ...constructionSheet,
    sums: [{ id: 's1', terms: [{ phasor: 'VR' }, { phasor: 'VL' }], equals: 'VS' }],
    phasors: constructionSheet.phasors.map((phasor) =>
      phasor.id === 'VC' ? { ...phasor, tail: { x: 200, y: 150 } } : phasor,
    ),
  }
  await openPage(page, loose)
  const screen = await sheetOnScreen(page, loose)
  const arrow = screen.scene.arrows.find(({ key }) => key === 'loose:VC')
  const last = screen.scene.arrows.find(({ key }) => key === 'term:s1:1')
  if (!arrow || !last) throw new Error('The arrows are not drawn.')
  const by = { x: last.to.x - arrow.from.x + 0.5, y: last.to.y - arrow.from.y }
  const hold = screen.middle('loose:VC')
  const scale = screen.paper.width / screen.scene.width
  await dragOver(page, hold, { x: hold.x + by.x * scale, y: hold.y - by.y * scale })
  await expect(page.locator('output.readout')).toHaveText('Let go: a term of VS')
  await page.mouse.up()
  const sheet = await settledSheet(page, ({ sums }) => sums?.[0]?.terms.length === 3)
  expect(sheet.sums?.[0]?.terms[2]).toEqual({ phasor: 'VC' })
  expect(sheet.phasors[3]).not.toHaveProperty('tail')
})
