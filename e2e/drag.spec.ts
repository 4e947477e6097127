import type { Page } from '@playwright/test'
import { benchSheet } from './support/bench'
import {
  arrowOf,
  away,
  between,
  boardOf,
  dragOver,
  isInked,
  type SheetOnScreen,
  sceneOf,
  sheetOnScreen,
} from './support/board'
import { figuresIn, textOf } from './support/figures'
import { openPage, settledSheet } from './support/page'
import { cell } from './support/schedule'
import { expect, test } from './support/test'

const unitsPerMillimetre = 0.5

test.describe('a tip that is dragged', () => {
  test('snaps to whole millimetres and degrees, and says all three figures', async ({ page }) => {
    const screen = await openBench(page)
    const { from } = arrowOf(screen.scene, 'term:s1:0')
    await dragOver(page, screen.tip('term:s1:0'), screen.at(away(from, 93.2, 24.3)))
    await expect(page.locator('output.readout')).toContainText(/^V1 93\.0 mm/)
    await expect(page.locator('output.readout')).toContainText(/ V ∠ /)
    expect(await readout(page)).toEqual([93, 46.5, 24])
    await page.mouse.up()
    const { phasors } = await settledSheet(page, (sheet) => sheet.phasors[1]?.angle?.value === 24)
    expect(phasors[1]).toMatchObject({
      magnitude: { value: 46.5, text: '46.5' },
      angle: { value: 24, text: '24' },
    })
  })

  test('goes to tenths while Shift is down', async ({ page }) => {
    const screen = await openBench(page)
    const { from } = arrowOf(screen.scene, 'term:s1:0')
    await page.keyboard.down('Shift')
    await dragOver(page, screen.tip('term:s1:0'), screen.at(away(from, 93.35, 24.35)))
    const [millimetres, volts, degrees] = await readout(page)
    await page.mouse.up()
    await page.keyboard.up('Shift')
    expect(Math.abs((millimetres as number) - 93.35)).toBeLessThan(0.2)
    expect(Math.abs((degrees as number) - 24.35)).toBeLessThan(0.2)
    expect(volts).toBeCloseTo((millimetres as number) * unitsPerMillimetre, 9)
    const { phasors } = await settledSheet(page, (sheet) => sheet.phasors[1]?.angle?.value !== 10)
    expect(phasors[1]?.magnitude?.value).toBeCloseTo(volts as number, 9)
    expect(phasors[1]?.angle?.value).toBeCloseTo(degrees as number, 9)
    expect(Number.isInteger(millimetres) && Number.isInteger(degrees)).toBe(false)
  })

  test('keeps its limit, and the schedule and the check line follow before it is let go', async ({
    page,
  }) => {
    const screen = await openBench(page)
    const { from } = arrowOf(screen.scene, 'term:s1:1')
    const calculated = page.getByRole('region', { name: 'Check' })
    const before = await textOf(calculated)
    await dragOver(page, screen.tip('term:s1:1'), screen.at(away(from, 50, 120)))
    await expect(cell(page, 'Magnitude', 'V2')).toHaveValue('25.0 V')
    await expect(cell(page, 'Angle', 'V2')).toHaveValue('120°')
    await expect(cell(page, 'Limit', 'V2')).toHaveValue('0.5 V')
    await expect(calculated).not.toHaveText(before)
    await page.mouse.up()
    const { phasors } = await settledSheet(page, (sheet) => sheet.phasors[2]?.angle?.value === 120)
    expect(phasors[2]?.magnitude).toEqual({ value: 25, text: '25.0', limit: 0.5 })
  })

  test('carries along what hangs on it', async ({ page }) => {
    const screen = await openBench(page)
    const from = arrowOf(screen.scene, 'term:s1:1').from
    const tip = away(from, 50, 120)
    const hung = arrowOf(screen.scene, 'loose:Vhung')
    const before = screen.middle('loose:Vhung')
    const after = screen.at(between(tip, away(tip, 30, 150), 0.5))
    expect(hung.from).toEqual(arrowOf(screen.scene, 'term:s1:1').to)
    await expect.poll(() => isInked(page, before)).toBe(true)
    expect(await isInked(page, after)).toBe(false)
    await dragOver(page, screen.tip('term:s1:1'), screen.at(tip))
    await expect.poll(() => isInked(page, after)).toBe(true)
    expect(await isInked(page, before)).toBe(false)
    await page.mouse.up()
    const sheet = await settledSheet(page, (now) => now.phasors[2]?.angle?.value === 120)
    expect(sheet.phasors[4]).toEqual(benchSheet.phasors[4])
    expect(arrowOf(sceneOf(sheet), 'loose:Vhung').from.x).toBeCloseTo(tip.x, 6)
    await expect.poll(() => isInked(page, after)).toBe(true)
  })

  test('stays where a meter put it, and the page says why', async ({ page }) => {
    const screen = await openBench(page)
    const tip = screen.tip('loose:Vread')
    await page.mouse.move(tip.x, tip.y)
    await expect.poll(() => cursorOf(page)).toBe('not-allowed')
    await dragOver(page, tip, { x: tip.x + 60, y: tip.y - 40 })
    await page.mouse.up()
    await expect(page.getByText('of Vread were read on a meter')).toBeVisible()
    await expect(cell(page, 'Magnitude', 'Vread')).toHaveValue('22.5 V')
    await expect(cell(page, 'Angle', 'Vread')).toHaveValue('60°')
    await expectUntouched(page)
  })
})

