import type { Page } from '@playwright/test'
import { benchSheet } from './support/bench'
import {
  boardOf,
  dragOver,
  isInked,
  paperOnScreen,
  type SheetOnScreen,
  sheetOnScreen,
} from './support/board'
import { openPage } from './support/page'
import { expect, test } from './support/test'

test('the wheel zooms about the pointer, and Whole sheet fits again', async ({ page }) => {
  const screen = await openBench(page)
  const { paper } = screen
  const pointer = screen.tip('term:s1:0')
  const across = (pointer.x - paper.left) / paper.width
  const down = (pointer.y - paper.top) / paper.height
  await page.mouse.move(pointer.x, pointer.y)
  await page.mouse.wheel(0, 200)
  await expect.poll(async () => (await paperOnScreen(page)).width).toBeLessThan(0.9 * paper.width)
  const small = await paperOnScreen(page)
  expect(small.width / small.height).toBeCloseTo(paper.width / paper.height, 2)
  expect(small.left + across * small.width).toBeCloseTo(pointer.x, 0)
  expect(small.top + down * small.height).toBeCloseTo(pointer.y, 0)
  await page.mouse.wheel(0, -600)
  await expect.poll(() => isInked(page, screen.middle('term:s1:2'))).toBe(false)
  expect(await isInked(page, pointer)).toBe(true)
  await page.getByRole('button', { name: 'Whole sheet' }).click()
  await expect.poll(() => paperOnScreen(page)).toEqual(paper)
})

test('the paper is moved by its empty parts and by the arrow keys', async ({ page }) => {
  const screen = await openBench(page)
  const { paper } = screen
  await page.getByRole('button', { name: 'Smaller' }).click()
  await page.getByRole('button', { name: 'Smaller' }).click()
  await expect.poll(async () => (await paperOnScreen(page)).width).toBeLessThan(0.7 * paper.width)
  const before = await paperOnScreen(page)
  const empty = { x: before.left + 0.5 * before.width, y: before.top + 0.1 * before.height }
  await dragOver(page, empty, { x: empty.x + 30, y: empty.y - 20 })
  await page.mouse.up()
  await expect.poll(async () => (await paperOnScreen(page)).left - before.left).toBeCloseTo(30, 0)
  expect((await paperOnScreen(page)).top - before.top).toBeCloseTo(-20, 0)
  const moved = await paperOnScreen(page)
  await page.getByRole('button', { name: 'Larger' }).focus()
  await page.keyboard.press('ArrowRight')
  await expect.poll(async () => (await paperOnScreen(page)).left).not.toBeCloseTo(moved.left, 0)
  await page.keyboard.press('0')
  await expect.poll(() => paperOnScreen(page)).toEqual(paper)
})

test('the paper fits the board at every size of the window', async ({ page }) => {
  const { scene } = await openBench(page)
  for (const [width, height] of [
    [1280, 800],
    [820, 1180],
    [390, 844],
  ] as const) {
    await page.setViewportSize({ width, height })
    await expect
      .poll(async () => {
        const board = await boardOf(page).boundingBox()
        const paper = await paperOnScreen(page)
        if (!board) return false
        const isWhole = Math.abs(paper.width / paper.height - scene.width / scene.height) < 0.02
        const isInside =
          paper.left >= board.x &&
          paper.top >= board.y &&
          paper.left + paper.width <= board.x + board.width &&
          paper.top + paper.height <= board.y + board.height
        const isFull = paper.width > 0.85 * board.width || paper.height > 0.85 * board.height
        return isWhole && isInside && isFull
      }, `at ${width} × ${height}`)
      .toBe(true)
  }
})

async function openBench(page: Page): Promise<SheetOnScreen> {
  await openPage(page, benchSheet)
  return sheetOnScreen(page, benchSheet)
}