test('dragging a body places a loose phasor and leaves its value alone', async ({ page }) => {
  const screen = await openBench(page)
  const hold = screen.middle('loose:Vfree')
  const { perMillimetre } = measuresOf(screen)
  await dragOver(page, hold, { x: hold.x + 12 * perMillimetre, y: hold.y + 25 * perMillimetre })
  await page.mouse.up()
  const { phasors } = await settledSheet(page, (sheet) => {
    const tail = sheet.phasors[5]?.tail
    return tail !== undefined && 'x' in tail && tail.x !== 230
  })
  expect(phasors[5]).toEqual({ ...benchSheet.phasors[5], tail: { x: 242, y: 75 } })
})

test.describe('a drag leaves no trace', () => {
  const endings: readonly (readonly [string, (page: Page) => Promise<void>])[] = [
    ['Escape is pressed', (page) => page.keyboard.press('Escape')],
    [
      'another window comes before the page',
      (page) => page.evaluate(() => void window.dispatchEvent(new Event('blur'))),
    ],
  ]
  for (const [event, end] of endings) {
    test(`where ${event}`, async ({ page }) => {
      const screen = await openBench(page)
      const { from } = arrowOf(screen.scene, 'term:s1:0')
      const aim = screen.at(away(from, 60, 70))
      await dragOver(page, screen.tip('term:s1:0'), aim)
      await expect(cell(page, 'Angle', 'V1')).toHaveValue('70°')
      await end(page)
      await expect(page.locator('output.readout')).toHaveCount(0)
      await expect(cell(page, 'Angle', 'V1')).toHaveValue('10°')
      await page.mouse.move(aim.x + 20, aim.y + 20)
      await page.mouse.up()
      await expectUntouched(page)
      await expect.poll(() => isInked(page, screen.middle('term:s1:0'))).toBe(true)
    })
  }
})

/** Opens the sheet to drag on, and lays it out in Node. */
async function openBench(page: Page): Promise<SheetOnScreen> {
  await openPage(page, benchSheet)
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('40 V')
  return sheetOnScreen(page, benchSheet)
}

/** Millimetres, units and degrees, as the readout beside the pointer gives them. */
async function readout(page: Page): Promise<readonly number[]> {
  const text = await textOf(page.locator('output.readout'))
  return figuresIn(text.replace(/^\S+ /, '')).map(({ value }) => value)
}

/** Expects that nothing can be undone and that each row says what it said. */
async function expectUntouched(page: Page): Promise<void> {
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled()
  await expect(cell(page, 'Magnitude', 'V1')).toHaveValue('40 V')
  await expect(cell(page, 'Angle', 'V1')).toHaveValue('10°')
}

async function cursorOf(page: Page): Promise<string> {
  return boardOf(page).evaluate((board) => getComputedStyle(board).cursor)
}

function measuresOf({ paper, scene }: SheetOnScreen): { readonly perMillimetre: number } {
  return { perMillimetre: paper.width / scene.width }
}
